import type { Finding, OctaneScale } from '../calc/live'
import { formatNumber, formatQuantityText, type UnitSystem } from '../units'
import { dataDeg, dataNumber, dataRpm, stackWords } from './finding-data'

/** Octane numbers of one scale are never turned into another's: the scale stands with each. */
export const octaneScale: Record<OctaneScale, string> = { ron: 'RON', mon: 'MON', aki: '(R+M)/2', lean: 'lean rating' }

const isScale = (text: unknown): text is OctaneScale => typeof text === 'string' && Object.hasOwn(octaneScale, text)

/** "91 RON" as typed; "93.2 RON" where it was computed. */
export function octaneWords(octane: number, scale: unknown, decimals = Number.isInteger(octane) ? 0 : 1): string {
  return `${formatNumber(octane, decimals)}\u00a0${isScale(scale) ? octaneScale[scale] : 'octane'}`
}

/** What no figure of detonation stands without. */
export const detonationLead = 'Detonation can destroy an engine in seconds.'
export const detonationRest = 'The model compares settings of one engine; it clears nothing for flight.'
export const detonationCaution = `${detonationLead} ${detonationRest}`

/** How well the octane number is known, in words. */
export const octaneUncertaintyWords = (octane: number, anchored: boolean): string =>
  (anchored ? `the model is anchored to a setting known to run clean, so the octane number is good to ±${octane}` : `the model’s octane number is good to ±${octane} at best`)

const margin = (value: unknown, system: UnitSystem) => (typeof value === 'number' ? formatQuantityText(value, 'angle', system) : null)

function worseWords(finding: Finding, system: UnitSystem): string {
  const { data } = finding
  const hotter = dataNumber(finding, 'hotterK')
  const denser = dataNumber(finding, 'denserKpa')
  const charge = [
    ...(hotter > 0 ? [`${formatQuantityText(hotter, 'temperatureDifference', system)} hotter`] : []),
    ...(denser > 0 ? [`${formatQuantityText(denser, 'pressure', system)} denser`] : []),
  ].join(' and ')
  return `${octaneWords(dataNumber(finding, 'octane'), data.scale)}${charge ? ` and a charge ${charge}` : ''}`
}

/** One octane number, 10 K, 10 kPa: what each takes from the margin. */
export function sensitivityWords(costs: { perOctaneDeg: unknown; per10KDeg: unknown; per10KpaDeg: unknown }, system: UnitSystem): string | null {
  const parts = [
    [costs.perOctaneDeg, 'one octane number less'],
    [costs.per10KDeg, `${formatQuantityText(10, 'temperatureDifference', system)} hotter`],
    [costs.per10KpaDeg, `${formatQuantityText(10, 'pressure', system)} denser`],
  ].flatMap(([value, what]) => (typeof value === 'number' ? [`${formatQuantityText(value, 'angle', system)} for ${String(what)}`] : []))
  return parts.length > 0 ? `It takes ${parts.join(', ')}.` : null
}

/** Why the margin is what it is, what it is worth, and what the backup gives. */
export function detonationSentence(finding: Finding, system: UnitSystem): string {
  const { data, channel } = finding
  const letter = channel === 'backup' ? 'B' : 'A'
  const at = `At ${dataRpm(finding, 'rpm', system)} with ${worseWords(finding, system)}`
  const fires = `${letter} fires at ${dataDeg(finding, 'sparkDeg', system)}`
  const uncertain = dataNumber(finding, 'uncertaintyOctane')
  const low = margin(data.lowDeg, system)
  const planned = margin(data.plannedDeg, system)
  const begins = data.state === 'always'
    ? `${at} it detonates at every spark searched; ${fires}.`
    : data.state === 'never' ? `${at} no spark searched reaches detonation, so the margin is at least this; ${fires}.` : `${at} detonation begins at ${dataDeg(finding, 'limitDeg', system)}; ${fires}.`
  const lines = [
    begins,
    `${capital(octaneUncertaintyWords(uncertain, data.anchored === true))}: ${low === null ? 'with that much less there is no margin at all' : `with that much less the margin is ${low}`}.`,
    `It asks for ${octaneWords(dataNumber(finding, 'octaneRequired'), data.scale, 1)}; as planned, ${planned === null ? 'there is no margin either' : `the margin is ${planned}`}.`,
    sensitivityWords({ perOctaneDeg: data.perOctaneDeg, per10KDeg: data.per10KDeg, per10KpaDeg: data.per10KpaDeg }, system),
    channel === 'backup' && typeof data.gainDeg === 'number' && typeof data.gainOctane === 'number' ? gainWords(data.gainDeg, data.gainOctane, system) : null,
  ].filter((line) => line !== null)
  return `${lines.join(' ')}${stackWords(finding, system)} ${detonationCaution}`
}

/** What going to the backup gives where the primary stands worst. */
export function gainWords(deg: number, octane: number, system: UnitSystem): string {
  if (deg <= 0) return 'Going to the backup gains nothing: it fires no later.'
  return `Going to the backup gains ${formatQuantityText(deg, 'angle', system)} and ${formatNumber(octane, 1)} octane numbers.`
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)
