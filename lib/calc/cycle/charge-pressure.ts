import { takeCycleEngine, type CycleEngine } from '../geometry/cycle-engine'
import { displacementM3, volumeM3 } from '../geometry/slider-crank'
import { takeNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf } from '../validate/shape'
import { gasConstant } from './prepare-cycle'

export interface ChargePressureInput {
  readonly engine: CycleEngine
  readonly volumetricEfficiency: number
  /** Density of the air around the engine. */
  readonly ambientDensityKgM3: number
  /** Of the charge at inlet closing. */
  readonly temperatureK: number
  readonly residualFraction: number
  readonly airFuelRatio: number
}

/**
 * Pressure of the charge at inlet closing, kPa, that a volumetric efficiency stands for.
 *
 * p = η_v·ρ_ambient·V_d·R·T/(V_ivc·(1 − residual)·AFR/(1 + AFR)), R = 287 J/(kg K)
 *
 * Validity: a four-stroke engine; the piston is already rising at inlet closing, so this is not the manifold's pressure: 95 kPa there is a volumetric efficiency of about 0.63.
 * Source: common practice, no published source (mass balance).
 *
 * @param input.engine `{ boreMm, strokeMm, rodMm, compressionRatio, ivcDeg, evoDeg }` as in `simulateCycle`
 * @param input.volumetricEfficiency mass of air drawn in over the mass the displacement holds at the ambient density, > 0
 * @param input.ambientDensityKgM3 kg/m³ > 0
 * @param input.temperatureK charge temperature at inlet closing, K > 0
 * @param input.residualFraction share of burned gas in the charge, 0 … below 1
 * @param input.airFuelRatio mass of air to mass of fuel, > 0
 * @throws CalcError on any of these by its path
 * @example
 * chargePressureFromVolumetricEfficiency({ engine: { boreMm: 90, strokeMm: 80, rodMm: 140, compressionRatio: 8, ivcDeg: -120, evoDeg: 120 }, volumetricEfficiency: 0.63, ambientDensityKgM3: 1.225, temperatureK: 370, residualFraction: 0.06, airFuelRatio: 12.8 }) // → 99.2260
 */
export const chargePressureFromVolumetricEfficiency = (input: ChargePressureInput): number => {
  const members = membersOf(input)
  const engine = takeCycleEngine(members.engine, 'engine')
  const volumetricEfficiency = takeNumber(members.volumetricEfficiency, 'volumetricEfficiency', { name: 'The volumetric efficiency', unit: '', above: 0 })
  const density = takeNumber(members.ambientDensityKgM3, 'ambientDensityKgM3', { name: 'The density of the air', unit: 'kg/m³', above: 0 })
  const temperatureK = takeNumber(members.temperatureK, 'temperatureK', { name: 'The temperature at inlet closing', unit: 'K', above: 0 })
  const residual = takeNumber(members.residualFraction, 'residualFraction', { name: 'The residual fraction', unit: '', min: 0, below: 1 })
  const ratio = takeNumber(members.airFuelRatio, 'airFuelRatio', { name: 'The air-fuel ratio', unit: '', above: 0 })
  const airKg = finiteResult(volumetricEfficiency * density * displacementM3(engine), 'volumetricEfficiency', volumetricEfficiency)
  const chargeKg = finiteResult(airKg / ((1 - residual) * (ratio / (1 + ratio))), 'airFuelRatio', ratio)
  const kpa = (chargeKg * gasConstant * temperatureK) / volumeM3(engine, engine.ivcDeg) / 1000
  return finiteResult(kpa, 'temperatureK', temperatureK, 'K')
}
