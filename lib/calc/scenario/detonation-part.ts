import { standardAtmosphere } from '../air/standard-atmosphere'
import { densityAltitudeM } from '../air/density-altitude'
import { powerAtDensityRatio } from '../air/lapsed-power'
import { checkCycle } from '../cycle/check-cycle'
import { firstKnock } from '../cycle/knock-limited-spark'
import { octaneExponent } from '../cycle/prepare-cycle'
import { sparkGrid } from '../cycle/spark-grid'
import { compress, searchedFromDeg, searchedToDeg, sweepSparks, type SparkPoint, type SparkSweep } from '../cycle/spark-sweep'
import type { CarriedPoint, CycleModel } from './cycle-model'
import { lookedSpeeds } from './looked-speeds'
import { withheld } from './part'
import type { ChannelName, DetonationPoint, DetonationRow, PartFigures, PerChannel } from './result-types'
import type { ReadyScenario } from './ready-scenario'
import { channelNames, perChannel } from './speed-points'

/** Absolute octane is good to this at best; against a setting known to run clean, to the second. */
const octaneUncertainty = 5
const anchoredUncertainty = 1
/** A typed charge may miss the power by this share. */
const mismatchAllowed = 0.05

/** One charge at any spark and octane: the integral scales with the octane number, so one grid serves all. */
interface ChargeState {
  readonly sweep: SparkSweep
  readonly grid: SparkPoint[]
}

interface Case { readonly hotterK: number, readonly denserKpa: number, readonly lapse: number, readonly octane: number }

/** The octane the grids are carried for; any would do. */
const carriedOctane = 100

/** The model's own octane scale against the fuel's: shifted where a reference setting anchors it. */
const scaleFor = (octane: number): number => (carriedOctane / octane) ** octaneExponent

const sweepAt = (model: CycleModel, rpm: number, pressureKpa: number, hotterK: number): SparkSweep =>
  sweepSparks(compress(checkCycle(model.inputAt(rpm, pressureKpa, 0, { hotterK, octane: carriedOctane }))))

/** A typed charge that does not make the power carried says nothing of detonation. */
export function refuseMismatch({ mismatch }: CycleModel): void {
  if (Math.abs(mismatch) <= mismatchAllowed) return
  throw withheld(
    'chargeMismatch', 'sheet.cycle.volumetricEfficiency',
    `With the volumetric efficiency typed the charge makes ${(100 * Math.abs(mismatch)).toFixed(0)} % ${mismatch < 0 ? 'less' : 'more'} power than the power curve says.`, mismatch, `within ${100 * mismatchAllowed} %`,
  )
}

