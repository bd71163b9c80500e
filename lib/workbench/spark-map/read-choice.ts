import { parseQuantity, quantityErrorSentence, rangeSentence, type QuantityKind, type UnitSystem } from '../../units'
import { linesAllowed, type LineCounts } from './axes'

export type ReadNumber = { ok: true, value: number } | { ok: false, sentence: string }

function readWithin(text: string, kind: QuantityKind, label: string, min: number, max: number, system: UnitSystem): ReadNumber {
  const read = parseQuantity(text, kind, system)
  if (!read.ok) return { ok: false, sentence: quantityErrorSentence(read, label, kind, system) }
  if (read.value < min || read.value > max) return { ok: false, sentence: rangeSentence(label, kind, system, { min, max }) }
  return { ok: true, value: read.value }
}

/** Degrees to keep short of the detonation limit. */
export const readMargin = (text: string, system: UnitSystem): ReadNumber => readWithin(text, 'angle', 'The margin', 0, 20, system)

const labels: Record<keyof LineCounts, string> = { speeds: 'The number of speeds', pressures: 'The number of pressures' }

export function readLines(of: keyof LineCounts, text: string, system: UnitSystem): ReadNumber {
  const { least, most } = linesAllowed[of]
  const read = readWithin(text, 'count', labels[of], least, most, system)
  return read.ok && !Number.isInteger(read.value) ? { ok: false, sentence: `${labels[of]} must be a whole number.` } : read
}
