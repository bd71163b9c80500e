/** What a scenario is judged by: the one table of limits, each with its default and where it comes from. */

export type LimitId =
  | 'beyondMbtDeg'
  | 'crankingAdvanceDeg'
  | 'retardAboveCrankingRpm'
  | 'retardBelowIdleRpm'
  | 'backupFirstDeg'
  | 'backupPowerRatio'
  | 'proofAboveIdleRpm'
  | 'registerDeg'
  | 'freeDeg'
  | 'leadsOutOfPlace'
  | 'markSpacingMm'
  | 'detonationDeg'
  | 'windingK'
  | 'sparkVoltageRatio'
  | 'periodShare'
  | 'climbMps'
  | 'noSparkPerH'

export type LimitUnit = 'deg' | 'rpm' | 'ratio' | 'distributorDeg' | 'mmPerDeg' | 'count' | 'kelvin' | 'mps' | 'perHour'

export interface Limit {
  id: LimitId
  sense: 'atMost' | 'atLeast'
  value: number
  /** A value inside the limit by less than this is close. */
  closeBand: number
  unit: LimitUnit
  /** 'shop': the shop's choice · 'commonPractice': common practice, no published source · 'geometry': follows from the drawing · 'insulationClass', 'hazardous': a publication, named in lib/words. */
  from: 'shop' | 'commonPractice' | 'geometry' | 'insulationClass' | 'hazardous'
}

export type Limits = Record<LimitId, Limit>

/** A tenth of the limit is close unless a band is set. */
const limit = (id: LimitId, sense: Limit['sense'], value: number, unit: LimitUnit, from: Limit['from'], closeBand = Math.abs(value) / 10): Limit =>
  ({ id, sense, value, closeBand, unit, from })

export const defaultLimits: Limits = {
  beyondMbtDeg: limit('beyondMbtDeg', 'atMost', 0, 'deg', 'shop', 1),
  crankingAdvanceDeg: limit('crankingAdvanceDeg', 'atMost', 20, 'deg', 'shop'),
  retardAboveCrankingRpm: limit('retardAboveCrankingRpm', 'atLeast', 100, 'rpm', 'shop'),
  retardBelowIdleRpm: limit('retardBelowIdleRpm', 'atLeast', 50, 'rpm', 'shop'),
  backupFirstDeg: limit('backupFirstDeg', 'atLeast', 0, 'deg', 'commonPractice'),
  backupPowerRatio: limit('backupPowerRatio', 'atLeast', 0.85, 'ratio', 'shop', 0.03),
  proofAboveIdleRpm: limit('proofAboveIdleRpm', 'atMost', 100, 'rpm', 'commonPractice'),
  registerDeg: limit('registerDeg', 'atLeast', 1, 'distributorDeg', 'shop', 1),
  freeDeg: limit('freeDeg', 'atLeast', 15, 'distributorDeg', 'shop'),
  leadsOutOfPlace: limit('leadsOutOfPlace', 'atMost', 0, 'count', 'geometry'),
  markSpacingMm: limit('markSpacingMm', 'atLeast', 1, 'mmPerDeg', 'shop'),
  // Worst case; close where only the low end of its uncertainty lies outside.
  detonationDeg: limit('detonationDeg', 'atLeast', 3, 'deg', 'shop'),
  windingK: limit('windingK', 'atMost', 428, 'kelvin', 'insulationClass', 15),
  sparkVoltageRatio: limit('sparkVoltageRatio', 'atLeast', 1.5, 'ratio', 'shop'),
  periodShare: limit('periodShare', 'atMost', 0.85, 'ratio', 'shop'),
  climbMps: limit('climbMps', 'atLeast', 0.5, 'mps', 'shop', 0.25),
  noSparkPerH: limit('noSparkPerH', 'atMost', 1e-5, 'perHour', 'hazardous'),
}

export type Verdict = 'outside' | 'close' | 'within'

/** Rounding of sums like 18.000000000000004 never turns a verdict. */
const hair = 1e-9

/** Verdict of a value against a limit; on the limit counts as inside, null (there is none) as outside. */
export function judge(value: number | null, { sense, value: limitValue, closeBand }: Pick<Limit, 'sense' | 'value' | 'closeBand'>): Verdict {
  if (value === null) return 'outside'
  const inside = sense === 'atMost' ? limitValue - value : value - limitValue
  if (inside < -hair) return 'outside'
  return inside < closeBand - hair ? 'close' : 'within'
}
