import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { crankDegFromMs, msFromCrankDeg } from '@/lib/calc/live'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const speed = fc.double({ min: 1, max: 20_000, noNaN: true })
const difference = fc.double({ min: -1e4, max: 1e4, noNaN: true })

describe('crankDegFromMs and msFromCrankDeg', () => {
  it('agree with a hand calculation', () => {
    expectClose(crankDegFromMs(1.25, 2640), 19.8, { rel: 1e-9 })
    expectClose(msFromCrankDeg(19.8, 2640), 1.25, { rel: 1e-9 })
    expectClose(crankDegFromMs(60_000 / 2640, 2640), 360, { rel: 1e-9 })
  })

  it('undo each other', () => {
    fc.assert(fc.property(difference, speed, (ms, rpm) => {
      expectClose(msFromCrankDeg(crankDegFromMs(ms, rpm), rpm), ms, { rel: 1e-12, abs: 1e-300 })
    }))
  })

  it('are additive and odd in the time', () => {
    fc.assert(fc.property(difference, difference, speed, (a, b, rpm) => {
      expectClose(crankDegFromMs(a + b, rpm), crankDegFromMs(a, rpm) + crankDegFromMs(b, rpm), { rel: 1e-9, abs: 1e-6 })
      expect(crankDegFromMs(-a, rpm)).toBe(-crankDegFromMs(a, rpm) + 0)
    }))
  })

  it('a stopped crank turns through nothing, and has no time for an angle', () => {
    expect(crankDegFromMs(5, 0)).toBe(0)
    expect(crankDegFromMs(-5, 0)).toBe(0)
    expectCalcError(() => msFromCrankDeg(5, 0), 'rpm')
  })

  it('name the argument that cannot be used', () => {
    for (const bad of [Number.NaN, Infinity, -Infinity, undefined, null, '3', [3], {}, true]) {
      expectCalcError(() => crankDegFromMs(bad as number, 2640), 'ms')
      expectCalcError(() => crankDegFromMs(1, bad as number), 'rpm')
      expectCalcError(() => msFromCrankDeg(bad as number, 2640), 'deg')
      expectCalcError(() => msFromCrankDeg(1, bad as number), 'rpm')
    }
    const error = expectCalcError(() => crankDegFromMs(1, -5), 'rpm')
    expect(error).toMatchObject({ value: -5, limit: '≥ 0', unit: 'rpm', message: 'The engine speed must be a number, at least 0 rpm; −5 was given.' })
  })

  it('refuse a result beyond any number', () => {
    expectCalcError(() => crankDegFromMs(1e300, 1e300), 'ms')
    expectCalcError(() => msFromCrankDeg(1e300, 1e-300), 'rpm')
  })
})
