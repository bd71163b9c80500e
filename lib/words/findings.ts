import type { Finding, LimitUnit, Verdict } from '../calc/live'
import { formatQuantity, formatQuantityText, type FormattedQuantity, type QuantityKind, type UnitSystem } from '../units'

/** Which kind of quantity a finding's figures are, for the person's units. */
const kindOfUnit: Record<LimitUnit, QuantityKind> = {
  deg: 'angle', distributorDeg: 'distributorAngle', rpm: 'engineSpeed', ratio: 'ratio', mmPerDeg: 'markSpacing', count: 'count',
}

export const verdictWord: Record<Verdict, string> = { outside: 'Outside', close: 'Close', within: 'Within' }

const channelLetter = { primary: 'A', backup: 'B' } as const
export const letterOf = (channel: 'primary' | 'backup') => channelLetter[channel]

const titles: Record<Finding['limitId'], string> = {
  beyondMbtDeg: 'Beyond best torque',
  crankingAdvanceDeg: 'Cranking advance',
  retardAboveCrankingRpm: 'Retard above cranking',
  retardBelowIdleRpm: 'Retard below idle',
  backupFirstDeg: 'Backup never first',
  backupPowerRatio: 'Power on the backup',
  proofAboveIdleRpm: 'Full timing shows at idle',
  registerDeg: 'Rotor register through the spark',
  freeDeg: 'Free angle to the next terminal',
  leadsOutOfPlace: 'Lead order on the cap',
  markSpacingMm: 'Timing marks',
}

/** Name of a finding; some have another wording when they lie outside. The channel's letter stands beside it, not in it. */
export function findingTitle({ limitId, verdict, value }: Pick<Finding, 'limitId' | 'verdict' | 'value'>, system: UnitSystem): string {
  if (limitId === 'backupFirstDeg' && verdict === 'outside') return 'Backup fires first'
  if (limitId === 'proofAboveIdleRpm' && verdict === 'outside')
    return value === null ? 'Full timing shows at no speed' : `Full timing shows only from ${formatQuantityText(value, 'engineSpeed', system)}, beside a turning propeller`
  if (limitId === 'leadsOutOfPlace' && verdict === 'outside') return 'Leads out of place on the cap'
  return titles[limitId]
}

/** The same before its figure, for a head that names both: "Full timing shows only from" 1523 rpm. */
export function findingLead(finding: Pick<Finding, 'limitId' | 'verdict' | 'value'>, system: UnitSystem): string {
  if (finding.limitId === 'proofAboveIdleRpm' && finding.verdict === 'outside' && finding.value !== null) return 'Full timing shows only from'
  return findingTitle(finding, system)
}

export function findingValue({ value, unit, limitId }: Finding, system: UnitSystem): FormattedQuantity | null {
  if (value === null) return null
  return formatQuantity(value, kindOfUnit[unit], system, limitId === 'beyondMbtDeg' || limitId === 'backupFirstDeg' ? { sign: true } : {})
}

/** "at least 3.0°", "at most 920 rpm". */
export const limitWords = ({ limit, sense, unit }: Pick<Finding, 'limit' | 'sense' | 'unit'>, system: UnitSystem): string =>
  `${sense === 'atLeast' ? 'at least' : 'at most'} ${formatQuantityText(limit, kindOfUnit[unit], system)}`

export const limitOrigin: Record<'shop' | 'commonPractice' | 'geometry', string> = {
  shop: 'shop’s choice',
  commonPractice: 'common practice, no published source',
  geometry: 'geometry',
}

type Write = (finding: Finding, system: UnitSystem) => string

const number = (finding: Finding, name: string): number => (typeof finding.data[name] === 'number' ? finding.data[name] : 0)
const rpm = (finding: Finding, name: string, system: UnitSystem) => formatQuantityText(number(finding, name), 'engineSpeed', system)
const deg = (finding: Finding, name: string, system: UnitSystem, decimals = 1) => formatQuantityText(number(finding, name), 'angle', system, { decimals })

