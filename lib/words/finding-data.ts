import type { Finding } from '../calc/live'
import { formatQuantityText, type UnitSystem } from '../units'

/** A figure that a finding carries for its sentence. */
export const dataNumber = (finding: Finding, name: string): number => (typeof finding.data[name] === 'number' ? finding.data[name] : 0)
export const dataRpm = (finding: Finding, name: string, system: UnitSystem): string => formatQuantityText(dataNumber(finding, name), 'engineSpeed', system)
export const dataDeg = (finding: Finding, name: string, system: UnitSystem, decimals = 1): string => formatQuantityText(dataNumber(finding, name), 'angle', system, { decimals })

/** What the tolerances may do to an angle, and whether they carry it past its limit; begins with a space, or is empty. */
export function stackWords(finding: Finding, system: UnitSystem): string {
  const { data, value, limit, sense } = finding
  if (typeof data.stackDeg !== 'number') return ''
  const stack = `±${formatQuantityText(data.stackDeg, 'angle', system)}`
  const room = value === null ? -1 : sense === 'atMost' ? limit - value : value - limit
  if (room < 0) return ` The tolerances stack up to ${stack}.`
  return data.stackDeg > room ? ` The tolerances stack up to ${stack}: that would carry it past the limit.` : ` The tolerances stack up to ${stack}, and leave it inside.`
}
