import { CalcError } from '../calc-error'
import type { Coil } from '../coil/coil'
import { coilCurrentA, sparkEnergyMj, stalledCurrentA } from '../coil/coil-current'
import { coilHeat } from '../coil/coil-heat'
import { sparksPerSecond } from '../coil/spark-period'
import { forChannel } from './part'
import type { ChannelName, CoilRow, PerChannel } from './result-types'
import type { CoilSetup, Scenario } from './scenario-types'
import { perChannel } from './speed-points'

export const coilAt = ({ ohm, mh, limitA }: CoilSetup, supplyV: number): Coil => ({ supplyV, ohm, mh, ...(limitA === null ? {} : { limitA }) })

/** Cylinders one coil fires: all through a cap; a coil a cylinder where they sit on the plugs, one that fires a pair counts as one with a wasted spark. */
export const cylindersOfCoil = ({ engine, sheet }: Scenario): number => (sheet.distribution === 'directCoils' ? 1 : engine.cylinders)

/** Charge, heat and time of each channel's coil at full-power speed, and what is left of them while the starter turns. */
export function coilsPart(scenario: Scenario): PerChannel<CoilRow> {
  return perChannel((channel) => forChannel(channel, () => coilRow(scenario, channel)))
}

function coilRow(scenario: Scenario, channel: ChannelName): CoilRow {
  const { engine, sheet } = scenario
  const setup = sheet.coils[channel]
  const running = coilAt(setup, setup.supplyV)
  const cranking = coilAt(setup, setup.crankingV)
  const turning = { cylinders: cylindersOfCoil(scenario), rpm: engine.maxRpm, wastedSpark: setup.wastedSpark }
  const periodMs = 1000 / sparksPerSecond(turning)
  const heat = setup.dwellMs > periodMs ? null : orRunaway(() => coilHeat({
    coil: running, dwellMs: setup.dwellMs, ...turning, ambientK: setup.ambientK, thermalResistanceKPerW: setup.thermalResistanceKPerW,
  }))
  return {
    currentA: coilCurrentA(running, setup.dwellMs), energyMj: sparkEnergyMj(running, setup.dwellMs),
    crankingCurrentA: coilCurrentA(cranking, setup.dwellMs), crankingEnergyMj: sparkEnergyMj(cranking, setup.dwellMs),
    stalledA: stalledCurrentA(running),
    windingK: heat?.windingK ?? null, powerW: heat?.powerW ?? null,
    periodShare: (setup.dwellMs + sheet.rotor.sparkDurationMs) / periodMs,
  }
}

/** A coil that finds no steady temperature is a result, the worst there is, not a fault of the typing. */
function orRunaway<T>(compute: () => T): T | null {
  try {
    return compute()
  } catch (error) {
    if (error instanceof CalcError) return null
    throw error
  }
}