const sentences: Record<Finding['limitId'], Write> = {
  beyondMbtDeg: (finding, system) =>
    `At ${rpm(finding, 'rpm', system)} it fires ${deg(finding, 'deg', system)} before TDC; best torque at full throttle is ${deg(finding, 'mbtDeg', system)} (${provenanceWord(finding.data.provenance)}). Beyond it torque falls and detonation comes nearer.`,
  crankingAdvanceDeg: (finding, system) =>
    `At ${rpm(finding, 'rpm', system)}${finding.data.released ? ', the retard already released once,' : ''} between the slowest and the fastest cranking. More would kick the starter back.`,
  retardAboveCrankingRpm: (finding, system) =>
    `The retard acts below ${rpm(finding, 'belowRpm', system)}${number(finding, 'hysteresisRpm') > 0 ? `, and once released only ${rpm(finding, 'hysteresisRpm', system)} lower` : ''}; the starter reaches ${rpm(finding, 'fastestRpm', system)}. Too near, and it cranks at running advance.`,
  retardBelowIdleRpm: (finding, system) =>
    `The retard lets go at ${rpm(finding, 'belowRpm', system)}; the slowest idle is ${rpm(finding, 'slowestRpm', system)}. Too near, and it idles ${deg(finding, 'byDeg', system)} late, and a timing light there shows nothing of running timing.`,
  backupFirstDeg: (finding, system) =>
    finding.verdict === 'outside'
      ? `At ${rpm(finding, 'rpm', system)} the backup fires before the primary, so the backup alone decides the timing.`
      : `The smallest stagger comes at ${rpm(finding, 'rpm', system)}.`,
  backupPowerRatio: (finding, system) =>
    `At ${rpm(finding, 'rpm', system)} the backup makes ${formatQuantityText(number(finding, 'backupKw'), 'power', system)} of the primary’s ${formatQuantityText(number(finding, 'primaryKw'), 'power', system)}; it fires ${deg(finding, 'shortOfMbtDeg', system)} short of best torque.`,
  proofAboveIdleRpm: (finding, system) => {
    if (finding.value === null && finding.data.followsPressure) return `Its timing follows the manifold pressure, and a throttled engine shows another advance than full power. A light on the ground cannot prove it.`
    if (finding.value === null) return `At no speed from idle up does it stand within ${deg(finding, 'toleranceDeg', system)} of its timing at ${rpm(finding, 'maxRpm', system)}.`
    return finding.verdict === 'outside'
      ? `Below that it does not stand within ${deg(finding, 'toleranceDeg', system)} of its full-power timing. A check that needs a fast propeller often is not made.`
      : `From there up it stands within ${deg(finding, 'toleranceDeg', system)} of its full-power timing: a light can prove it on a slow engine.`
  },
  registerDeg: (finding, system) => registerSentence(finding, system, 'The rotor and its terminal must still face each other when the spark ends.'),
  freeDeg: (finding, system) => registerSentence(finding, system, 'Too little, and the spark jumps to the next cylinder’s lead.'),
  leadsOutOfPlace: (finding) =>
    finding.verdict === 'outside'
      ? `Round the cap, ${finding.data.rotation} with the rotor, the leads stand ${finding.data.actual}; the engine fires ${finding.data.expected}.`
      : `Round the cap, ${finding.data.rotation} with the rotor, the leads follow the firing order ${finding.data.expected}.`,
  markSpacingMm: (finding, system) =>
    `One degree on a diameter of ${formatQuantityText(number(finding, 'diameterMm'), 'length', system)}. Finer marks cannot be read under a timing light.`,
}

const provenanceWord = (provenance: Finding['data'][string] | undefined) => ({ measured: 'measured', handbook: 'from a handbook', guess: 'a guess' })[String(provenance)] ?? 'a guess'

function registerSentence(finding: Finding, system: UnitSystem, why: string): string {
  const turned = formatQuantityText(number(finding, 'endOffsetDeg'), 'distributorAngle', system, { sign: true })
  const best = number(finding, 'bestPhasingDeg')
  const hint = Math.abs(best - number(finding, 'phasedAtDeg')) > 0.5 ? ` Centred at ${formatQuantityText(best, 'angle', system)} it would stand evenly.` : ''
  return `At ${rpm(finding, 'rpm', system)} the rotor stands ${turned} from centre when the spark ends. ${why}${hint}`
}

/** Why the figure matters, with the speed or setting it comes from. */
export const findingSentence: Write = (finding, system) => sentences[finding.limitId](finding, system)

/** "1 outside its limit, 2 close, 15 within": counts, never an approval. */
export function headLine({ outside, close, within }: Record<Verdict, number>): string {
  const total = outside + close + within
  if (total === 0) return 'Nothing could be judged'
  if (outside > 0) return `${outside} outside ${outside === 1 ? 'its limit' : 'their limits'}, ${close} close, ${within} within`
  return close > 0 ? `All ${total} within the limits set, ${close} close` : `All ${total} within the limits set`
}
