import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { coilCurrentA, dwellForCurrentMs, sparkEnergyMj, stalledCurrentA } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { integrateCoil } from './integrate-coil'

const free = { supplyV: 13, ohm: 0.6, mh: 4 }
const limited = { ...free, limitA: 7 }
const coils = fc.record({
  supplyV: fc.double({ min: 4, max: 30, noNaN: true }), ohm: fc.double({ min: 0.05, max: 10, noNaN: true }), mh: fc.double({ min: 0.5, max: 20, noNaN: true }),
})

describe('coilCurrentA', () => {
  it('agrees with a hand calculation, before and at the limit', () => {
    expectClose(coilCurrentA(free, 3), (13 / 0.6) * (1 - Math.exp(-0.45)), { rel: 1e-14 })
    expect(coilCurrentA(limited, 3)).toBe(7)
    expect(coilCurrentA(limited, 0)).toBe(0)
    expectClose(coilCurrentA(free, 1e6), 13 / 0.6, { rel: 1e-15 })
  })

  it('agrees with a numeric integration of L·i′ = V − R·i', () => {
    fc.assert(fc.property(coils, fc.double({ min: 0.01, max: 20, noNaN: true }), (coil, ms) => {
      if ((coil.ohm * ms) / coil.mh > 30) return
      expectClose(coilCurrentA(coil, ms), integrateCoil(coil, ms).amps, { rel: 1e-9 })
    }), { numRuns: 40 })
  })

  it('keeps its digits where the resistance hardly tells', () => {
    for (const x of [1e-3, 1e-6, 1e-9, 1e-12]) {
      const ms = (x * 4) / 0.6
      expectClose(coilCurrentA(free, ms), ((13 * ms) / 4) * (1 - x / 2 + x ** 2 / 6 - x ** 3 / 24), { rel: 1e-13 })
    }
    // V/R itself is beyond a number here.
    expectClose(coilCurrentA({ ...limited, ohm: 1e-310 }, 2), 6.5, { rel: 1e-14 })
  })

  it('both its forms meet', () => {
    const ms = 4 / 0.6
    expectClose(coilCurrentA(free, ms * (1 - 1e-15)), coilCurrentA(free, ms * (1 + 1e-15)), { rel: 1e-14 })
  })

  it('names what cannot be used', () => {
    for (const bad of [undefined, null, Number.NaN, Infinity, '1', 0, -1]) {
      for (const name of ['supplyV', 'ohm', 'mh']) expectCalcError(() => coilCurrentA(deepFreeze({ ...free, [name]: bad }), 3), `coil.${name}`)
      if (bad !== undefined) expectCalcError(() => coilCurrentA({ ...free, limitA: bad as never }, 3), 'coil.limitA')
    }
    for (const ms of [undefined, null, Number.NaN, Infinity, '1', -1]) expectCalcError(() => coilCurrentA(free, ms as never), 'ms')
    for (const coil of [undefined, null, 3, []]) expectCalcError(() => coilCurrentA(coil as never, 3), 'coil')
    expectCalcError(() => coilCurrentA({ supplyV: 1e308, ohm: 1e-9, mh: 1 }, 100), 'coil.supplyV')
    expect(coilCurrentA({ supplyV: 1e308, ohm: 1e-9, mh: 1, limitA: 8 }, 100)).toBe(8)
  })
})

describe('dwellForCurrentMs', () => {
  it('is the inverse of the current', () => {
    fc.assert(fc.property(coils, fc.double({ min: 1e-9, max: 0.95, noNaN: true }), (coil, share) => {
      const amps = (share * coil.supplyV) / coil.ohm
      expectClose(coilCurrentA(coil, dwellForCurrentMs(coil, amps)), amps, { rel: 1e-12 })
    }))
  })

  it('agrees with a hand calculation and keeps its digits at small currents', () => {
    expectClose(dwellForCurrentMs(free, 7), (-4 / 0.6) * Math.log(1 - (7 * 0.6) / 13), { rel: 1e-13 })
    expectClose(dwellForCurrentMs(free, 1e-9), (4e-9 / 13) * (1 + 0.6e-9 / 26), { rel: 1e-14 })
    expect(dwellForCurrentMs(free, 0)).toBe(0)
    expect(dwellForCurrentMs(limited, 7)).toBe(dwellForCurrentMs(free, 7))
  })

  it('refuses what is never reached, and says why', () => {
    expect(expectCalcError(() => dwellForCurrentMs(limited, 7.001), 'amps').message).toContain('driver')
    expect(expectCalcError(() => dwellForCurrentMs(free, 22), 'amps').message).toContain('resistance')
    expectCalcError(() => dwellForCurrentMs({ supplyV: 12, ohm: 3, mh: 4 }, 4), 'amps')
    expectCalcError(() => dwellForCurrentMs({ supplyV: 12, ohm: 3, mh: 4, limitA: 9 }, 5), 'amps')
    for (const amps of [undefined, null, Number.NaN, Infinity, '1', -1]) expectCalcError(() => dwellForCurrentMs(free, amps as never), 'amps')
    expectCalcError(() => dwellForCurrentMs({ ...free, mh: 0 }, 1), 'coil.mh')
  })
})

describe('sparkEnergyMj', () => {
  it('is half the inductance times the current squared', () => {
    expectClose(sparkEnergyMj(free, 2), 2 * coilCurrentA(free, 2) ** 2, { rel: 1e-14 })
    expect(sparkEnergyMj(limited, 5)).toBe(98)
    expect(sparkEnergyMj(limited, 0)).toBe(0)
  })

  it('a cranking battery leaves less', () => {
    expectClose(sparkEnergyMj({ ...free, supplyV: 8.5 }, 2) / sparkEnergyMj(free, 2), (8.5 / 13) ** 2, { rel: 1e-13 })
  })

  it('what the supply gave is in the core or in the winding’s heat', () => {
    fc.assert(fc.property(coils, fc.double({ min: 0.01, max: 20, noNaN: true }), (coil, ms) => {
      if ((coil.ohm * ms) / coil.mh > 30) return
      const { suppliedMj, heatMj } = integrateCoil(coil, ms)
      expectClose(sparkEnergyMj(coil, ms) + heatMj, suppliedMj, { rel: 1e-9 })
    }), { numRuns: 40 })
  })

  it('names what cannot be used', () => {
    expectCalcError(() => sparkEnergyMj(free, -1), 'ms')
    expectCalcError(() => sparkEnergyMj({ ...free, supplyV: 1e200 }, 3), 'coil.supplyV')
    expectCalcError(() => sparkEnergyMj(undefined as never, 3), 'coil')
  })
})

describe('stalledCurrentA', () => {
  it('is what supply and resistance, or the driver, let through', () => {
    expectClose(stalledCurrentA(free), 13 / 0.6, { rel: 1e-15 })
    expect(stalledCurrentA(limited)).toBe(7)
    expectClose(stalledCurrentA(free), coilCurrentA(free, 1e9), { rel: 1e-15 })
    expectCalcError(() => stalledCurrentA({ supplyV: 1e300, ohm: 1e-300, mh: 1 }), 'coil.ohm')
    expectCalcError(() => stalledCurrentA(null as never), 'coil')
  })
})
