import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { frictionMepKpa, mepFromPower, powerFromMep } from '@/lib/calc/live'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

describe('frictionMepKpa', () => {
  it('agrees with a hand calculation', () => {
    expect(frictionMepKpa({ rpm: 0 })).toBe(97)
    expectClose(frictionMepKpa({ rpm: 2400 }), 97 + 36 + 28.8, { rel: 1e-9 })
  })

  it('rises with speed', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 6000, noNaN: true }), (rpm) => {
      expect(frictionMepKpa({ rpm: rpm + 1 })).toBeGreaterThan(frictionMepKpa({ rpm }))
    }))
  })

  it('names the argument that cannot be used', () => {
    for (const rpm of [-1, Number.NaN, undefined, null, '2000', Infinity, 1e200]) expectCalcError(() => frictionMepKpa({ rpm } as never), 'rpm')
    expectCalcError(() => frictionMepKpa(2000 as never), 'rpm')
  })
})

describe('mepFromPower and powerFromMep', () => {
  it('agree with a hand calculation', () => {
    expectClose(mepFromPower({ powerKw: 78, displacementCc: 2600, rpm: 2880 }), 1250, { rel: 1e-9 })
    expectClose(powerFromMep({ mepKpa: 1250, displacementCc: 2600, rpm: 2880 }), 78, { rel: 1e-9 })
    expectClose(mepFromPower({ powerKw: -7.8, displacementCc: 2600, rpm: 2880 }), -125, { rel: 1e-9 })
    expect(mepFromPower({ powerKw: 0, displacementCc: 2600, rpm: 2880 })).toBe(0)
  })

  it('undo each other, and four-stroke work is mep times displacement', () => {
    const positive = fc.double({ min: 0.1, max: 5000, noNaN: true })
    fc.assert(fc.property(positive, positive, positive, (mepKpa, displacementCc, rpm) => {
      const powerKw = powerFromMep({ mepKpa, displacementCc, rpm })
      expectClose(mepFromPower({ powerKw, displacementCc, rpm }), mepKpa, { rel: 1e-12 })
      // kW over cycles a second is kJ a cycle; kPa times cubic metres is kJ.
      expectClose(powerKw / (rpm / 120), mepKpa * displacementCc * 1e-6, { rel: 1e-12 })
    }))
  })

  it('name the argument that cannot be used', () => {
    for (const bad of [0, -1, Number.NaN, undefined, null, Infinity, '5']) {
      expectCalcError(() => mepFromPower({ powerKw: 5, displacementCc: bad, rpm: 1 } as never), 'displacementCc')
      expectCalcError(() => mepFromPower({ powerKw: 5, displacementCc: 5, rpm: bad } as never), 'rpm')
      expectCalcError(() => powerFromMep({ mepKpa: bad, displacementCc: 5, rpm: 5 } as never), 'mepKpa')
      expectCalcError(() => powerFromMep({ mepKpa: 5, displacementCc: bad, rpm: 5 } as never), 'displacementCc')
      expectCalcError(() => powerFromMep({ mepKpa: 5, displacementCc: 5, rpm: bad } as never), 'rpm')
    }
    expectCalcError(() => mepFromPower({ powerKw: '5', displacementCc: 5, rpm: 5 } as never), 'powerKw')
    expectCalcError(() => mepFromPower({ powerKw: 1e300, displacementCc: 1e-300, rpm: 5 }), 'powerKw')
    expectCalcError(() => powerFromMep({ mepKpa: 1e300, displacementCc: 1e300, rpm: 5 }), 'mepKpa')
    expectCalcError(() => mepFromPower(undefined as never), 'powerKw')
    expectCalcError(() => powerFromMep(undefined as never), 'mepKpa')
  })
})
