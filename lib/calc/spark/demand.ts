import { CalcError } from '../calc-error'
import { takeCycleEngine, type CycleEngine } from '../geometry/cycle-engine'
import { volumeM3 } from '../geometry/slider-crank'
import { takeNumber, takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { membersOf, takeRecord } from '../validate/shape'
import { breakdownOf, takeGap } from './breakdown'

export interface SparkDemandInput {
  readonly engine: CycleEngine
  readonly charge: { readonly pressureKpa: number, readonly temperatureK: number }
  readonly sparkDeg: number
  readonly gapMm: number
  readonly polytropicExponent?: number
}

/**
 * Voltage that the plug asks for at the moment of the spark, kV.
 *
 * `breakdownKv` at p = p₁·(V₁/V)^n and T = T₁·(V₁/V)^(n − 1), V₁ at inlet closing, V at the spark, both as in `cylinderVolumeCc`
 *
 * Validity: compression without blow-by before anything burns; the uniform field of the breakdown law, cold clean electrodes: worn or fouled plugs need more.
 * Source: wadhwa, Ex. 4.1 (read).
 *
 * @param input.engine `{ boreMm, strokeMm, rodMm, compressionRatio, ivcDeg, evoDeg }`: mm > 0, rod above half the stroke, ratio > 1, crank degrees −180 ≤ ivcDeg < 0 < evoDeg ≤ 180
 * @param input.charge `{ pressureKpa, temperatureK }` in the cylinder at inlet closing, kPa and K, > 0
 * @param input.sparkDeg spark, crank degrees BTDC, ivcDeg < −sparkDeg < evoDeg
 * @param input.gapMm gap of the plug, mm, > 0
 * @param input.polytropicExponent exponent n of the compression, 1 … 1.67; 1.3 unless given
 * @throws CalcError on any of these by its name, or below `engine` or `charge`
 * @example
 * sparkDemandKv({ engine: { boreMm: 94, strokeMm: 76, rodMm: 128, compressionRatio: 8.6, ivcDeg: -120, evoDeg: 120 }, charge: { pressureKpa: 100, temperatureK: 360 }, sparkDeg: 25, gapMm: 0.6 }) // → 8.6680
 */
export const sparkDemandKv = (input: SparkDemandInput): number => {
  const members = membersOf(input)
  const engine = takeCycleEngine(members.engine, 'engine')
  const charge = takeRecord(members.charge, 'charge', 'The charge')
  const pressureKpa = takeNumber(charge.pressureKpa, 'charge.pressureKpa', { name: 'The pressure at inlet closing', unit: 'kPa', above: 0 })
  const temperatureK = takeNumber(charge.temperatureK, 'charge.temperatureK', { name: 'The temperature at inlet closing', unit: 'K', above: 0 })
  const sparkDeg = takeNumber(members.sparkDeg, 'sparkDeg', { name: 'The spark', unit: 'deg' })
  if (!(-sparkDeg > engine.ivcDeg && -sparkDeg < engine.evoDeg)) {
    const range = `${-engine.evoDeg} … ${-engine.ivcDeg}`.replace('-', '−')
    throw new CalcError({
      field: 'sparkDeg', value: sparkDeg, limit: `within ${range}`, unit: 'deg',
      message: `The spark must fall while both valves are closed, between ${range}° before top dead centre; ${sparkDeg}° was given.`,
    })
  }
  const gapMm = takeGap(members.gapMm)
  const exponent = takeOptionalNumber(members.polytropicExponent, 'polytropicExponent', { name: 'The exponent of the compression', unit: '', min: 1, max: 1.67 }, 1.3)
  const squeeze = volumeM3(engine, engine.ivcDeg) / volumeM3(engine, -sparkDeg)
  const demand = breakdownOf(gapMm, pressureKpa * squeeze ** exponent, temperatureK * squeeze ** (exponent - 1))
  return finiteResult(demand, 'charge.pressureKpa', pressureKpa, 'kPa')
}
