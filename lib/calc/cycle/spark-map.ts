import { CalcError } from '../calc-error'
import { takeNumbers } from '../validate/numbers'
import { isRecord, membersOf, takeList, takeRecord } from '../validate/shape'
import { describeValue } from '../validate/describe'
import { burnStartDeg, checkCycle } from './check-cycle'
import type { CycleInput } from './cycle-types'
import { bestOnGrid, noBestSpark } from './find-mbt'
import { firstKnock, takeOctane } from './knock-limited-spark'
import { scaleBurn, type BurnReference } from './scale-burn'
import { sparkGrid } from './spark-grid'
import { burnOf, compress, searchedFromDeg, sweepSparks } from './spark-sweep'

/** How the burn's angles follow speed and charge; the reference's angles are those of `burn` unless given. */
export interface BurnScaling {
  readonly reference: Pick<BurnReference, 'rpm' | 'pressureKpa'> & Partial<BurnReference>
  readonly speedExponent?: number
  readonly pressureExponent?: number
}

export interface SparkMapInput extends Omit<CycleInput, 'rpm'> {
  readonly rpm: readonly number[]
  readonly pressureKpa: readonly number[]
  readonly burnScaling?: BurnScaling
  readonly onProgress?: (progress: { readonly done: number, readonly total: number }) => void
  readonly signal?: AbortSignal
}

/** Index i over rpm, j over pressure; crank degrees BTDC. */
export interface SparkMap {
  readonly rpm: number[]
  readonly pressureKpa: number[]
  readonly mbtDeg: number[][]
  /** `null`: no spark of −20 … 60° reaches the limit; −20, the start of the search, where every spark does. */
  readonly knockLimitDeg: (number | null)[][]
  /** The lesser of the two; `null` where every spark knocks. */
  readonly sparkDeg: (number | null)[][]
}

const largest = 200

const takeAxis = (value: unknown, field: 'rpm' | 'pressureKpa', name: string, unit: string): number[] => {
  const list = takeList(value, field, `The list of ${name}s`, 1)
  if (list.length > largest) {
    throw new CalcError({ field, value, limit: `at most ${largest} entries`, unit: '', message: `The map may have at most ${largest} ${name}s; ${list.length} were given.` })
  }
  return takeNumbers(list, field, { unit, above: 0 }, (i) => `The ${name} ${i + 1}`)
}

/** Lets other work, a key or a wish to stop, have its turn. */
const breathe = () => new Promise<void>((resolve) => { setTimeout(resolve, 0) })

const takeScaling = (value: unknown, burn: { delayDeg: number, durationDeg: number }) => {
  if (value === undefined) return null
  const scaling = takeRecord(value, 'burnScaling', 'The scaling of the burn')
  const reference = takeRecord(scaling.reference, 'burnScaling.reference', 'The reference of the burn')
  return { speedExponent: scaling.speedExponent, pressureExponent: scaling.pressureExponent, reference: { delayDeg: burn.delayDeg, durationDeg: burn.durationDeg, ...reference } }
}

/** An error of `scaleBurn` points into the scaling; its rpm and pressure are the map's own. */
const inScaling = <T>(compute: () => T, i: number, j: number): T => {
  try {
    return compute()
  } catch (error) {
    if (!(error instanceof CalcError)) throw error
    const field = error.field === 'rpm' ? `rpm.${i}` : error.field === 'pressureKpa' ? `pressureKpa.${j}` : `burnScaling.${error.field}`
    throw new CalcError({ ...error.details(), field })
  }
}

/**
 * Best and knock-limited spark over speed and charge pressure, a promise of `{ rpm, pressureKpa, mbtDeg, knockLimitDeg, sparkDeg }`, crank degrees BTDC, [i][j] with i over rpm and j over pressure.
 *
 * At each place `findMbt` and `knockLimitedSpark`; sparkDeg is the lesser of the two. Both come from one grid of sparks that share their compression.
 *
 * Validity: as in `simulateCycle`. 2° steps unless given: best spark and knock limit then differ by less than 0.01° from 0.5° steps. Without `burnScaling` the burn's angles are the same everywhere and the best spark hardly moves with speed.
 * Source: common practice, no published source (a search over `simulateCycle`); scaling as in `scaleBurn`.
 *
 * @param input as in `simulateCycle`, but rpm is a list of 1 … 200 speeds, rpm > 0; `burn` may not be `null`, `octane` must be given, stepDeg is 2 unless given; charge.pressureKpa is not used
 * @param input.pressureKpa list of 1 … 200 charge pressures at inlet closing, kPa > 0
 * @param input.burnScaling `{ reference: { rpm, pressureKpa, delayDeg?, durationDeg? }, speedExponent?, pressureExponent? }` as in `scaleBurn`, its angles those of `burn` unless given
 * @param input.onProgress called with `{ done, total }`, rows of the map, after each speed
 * @param input.signal an AbortSignal: the promise then rejects with its reason
 * @throws CalcError on what `simulateCycle` refuses (as a rejection), on `rpm.i`, `pressureKpa.j`, `burnScaling.…`, `octane`, and on `burn` where the best spark lies at an end of the range
 * @example
 * (await sparkMap({ engine: { boreMm: 90, strokeMm: 80, rodMm: 140, compressionRatio: 8, ivcDeg: -120, evoDeg: 120 }, rpm: [2000], pressureKpa: [100], charge: { pressureKpa: 100, temperatureK: 370, residualFraction: 0.05, airFuelRatio: 13 }, burn: { sparkDeg: 20, delayDeg: 9, durationDeg: 60, efficiency: 0.85 }, gamma: 1.3, heatLoss: null, octane: 150 })).knockLimitDeg // → [[null]]
 */
