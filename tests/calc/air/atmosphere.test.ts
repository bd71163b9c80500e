import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { densityAltitudeM, powerAtDensityRatio, standardAtmosphere } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const altitude = fc.double({ min: -1000, max: 11_000, noNaN: true })
const notNumbers = [undefined, null, Number.NaN, Infinity, -Infinity, '1', [], {}]

describe('standardAtmosphere', () => {
  it('starts from the sea-level values themselves', () => {
    expect(standardAtmosphere({ altitudeM: 0 })).toEqual({ temperatureK: 288.15, pressureKpa: 101.325, densityKgM3: 1.225, densityRatio: 1 })
  })

  it('agrees with a hand calculation', () => {
    const { temperatureK, pressureKpa } = standardAtmosphere({ altitudeM: 5000 })
    expectClose(temperatureK, 255.65, { rel: 1e-14 })
    expectClose(pressureKpa, 101.325 * (255.65 / 288.15) ** (9.80665 / ((8314.32 / 28.9644) * 0.0065)), { rel: 1e-13 })
  })

  it('stands in hydrostatic balance: what the pressure falls is the weight of the air between', () => {
    fc.assert(fc.property(fc.double({ min: -900, max: 10_900, noNaN: true }), (altitudeM) => {
      const at = (m: number) => standardAtmosphere({ altitudeM: m })
      const fall = (at(altitudeM - 50).pressureKpa - at(altitudeM + 50).pressureKpa) * 10
      const { pressureKpa, temperatureK } = at(altitudeM)
      const density = (pressureKpa * 1000) / ((8314.32 / 28.9644) * temperatureK)
      expectClose(fall, density * 9.80665, { rel: 1e-5 })
    }))
  })

  it('obeys the gas law, its density that of the standard’s own sea level', () => {
    fc.assert(fc.property(altitude, fc.double({ min: -40, max: 40, noNaN: true }), (altitudeM, offsetK) => {
      const air = standardAtmosphere({ altitudeM, offsetK })
      expectClose(air.densityRatio, (air.pressureKpa / 101.325) * (288.15 / air.temperatureK), { rel: 1e-14 })
      expectClose(air.densityKgM3, 1.225 * air.densityRatio, { rel: 1e-15 })
    }))
  })

  it('a warm day leaves the pressure', () => {
    const [warm, standard] = [standardAtmosphere({ altitudeM: 2000, offsetK: 20 }), standardAtmosphere({ altitudeM: 2000 })]
    expect(warm.pressureKpa).toBe(standard.pressureKpa)
    expectClose(warm.temperatureK - standard.temperatureK, 20, { abs: 1e-12 })
    expectClose(warm.densityRatio * warm.temperatureK, standard.densityRatio * standard.temperatureK, { rel: 1e-14 })
  })

  it('names what cannot be used', () => {
    for (const altitudeM of [...notNumbers, -1000.001, 11_000.001]) expectCalcError(() => standardAtmosphere({ altitudeM: altitudeM as never }), 'altitudeM')
    for (const offsetK of [null, Number.NaN, Infinity, '1', -288.15, -300]) expectCalcError(() => standardAtmosphere({ altitudeM: 0, offsetK: offsetK as never }), 'offsetK')
    expect(standardAtmosphere(deepFreeze({ altitudeM: 0, offsetK: -288.1 })).temperatureK).toBeGreaterThan(0)
    expectCalcError(() => standardAtmosphere(undefined as never), 'altitudeM')
  })
})

describe('densityAltitudeM', () => {
  it('is the altitude itself in the standard, ends included', () => {
    fc.assert(fc.property(altitude, (altitudeM) => {
      const { temperatureK } = standardAtmosphere({ altitudeM })
      expectClose(densityAltitudeM({ pressureAltitudeM: altitudeM, temperatureK }), altitudeM, { abs: 1e-9, rel: 1e-12 })
    }))
    expect(densityAltitudeM({ pressureAltitudeM: 0, temperatureK: 288.15 })).toBe(0)
    expectClose(densityAltitudeM({ pressureAltitudeM: -1000, temperatureK: 294.65 }), -1000, { abs: 1e-9 })
    expect(densityAltitudeM({ pressureAltitudeM: 11_000, temperatureK: 216.65 })).toBeLessThanOrEqual(11_000)
  })

  it('is where the standard has the density of this air', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 8000, noNaN: true }), fc.double({ min: -15, max: 25, noNaN: true }), (altitudeM, offsetK) => {
      const air = standardAtmosphere({ altitudeM, offsetK })
      const altitude = densityAltitudeM({ pressureAltitudeM: altitudeM, temperatureK: air.temperatureK })
      if (altitude < -1000) return
      expectClose(standardAtmosphere({ altitudeM: altitude }).densityRatio, air.densityRatio, { rel: 1e-12 })
    }))
  })

  it('follows cold air far below the sea, down to −5000 m and no further', () => {
    // (288.15/T) = (1 + 0.0065·5000/288.15)^4.2559 at −5000 m.
    const coldestK = 288.15 * (320.65 / 288.15) ** -(9.80665 / ((8314.32 / 28.9644) * 0.0065) - 1)
    expectClose(densityAltitudeM({ pressureAltitudeM: 0, temperatureK: coldestK + 1e-9 }), -5000, { rel: 1e-6 })
    const cold = expectCalcError(() => densityAltitudeM({ pressureAltitudeM: 0, temperatureK: coldestK - 0.01 }), 'temperatureK')
    expect(cold.message).toContain('denser')
    expect(expectCalcError(() => densityAltitudeM({ pressureAltitudeM: 11_000, temperatureK: 216.7 }), 'temperatureK').message).toContain('thinner')
  })

  it('names what cannot be used', () => {
    for (const temperatureK of [...notNumbers, 0, -1, 5e-324, 1e308]) expectCalcError(() => densityAltitudeM({ pressureAltitudeM: 0, temperatureK: temperatureK as never }), 'temperatureK')
    for (const pressureAltitudeM of [...notNumbers, -1001, 11_001]) expectCalcError(() => densityAltitudeM({ pressureAltitudeM: pressureAltitudeM as never, temperatureK: 280 }), 'pressureAltitudeM')
    expectCalcError(() => densityAltitudeM(null as never), 'pressureAltitudeM')
  })
})

describe('powerAtDensityRatio', () => {
  it('is whole at sea level, a straight line, and nothing where friction takes all', () => {
    expectClose(powerAtDensityRatio(1), 1, { rel: 1e-15 })
    expectClose(powerAtDensityRatio(0.132 / 1.132), 0, { abs: 1e-15 })
    expectClose(powerAtDensityRatio(0.05), -0.0754, { rel: 1e-13 })
    expectClose(powerAtDensityRatio(1.1) - powerAtDensityRatio(0.9), 0.2264, { rel: 1e-13 })
  })

  it('names what cannot be used', () => {
    for (const ratio of [...notNumbers, 0, -1, 1.7e308]) expectCalcError(() => powerAtDensityRatio(ratio as never), 'ratio')
  })
})
