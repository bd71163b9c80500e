import { takeNumber, type NumberRule } from '../validate/number'
import { finiteResult } from '../validate/result'
import { anyAngle } from '../validate/rules'

const diameter: NumberRule = { name: 'The diameter', unit: 'mm', above: 0 }

/**
 * Length of an arc on a circle, in millimetres: how far apart two marks lie on a damper or a plate.
 *
 * arc = π · D · deg / 360
 *
 * Validity: exact; measured along the rim, not across it.
 * Source: common practice, no published source (geometry).
 *
 * @param diameterMm diameter of the circle, mm, > 0
 * @param deg angle in degrees of the part that carries the circle, signed, any finite number
 * @throws CalcError on `diameterMm` or `deg`
 * @example
 * arcMm(150, 10) // → 13.0900
 */
export const arcMm = (diameterMm: number, deg: number): number => {
  takeNumber(diameterMm, 'diameterMm', diameter)
  takeNumber(deg, 'deg', anyAngle)
  return finiteResult((Math.PI * diameterMm * deg) / 360, 'deg', deg, 'deg')
}

/**
 * Angle under an arc on a circle, in degrees.
 *
 * deg = 360 · arc / (π · D)
 *
 * Validity: exact; the arc is measured along the rim.
 * Source: common practice, no published source (geometry).
 *
 * @param diameterMm diameter of the circle, mm, > 0
 * @param arcMm arc along the rim, mm, a difference: signed, any finite number
 * @throws CalcError on `diameterMm` or `arcMm`
 * @example
 * degFromArcMm(150, 13.089969389957471) // → 10.0000000
 */
export const degFromArcMm = (diameterMm: number, arcMm: number): number => {
  takeNumber(diameterMm, 'diameterMm', diameter)
  takeNumber(arcMm, 'arcMm', { name: 'The arc', unit: 'mm' })
  return finiteResult((360 * arcMm) / (Math.PI * diameterMm), 'arcMm', arcMm, 'mm')
}
