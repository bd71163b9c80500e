import { CalcError } from '../calc-error'
import { takeCycleEngine, type CycleEngine } from '../geometry/cycle-engine'
import { takeNumber, takeOptionalNumber, type NumberRule } from '../validate/number'
import { turningSpeed } from '../validate/rules'
import { membersOf, takeRecord } from '../validate/shape'
import { describeValue } from '../validate/describe'
import type { Burn, Charge, CycleInput, HeatLoss } from './cycle-types'

/** A cycle's input with its defaults filled in. */
export interface CheckedCycle {
  readonly engine: CycleEngine
  readonly rpm: number
  readonly charge: Charge
  readonly burn: Required<Burn> | null
  readonly gamma: number | 'temperature'
  readonly heatLoss: Required<HeatLoss> | null
  readonly octane: number | null
  readonly stepDeg: number
}

const stepRule: NumberRule = { name: 'The step', unit: 'deg', min: 0.001, max: 10 }

/** Crank angle at which burning starts, degrees after top dead centre. */
export const burnStartDeg = ({ sparkDeg, delayDeg }: Pick<Burn, 'sparkDeg' | 'delayDeg'>): number => delayDeg - sparkDeg

/** Share of the burn's duration after which 90 % of the fuel is burned; infinite when the curve never gets there. */
export const ninetyShare = (burn: { readonly a: number, readonly m: number }): number => {
  const share = (Math.LN10 / burn.a) ** (1 / (burn.m + 1))
  return share <= 1 ? share : Infinity
}

export const takeCharge = (value: unknown): Charge => {
  const members = takeRecord(value, 'charge', 'The charge')
  return {
    pressureKpa: takeNumber(members.pressureKpa, 'charge.pressureKpa', { name: 'The pressure at inlet closing', unit: 'kPa', above: 0 }),
    temperatureK: takeNumber(members.temperatureK, 'charge.temperatureK', { name: 'The temperature at inlet closing', unit: 'K', above: 0 }),
    residualFraction: takeNumber(members.residualFraction, 'charge.residualFraction', { name: 'The residual fraction', unit: '', min: 0, below: 1 }),
    airFuelRatio: takeNumber(members.airFuelRatio, 'charge.airFuelRatio', { name: 'The air-fuel ratio', unit: '', above: 0 }),
  }
}

const takeBurn = (value: unknown, { ivcDeg, evoDeg }: CycleEngine): Required<Burn> => {
  const members = takeRecord(value, 'burn', 'The burn')
  const burn = {
    sparkDeg: takeNumber(members.sparkDeg, 'burn.sparkDeg', { name: 'The spark', unit: 'deg' }),
    delayDeg: takeNumber(members.delayDeg, 'burn.delayDeg', { name: 'The delay from spark to burning', unit: 'deg', min: 0 }),
    durationDeg: takeNumber(members.durationDeg, 'burn.durationDeg', { name: 'The duration of the burn', unit: 'deg', above: 0 }),
    a: takeOptionalNumber(members.a, 'burn.a', { name: 'The constant a of the burn', unit: '', above: 0 }, 5),
    m: takeOptionalNumber(members.m, 'burn.m', { name: 'The exponent m of the burn', unit: '', min: 0 }, 2),
    efficiency: takeNumber(members.efficiency, 'burn.efficiency', { name: 'The efficiency of combustion', unit: '', above: 0, max: 1 }),
    heatingValueKjPerKg: takeOptionalNumber(members.heatingValueKjPerKg, 'burn.heatingValueKjPerKg', { name: 'The heating value of the fuel', unit: 'kJ/kg', above: 0 }, 44_000),
  }
  const startDeg = burnStartDeg(burn)
  if (startDeg < ivcDeg || startDeg >= evoDeg) {
    throw new CalcError({
      field: 'burn.sparkDeg', value: burn.sparkDeg, limit: `> ${burn.delayDeg - evoDeg} and ≤ ${burn.delayDeg - ivcDeg}`, unit: 'deg',
      message: `Burning must start between the closing of the inlet valve (${ivcDeg} deg) and the opening of the exhaust valve (${evoDeg} deg); a spark at ${burn.sparkDeg} deg with a delay of ${burn.delayDeg} deg starts it at ${startDeg} deg.`,
    })
  }
  return burn
}

const takeGamma = (value: unknown): number | 'temperature' => {
  if (value === 'temperature') return value
  if (typeof value === 'string') {
    throw new CalcError({ field: 'gamma', value, limit: '> 1 and ≤ 1.67, or the word temperature', unit: '', message: `The ratio of specific heats must be a number or the word “temperature”; ${describeValue(value)} was given.` })
  }
  return takeNumber(value, 'gamma', { name: 'The ratio of specific heats', unit: '', above: 1, max: 1.67 })
}

const takeHeatLoss = (value: unknown): Required<HeatLoss> => {
  const members = takeRecord(value, 'heatLoss', 'The heat loss')
  return {
    wallK: takeNumber(members.wallK, 'heatLoss.wallK', { name: 'The temperature of the walls', unit: 'K', above: 0 }),
    headAreaFactor: takeOptionalNumber(members.headAreaFactor, 'heatLoss.headAreaFactor', { name: 'The factor of the head area', unit: '', above: 0 }, 1),
  }
}

/** `null` must be said: nothing given is a missing argument, not a motored cycle or one without loss. */
const orNull = <T>(value: unknown, take: (value: unknown) => T): T | null => (value === null ? null : take(value))

/** Every value of a cycle's input checked; the error's field begins at the member of the input. */
export const checkCycle = (input: CycleInput): CheckedCycle => {
  const members = membersOf(input)
  const engine = takeCycleEngine(members.engine, 'engine')
  return {
    engine,
    rpm: takeNumber(members.rpm, 'rpm', turningSpeed),
    charge: takeCharge(members.charge),
    burn: orNull(members.burn, (value) => takeBurn(value, engine)),
    gamma: takeGamma(members.gamma),
    heatLoss: orNull(members.heatLoss, takeHeatLoss),
    octane: members.octane === undefined ? null : takeNumber(members.octane, 'octane', { name: 'The octane number', unit: '', above: 0 }),
    stepDeg: takeOptionalNumber(members.stepDeg, 'stepDeg', stepRule, 0.5),
  }
}