export const sparkMap = async (input: SparkMapInput): Promise<SparkMap> => {
  const members = membersOf(input)
  const rpm = takeAxis(members.rpm, 'rpm', 'speed', 'rpm')
  const pressureKpa = takeAxis(members.pressureKpa, 'pressureKpa', 'charge pressure', 'kPa')
  const charge = isRecord(members.charge) ? members.charge : {}
  const first = checkCycle({ stepDeg: 2, ...input, rpm: rpm[0] ?? 0, charge: { ...input.charge, ...charge, pressureKpa: pressureKpa[0] ?? 0 } })
  const burn = burnOf(first)
  takeOctane(first)
  const scaling = takeScaling(members.burnScaling, burn)
  const onProgress = takeFunction(members.onProgress)
  const signal = takeSignal(members.signal)
  const map: SparkMap = { rpm, pressureKpa, mbtDeg: [], knockLimitDeg: [], sparkDeg: [] }
  for (const [i, speed] of rpm.entries()) {
    await breathe()
    signal?.throwIfAborted()
    const rows: [number[], (number | null)[], (number | null)[]] = [[], [], []]
    for (const [j, pressure] of pressureKpa.entries()) {
      const angles = scaling === null ? burn : inScaling(() => scaleBurn({
        reference: scaling.reference, rpm: speed, pressureKpa: pressure,
        speedExponent: scaling.speedExponent, pressureExponent: scaling.pressureExponent,
      } as Parameters<typeof scaleBurn>[0]), i, j)
      const here = { ...burn, delayDeg: angles.delayDeg, durationDeg: angles.durationDeg }
      const startDeg = burnStartDeg(here)
      if (startDeg < first.engine.ivcDeg || startDeg >= first.engine.evoDeg) throw noBestSpark(members.burn, { fromDeg: searchedFromDeg, toDeg: here.delayDeg - first.engine.ivcDeg, at: () => ({ sparkDeg: 0, workJ: 0, knock: 0 }) }, placeOf(speed, pressure))
      const sweep = sweepSparks(compress({ ...first, rpm: speed, charge: { ...first.charge, pressureKpa: pressure }, burn: here }))
      const grid = sparkGrid(sweep)
      const best = bestOnGrid(sweep, grid)
      if (!best) throw noBestSpark(members.burn, sweep, placeOf(speed, pressure))
      const { state, limitDeg } = firstKnock(sweep, grid, 1)
      rows[0].push(best.sparkDeg)
      rows[1].push(state === 'always' ? searchedFromDeg : limitDeg)
      rows[2].push(state === 'always' ? null : Math.min(best.sparkDeg, limitDeg ?? Infinity))
    }
    map.mbtDeg.push(rows[0])
    map.knockLimitDeg.push(rows[1])
    map.sparkDeg.push(rows[2])
    onProgress?.({ done: i + 1, total: rpm.length })
  }
  signal?.throwIfAborted()
  return map
}

const placeOf = (rpm: number, pressureKpa: number): string => ` (at ${rpm} rpm and ${pressureKpa} kPa)`

const takeFunction = (value: unknown): SparkMapInput['onProgress'] => {
  if (value === undefined) return undefined
  if (typeof value === 'function') return (progress) => { value(progress) }
  throw new CalcError({ field: 'onProgress', value, limit: 'a function', unit: '', message: `The receiver of progress must be a function; ${describeValue(value)} was given.` })
}

const takeSignal = (value: unknown): AbortSignal | undefined => {
  if (value === undefined || value instanceof AbortSignal) return value
  throw new CalcError({ field: 'signal', value, limit: 'an AbortSignal', unit: '', message: `The signal to stop must be an AbortSignal; ${describeValue(value)} was given.` })
}
