import { isWithin } from '../shared/within'
import { takeNumber, takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf, takeRecord } from '../validate/shape'

export interface ExpectedDrops {
  readonly primaryDropRpm: number
  readonly backupDropRpm: number
  readonly toleranceRpm: number
}

export interface RunUpInput {
  /** Speed with both channels; left out where the engine runs on one at a time. */
  readonly bothRpm?: number
  readonly primaryRpm: number
  readonly backupRpm: number
  readonly expected: ExpectedDrops
}

export interface RunUpChannel {
  readonly dropRpm: number
  readonly expectedRpm: number
  readonly verdict: 'within' | 'tooLarge' | 'tooSmall'
}

export interface RunUp {
  /** `null` where the primary is the reference. */
  readonly primary: RunUpChannel | null
  readonly backup: RunUpChannel
  /** Primary − backup: positive when the engine is slower on the backup. */
  readonly differenceRpm: number
  readonly pass: boolean
}

const verdictOf = (dropRpm: number, expectedRpm: number, toleranceRpm: number): RunUpChannel['verdict'] => {
  if (isWithin(dropRpm - expectedRpm, toleranceRpm)) return 'within'
  return dropRpm > expectedRpm ? 'tooLarge' : 'tooSmall'
}

/** On a backup that should drop, no drop is a finding however wide the tolerance: it was not selected, the other stayed live, or it fires early. */
const backupVerdictOf = (dropRpm: number, expectedRpm: number, toleranceRpm: number): RunUpChannel['verdict'] =>
  (expectedRpm > 0 && dropRpm <= 0 ? 'tooSmall' : verdictOf(dropRpm, expectedRpm, toleranceRpm))

/**
 * A run-up on each channel against the drops expected: `{ primary, backup, differenceRpm, pass }`, drops in rpm.
 *
 * dropRpm = bothRpm − the channel's rpm; without bothRpm the primary is the reference, its own result `null`, the backup's drop primaryRpm − backupRpm.
 * 'within' where |dropRpm − expectedRpm| ≤ toleranceRpm + 1e-9, else 'tooLarge' or 'tooSmall'; a backup expected to drop (above 0) that does not drop at all is 'tooSmall'
 * whatever the tolerance. differenceRpm = primaryRpm − backupRpm, positive when the engine is slower on the backup; pass: every channel within.
 *
 * Validity: one throttle setting, a warm engine, one wind; each channel has its own expected drop, best the aircraft's own median.
 * Source: common practice, no published source.
 *
 * @param input.bothRpm speed with both channels, rpm, ≥ 0; left out where one runs at a time
 * @param input.primaryRpm speed on the primary alone, rpm, ≥ 0
 * @param input.backupRpm speed on the backup alone, rpm, ≥ 0
 * @param input.expected `{ primaryDropRpm, backupDropRpm, toleranceRpm }`: drops in rpm, any finite numbers; toleranceRpm to either side, rpm, ≥ 0
 * @throws CalcError on `bothRpm`, `primaryRpm`, `backupRpm` or below `expected`
 * @example
 * evaluateRunUp({ primaryRpm: 1800, backupRpm: 1745, expected: { primaryDropRpm: 0, backupDropRpm: 50, toleranceRpm: 20 } }) // → { primary: null, backup: { dropRpm: 55, expectedRpm: 50, verdict: 'within' }, differenceRpm: 55, pass: true }
 * evaluateRunUp({ bothRpm: 1800, primaryRpm: 1790, backupRpm: 1800, expected: { primaryDropRpm: 5, backupDropRpm: 50, toleranceRpm: 20 } }).backup // → { dropRpm: 0, expectedRpm: 50, verdict: 'tooSmall' }
 */
export const evaluateRunUp = (input: RunUpInput): RunUp => {
  const members = membersOf(input)
  const speed = (name: string) => ({ name, unit: 'rpm', min: 0 })
  const bothRpm = takeOptionalNumber(members.bothRpm, 'bothRpm', speed('The speed on both channels'), null)
  const primaryRpm = takeNumber(members.primaryRpm, 'primaryRpm', speed('The speed on the primary'))
  const backupRpm = takeNumber(members.backupRpm, 'backupRpm', speed('The speed on the backup'))
  const expected = takeRecord(members.expected, 'expected', 'The expected drops')
  const primaryDropRpm = takeNumber(expected.primaryDropRpm, 'expected.primaryDropRpm', { name: 'The expected drop on the primary', unit: 'rpm' })
  const backupDropRpm = takeNumber(expected.backupDropRpm, 'expected.backupDropRpm', { name: 'The expected drop on the backup', unit: 'rpm' })
  const toleranceRpm = takeNumber(expected.toleranceRpm, 'expected.toleranceRpm', { name: 'The tolerance of the drop', unit: 'rpm', min: 0 })

  const dropTo = (rpm: number, field: string): number => finiteResult((bothRpm ?? primaryRpm) - rpm, field, rpm, 'rpm')
  const primaryDrop = dropTo(primaryRpm, 'primaryRpm')
  const backupDrop = dropTo(backupRpm, 'backupRpm')
  const primary = bothRpm === null ? null : { dropRpm: primaryDrop, expectedRpm: primaryDropRpm, verdict: verdictOf(primaryDrop, primaryDropRpm, toleranceRpm) }
  const backup = { dropRpm: backupDrop, expectedRpm: backupDropRpm, verdict: backupVerdictOf(backupDrop, backupDropRpm, toleranceRpm) }
  return {
    primary, backup,
    differenceRpm: finiteResult(primaryRpm - backupRpm, 'backupRpm', backupRpm, 'rpm'),
    pass: (primary === null || primary.verdict === 'within') && backup.verdict === 'within',
  }
}
