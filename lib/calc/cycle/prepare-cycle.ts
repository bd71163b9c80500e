import { clearanceM3, displacementM3, volumeM3 } from '../geometry/slider-crank'
import { burnStartDeg, ninetyShare, type CheckedCycle } from './check-cycle'

/** Gas constant of the charge, J/(kg K). */
export const gasConstant = 287

/** The delay to autoignition grows with this power of the octane number. */
export const octaneExponent = 3.402

/** Everything of a cycle that does not change with crank angle, in kPa, m, m³, K, J and crank degrees. */
export interface PreparedCycle {
  readonly ivcDeg: number
  readonly evoDeg: number
  readonly crankRadiusM: number
  /** Crank radius over rod length. */
  readonly lean: number
  readonly pistonAreaM2: number
  readonly clearanceM3: number
  readonly displacementM3: number
  readonly startVolumeM3: number
  readonly startKpa: number
  readonly startK: number
  /** m·R, J/K. */
  readonly massR: number
  /** Constant γ, or 0 where it follows the temperature. */
  readonly gamma: number
  /** Heat released by a whole burn, J; 0 motored. */
  readonly heatJ: number
  readonly a: number
  readonly m: number
  readonly durationDeg: number
  /** Crank degrees; the end of the cycle when motored. */
  readonly startDeg: number
  /** From the start of burning to 90 % burned, degrees; infinite when it never gets there. */
  readonly ninetyDeg: number
  /** Factor of the wall heat flow, J/degree for 1 kPa^0.25, 1 (m/s)^0.8, 1 K, 1 m² at the volume of inlet closing; 0: no loss. */
  readonly cooling: number
  readonly wallK: number
  /** Area of head and piston crown with the wall at top dead centre, m². */
  readonly wallAreaM2: number
  /** Area of wall that one metre of travel uncovers, m. */
  readonly wallPerM: number
  /** Gas speed without combustion, m/s. */
  readonly gasMps: number
  /** Gas speed that one kPa above the motored pressure adds, m/s. */
  readonly gasMpsPerKpa: number
  /** Factor of the knock integral at the pressure of inlet closing, per degree; 0: no octane. */
  readonly knockPerDeg: number
  readonly stepDeg: number
}

/**
 * Woschni's heat transfer with its powers gathered: h = 3.26·B^−0.2·p^0.8·T^−0.55·w^0.8, T = T₁·(p/p₁)·(V/V₁), so
 * h = 3.26·B^−0.2·(T₁/p₁)^−0.55·p^0.25·(V/V₁)^−0.55·w^0.8: p takes two square roots, and the volume's power depends on the angle alone.
 */
export const prepareCycle = ({ engine, rpm, charge, burn, gamma, heatLoss, octane, stepDeg }: CheckedCycle): PreparedCycle => {
  const bore = engine.boreMm / 1000
  const displacement = displacementM3(engine)
  const clearance = clearanceM3(engine)
  const startVolume = volumeM3(engine, engine.ivcDeg)
  const massR = (charge.pressureKpa * 1000 * startVolume) / charge.temperatureK
  const fuelKg = ((massR / gasConstant) * (1 - charge.residualFraction)) / (1 + charge.airFuelRatio)
  const area = (Math.PI / 4) * bore * bore
  const pistonMps = (2 * (engine.strokeMm / 1000) * rpm) / 60
  return {
    ivcDeg: engine.ivcDeg, evoDeg: engine.evoDeg,
    crankRadiusM: engine.strokeMm / 2000, lean: engine.strokeMm / 2 / engine.rodMm, pistonAreaM2: area,
    clearanceM3: clearance, displacementM3: displacement, startVolumeM3: startVolume,
    startKpa: charge.pressureKpa, startK: charge.temperatureK, massR,
    gamma: gamma === 'temperature' ? 0 : gamma,
    heatJ: burn ? fuelKg * burn.heatingValueKjPerKg * 1000 * burn.efficiency : 0,
    a: burn?.a ?? 1, m: burn?.m ?? 1, durationDeg: burn?.durationDeg ?? 1,
    startDeg: burn ? burnStartDeg(burn) : engine.evoDeg,
    ninetyDeg: burn ? burn.durationDeg * ninetyShare(burn) : Infinity,
    cooling: heatLoss ? (3.26 * bore ** -0.2 * (charge.temperatureK / charge.pressureKpa) ** -0.55) / (6 * rpm) : 0,
    wallK: heatLoss?.wallK ?? 0,
    wallAreaM2: 2 * area * (heatLoss?.headAreaFactor ?? 1) + Math.PI * bore * (clearance / area),
    wallPerM: Math.PI * bore,
    gasMps: 2.28 * pistonMps,
    gasMpsPerKpa: (3.24e-3 * displacement * charge.temperatureK) / (charge.pressureKpa * startVolume),
    knockPerDeg: octane === null || !burn ? 0
      : (charge.pressureKpa / 101.325) ** 1.7 / (17.68 * (octane / 100) ** octaneExponent) / (0.006 * rpm),
    stepDeg,
  }
}
