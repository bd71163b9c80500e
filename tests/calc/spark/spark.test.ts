import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { breakdownKv, cylinderVolumeCc, sparkDemandKv, sparkMargin, type SparkDemandInput } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const engine = { boreMm: 94, strokeMm: 76, rodMm: 128, compressionRatio: 8.6, ivcDeg: -125, evoDeg: 120 }
const demand: SparkDemandInput = { engine, charge: { pressureKpa: 98, temperatureK: 350 }, sparkDeg: 24, gapMm: 0.7 }
const notPositive = [undefined, null, Number.NaN, Infinity, '1', 0, -1]

describe('breakdownKv', () => {
  it('agrees with a hand calculation', () => {
    expectClose(breakdownKv({ gapMm: 10, pressureKpa: 101.325, temperatureK: 293.15 }), 30.3, { rel: 1e-14 })
    expectClose(breakdownKv({ gapMm: 2.5, pressureKpa: 405.3, temperatureK: 293.15 }), 30.3, { rel: 1e-14 })
  })

  it('depends on gap times density alone', () => {
    fc.assert(fc.property(fc.double({ min: 0.1, max: 10, noNaN: true }), fc.double({ min: 0.2, max: 20, noNaN: true }), (gapMm, factor) => {
      const kv = breakdownKv({ gapMm, pressureKpa: 300, temperatureK: 500 })
      expectClose(breakdownKv({ gapMm: gapMm / factor, pressureKpa: 300 * factor, temperatureK: 500 }), kv, { rel: 1e-13 })
      expectClose(breakdownKv({ gapMm: gapMm * factor, pressureKpa: 300, temperatureK: 500 * factor }), kv, { rel: 1e-13 })
    }))
  })

  it('names what cannot be used', () => {
    for (const bad of notPositive) {
      for (const name of ['gapMm', 'pressureKpa', 'temperatureK']) expectCalcError(() => breakdownKv({ gapMm: 1, pressureKpa: 100, temperatureK: 300, [name]: bad }), name)
    }
    expectCalcError(() => breakdownKv({ gapMm: 1e300, pressureKpa: 1e300, temperatureK: 300 }), 'gapMm')
    expectCalcError(() => breakdownKv(undefined as never), 'gapMm')
  })
})

describe('sparkDemandKv', () => {
  it('is the breakdown at the compressed charge', () => {
    fc.assert(fc.property(fc.double({ min: -119, max: 124, noNaN: true }), fc.double({ min: 1, max: 1.67, noNaN: true }), (sparkDeg, polytropicExponent) => {
      const squeeze = cylinderVolumeCc({ engine, thetaDeg: -125 }) / cylinderVolumeCc({ engine, thetaDeg: -sparkDeg })
      const state = { pressureKpa: 98 * squeeze ** polytropicExponent, temperatureK: 350 * squeeze ** (polytropicExponent - 1) }
      expectClose(sparkDemandKv({ ...demand, sparkDeg, polytropicExponent }), breakdownKv({ gapMm: 0.7, ...state }), { rel: 1e-13 })
    }))
  })

  it('the density is the same whatever the exponent, and so is the demand', () => {
    expectClose(sparkDemandKv({ ...demand, polytropicExponent: 1 }), sparkDemandKv(demand), { rel: 1e-13 })
  })

  it('a later spark asks for more, up to the top, and is even about it', () => {
    const at = (sparkDeg: number) => sparkDemandKv({ ...demand, sparkDeg })
    expect([40, 30, 20, 10, 0].map(at)).toEqual([40, 30, 20, 10, 0].map(at).toSorted((a, b) => a - b))
    expectClose(at(15), at(-15), { rel: 1e-14 })
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => sparkDemandKv(deepFreeze({ ...demand, ...change }) as never)
    for (const sparkDeg of [undefined, null, Number.NaN, Infinity, '1', 125, 130, -120, -121]) expectCalcError(of({ sparkDeg }), 'sparkDeg')
    for (const bad of notPositive) {
      expectCalcError(of({ gapMm: bad }), 'gapMm')
      expectCalcError(of({ charge: { pressureKpa: bad, temperatureK: 350 } }), 'charge.pressureKpa')
      expectCalcError(of({ charge: { pressureKpa: 98, temperatureK: bad } }), 'charge.temperatureK')
      for (const name of ['boreMm', 'strokeMm', 'rodMm', 'compressionRatio', 'evoDeg']) expectCalcError(of({ engine: { ...engine, [name]: bad } }), `engine.${name}`)
    }
    for (const polytropicExponent of [null, Number.NaN, 0.99, 1.68, '1.3']) expectCalcError(of({ polytropicExponent }), 'polytropicExponent')
    expectCalcError(of({ engine: { ...engine, ivcDeg: 0 } }), 'engine.ivcDeg')
    expectCalcError(of({ engine: undefined }), 'engine')
    expectCalcError(of({ charge: null }), 'charge')
    expectCalcError(of({ charge: { pressureKpa: 1e308, temperatureK: 350 } }), 'charge.pressureKpa')
    expectCalcError(() => sparkDemandKv(undefined as never), 'engine')
  })
})

describe('sparkMargin', () => {
  const base = { demandKv: 11, energyMj: 60, secondaryPf: 90, transferEfficiency: 0.5 }

  it('agrees with a hand calculation: ½·C·U² is the energy that arrives', () => {
    const { offeredKv, marginKv, ratio } = sparkMargin(base)
    expectClose(0.5 * 90e-12 * (offeredKv * 1000) ** 2, 0.5 * 60e-3, { rel: 1e-14 })
    expectClose(marginKv, offeredKv - 11, { rel: 1e-15 })
    expectClose(ratio, offeredKv / 11, { rel: 1e-15 })
  })

  it('the clamp cuts, a high one does not', () => {
    expect(sparkMargin({ ...base, clampKv: 22 })).toEqual({ offeredKv: 22, marginKv: 11, ratio: 2 })
    expect(sparkMargin({ ...base, clampKv: 60 })).toEqual(sparkMargin(base))
  })

  it('too little is a negative margin, reported as it is', () => {
    expect(sparkMargin({ ...base, energyMj: 0 })).toEqual({ offeredKv: 0, marginKv: -11, ratio: 0 })
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => sparkMargin({ ...base, ...change })
    for (const bad of notPositive) {
      for (const name of ['demandKv', 'secondaryPf', 'transferEfficiency']) expectCalcError(of({ [name]: bad }), name)
      if (bad !== undefined) expectCalcError(of({ clampKv: bad }), 'clampKv')
    }
    for (const energyMj of [undefined, null, Number.NaN, -1, '1', 1e308]) expectCalcError(of({ energyMj }), 'energyMj')
    expectCalcError(of({ transferEfficiency: 1.01 }), 'transferEfficiency')
    expectCalcError(of({ demandKv: 5e-324 }), 'demandKv')
    expectCalcError(() => sparkMargin(null as never), 'demandKv')
  })
})
