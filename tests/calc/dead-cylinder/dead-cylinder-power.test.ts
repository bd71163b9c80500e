import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { deadCylinderPower, morseTest } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const six = { cylinders: 6, dead: 1, brakePowerKw: 84, mechanicalEfficiency: 0.84 }

describe('deadCylinderPower', () => {
  it('agrees with a hand calculation', () => {
    // FP = 84/0.84 − 84 = 16; IP = 0.95·84 + 16 = 95.8; remaining = 95.8·4/6 − 16 − 2·1.3.
    const result = deadCylinderPower({ ...six, dead: 2, extraDragKwPerDead: 1.3, timingRatio: 0.95 })
    expectClose(result.frictionPowerKw, 16, { rel: 1e-9 })
    expectClose(result.indicatedPowerKw, 95.8, { rel: 1e-9 })
    expectClose(result.brakePowerKw, 95.8 * 4 / 6 - 18.6, { rel: 1e-9 })
    expectClose(result.fraction, (95.8 * 4 / 6 - 18.6) / 84, { rel: 1e-9 })
  })

  it('with none dead it is the healthy engine at that timing; with all dead the friction alone', () => {
    expectClose(deadCylinderPower({ ...six, dead: 0 }).fraction, 1, { rel: 1e-12 })
    expectClose(deadCylinderPower({ ...six, dead: 0, timingRatio: 0.9 }).fraction, 0.9, { rel: 1e-12 })
    const all = deadCylinderPower({ cylinders: 6, dead: 6, brakePowerKw: 84, frictionPowerKw: 16 })
    expect(all.brakePowerKw).toBe(-16)
    expectClose(all.fraction, -16 / 84, { rel: 1e-12 })
    expect(deadCylinderPower({ cylinders: 4, dead: 4, brakePowerKw: 50, mechanicalEfficiency: 1 })).toMatchObject({ brakePowerKw: 0, frictionPowerKw: 0 })
  })

  it('a dead cylinder costs 1/(N·ηm) of the brake power', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 12 }), fc.double({ min: 0.3, max: 1, noNaN: true }), fc.double({ min: 1, max: 500, noNaN: true }), (cylinders, mechanicalEfficiency, brakePowerKw) => {
      for (let dead = 0; dead <= cylinders; dead += 1) {
        const { fraction } = deadCylinderPower({ cylinders, dead, brakePowerKw, mechanicalEfficiency })
        expectClose(fraction, 1 - dead / (cylinders * mechanicalEfficiency), { rel: 1e-9, abs: 1e-12 })
      }
    }))
  })

  it('efficiency and friction power say the same', () => {
    const friction = deadCylinderPower(six).frictionPowerKw
    const { brakePowerKw, dead, cylinders } = six
    expectClose(deadCylinderPower({ cylinders, dead, brakePowerKw, frictionPowerKw: friction }).fraction, deadCylinderPower(six).fraction, { rel: 1e-12 })
  })

  it('the Morse test reads the same engine back', () => {
    fc.assert(fc.property(fc.integer({ min: 2, max: 12 }), fc.double({ min: 0.3, max: 0.99, noNaN: true }), fc.double({ min: 1, max: 500, noNaN: true }), (cylinders, mechanicalEfficiency, allFiringKw) => {
      const cut = deadCylinderPower({ cylinders, dead: 1, brakePowerKw: allFiringKw, mechanicalEfficiency })
      const test = morseTest({ allFiringKw, cutOutKw: Array.from({ length: cylinders }, () => cut.brakePowerKw) })
      expectClose(test.mechanicalEfficiency, mechanicalEfficiency, { rel: 1e-9 })
      expectClose(test.frictionPowerKw, cut.frictionPowerKw, { rel: 1e-7 })
      expectClose(test.indicatedTotalKw, cut.indicatedPowerKw, { rel: 1e-9 })
    }))
  })

  it('names the argument that cannot be used', () => {
    const of = (change: object) => () => deadCylinderPower(deepFreeze({ ...six, ...change }) as never)
    for (const cylinders of [0, -1, 2.5, undefined, '6', 1e300]) expectCalcError(of({ cylinders }), 'cylinders')
    for (const dead of [-1, 7, 0.5, undefined, null]) expectCalcError(of({ dead }), 'dead')
    for (const brakePowerKw of [0, -1, Number.NaN, undefined]) expectCalcError(of({ brakePowerKw }), 'brakePowerKw')
    for (const mechanicalEfficiency of [0, 1.01, -0.5, undefined, null, Number.NaN]) expectCalcError(of({ mechanicalEfficiency }), 'mechanicalEfficiency')
    for (const frictionPowerKw of [-1, null, Infinity]) expectCalcError(of({ mechanicalEfficiency: undefined, frictionPowerKw }), 'frictionPowerKw')
    expectCalcError(of({ frictionPowerKw: 16 }), 'frictionPowerKw')
    for (const extraDragKwPerDead of [-1, null, 'x']) expectCalcError(of({ extraDragKwPerDead }), 'extraDragKwPerDead')
    for (const timingRatio of [-0.1, null, Number.NaN]) expectCalcError(of({ timingRatio }), 'timingRatio')
    expectCalcError(of({ mechanicalEfficiency: 1e-320 }), 'mechanicalEfficiency')
    expectCalcError(of({ timingRatio: 1e308 }), 'brakePowerKw')
    expectCalcError(of({ dead: 6, extraDragKwPerDead: 1e308 }), 'extraDragKwPerDead')
    expectCalcError(() => deadCylinderPower(undefined as never), 'cylinders')
  })
})