export function detonationPart(scenario: ReadyScenario, model: CycleModel): PartFigures<'detonation'> {
  const { sheet } = scenario
  refuseMismatch(model)
  const stateAt = (rpm: number, pressureKpa: number, hotterK: number): ChargeState => {
    const sweep = sweepAt(model, rpm, pressureKpa, hotterK)
    return { sweep, grid: sparkGrid(sweep) }
  }
  const shift = octaneShiftOf(scenario, model)
  const uncertainty = sheet.reference === null ? octaneUncertainty : anchoredUncertainty

  const limitOf = ({ sweep, grid }: ChargeState, octane: number) => firstKnock(sweep, grid, scaleFor(Math.max(1, octane - shift)))
  const marginOf = (state: ChargeState, octane: number, sparkDeg: number): number | null => {
    const { state: kind, limitDeg } = limitOf(state, octane)
    if (kind === 'always') return null
    return (limitDeg ?? searchedToDeg) - sparkDeg
  }
  const pointOf = (carried: CarriedPoint, pressureKpa: number, state: ChargeState, octane: number, sparkDeg: number): DetonationPoint => {
    const { state: kind, limitDeg } = limitOf(state, octane)
    const integral = state.sweep.at(Math.min(state.sweep.toDeg, Math.max(searchedFromDeg, sparkDeg))).knock
    return {
      rpm: carried.rpm, powerKw: carried.powerKw, pressureKpa, sparkDeg, limitDeg, state: kind,
      marginDeg: kind === 'always' ? null : (limitDeg ?? searchedToDeg) - sparkDeg,
      lowDeg: marginOf(state, octane - uncertainty, sparkDeg), highDeg: marginOf(state, octane + uncertainty, sparkDeg),
      octaneRequired: carriedOctane * integral ** (1 / octaneExponent) + shift,
    }
  }

  const cases: Record<'planned' | 'worse' | 'altitude', Case> = {
    planned: { hotterK: 0, denserKpa: 0, lapse: 1, octane: sheet.fuel.octane },
    worse: { hotterK: sheet.worse.hotterK, denserKpa: sheet.worse.denserKpa, lapse: 1, octane: sheet.fuel.worseOctane },
    altitude: { hotterK: 0, denserKpa: 0, lapse: lapseOf(scenario), octane: sheet.fuel.octane },
  }
  const looked = lookedSpeeds(scenario).map((rpm) => {
    const carried = model.carriedAt(rpm)
    const spark = perChannel((channel) => scenario.advance(channel, carried.rpm, sheet.manifold.fullKpa))
    const at = (name: keyof typeof cases): PerChannel<DetonationPoint> & { pressureKpa: number } => {
      const { hotterK, denserKpa, lapse, octane } = cases[name]
      const pressureKpa = carried.pressureKpa * lapse + denserKpa
      const state = stateAt(carried.rpm, pressureKpa, hotterK)
      return { pressureKpa, ...perChannel((channel) => pointOf(carried, pressureKpa, state, octane, spark[channel])) }
    }
    return { carried, spark, planned: at('planned'), worse: at('worse'), altitude: at('altitude') }
  })

  const marginAt = (i: number, channel: ChannelName) => looked[i]?.worse[channel].marginDeg ?? -Infinity
  const worstOf = (channel: ChannelName) => looked.reduce((worst, _, i) => (marginAt(i, channel) < marginAt(worst, channel) - 1e-9 ? i : worst), looked.length - 1)
  const rowOf = (channel: ChannelName): DetonationRow => {
    const entry = looked[worstOf(channel)]
    if (!entry) throw withheld('notComputed', 'sheet.cycle', 'No speed could be looked at.')
    const { hotterK, octane } = cases.worse
    const { pressureKpa } = entry.worse
    const here = entry.worse[channel].limitDeg
    const lost = (state: ChargeState, fuel: number) => {
      const { limitDeg } = limitOf(state, fuel)
      return here === null || limitDeg === null ? null : here - limitDeg
    }
    const { rpm } = entry.carried
    return {
      planned: entry.planned[channel], worse: entry.worse[channel], altitude: entry.altitude[channel],
      perOctaneDeg: lost(stateAt(rpm, pressureKpa, hotterK), octane - 1),
      per10KDeg: lost(stateAt(rpm, pressureKpa, hotterK + 10), octane),
      per10KpaDeg: lost(stateAt(rpm, pressureKpa + 10, hotterK), octane),
    }
  }
  const primaryWorst = looked[worstOf('primary')]
  return {
    ...Object.fromEntries(channelNames.map((channel) => [channel, rowOf(channel)])) as PerChannel<DetonationRow>,
    octaneUncertainty: uncertainty, anchored: sheet.reference !== null, octaneShift: shift,
    gainDeg: primaryWorst ? primaryWorst.spark.primary - primaryWorst.spark.backup : 0,
    gainOctane: primaryWorst ? primaryWorst.worse.primary.octaneRequired - primaryWorst.worse.backup.octaneRequired : 0,
  }
}

/** Full-throttle power at the planned place over that at sea level: the charge thins with it. */
function lapseOf({ sheet }: ReadyScenario): number {
  const { densityRatio } = standardAtmosphere({ altitudeM: densityAltitudeM(sheet.conditions) })
  return Math.max(0.05, powerAtDensityRatio(densityRatio))
}

/** By how much the fuel's octane number lies above what the model would ask for, at a setting known to run clean with a margin. */
export function octaneShiftOf({ sheet, engine }: ReadyScenario, model: CycleModel): number {
  const { reference } = sheet
  if (reference === null) return 0
  if (reference.rpm < engine.idleRpm || reference.rpm > engine.maxRpm)
    throw withheld('runUpOutside', 'sheet.reference.rpm', `The reference setting must lie between idle, ${engine.idleRpm} rpm, and full power, ${engine.maxRpm} rpm.`, reference.rpm, `${engine.idleRpm} … ${engine.maxRpm}`)
  const { pressureKpa } = model.carriedAt(reference.rpm, 'full')
  const sweep = sweepAt(model, reference.rpm, pressureKpa, 0)
  const limitDeg = reference.sparkDeg + reference.marginDeg
  if (limitDeg > sweep.toDeg || limitDeg < sweep.fromDeg)
    throw withheld('runUpOutside', 'sheet.reference.sparkDeg', `Spark and margin of the reference together must lie in ${sweep.fromDeg} … ${sweep.toDeg}°.`, limitDeg, `${sweep.fromDeg} … ${sweep.toDeg}`)
  return reference.octane - carriedOctane * sweep.at(limitDeg).knock ** (1 / octaneExponent)
}
