import { anyAngle } from '../validate/rules'
import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'
import { takeCrank, takeCylinder, type Cylinder } from './cycle-engine'
import { travelM, volumeM3 } from './slider-crank'

export interface PistonTravelInput { readonly strokeMm: number, readonly rodMm: number, readonly thetaDeg: number }
export interface CylinderVolumeInput { readonly engine: Cylinder, readonly thetaDeg: number }

/**
 * Travel of the piston from top dead centre, mm.
 *
 * x = r·(1 − cosθ) + l − √(l² − r²·sin²θ), r = stroke/2
 *
 * Validity: the pin moves on a line through the crankshaft's axis (no offset).
 * Source: common practice, no published source (geometry).
 *
 * @param input.strokeMm stroke, mm, > 0
 * @param input.rodMm length of the connecting rod l between its centres, mm, above half the stroke
 * @param input.thetaDeg crank degrees from top dead centre, any finite number
 * @throws CalcError on any of these by its name
 * @example
 * pistonTravelMm({ strokeMm: 86.025, rodMm: 172, thetaDeg: 20 }) // → 3.2242
 */
export const pistonTravelMm = (input: PistonTravelInput): number => {
  const members = membersOf(input)
  const crank = takeCrank(members, '')
  const thetaDeg = takeNumber(members.thetaDeg, 'thetaDeg', anyAngle)
  return finiteResult(travelM(crank, thetaDeg) * 1000, 'strokeMm', crank.strokeMm, 'mm')
}

/**
 * Volume of one cylinder at a crank angle, cm³.
 *
 * V = V_d/(compressionRatio − 1) + (π/4)·bore²·x, V_d = (π/4)·bore²·stroke, x as in `pistonTravelMm`
 *
 * Validity: as for the travel; rings, crevices and the stretch of parts left out.
 * Source: common practice, no published source (geometry).
 *
 * @param input.engine `{ boreMm, strokeMm, rodMm, compressionRatio }`: mm > 0, rod above half the stroke, ratio > 1
 * @param input.thetaDeg crank degrees from top dead centre, any finite number
 * @throws CalcError on `thetaDeg`, on `engine` or below it, also where its volumes are beyond what a number can hold
 * @example
 * cylinderVolumeCc({ engine: { boreMm: 86.025, strokeMm: 86.025, rodMm: 172, compressionRatio: 9 }, thetaDeg: 0 }) // → 62.4991
 */
export const cylinderVolumeCc = (input: CylinderVolumeInput): number => {
  const members = membersOf(input)
  const engine = takeCylinder(members.engine, 'engine')
  const thetaDeg = takeNumber(members.thetaDeg, 'thetaDeg', anyAngle)
  return finiteResult(volumeM3(engine, thetaDeg) * 1e6, 'engine.boreMm', engine.boreMm, 'mm')
}
