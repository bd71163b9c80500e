import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { coilCurrentA, coilHeat, dwellAvailableMs, type CoilHeatInput } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { integrateCoil } from './integrate-coil'

const free = { supplyV: 13, ohm: 0.6, mh: 4 }
const limited = { ...free, limitA: 7 }
const base: CoilHeatInput = { coil: limited, cylinders: 4, rpm: 2700, dwellMs: 4, ambientK: 320, thermalResistanceKPerW: 3 }
const at = (change: Partial<CoilHeatInput> = {}) => coilHeat({ ...base, ...change })
const copper = (kelvin: number, refK = 293.15) => (1 + 0.00393 * (kelvin - 293.15)) / (1 + 0.00393 * (refK - 293.15))

describe('coilHeat', () => {
  it('without self-heating is the closed form by hand: a ramp, then the limit', () => {
    const cold = at({ coil: limited, ambientK: 293.15, thermalResistanceKPerW: 0 })
    const [r, l] = [0.6, 4]
    const u = (7 * r) / 13
    const x = -Math.log(1 - u)
    const heatMj = ((13 ** 2 * l) / r ** 2) * (x - u - u ** 2 / 2) + r * 49 * (4 - (x * l) / r)
    expect(cold.windingK).toBe(293.15)
    expectClose(cold.resistanceOhm, 0.6, { rel: 1e-15 })
    expectClose(cold.powerW, heatMj * 0.09, { rel: 1e-12 })
    expect(cold.finalCurrentA).toBe(7)
  })

  it('agrees with a numeric integration, with and without a limit', () => {
    fc.assert(fc.property(
      fc.double({ min: 4, max: 20, noNaN: true }), fc.double({ min: 0.1, max: 8, noNaN: true }), fc.double({ min: 0.5, max: 12, noNaN: true }),
      fc.option(fc.double({ min: 1, max: 15, noNaN: true }), { nil: undefined }), fc.double({ min: 0.05, max: 10, noNaN: true }),
      (supplyV, ohm, mh, limitA, dwellMs) => {
        if ((ohm * dwellMs) / mh > 25) return
        const coil = { supplyV, ohm, mh, ...(limitA === undefined ? {} : { limitA }) }
        const { powerW } = coilHeat({ coil, cylinders: 1, rpm: 3000, dwellMs, ambientK: 293.15, thermalResistanceKPerW: 0 })
        expectClose(powerW, integrateCoil(coil, dwellMs).heatMj * 0.025, { rel: 1e-9 })
      },
    ), { numRuns: 60 })
  })

  it('keeps its digits where the resistance hardly tells: a straight ramp', () => {
    for (const ohm of [1e-3, 1e-6, 1e-9, 1e-200]) {
      const x = (ohm * 2) / 4
      const { powerW } = coilHeat({ coil: { supplyV: 13, ohm, mh: 4 }, cylinders: 4, rpm: 3000, dwellMs: 2, ambientK: 293.15, thermalResistanceKPerW: 0 })
      expectClose(powerW, ((ohm * 6.5 ** 2 * 2) / 3) * (1 - 0.75 * x + 0.35 * x ** 2 - 0.125 * x ** 3) * 0.1, { rel: 1e-13 })
    }
  })

  it('both forms of the ramp meet', () => {
    const power = (dwellMs: number) => coilHeat({ coil: { supplyV: 10, ohm: 1, mh: 5 }, cylinders: 1, rpm: 3000, dwellMs, ambientK: 293.15, thermalResistanceKPerW: 0 }).powerW
    expectClose(power(5 * (1 - 1e-15)), power(5 * (1 + 1e-15)), { rel: 1e-13 })
  })

  it('stands in balance with its surroundings, its resistance risen', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 6, noNaN: true }), fc.double({ min: 0.5, max: 5.5, noNaN: true }), fc.boolean(), (thermalResistanceKPerW, dwellMs, isLimited) => {
      const coil = isLimited ? limited : free
      const input = { ...base, coil, thermalResistanceKPerW, dwellMs, refK: 298.15, maxWindingK: 2000 }
      const { windingK, resistanceOhm, powerW, finalCurrentA } = coilHeat(input)
      expectClose(windingK, 320 + thermalResistanceKPerW * powerW, { rel: 1e-12 })
      expectClose(resistanceOhm, 0.6 * copper(windingK, 298.15), { rel: 1e-13 })
      const warm = { ...coil, ohm: resistanceOhm }
      expectClose(finalCurrentA, coilCurrentA(warm, dwellMs), { rel: 1e-13 })
      expectClose(powerW, coilHeat({ ...input, coil: { ...coil, ohm: resistanceOhm }, refK: windingK, ambientK: windingK, thermalResistanceKPerW: 0 }).powerW, { rel: 1e-11 })
    }))
  })

  it('gives the lowest balance, as a walk from below finds it', () => {
    fc.assert(fc.property(fc.double({ min: 1, max: 40, noNaN: true }), fc.double({ min: 0.5, max: 5.5, noNaN: true }), fc.double({ min: 2, max: 15, noNaN: true }), (thermalResistanceKPerW, dwellMs, limitA) => {
      const coil = { ...free, limitA }
      const input = { ...base, coil, thermalResistanceKPerW, dwellMs, maxWindingK: 1200 }
      const missing = (kelvin: number) => 320 + thermalResistanceKPerW * coilHeat({ ...input, ambientK: kelvin, thermalResistanceKPerW: 0 }).powerW - kelvin
      let lowest: number | null = null
      for (let kelvin = 320; kelvin < 1200 && lowest === null; kelvin += 2) if (missing(kelvin) <= 0) lowest = kelvin
      if (lowest === null) {
        if (missing(1200) > 0) expectCalcError(() => coilHeat(input), 'maxWindingK')
        return
      }
      const { windingK } = coilHeat(input)
      expect(windingK).toBeLessThanOrEqual(lowest)
      expect(windingK).toBeGreaterThan(lowest - 2.0001)
    }), { numRuns: 40 })
  })

  it('heat may take the current below the limit that a cold winding reaches', () => {
    const coil = { supplyV: 8.5, ohm: 1, mh: 3, limitA: 8 }
    expect(coilHeat({ ...base, coil, dwellMs: 10, cylinders: 1, thermalResistanceKPerW: 0, ambientK: 280 }).finalCurrentA).toBe(8)
    const hot = coilHeat({ ...base, coil, dwellMs: 10, cylinders: 1, thermalResistanceKPerW: 10 })
    expect(hot.finalCurrentA).toBeLessThan(8)
    expectClose(hot.finalCurrentA, (8.5 / hot.resistanceOhm) * (1 - Math.exp((-hot.resistanceOhm * 10) / 3)), { rel: 1e-12 })
  })

  it('says that there is no balance when the heat runs away or the winding would be too hot', () => {
    const run = expectCalcError(() => at({ thermalResistanceKPerW: 600, maxWindingK: 1500 }), 'maxWindingK')
    expect(run.message).toContain('runs away')
    expectCalcError(() => at({ thermalResistanceKPerW: 15 }), 'maxWindingK')
    expectCalcError(() => at({ ambientK: 460 }), 'maxWindingK')
    expectCalcError(() => at({ ambientK: 320, maxWindingK: 300 }), 'maxWindingK')
    expect(at({ thermalResistanceKPerW: 0, ambientK: 453.15 }).windingK).toBe(453.15)
  })

  it('a dwell may fill the period and no more; none heats nothing', () => {
    const wholeMs = dwellAvailableMs({ cylinders: 4, rpm: 2700, dutyLimit: 1 })
    expect(at({ dwellMs: wholeMs, thermalResistanceKPerW: 1 }).powerW).toBeGreaterThan(0)
    expectCalcError(() => at({ dwellMs: wholeMs * 1.001 }), 'dwellMs')
    expectCalcError(() => at({ dwellMs: wholeMs * 0.7, wastedSpark: true }), 'dwellMs')
    expectClose(at({ wastedSpark: true, thermalResistanceKPerW: 0 }).powerW, 2 * at({ thermalResistanceKPerW: 0 }).powerW, { rel: 1e-14 })
    expect(at({ dwellMs: 0 })).toMatchObject({ windingK: 320, powerW: 0, finalCurrentA: 0 })
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => coilHeat(deepFreeze({ ...base, ...change }) as never)
    for (const bad of [undefined, null, Number.NaN, Infinity, '1', -1]) {
      for (const name of ['dwellMs', 'cylinders', 'rpm', 'ambientK', 'thermalResistanceKPerW']) expectCalcError(of({ [name]: bad }), name)
      if (bad !== undefined) for (const name of ['refK', 'maxWindingK']) expectCalcError(of({ [name]: bad }), name)
    }
    for (const name of ['refK', 'ambientK', 'maxWindingK']) expectCalcError(of({ [name]: 38 }), name)
    expectCalcError(of({ rpm: 0 }), 'rpm')
    expectCalcError(of({ wastedSpark: 1 }), 'wastedSpark')
    expectCalcError(of({ coil: { ...free, ohm: 0 } }), 'coil.ohm')
    expectCalcError(of({ coil: null }), 'coil')
    expectCalcError(of({ coil: { ...free, supplyV: 1e200 } }), 'coil.supplyV')
    expectCalcError(of({ thermalResistanceKPerW: 1e308 }), 'thermalResistanceKPerW')
    expectCalcError(() => coilHeat(undefined as never), 'coil')
  })
})
