import { bestOnGrid } from '../cycle/find-mbt'
import { checkCycle } from '../cycle/check-cycle'
import { simulateCycle } from '../cycle/simulate-cycle'
import { sparkGrid } from '../cycle/spark-grid'
import { compress, sweepSparks } from '../cycle/spark-sweep'
import { displacementM3 } from '../geometry/slider-crank'
import { defaultLimits, type Limits } from '../limits'
import type { Notice } from '../notice'
import { sparkEnergyMj } from '../coil/coil-current'
import { sparkDemandKv } from '../spark/demand'
import { sparkMargin } from '../spark/margin'
import { coilAt } from './coils-part'
import { cycleDrafts } from './cycle-findings'
import { cycleModel, type CycleModel } from './cycle-model'
import { detonationPart } from './detonation-part'
import { rankFindings, toFindings } from './draft'
import { forChannel, part } from './part'
import { readyScenario, type ReadyScenario } from './ready-scenario'
import { cycleParts, type Part, type PartError, type PerChannel, type PressureRow, type ScenarioParts, type ScenarioResult, type SparkRow } from './result-types'
import type { Scenario } from './scenario-types'
import { perChannel } from './speed-points'

type CycleParts = Pick<ScenarioParts, (typeof cycleParts)[number]>

const notYet: PartError = { code: 'notComputed', field: 'sheet.cycle', value: null, limit: null, unit: null, message: 'The simulated cycle is being computed.' }
const withoutCycle: { ok: false; error: PartError } = { ok: false, error: notYet }

/** What stands in the cycle's parts until their layer is computed. */
export const cycleNotComputed: CycleParts = { charge: withoutCycle, detonation: withoutCycle, pressure: withoutCycle, spark: withoutCycle }

/** Air that a starter draws in: standard sea level, kPa and K. */
const crankingCharge = { pressureKpa: 101.325, temperatureK: 288.15 }

/**
 * The second layer of a scenario: charge, detonation, pressure and spark demand from the simulated cycle, with the findings that stand on them.
 * Takes some tens of milliseconds: a page runs it beside itself. Never throws for a part.
 *
 * @param scenario the same that `closed` was computed from
 * @param closed result of `evaluateClosedForms`
 * @param limits the same again
 */
export function addCycleLayer(scenario: Scenario, closed: ScenarioResult, limits: Limits = defaultLimits): ScenarioResult {
  const ready = readyScenario(scenario)
  const model = part(() => cycleModel(ready))
  const heard: Notice[] = []
  const standing = <T extends object>(compute: (model: CycleModel) => T): Part<T> => (model.ok ? part(() => compute(model)) : model)
  const cycle: CycleParts = {
    charge: standing((found) => chargePart(scenario, found)),
    detonation: standing((found) => detonationPart(ready, found)),
    pressure: standing((found) => pressurePart(ready, found, heard)),
    spark: standing((found) => sparkPart(ready, found)),
  }
  const parts: ScenarioParts = { ...closed.parts, ...cycle }
  const isCycleFinding = new Set<string>(['detonationDeg', 'sparkVoltageRatio'])
  const findings = rankFindings([
    ...closed.findings.filter(({ limitId }) => !isCycleFinding.has(limitId)),
    ...toFindings(cycleDrafts(ready, parts), limits),
  ])
  const notices = [...closed.notices.filter(({ field }) => !field.startsWith('sheet.cycle')), ...cycleNotices(scenario, cycle, heard)]
  const count = (verdict: string) => findings.filter((finding) => finding.verdict === verdict).length
  const modelSources = cycle.charge.ok ? ['woschni-1967', 'hires-1978', 'gamma-fit'] : []
  return {
    ...closed, parts, findings, notices,
    counts: { outside: count('outside'), close: count('close'), within: count('within') },
    sourceIds: [...new Set([...closed.sourceIds, ...findings.flatMap(({ sourceIds }) => sourceIds), ...notices.map(({ source }) => source), ...modelSources])].sort(),
  }
}

