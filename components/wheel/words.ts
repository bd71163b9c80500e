import { formatNumber } from '@/lib/units'
import type { Rotation } from './geometry'

export interface WheelFigures {
  rpm: number
  /** Degrees before top dead centre; null: this channel's value is not known now. */
  primaryDeg: number | null
  backupDeg: number | null
  /** Primary less backup; positive: the backup fires later. */
  staggerDeg: number | null
  staggerMs: number | null
  rotation: Rotation
}

const before = (deg: number) => `${formatNumber(Math.abs(deg), 1)} degrees ${deg < 0 ? 'after' : 'before'} top dead centre`

/** What the wheel shows, for those who do not see it. */
export function wheelSentence({ rpm, primaryDeg, backupDeg, staggerDeg, staggerMs, rotation }: WheelFigures): string {
  const sparks = [
    primaryDeg === null ? null : `A fires ${before(primaryDeg)}`,
    backupDeg === null ? null : `B ${before(backupDeg)}`,
    staggerDeg === null ? null : staggerDeg === 0 ? 'both at once' : `stagger ${formatNumber(Math.abs(staggerDeg), 1)} degrees${staggerMs === null ? '' : `, ${formatNumber(Math.abs(staggerMs), 2)} milliseconds`}, ${staggerDeg > 0 ? 'B later' : 'B first'}`,
  ].filter(Boolean)
  return `Degree wheel at ${formatNumber(rpm, 0)} rpm, seen from the damper end, turning ${rotation}: ${sparks.join('; ')}.`
}

/** The word over the number in the middle. */
export const staggerWord = (staggerDeg: number): string => (staggerDeg < 0 ? 'stagger, B first' : 'stagger')

export const degText = (deg: number): string => `${formatNumber(deg, 1)}°`
