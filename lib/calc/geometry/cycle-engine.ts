import { takeNumber, type NumberRule } from '../validate/number'
import { finiteResult } from '../validate/result'
import { takeRecord } from '../validate/shape'
import { clearanceM3, displacementM3 } from './slider-crank'

/** One cylinder with its piston and rod. */
export interface Cylinder {
  readonly boreMm: number
  readonly strokeMm: number
  readonly rodMm: number
  readonly compressionRatio: number
}

/** A cylinder with the ends of its closed cycle, crank degrees from firing top dead centre. */
export interface CycleEngine extends Cylinder {
  readonly ivcDeg: number
  readonly evoDeg: number
}

const lengthRule = (name: string, above = 0): NumberRule => ({ name, unit: 'mm', above })

/** Stroke and rod; `prefix` stands before the names of the fields. */
export const takeCrank = (members: Record<string, unknown>, prefix: string): Pick<Cylinder, 'strokeMm' | 'rodMm'> => {
  const strokeMm = takeNumber(members.strokeMm, `${prefix}strokeMm`, lengthRule('The stroke'))
  const rodMm = takeNumber(members.rodMm, `${prefix}rodMm`, lengthRule('The length of the connecting rod', strokeMm / 2))
  return { strokeMm, rodMm }
}

/** Bore, stroke, rod and compression ratio whose volumes are finite and above zero; the error falls below `field`. */
export const takeCylinder = (value: unknown, field: string): Cylinder => {
  const members = takeRecord(value, field, 'The engine')
  const boreMm = takeNumber(members.boreMm, `${field}.boreMm`, lengthRule('The bore'))
  const { strokeMm, rodMm } = takeCrank(members, `${field}.`)
  const compressionRatio = takeNumber(members.compressionRatio, `${field}.compressionRatio`, { name: 'The compression ratio', unit: '', above: 1 })
  const cylinder = { boreMm, strokeMm, rodMm, compressionRatio }
  // With their reciprocals, so that a volume too small for a number is refused like one too large.
  finiteResult(displacementM3(cylinder) + 1 / displacementM3(cylinder), `${field}.boreMm`, boreMm, 'mm')
  finiteResult(clearanceM3(cylinder) + 1 / clearanceM3(cylinder), `${field}.compressionRatio`, compressionRatio)
  return cylinder
}

/** As `takeCylinder`, with −180 ≤ ivcDeg < 0 < evoDeg ≤ 180. */
export const takeCycleEngine = (value: unknown, field: string): CycleEngine => {
  const cylinder = takeCylinder(value, field)
  const members = takeRecord(value, field, 'The engine')
  const ivcDeg = takeNumber(members.ivcDeg, `${field}.ivcDeg`, { name: 'The angle at which the inlet valve closes', unit: 'deg', min: -180, below: 0 })
  const evoDeg = takeNumber(members.evoDeg, `${field}.evoDeg`, { name: 'The angle at which the exhaust valve opens', unit: 'deg', above: 0, max: 180 })
  return { ...cylinder, ivcDeg, evoDeg }
}
