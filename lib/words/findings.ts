import type { Finding, Limit, LimitUnit, Verdict } from '../calc/live'
import { formatQuantity, formatQuantityText, type FormattedQuantity, type QuantityKind, type UnitSystem } from '../units'

/** Which kind of quantity a finding's figures are, for the person's units. */
export const kindOfLimitUnit: Record<LimitUnit, QuantityKind> = {
  deg: 'angle', distributorDeg: 'distributorAngle', rpm: 'engineSpeed', ratio: 'ratio', mmPerDeg: 'markSpacing', count: 'count',
  kelvin: 'temperature', mps: 'climb', perHour: 'failureRate',
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
  detonationDeg: 'Margin to detonation',
  windingK: 'Coil winding',
  sparkVoltageRatio: 'Spark voltage in hand',
  periodShare: 'Spark period used',
  climbMps: 'Climb with one cylinder cold',
  noSparkPerH: 'No spark at all',
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

const signed: ReadonlySet<Finding['limitId']> = new Set(['beyondMbtDeg', 'backupFirstDeg', 'climbMps'])

/** What stands in place of a value there is none of. */
export const noValueWord = ({ limitId }: Pick<Finding, 'limitId'>): string => (limitId === 'windingK' ? 'no end' : 'none')

export function findingValue({ value, unit, limitId }: Finding, system: UnitSystem): FormattedQuantity | null {
  if (value === null) return null
  return formatQuantity(value, kindOfLimitUnit[unit], system, signed.has(limitId) ? { sign: true } : {})
}

/** "at least 3.0°", "at most 920 rpm". */
export const limitWords = ({ limit, sense, unit }: Pick<Finding, 'limit' | 'sense' | 'unit'>, system: UnitSystem): string =>
  `${sense === 'atLeast' ? 'at least' : 'at most'} ${formatQuantityText(limit, kindOfLimitUnit[unit], system)}`

/**
 * How far an uncertain value reaches, where it must not stand alone: a chance with each rate a tenth and ten times, a margin to detonation
 * with the octane number off. null: the value has no such spread.
 */
export function findingSpread({ limitId, data }: Pick<Finding, 'limitId' | 'data'>, system: UnitSystem): string | null {
  if (limitId === 'noSparkPerH' && typeof data.lowPerHour === 'number' && typeof data.highPerHour === 'number')
    return `${formatQuantity(data.lowPerHour, 'failureRate', system).text} to ${formatQuantityText(data.highPerHour, 'failureRate', system)}`
  if (limitId === 'detonationDeg' && typeof data.uncertaintyOctane === 'number') {
    const off = `${data.uncertaintyOctane} octane less`
    return typeof data.lowDeg === 'number' ? `${formatQuantityText(data.lowDeg, 'angle', system)} for ${off}` : `none for ${off}`
  }
  return null
}

/** Value and spread in one: "1.7° (−2.5° for 5 octane less)". */
export function findingAmount(finding: Finding, system: UnitSystem): string {
  const value = findingValue(finding, system)
  const spread = findingSpread(finding, system)
  const text = value ? `${value.text}${value.joined ? value.unit : value.unit ? `\u00a0${value.unit}` : ''}` : noValueWord(finding)
  return spread ? `${text} (${spread})` : text
}

export const limitOrigin: Record<Limit['from'], string> = {
  shop: 'shop’s choice',
  commonPractice: 'common practice, no published source',
  geometry: 'geometry',
  insulationClass: 'insulation class F, IEC 60085, from memory',
  hazardous: 'AC 23.1309-1E class I, hazardous, from memory: for orientation; homebuilts are not certificated to it',
}

/** Publications that the origin of a limit names already. */
export const namedInOrigin: Partial<Record<Limit['from'], string>> = { insulationClass: 'iec-60085', hazardous: 'ac-23-1309-1e' }

/** "1 outside its limit, 2 close, 15 within": counts, never an approval. */
export function headLine({ outside, close, within }: Record<Verdict, number>): string {
  const total = outside + close + within
  if (total === 0) return 'Nothing could be judged'
  if (outside > 0) return `${outside} outside ${outside === 1 ? 'its limit' : 'their limits'}, ${close} close, ${within} within`
  return close > 0 ? `All ${total} within the limits set, ${close} close` : `All ${total} within the limits set`
}
