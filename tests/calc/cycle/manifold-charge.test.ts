import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { chargeKpaFromManifold, manifoldKpaFromCharge } from '@/lib/calc'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const full = { fullChargeKpa: 112, fullManifoldKpa: 96 }

describe('manifold and charge pressure', () => {
  it('belong together at full throttle and fall in proportion from there', () => {
    expect(manifoldKpaFromCharge({ chargeKpa: 112, ...full })).toBe(96)
    expectClose(manifoldKpaFromCharge({ chargeKpa: 28, ...full }), 24, { rel: 1e-12 })
    expectClose(manifoldKpaFromCharge({ chargeKpa: 140, ...full }), 120, { rel: 1e-12 })
  })

  it('are each other’s inverse', () => {
    const kpa = fc.double({ min: 1e-3, max: 1e4, noNaN: true })
    fc.assert(fc.property(kpa, kpa, kpa, (chargeKpa, fullChargeKpa, fullManifoldKpa) => {
      const manifoldKpa = manifoldKpaFromCharge({ chargeKpa, fullChargeKpa, fullManifoldKpa })
      expectClose(chargeKpaFromManifold({ manifoldKpa, fullChargeKpa, fullManifoldKpa }), chargeKpa, { rel: 1e-12 })
    }))
  })

  it('must be above zero and not beyond what a number holds', () => {
    expectCalcError(() => manifoldKpaFromCharge({ chargeKpa: 0, ...full }), 'chargeKpa')
    expectCalcError(() => manifoldKpaFromCharge({ chargeKpa: 1, ...full, fullChargeKpa: NaN }), 'fullChargeKpa')
    expectCalcError(() => chargeKpaFromManifold({ manifoldKpa: 1e300, fullChargeKpa: 1e300, fullManifoldKpa: 1e-300 }), 'manifoldKpa')
    expectCalcError(() => chargeKpaFromManifold({ manifoldKpa: 1, ...full, fullManifoldKpa: -1 }), 'fullManifoldKpa')
  })
})
