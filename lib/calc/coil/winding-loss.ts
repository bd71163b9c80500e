import { rampA, rampMs, type Coil } from './coil'

/** Σ u^k/k from k = 3 over u³: what is left of −ln(1 − u) after its first two terms, without their cancellation. */
const tailOverCube = (u: number): number => {
  if (u > 0.5) return (-Math.log1p(-u) - u - (u * u) / 2) / u ** 3
  let sum = 0
  let power = 1
  for (let k = 3; power > 1e-18; k += 1) {
    sum += power / k
    power *= u
  }
  return sum
}

/** Heat that the winding takes while the current climbs from 0, mJ. With x = R·t/L and u = 1 − e^(−x): R·(V/R)²·(L/R)·(x − u − u²/2). */
const rampMj = (primary: Omit<Coil, 'limitA'>, ms: number): number => {
  const { supplyV, ohm, mh } = primary
  const x = (ohm * ms) / mh
  if (x < 1) {
    const u = -Math.expm1(-x)
    const rise = x === 0 ? 1 : u / x
    const straightA = supplyV * (ms / mh)
    return ohm * straightA * straightA * ms * tailOverCube(u) * rise ** 3
  }
  const u = -Math.expm1(-x)
  const mostA = supplyV / ohm
  // x − u − u²/2 itself: of −ln(1 − u), which is x, not enough is left once u is close to 1.
  return mostA * mostA * mh * (x - u - (u * u) / 2)
}

/** Heat that the winding takes in one dwell, mJ: the ramp, then held at the limit. */
export const windingLossMj = ({ limitA, ...primary }: Required<Coil>, ms: number): number => {
  const reachedMs = rampMs(primary, limitA)
  if (reachedMs >= ms) return rampMj(primary, ms)
  return rampMj(primary, reachedMs) + primary.ohm * limitA * limitA * (ms - reachedMs)
}

export const finalCurrentA = ({ limitA, ...primary }: Required<Coil>, ms: number): number => Math.min(limitA, rampA(primary, ms))
