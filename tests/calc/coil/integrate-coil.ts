/** Current, heat of the winding and energy drawn after a dwell by classical Runge–Kutta steps: knows nothing of closed forms. */
export const integrateCoil = (coil: { supplyV: number, ohm: number, mh: number, limitA?: number }, ms: number, steps = 6000): { amps: number, heatMj: number, suppliedMj: number } => {
  const { supplyV, ohm, mh, limitA = Infinity } = coil
  let [amps, heatMj, suppliedMj, atMs] = [0, 0, 0, 0]
  const slope = (i: number): number => (supplyV - ohm * i) / mh
  /** One step of a length; Simpson’s rule on the same points for heat and energy drawn. */
  const advance = (h: number): number => {
    const k1 = slope(amps)
    const k2 = slope(amps + (h / 2) * k1)
    const k3 = slope(amps + (h / 2) * k2)
    const k4 = slope(amps + h * k3)
    return amps + (h / 6) * (k1 + 2 * k2 + 2 * k3 + k4)
  }
  const h = ms / steps
  for (let n = 0; n < steps && amps < limitA; n += 1) {
    let step = h
    let next = advance(step)
    // The step that would pass the limit is shortened until it ends on it.
    for (let k = 0; next > limitA && k < 60; k += 1) {
      step *= (limitA - amps) / (next - amps)
      next = advance(step)
      if (Math.abs(next - limitA) < 1e-13 * limitA) break
    }
    const middle = advance(step / 2)
    heatMj += (step / 6) * ohm * (amps ** 2 + 4 * middle ** 2 + next ** 2)
    suppliedMj += (step / 6) * supplyV * (amps + 4 * middle + next)
    amps = Math.abs(next - limitA) < 1e-12 * limitA ? limitA : next
    atMs += step
  }
  if (amps >= limitA) heatMj += ohm * limitA ** 2 * (ms - atMs)
  return { amps, heatMj, suppliedMj }
}
