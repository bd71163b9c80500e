import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { bestClimb, outcome, powerAtDensityRatio, powerRequiredKw, standardAtmosphere, type OutcomeInput } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const aeroplane = { massKg: 620, wingAreaM2: 11.5, cd0: 0.034, inducedK: 0.062 }
const base: OutcomeInput = { ...aeroplane, propEfficiency: 0.7, seaLevelPowerKw: 45, densityAltitudeM: 1200, minSpeedMps: 30 }
const at = (change: Partial<OutcomeInput> = {}) => outcome({ ...base, ...change })

/** Climb at an altitude out of the parts that the outcome is made of. */
const climbAt = (altitudeM: number, { seaLevelPowerKw, propEfficiency, minSpeedMps = 30 }: OutcomeInput) => {
  const { densityKgM3, densityRatio } = standardAtmosphere({ altitudeM })
  return bestClimb({ ...aeroplane, densityKgM3, brakePowerKw: seaLevelPowerKw * powerAtDensityRatio(densityRatio), propEfficiency, minSpeedMps })
}

describe('outcome', () => {
  it('is the best climb with the lapsed power in the air of that altitude', () => {
    const { speedMps, climbMps, gradient } = at()
    const parts = climbAt(1200, base)
    expectClose(speedMps, parts.speedMps, { rel: 1e-13 })
    expectClose(climbMps, parts.climbMps, { rel: 1e-12 })
    expectClose(gradient, parts.gradient, { rel: 1e-12 })
  })

  it('at its ceiling it climbs no more', () => {
    fc.assert(fc.property(fc.double({ min: 22, max: 75, noNaN: true }), fc.boolean(), fc.double({ min: 20, max: 40, noNaN: true }), (seaLevelPowerKw, varies, minSpeedMps) => {
      const input = { ...base, seaLevelPowerKw, minSpeedMps, propEfficiency: varies ? (v: number) => 0.75 - ((v - 38) / 60) ** 2 : 0.7 }
      const { ceilingM, ceiling } = outcome(input)
      if (ceilingM === null) {
        const climbs = [-1000, 11_000].map((altitudeM) => climbAt(altitudeM, input).climbMps)
        if (ceiling === 'aboveRange') expect(Math.min(...climbs)).toBeGreaterThan(0)
        else expect(Math.max(...climbs)).toBeLessThan(0)
        return
      }
      expect(ceiling).toBe('inRange')
      expectClose(climbAt(ceilingM, input).climbMps, 0, { abs: 1e-11 })
      expect(climbAt(Math.max(-1000, ceilingM - 5), input).climbMps).toBeGreaterThanOrEqual(0)
      expect(climbAt(Math.min(11_000, ceilingM + 5), input).climbMps).toBeLessThanOrEqual(0)
    }))
  })

  it('the ceiling does not depend on where the flight is', () => {
    const { ceilingM } = at()
    for (const densityAltitudeM of [-5000, -1000, 0, 6000, 11_000]) expect(at({ densityAltitudeM }).ceilingM).toBe(ceilingM)
  })

  it('says on which side of the range a ceiling lies that it does not give', () => {
    expect(at({ seaLevelPowerKw: 400 })).toMatchObject({ ceilingM: null, ceiling: 'aboveRange', verdict: 'climbs' })
    expect(at({ seaLevelPowerKw: 5 })).toMatchObject({ ceilingM: null, ceiling: 'belowRange', verdict: 'descends' })
    expect(at({ seaLevelPowerKw: 0 })).toMatchObject({ ceilingM: null, ceiling: 'belowRange' })
  })

  it('the verdict turns at the band, which counts as level itself', () => {
    const { climbMps } = at()
    expect(climbMps).toBeGreaterThan(0)
    expect(at({ levelBandMps: climbMps }).verdict).toBe('level')
    expect(at({ levelBandMps: climbMps * (1 - 1e-12) }).verdict).toBe('climbs')
    const { climbMps: sink } = at({ seaLevelPowerKw: 15 })
    expect(sink).toBeLessThan(0)
    expect(at({ seaLevelPowerKw: 15, levelBandMps: -sink }).verdict).toBe('level')
    expect(at({ seaLevelPowerKw: 15, levelBandMps: -sink * (1 - 1e-12) }).verdict).toBe('descends')
  })

  it('without a band, a quarter of a metre a second is level', () => {
    const { densityKgM3, densityRatio } = standardAtmosphere({ altitudeM: 1200 })
    const forClimb = (climbMps: number) =>
      (powerRequiredKw({ ...aeroplane, densityKgM3, speedMps: 30 }) + (climbMps * 620 * 9.80665) / 1000) / 0.7 / powerAtDensityRatio(densityRatio)
    for (const [climbMps, verdict] of [[0.2501, 'climbs'], [0.2499, 'level'], [-0.2499, 'level'], [-0.2501, 'descends']] as const) {
      const result = at({ seaLevelPowerKw: forClimb(climbMps) })
      expectClose(result.climbMps, climbMps, { rel: 1e-9 })
      expect(result.verdict).toBe(verdict)
    }
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => outcome(deepFreeze({ ...base, ...change }) as never)
    for (const bad of [undefined, null, Number.NaN, Infinity, '1', 0, -1]) {
      for (const name of ['massKg', 'wingAreaM2', 'cd0', 'inducedK']) expectCalcError(of({ [name]: bad }), name)
    }
    for (const densityAltitudeM of [undefined, null, Number.NaN, -5001, 11_001, '0']) expectCalcError(of({ densityAltitudeM }), 'densityAltitudeM')
    for (const seaLevelPowerKw of [undefined, null, Number.NaN, -1, 1e308, 1.7e305, '1']) expectCalcError(of({ seaLevelPowerKw }), 'seaLevelPowerKw')
    for (const levelBandMps of [null, Number.NaN, -0.1, Infinity]) expectCalcError(of({ levelBandMps }), 'levelBandMps')
    for (const minSpeedMps of [null, 0, Number.NaN]) expectCalcError(of({ minSpeedMps }), 'minSpeedMps')
    for (const propEfficiency of [undefined, 1.2, () => Number.NaN, () => 2, () => -1]) expectCalcError(of({ propEfficiency }), 'propEfficiency')
    expectCalcError(() => outcome(undefined as never), 'massKg')
  })
})
