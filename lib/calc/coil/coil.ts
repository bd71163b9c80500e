import { takeNumber, takeOptionalNumber } from '../validate/number'
import { takeRecord } from '../validate/shape'

/** The primary of an ignition coil behind its switch. */
export interface Coil {
  /** Voltage at the coil, what the switch drops taken off. */
  readonly supplyV: number
  readonly ohm: number
  readonly mh: number
  /** The driver holds the current here; no limit unless given. */
  readonly limitA?: number
}

/** Without a limit, `limitA` is Infinity. */
export const takeCoil = (value: unknown, field: string): Required<Coil> => {
  const members = takeRecord(value, field, 'The coil')
  return {
    supplyV: takeNumber(members.supplyV, `${field}.supplyV`, { name: 'The voltage at the coil', unit: 'V', above: 0 }),
    ohm: takeNumber(members.ohm, `${field}.ohm`, { name: 'The resistance of the primary', unit: 'Ω', above: 0 }),
    mh: takeNumber(members.mh, `${field}.mh`, { name: 'The inductance of the primary', unit: 'mH', above: 0 }),
    limitA: takeOptionalNumber(members.limitA, `${field}.limitA`, { name: 'The current limit', unit: 'A', above: 0 }, Infinity),
  }
}

/** Current after a dwell without a limit, A: as time over inductance while the resistance has hardly begun to tell, else as a share of V/R. */
export const rampA = ({ supplyV, ohm, mh }: Omit<Coil, 'limitA'>, ms: number): number => {
  const x = (ohm * ms) / mh
  if (!(x < 1)) return (supplyV / ohm) * -Math.expm1(-x)
  return supplyV * (ms / mh) * (x === 0 ? 1 : -Math.expm1(-x) / x)
}

/** Dwell that brings the current to `amps` when nothing limits it, ms; Infinity when V/R never passes it. */
export const rampMs = ({ supplyV, ohm, mh }: Omit<Coil, 'limitA'>, amps: number): number => {
  const share = (amps * ohm) / supplyV
  if (!(share < 1)) return Infinity
  return mh * (amps / supplyV) * (share === 0 ? 1 : -Math.log1p(-share) / share)
}
