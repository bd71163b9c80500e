import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dwellAvailableMs, sparkPeriodShare, sparksPerSecond } from '@/lib/calc/live'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const served = { cylinders: 6, rpm: 2700 }
const notFlags = [null, 0, 1, 'true', Number.NaN, {}]

describe('sparks, dwell and period', () => {
  it('agree with a hand calculation', () => {
    expect(sparksPerSecond(served)).toBe(135)
    expect(sparksPerSecond({ ...served, wastedSpark: true })).toBe(270)
    expect(sparksPerSecond({ ...served, wastedSpark: false })).toBe(135)
    expect(sparksPerSecond({ ...served, rpm: 0 })).toBe(0)
    expectClose(dwellAvailableMs({ ...served, dutyLimit: 0.6 }), 600 / 135, { rel: 1e-15 })
    expectClose(dwellAvailableMs({ ...served, dutyLimit: 0.6, wastedSpark: true }), 300 / 135, { rel: 1e-15 })
    expectClose(sparkPeriodShare({ ...served, dwellMs: 4, sparkDurationMs: 1.5 }), 5.5 * 0.135, { rel: 1e-14 })
  })

  it('a double-ended coil is one cylinder with a wasted spark: as often as two cylinders', () => {
    expect(sparksPerSecond({ cylinders: 1, rpm: 2700, wastedSpark: true })).toBe(sparksPerSecond({ cylinders: 2, rpm: 2700 }))
  })

  it('the dwell available is its share of the period', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 12 }), fc.double({ min: 50, max: 9000, noNaN: true }), fc.double({ min: 0.01, max: 1, noNaN: true }), fc.boolean(), (cylinders, rpm, dutyLimit, wastedSpark) => {
      const engine = { cylinders, rpm, wastedSpark }
      const dwellMs = dwellAvailableMs({ ...engine, dutyLimit })
      expectClose(sparkPeriodShare({ ...engine, dwellMs, sparkDurationMs: 0 }), dutyLimit, { rel: 1e-14 })
      expectClose(dwellMs * sparksPerSecond(engine), dutyLimit * 1000, { rel: 1e-14 })
    }))
  })

  it('name what cannot be used', () => {
    for (const cylinders of [undefined, null, 0, -1, 2.5, Number.NaN, '4']) {
      expectCalcError(() => sparksPerSecond({ ...served, cylinders: cylinders as never }), 'cylinders')
      expectCalcError(() => dwellAvailableMs({ ...served, dutyLimit: 0.5, cylinders: cylinders as never }), 'cylinders')
    }
    for (const rpm of [undefined, null, -1, Number.NaN, Infinity, '4']) {
      expectCalcError(() => sparksPerSecond({ ...served, rpm: rpm as never }), 'rpm')
      expectCalcError(() => dwellAvailableMs({ ...served, dutyLimit: 0.5, rpm: rpm as never }), 'rpm')
      expectCalcError(() => sparkPeriodShare({ ...served, dwellMs: 1, sparkDurationMs: 1, rpm: rpm as never }), 'rpm')
    }
    for (const rpm of [0, 5e-324, 1e308]) expectCalcError(() => dwellAvailableMs({ cylinders: 100, rpm, dutyLimit: 0.5 }), 'rpm')
    for (const wastedSpark of notFlags) expectCalcError(() => sparksPerSecond({ ...served, wastedSpark: wastedSpark as never }), 'wastedSpark')
    for (const dutyLimit of [undefined, null, 0, -0.1, 1.01, Number.NaN]) expectCalcError(() => dwellAvailableMs({ ...served, dutyLimit: dutyLimit as never }), 'dutyLimit')
    for (const bad of [undefined, null, -1, Number.NaN, '1']) {
      expectCalcError(() => sparkPeriodShare({ ...served, dwellMs: bad as never, sparkDurationMs: 1 }), 'dwellMs')
      expectCalcError(() => sparkPeriodShare({ ...served, dwellMs: 1, sparkDurationMs: bad as never }), 'sparkDurationMs')
    }
    expectCalcError(() => sparksPerSecond(undefined as never), 'cylinders')
  })
})
