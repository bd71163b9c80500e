import { CalcError } from '../calc-error'
import { meanOf } from '../shared/moments'
import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { anySpeed } from '../validate/rules'
import { membersOf, takeChoice, takeRecord } from '../validate/shape'
import type { BenchReading } from './bench-types'
import { takeReadings } from './take-readings'

/** Reading of the wheel at which the piston stands at its top. */
export interface IndexDatum { readonly kind: 'index', readonly atDeg: number }
/** No top is known: the mean of the primary at one speed is taken to be as planned. */
export interface RelativeDatum { readonly kind: 'relative', readonly rpm: number, readonly planDeg: number }

export interface BenchWheel {
  readonly wheel: 'crank' | 'distributor'
  /** 1 where the wheel's numbers fall as a spark comes earlier, −1 where they rise. */
  readonly sense: 1 | -1
  readonly datum: IndexDatum | RelativeDatum
}

const wheels: readonly BenchWheel['wheel'][] = ['crank', 'distributor']
const datumKinds: readonly (IndexDatum | RelativeDatum)['kind'][] = ['index', 'relative']

const takeSense = (value: unknown): 1 | -1 => {
  if (value === 1 || value === -1) return value
  throw new CalcError({ field: 'sense', value, limit: '1 or −1', unit: '', message: 'The sense of the wheel must be 1 (its numbers fall as a spark comes earlier) or −1 (they rise).' })
}

/** Advance at which the wheel reads `fromDeg`. */
const takeDatum = (given: unknown, readings: readonly BenchReading[], all: unknown): { advanceDeg: number, fromDeg: number, field: string } => {
  const members = takeRecord(given, 'datum', 'The datum of the wheel')
  if (takeChoice(members.kind, 'datum.kind', 'The kind of datum', datumKinds) === 'index') {
    return { advanceDeg: 0, fromDeg: takeNumber(members.atDeg, 'datum.atDeg', { name: 'The reading at top dead centre', unit: 'deg' }), field: 'datum.atDeg' }
  }
  const rpm = takeNumber(members.rpm, 'datum.rpm', { ...anySpeed, name: 'The speed of the datum' })
  const planDeg = takeNumber(members.planDeg, 'datum.planDeg', { name: 'The planned advance at the datum', unit: 'deg' })
  const read = readings.filter((reading) => reading.channel === 'primary' && reading.rpm === rpm).map(({ readDeg }) => readDeg)
  if (read.length === 0) {
    throw new CalcError({ field: 'datum.rpm', value: rpm, limit: 'a speed at which the primary was read', unit: 'rpm', message: `The primary must have been read at the speed of the datum; there is no reading of it at ${rpm} rpm.` })
  }
  return { advanceDeg: planDeg, fromDeg: finiteResult(meanOf(read), 'readings', all, 'deg'), field: 'datum.planDeg' }
}

/**
 * Readings of a bench's wheel turned into advance: the same readings, `readDeg` in crank degrees of advance.
 *
 * index: advance = sense·k·(atDeg − readDeg); relative: advance = planDeg + sense·k·(mean primary reading at that rpm − readDeg);
 * k = 2 on a distributor's wheel, which turns at half the crank's speed, else 1.
 *
 * Validity: readings taken against each cylinder's own mark. With a relative datum only shape, stagger, step and scatter can be judged:
 * absolute timing is set on the engine.
 * Source: common practice, no published source.
 *
 * @param readings one at least, each `{ rpm, channel, readDeg, cylinder, mapKpa, trend }` as in `evaluateBenchRun`, but readDeg in degrees of the wheel
 * @param options.wheel what turns with the wheel: 'crank' or 'distributor'
 * @param options.sense 1 where the wheel's numbers fall as a spark comes earlier, −1 where they rise
 * @param options.datum `{ kind: 'index', atDeg }`, atDeg the wheel's degrees at top dead centre, any finite number; or `{ kind: 'relative', rpm, planDeg }`,
 *   rpm a speed at which the primary was read, ≥ 0, planDeg its planned advance there, crank degrees, any finite number
 * @throws CalcError below `readings`, on `wheel`, `sense` or below `datum`; on `datum.rpm` when the primary was not read there
 * @example
 * benchReadingsToAdvance([{ rpm: 1500, channel: 'primary', readDeg: 77 }], { wheel: 'distributor', sense: 1, datum: { kind: 'index', atDeg: 90 } }) // → [{ rpm: 1500, channel: 'primary', readDeg: 26 }]
 * benchReadingsToAdvance([{ rpm: 1500, channel: 'primary', readDeg: 40 }, { rpm: 1500, channel: 'backup', readDeg: 44.5 }], { wheel: 'distributor', sense: 1, datum: { kind: 'relative', rpm: 1500, planDeg: 26 } })[1] // → { rpm: 1500, channel: 'backup', readDeg: 17 }
 */
export const benchReadingsToAdvance = (readings: readonly BenchReading[], options: BenchWheel): BenchReading[] => {
  const taken = takeReadings(readings)
  const members = membersOf(options)
  const factor = takeSense(members.sense) * (takeChoice(members.wheel, 'wheel', 'The wheel', wheels) === 'distributor' ? 2 : 1)
  const { advanceDeg, fromDeg } = takeDatum(members.datum, taken, readings)
  return taken.map((reading, i) => ({
    ...reading, readDeg: finiteResult(advanceDeg + factor * (fromDeg - reading.readDeg), `readings.${i}.readDeg`, reading.readDeg, 'deg'),
  }))
}
