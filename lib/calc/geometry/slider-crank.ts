import type { Cylinder } from './cycle-engine'

type Crank = Pick<Cylinder, 'strokeMm' | 'rodMm'>

/**
 * Piston travel from top dead centre over the crank radius, dimensionless; theta in crank degrees, 0 at top dead centre.
 *
 * x/r = 2·sin²(θ/2) + q·sin²θ/(1 + √(1 − q²·sin²θ)), q = crank radius over rod length:
 * r(1 − cosθ) + l − √(l² − r²sin²θ) without its two differences of almost equal numbers.
 */
const travelOverRadius = ({ strokeMm, rodMm }: Crank, thetaDeg: number): number => {
  // Whole turns come off exactly in degrees, not in radians.
  const theta = ((thetaDeg % 360) * Math.PI) / 180
  const half = Math.sin(theta / 2)
  const lean = (strokeMm / 2 / rodMm) * Math.sin(theta)
  return 2 * half * half + (lean * Math.sin(theta)) / (1 + Math.sqrt((1 - lean) * (1 + lean)))
}

/** Piston travel from top dead centre, m. */
export const travelM = (crank: Crank, thetaDeg: number): number => (travelOverRadius(crank, thetaDeg) * crank.strokeMm) / 2000

/** Swept volume of one cylinder, m³. */
export const displacementM3 = ({ boreMm, strokeMm }: Pick<Cylinder, 'boreMm' | 'strokeMm'>): number =>
  (Math.PI / 4) * (boreMm / 1000) * (boreMm / 1000) * (strokeMm / 1000)

/** Volume left at top dead centre, m³. */
export const clearanceM3 = (cylinder: Pick<Cylinder, 'boreMm' | 'strokeMm' | 'compressionRatio'>): number =>
  displacementM3(cylinder) / (cylinder.compressionRatio - 1)

/** Volume of one cylinder at a crank angle, m³. */
export const volumeM3 = (cylinder: Cylinder, thetaDeg: number): number =>
  clearanceM3(cylinder) + (displacementM3(cylinder) * travelOverRadius(cylinder, thetaDeg)) / 2
