import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { benchReadingsToAdvance, evaluateBenchRun, type BenchReading, type BenchWheel } from '@/lib/calc'
import { fixed } from '@/tests/calc/advance/channels'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const index: BenchWheel = { wheel: 'distributor', sense: 1, datum: { kind: 'index', atDeg: 60 } }
const readings: readonly BenchReading[] = [
  { rpm: 900, channel: 'primary', readDeg: 48, cylinder: 1, mapKpa: 60, trend: 'falling' },
  { rpm: 900, channel: 'primary', readDeg: 47, cylinder: 2 },
  { rpm: 900, channel: 'backup', readDeg: 52 },
  { rpm: 300, channel: 'primary', readDeg: 53 },
]

describe('benchReadingsToAdvance', () => {
  it('counts from the index, a distributor degree twice', () => {
    expect(benchReadingsToAdvance(deepFreeze(readings), deepFreeze(index))).toEqual([
      { rpm: 900, channel: 'primary', readDeg: 24, cylinder: 1, mapKpa: 60, trend: 'falling' },
      { rpm: 900, channel: 'primary', readDeg: 26, cylinder: 2 },
      { rpm: 900, channel: 'backup', readDeg: 16 },
      { rpm: 300, channel: 'primary', readDeg: 14 },
    ])
    expect(benchReadingsToAdvance(readings, { ...index, wheel: 'crank' }).map(({ readDeg }) => readDeg)).toEqual([12, 13, 8, 7])
    expect(benchReadingsToAdvance(readings, { ...index, wheel: 'crank', sense: -1 }).map(({ readDeg }) => readDeg)).toEqual([-12, -13, -8, -7])
  })

  it('a relative datum puts the mean of the primary at its speed on the plan', () => {
    const relative = benchReadingsToAdvance(readings, { wheel: 'distributor', sense: 1, datum: { kind: 'relative', rpm: 900, planDeg: 25 } })
    expect(relative.map(({ readDeg }) => readDeg)).toEqual([24, 26, 16, 14])
    const turned = benchReadingsToAdvance(readings.map((reading) => ({ ...reading, readDeg: -reading.readDeg })), { wheel: 'distributor', sense: -1, datum: { kind: 'relative', rpm: 900, planDeg: 25 } })
    expect(turned).toEqual(relative)
  })

  it('with a relative datum the place of the wheel does not matter', () => {
    fc.assert(fc.property(fc.double({ min: -360, max: 360, noNaN: true }), fc.constantFrom(1 as const, -1 as const), (shift, sense) => {
      const options: BenchWheel = { wheel: 'distributor', sense, datum: { kind: 'relative', rpm: 900, planDeg: 25 } }
      const there = benchReadingsToAdvance(readings, options)
      const moved = benchReadingsToAdvance(readings.map((reading) => ({ ...reading, readDeg: reading.readDeg + shift })), options)
      moved.forEach(({ readDeg }, i) => expectClose(readDeg, there[i]?.readDeg, { abs: 1e-9 }))
    }))
  })

  it('leads into evaluateBenchRun', () => {
    const plan = { primary: fixed(25, { crankRetard: { belowRpm: 520, byDeg: 11 } }), backup: fixed(16) }
    const result = evaluateBenchRun({ plan, readings: benchReadingsToAdvance(readings, index), toleranceDeg: 1, cylinders: 2 })
    expect(result.pass).toBe(true)
    // The reading of 24° was taken with falling speed and does not count: 26 − 14.
    expect(result.crankRetard).toEqual([{ channel: 'primary', aboveRpm: 300, atMostRpm: 900, stepDeg: 12 }])
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => benchReadingsToAdvance(readings, { ...index, ...change } as never)
    for (const bad of [undefined, null, [], 5]) expectCalcError(() => benchReadingsToAdvance(bad as never, index), 'readings')
    expectCalcError(() => benchReadingsToAdvance([{ rpm: 900, channel: 'primary', readDeg: Number.NaN }], index), 'readings.0.readDeg')
    expectCalcError(() => benchReadingsToAdvance([{ rpm: 900, channel: 'primary', readDeg: 4, cylinder: 0 }], index), 'readings.0.cylinder')
    for (const wheel of ['cam', undefined, 2]) expectCalcError(of({ wheel }), 'wheel')
    for (const sense of [0, 2, '1', undefined, null, true]) expectCalcError(of({ sense }), 'sense')
    for (const datum of [undefined, null, 5]) expectCalcError(of({ datum }), 'datum')
    for (const kind of [undefined, 'absolute']) expectCalcError(of({ datum: { kind, atDeg: 5 } }), 'datum.kind')
    for (const atDeg of [undefined, Number.NaN, '5']) expectCalcError(of({ datum: { kind: 'index', atDeg } }), 'datum.atDeg')
    for (const rpm of [undefined, -1, 901]) expectCalcError(of({ datum: { kind: 'relative', rpm, planDeg: 25 } }), 'datum.rpm')
    for (const planDeg of [undefined, Infinity]) expectCalcError(of({ datum: { kind: 'relative', rpm: 900, planDeg } }), 'datum.planDeg')
    expectCalcError(() => benchReadingsToAdvance([{ rpm: 900, channel: 'backup', readDeg: 4 }], { ...index, datum: { kind: 'relative', rpm: 900, planDeg: 25 } }), 'datum.rpm')
    expectCalcError(of({ datum: { kind: 'index', atDeg: 1.5e308 } }), 'readings.0.readDeg')
    expectCalcError(() => benchReadingsToAdvance(readings, undefined as never), 'sense')
  })
})
