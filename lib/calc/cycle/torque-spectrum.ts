import { finiteResult } from '../validate/result'

export interface TorqueSpectrum {
  readonly meanNm: number
  readonly rippleNm: number
  /** Order in events a turn of the crank: 0.5 … 6. */
  readonly orders: { readonly order: number, readonly amplitudeNm: number }[]
}

const orderCount = 12

/** Mean, ripple (greatest less least) and the amplitudes of orders 0.5 … 6 of a torque given at each whole degree of a working cycle. */
export const torqueSpectrum = (torqueNm: readonly number[], massKg: number): TorqueSpectrum => {
  const cycleDeg = torqueNm.length
  const meanNm = finiteResult(torqueNm.reduce((sum, torque) => sum + torque, 0) / cycleDeg, 'reciprocatingMassKg', massKg, 'kg')
  const rippleNm = torqueNm.reduce((most, torque) => Math.max(most, torque), -Infinity) - torqueNm.reduce((least, torque) => Math.min(least, torque), Infinity)
  const orders = Array.from({ length: orderCount }, (_, i) => {
    const order = (i + 1) / 2
    let real = 0
    let imaginary = 0
    torqueNm.forEach((torque, angle) => {
      // Whole turns come off before the sine: order·angle is a multiple of half a degree.
      const phi = (((order * angle) % 360) * Math.PI) / 180
      real += torque * Math.cos(phi)
      imaginary += torque * Math.sin(phi)
    })
    return { order, amplitudeNm: finiteResult((2 / cycleDeg) * Math.hypot(real, imaginary), 'reciprocatingMassKg', massKg, 'kg') }
  })
  return { meanNm, rippleNm: finiteResult(rippleNm, 'reciprocatingMassKg', massKg, 'kg'), orders }
}
