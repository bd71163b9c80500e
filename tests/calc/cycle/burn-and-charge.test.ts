import { describe, expect, it } from 'vitest'
import { autoignitionDelayMs, burnedFraction, chargePressureFromVolumetricEfficiency, combustionEfficiency, cylinderVolumeCc, scaleBurn, wallHeatTransfer } from '@/lib/calc'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { sampleCycle } from './cycles'

const { engine } = sampleCycle()
const air = { engine, volumetricEfficiency: 0.8, ambientDensityKgM3: 1.225, temperatureK: 370, residualFraction: 0.06, airFuelRatio: 12.8 }

describe('combustionEfficiency', () => {
  it('falls with the air that is missing and stays at 0.97 beyond', () => {
    expectClose(combustionEfficiency(7.3), 0.485, { rel: 1e-12 })
    expectClose(combustionEfficiency(20), 0.97, { rel: 1e-12 })
    expectCalcError(() => combustionEfficiency(0), 'airFuelRatio')
  })
})

describe('chargePressureFromVolumetricEfficiency', () => {
  it('holds the mass of air that the volumetric efficiency says', () => {
    const kpa = chargePressureFromVolumetricEfficiency(air)
    const volumeM3 = cylinderVolumeCc({ engine, thetaDeg: engine.ivcDeg }) * 1e-6
    const displacementM3 = ((Math.PI / 4) * engine.boreMm ** 2 * engine.strokeMm) * 1e-9
    const airKg = ((kpa * 1000 * volumeM3) / (287 * 370)) * 0.94 * (12.8 / 13.8)
    expectClose(airKg, 0.8 * 1.225 * displacementM3, { rel: 1e-12 })
  })

  it('95 kPa at inlet closing is a volumetric efficiency of about 0.63', () => {
    const perEfficiency = chargePressureFromVolumetricEfficiency({ ...air, volumetricEfficiency: 1 })
    expectClose(95 / perEfficiency, 0.63, { abs: 0.03 })
  })

  it('refuses what cannot be', () => {
    expectCalcError(() => chargePressureFromVolumetricEfficiency({ ...air, residualFraction: 1 }), 'residualFraction')
    expectCalcError(() => chargePressureFromVolumetricEfficiency({ ...air, volumetricEfficiency: 0 }), 'volumetricEfficiency')
    expectCalcError(() => chargePressureFromVolumetricEfficiency({ ...air, engine: { ...engine, evoDeg: 0 } }), 'engine.evoDeg')
  })
})

describe('scaleBurn', () => {
  const reference = { rpm: 2000, pressureKpa: 100, delayDeg: 8, durationDeg: 60 }
  it('is the reference at the reference, and scales there and back', () => {
    expect(scaleBurn({ reference, rpm: 2000, pressureKpa: 100 })).toEqual({ delayDeg: 8, durationDeg: 60 })
    const there = scaleBurn({ reference, rpm: 3000, pressureKpa: 50 })
    const back = scaleBurn({ reference: { ...there, rpm: 3000, pressureKpa: 50 }, rpm: 2000, pressureKpa: 100 })
    expectClose(back.durationDeg, 60, { rel: 1e-12 })
    expectClose(there.durationDeg, 60 * 1.5 ** (1 / 3) * 0.5 ** -0.25, { rel: 1e-12 })
  })

  it('refuses a stopped engine and a pressure of nothing', () => {
    expectCalcError(() => scaleBurn({ reference, rpm: 0, pressureKpa: 100 }), 'rpm')
    expectCalcError(() => scaleBurn({ reference: { ...reference, pressureKpa: -1 }, rpm: 2000, pressureKpa: 100 }), 'reference.pressureKpa')
  })
})

describe('the parts of the model', () => {
  it('burned fraction starts at 0, ends at 1 − e^−a and refuses shares outside', () => {
    expect(burnedFraction({ share: 0 })).toBe(0)
    expectClose(burnedFraction({ share: 1, a: 3, m: 1 }), 1 - Math.exp(-3), { rel: 1e-14 })
    expectCalcError(() => burnedFraction({ share: 1.01 }), 'share')
  })

  it('the delay to autoignition halves when the pressure rises by 2^(1/1.7)', () => {
    const at = { octane: 90, pressureKpa: 2000, temperatureK: 780 }
    expectClose(autoignitionDelayMs({ ...at, pressureKpa: 2000 * 2 ** (1 / 1.7) }), autoignitionDelayMs(at) / 2, { rel: 1e-12 })
    expectCalcError(() => autoignitionDelayMs({ ...at, octane: 0 }), 'octane')
  })

  it('heat transfer grows with the 0.8th power of the gas speed', () => {
    const at = { boreMm: 94, pressureKpa: 3000, temperatureK: 1800, gasMps: 10 }
    expectClose(wallHeatTransfer({ ...at, gasMps: 20 }), wallHeatTransfer(at) * 2 ** 0.8, { rel: 1e-12 })
    expectCalcError(() => wallHeatTransfer({ ...at, gasMps: -1 }), 'gasMps')
  })
})