function chargePart({ sheet }: Scenario, { full, volumetricEfficiency, mismatch }: CycleModel) {
  return {
    rpm: full.rpm, powerKw: full.powerKw, pressureKpa: full.pressureKpa, volumetricEfficiency, mismatch,
    from: sheet.cycle.volumetricEfficiency === null ? 'power' as const : 'typed' as const,
    ...full.burn, mbtDeg: sheet.mbt.deg,
  }
}

/** Pressures of the cycle at full power on either channel's spark; what the cycle had to say beside them is added to `heard`. */
function pressurePart({ engine, sheet, advance }: ReadyScenario, model: CycleModel, heard: Notice[]): PerChannel<PressureRow> & { rpm: number } {
  const { pressureKpa } = model.full
  const rpm = engine.maxRpm
  const sweep = sweepSparks(compress(checkCycle(model.inputAt(rpm, pressureKpa, 0))))
  const best = bestOnGrid(sweep, sparkGrid(sweep))
  const fmepKpa = model.fmepKpa(rpm)
  const bestImepKpa = best ? best.workJ / 1000 / displacementM3(model.engine) : null
  const rowOf = (sparkDeg: number): PressureRow => {
    const { imepKpa, peakKpa, peakDeg, notices } = simulateCycle({ ...model.inputAt(rpm, pressureKpa, sparkDeg), stepDeg: 0.5, arrays: false })
    heard.push(...notices)
    return { imepKpa, peakKpa, peakDeg, torqueRatio: bestImepKpa === null || bestImepKpa <= fmepKpa ? 1 : (imepKpa - fmepKpa) / (bestImepKpa - fmepKpa) }
  }
  return { rpm, ...perChannel((channel) => rowOf(advance(channel, rpm, sheet.manifold.fullKpa))) }
}

/** Voltage asked for and offered, at full power and while the starter turns. */
function sparkPart(scenario: ReadyScenario, model: CycleModel): PerChannel<SparkRow> {
  const { engine, sheet, advance } = scenario
  return perChannel((channel) => forChannel(channel, () => {
    const setup = sheet.coils[channel]
    const demandAt = (charge: { pressureKpa: number; temperatureK: number }, sparkDeg: number) =>
      sparkDemandKv({ engine: model.engine, charge, sparkDeg, gapMm: sheet.plugGapMm })
    const offerAt = (supplyV: number, demandKv: number) => sparkMargin({
      demandKv, energyMj: sparkEnergyMj(coilAt(setup, supplyV), setup.dwellMs), secondaryPf: setup.secondaryPf,
      transferEfficiency: setup.transferEfficiency, ...(setup.clampKv === null ? {} : { clampKv: setup.clampKv }),
    })
    const demandKv = demandAt({ pressureKpa: model.full.pressureKpa + sheet.worse.denserKpa, temperatureK: sheet.cycle.chargeK }, advance(channel, engine.maxRpm, sheet.manifold.fullKpa))
    const crankingDemandKv = demandAt(crankingCharge, advance(channel, engine.crankingRpm, sheet.manifold.fullKpa))
    const running = offerAt(setup.supplyV, demandKv)
    const cranking = offerAt(setup.crankingV, crankingDemandKv)
    return {
      demandKv, offeredKv: running.offeredKv, ratio: running.ratio,
      crankingDemandKv, crankingOfferedKv: cranking.offeredKv, crankingRatio: cranking.ratio,
    }
  }))
}

/** What a typed charge means, and each kind of thing the cycle said once, at its largest. */
function cycleNotices({ sheet }: Scenario, { charge, pressure }: CycleParts, heard: readonly Notice[]): Notice[] {
  const typed: Notice[] = charge.ok && charge.from === 'typed'
    ? [{ code: 'chargeTyped', severity: 'info', field: 'sheet.cycle.volumetricEfficiency', value: sheet.cycle.volumetricEfficiency ?? 0, limit: `${(100 * charge.mismatch).toFixed(1)} %`, source: 'trade' }]
    : []
  const byCode = new Map([...heard].sort((left, right) => left.value - right.value).map((notice) => [notice.code, { ...notice, field: 'sheet.cycle' }]))
  return [...typed, ...(pressure.ok ? byCode.values() : [])]
}
