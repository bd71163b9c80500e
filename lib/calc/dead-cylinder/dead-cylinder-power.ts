import { CalcError } from '../calc-error'
import { takeNumber, takeOptionalNumber } from '../validate/number'
import { finiteResult } from '../validate/result'
import { cylinderCount } from '../validate/rules'
import { membersOf } from '../validate/shape'

export interface DeadCylinderInput {
  readonly cylinders: number
  readonly dead: number
  readonly brakePowerKw: number
  readonly mechanicalEfficiency?: number
  readonly frictionPowerKw?: number
  readonly extraDragKwPerDead?: number
  readonly timingRatio?: number
}

export interface DeadCylinderPower {
  readonly brakePowerKw: number
  /** Of the healthy brake power at reference timing; may be negative. */
  readonly fraction: number
  /** Of all cylinders at this timing. */
  readonly indicatedPowerKw: number
  readonly frictionPowerKw: number
}

/** Exactly one of the two ways to state friction. */
const takeFrictionKw = (members: Record<string, unknown>, brakePowerKw: number): number => {
  const { mechanicalEfficiency, frictionPowerKw } = members
  if (mechanicalEfficiency !== undefined && frictionPowerKw !== undefined) {
    throw new CalcError({
      field: 'frictionPowerKw', value: frictionPowerKw, limit: 'left out when mechanicalEfficiency is given', unit: 'kW',
      message: 'Give either the mechanical efficiency or the friction power, not both: one follows from the other.',
    })
  }
  if (frictionPowerKw !== undefined) return takeNumber(frictionPowerKw, 'frictionPowerKw', { name: 'The friction power', unit: 'kW', min: 0 })
  if (mechanicalEfficiency === undefined) {
    throw new CalcError({
      field: 'mechanicalEfficiency', value: undefined, limit: '> 0 and ≤ 1, or frictionPowerKw instead', unit: '',
      message: 'Friction is missing: give the mechanical efficiency, above 0 and at most 1, or the friction power in kW.',
    })
  }
  const efficiency = takeNumber(mechanicalEfficiency, 'mechanicalEfficiency', { name: 'The mechanical efficiency', unit: '', above: 0, max: 1 })
  return finiteResult(brakePowerKw * (1 / efficiency - 1), 'mechanicalEfficiency', efficiency)
}

/**
 * Power left when some cylinders don't fire and the others turn them: `{ brakePowerKw, fraction, indicatedPowerKw, frictionPowerKw }`, kW.
 *
 * IP = timingRatio·BP + FP; remaining = IP·(N − k)/N − FP − k·drag; fraction = remaining/BP, may be negative and is reported as it is;
 * FP = BP·(1/ηm − 1) when the efficiency is given. `indicatedPowerKw` is IP of all cylinders at this timing.
 *
 * Validity: full throttle, friction unchanged, equal cylinders. At altitude power lapses first, then this with the unlapsed friction power.
 * Source: common practice, no published source (the Morse test read backwards; its published tests are among the checks).
 *
 * @param input.cylinders number of cylinders N, a whole number ≥ 1
 * @param input.dead number k of them that don't fire, a whole number 0 … N
 * @param input.brakePowerKw healthy brake power BP at reference timing, kW, > 0
 * @param input.mechanicalEfficiency ηm = BP/(BP + FP), > 0 … 1; exactly one of this and frictionPowerKw
 * @param input.frictionPowerKw friction power FP, kW, ≥ 0; exactly one of this and mechanicalEfficiency
 * @param input.extraDragKwPerDead what a dead cylinder costs beyond its friction, kW, ≥ 0; 0 when left out
 * @param input.timingRatio brake torque at this timing over that at reference timing, ≥ 0; 1 when left out
 * @throws CalcError on any of these by its name
 * @example
 * deadCylinderPower({ cylinders: 6, dead: 1, brakePowerKw: 84, frictionPowerKw: 18 }) // → { brakePowerKw: 67, fraction: 0.797619, indicatedPowerKw: 102, frictionPowerKw: 18 }
 */
export const deadCylinderPower = (input: DeadCylinderInput): DeadCylinderPower => {
  const members = membersOf(input)
  const cylinders = takeNumber(members.cylinders, 'cylinders', cylinderCount)
  const dead = takeNumber(members.dead, 'dead', { name: 'The number of dead cylinders', unit: '', min: 0, max: cylinders, integer: true })
  const healthyKw = takeNumber(members.brakePowerKw, 'brakePowerKw', { name: 'The brake power', unit: 'kW', above: 0 })
  const frictionPowerKw = takeFrictionKw(members, healthyKw)
  const dragKw = takeOptionalNumber(members.extraDragKwPerDead, 'extraDragKwPerDead', { name: 'The extra drag of a dead cylinder', unit: 'kW', min: 0 }, 0)
  const timingRatio = takeOptionalNumber(members.timingRatio, 'timingRatio', { name: 'The timing ratio', unit: '', min: 0 }, 1)

  const indicatedPowerKw = finiteResult(timingRatio * healthyKw + frictionPowerKw, 'brakePowerKw', healthyKw, 'kW')
  const brakePowerKw = finiteResult((indicatedPowerKw * (cylinders - dead)) / cylinders - frictionPowerKw - dead * dragKw, 'extraDragKwPerDead', dragKw, 'kW')
  return { brakePowerKw, fraction: finiteResult(brakePowerKw / healthyKw, 'brakePowerKw', healthyKw, 'kW'), indicatedPowerKw, frictionPowerKw }
}
