import { describe, expect, it } from 'vitest'
import { calibrateBurn, findMbt, knockLimitedSpark, simulateCycle, type CycleInput } from '@/lib/calc'
import { someCases } from '@/tests/support/cases'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { sampleCycle } from './cycles'

const burn = { sparkDeg: 27, delayDeg: 9, durationDeg: 67, efficiency: 0.85 }
const workAt = (input: CycleInput, sparkDeg: number) => simulateCycle({ ...input, burn: { ...burn, ...input.burn, sparkDeg }, arrays: false }).workJ
const knockAt = (input: CycleInput, sparkDeg: number) => simulateCycle({ ...input, burn: { ...burn, ...input.burn, sparkDeg }, arrays: false }).knock?.integral ?? NaN

const settings: [string, CycleInput][] = [
  ['full throttle', sampleCycle()],
  ['part throttle', sampleCycle({ charge: { pressureKpa: 55, temperatureK: 350, residualFraction: 0.12, airFuelRatio: 13.5 }, rpm: 1700 })],
  ['short burn', sampleCycle({ burn: { ...burn, delayDeg: 4, durationDeg: 40 } })],
  ['no loss, constant γ', sampleCycle({ gamma: 1.28, heatLoss: null })],
]

describe('findMbt', () => {
  it.each(someCases(settings))('%s: no spark beside it gives more work, and the slope of fine steps vanishes there', (_name, input) => {
    const { mbtDeg, workJ, imepKpa } = findMbt(input)
    const fine = { ...input, stepDeg: 0.05 }
    // The root of a central difference is the top to a thousandth of a degree where the curve is this flat.
    const slope = (workAt(fine, mbtDeg + 0.5) - workAt(fine, mbtDeg - 0.5))
    const bend = workAt(fine, mbtDeg + 0.5) - 2 * workAt(fine, mbtDeg) + workAt(fine, mbtDeg - 0.5)
    expectClose(-(slope / 2 / bend) * 0.5, 0, { abs: 0.01 })
    expectClose(workJ, workAt(input, mbtDeg), { rel: 1e-7 })
    for (let spark = -20; spark <= 60; spark += 1) expect(workAt(input, spark)).toBeLessThan(workJ + 1e-4)
    expectClose(imepKpa, simulateCycle({ ...input, burn: { ...burn, ...input.burn, sparkDeg: mbtDeg }, arrays: false }).imepKpa, { rel: 1e-7 })
  })

  it.each(someCases(settings))('%s: 2° steps and 0.5° steps differ by less than 0.01° in best spark and knock limit', (_name, input) => {
    expectClose(findMbt({ ...input, stepDeg: 2 }).mbtDeg, findMbt(input).mbtDeg, { abs: 0.01 })
    const low = { ...input, octane: 70 }
    expectClose(knockLimitedSpark({ ...low, stepDeg: 2 }).limitDeg ?? NaN, knockLimitedSpark(low).limitDeg ?? NaN, { abs: 0.01 })
  })

  it('refuses a motored cycle and a burn whose best spark lies at an end', () => {
    expectCalcError(() => findMbt(sampleCycle({ burn: null })), 'burn')
    expectCalcError(() => findMbt(sampleCycle({ burn: { ...burn, delayDeg: 40, durationDeg: 120 } })), 'burn')
  })
})

describe('knockLimitedSpark', () => {
  it.each(someCases([60, 70, 80, 92, 98]))('octane %d: the first spark past 1 of a scan in hundredths of a degree', (octane) => {
    const input = sampleCycle({ octane, stepDeg: 2 })
    const { limitDeg, marginDeg, state } = knockLimitedSpark(input)
    expect(state).toBe('limited')
    let first = -20
    while (knockAt(input, first) < 1) first += 0.5
    first -= 0.5
    while (knockAt(input, first) < 1) first += 0.01
    expectClose(limitDeg ?? NaN, first, { abs: 0.0101 })
    expectClose(marginDeg ?? NaN, (limitDeg ?? NaN) - 27, { abs: 1e-12 })
  })

  it('does not jump through a knocking band: where the integral turns down again the first crossing counts', () => {
    const input = sampleCycle({ octane: 100 })
    const { limitDeg } = knockLimitedSpark(input)
    expect(knockAt(input, 60)).toBeLessThan(1)
    expect(knockAt(input, 52)).toBeGreaterThan(1)
    expect(limitDeg).toBeGreaterThan(45)
    expect(limitDeg).toBeLessThan(52)
  })

  it('finds a band narrower than its grid', () => {
    const tops = Array.from({ length: 41 }, (_, i) => 50 + i / 4).map((spark) => simulateCycle({ ...sampleCycle({ burn: { ...burn, sparkDeg: spark } }), arrays: false }).knock?.octaneRequired ?? 0)
    const top = Math.max(...tops)
    expect(knockLimitedSpark(sampleCycle({ octane: top - 0.02 })).state).toBe('limited')
    expect(knockLimitedSpark(sampleCycle({ octane: top + 0.05 })).state).toBe('never')
  })

  it('finds a band within the last stretch of its grid, past the last sample but one and over before the last', () => {
    const late = { ...burn, delayDeg: 14 }
    const asked = (sparkDeg: number) => simulateCycle({ ...sampleCycle({ burn: { ...late, sparkDeg } }), arrays: false }).knock?.octaneRequired ?? NaN
    const octane = asked(58.65) - 0.004
    expect(asked(60)).toBeLessThan(octane - 0.05)
    expect(asked(56)).toBeLessThan(asked(60))
    const { limitDeg } = knockLimitedSpark(sampleCycle({ burn: late, octane }))
    expectClose(knockAt(sampleCycle({ burn: late, octane }), limitDeg ?? NaN), 1, { abs: 1e-5 })
    expect(limitDeg).toBeLessThan(58.65)
    expect(knockLimitedSpark(sampleCycle({ burn: late, octane: octane + 0.01 })).state).toBe('never')
  })

  it('says never and always, both without a limit', () => {
    expect(knockLimitedSpark(sampleCycle({ octane: 130 }))).toEqual({ limitDeg: null, marginDeg: null, state: 'never' })
    expect(knockLimitedSpark(sampleCycle({ octane: 30 }))).toEqual({ limitDeg: null, marginDeg: null, state: 'always' })
  })

  it('denser and hotter charge and poorer fuel bring it nearer', () => {
    const limit = (changes: Partial<CycleInput>) => knockLimitedSpark(sampleCycle(changes)).limitDeg ?? NaN
    const { charge } = sampleCycle()
    expect(limit({ octane: 88 })).toBeLessThan(limit({}))
    expect(limit({ charge: { ...charge, pressureKpa: 122 } })).toBeLessThan(limit({}))
    expect(limit({ charge: { ...charge, temperatureK: 390 } })).toBeLessThan(limit({}))
  })

  it('needs a fuel and a burn', () => {
    const { octane: _octane, ...noFuel } = sampleCycle()
    expectCalcError(() => knockLimitedSpark(noFuel), 'octane')
    expectCalcError(() => knockLimitedSpark(sampleCycle({ burn: null })), 'burn')
  })
})

describe('calibrateBurn', () => {
  it.each(someCases([20, 28, 34, 42]))('the best spark of its burn is the %d° asked for', (mbtDeg) => {
    const angles = calibrateBurn(sampleCycle(), { mbtDeg })
    expectClose(findMbt(sampleCycle({ burn: { ...burn, ...angles } })).mbtDeg, mbtDeg, { abs: 0.01 })
    expectClose(angles.delayDeg / (angles.delayDeg + angles.durationDeg), 9 / 76, { rel: 1e-12 })
  })

  it('gives a burn back that it knew', () => {
    const { mbtDeg } = findMbt(sampleCycle())
    const { delayDeg, durationDeg } = calibrateBurn(sampleCycle(), { mbtDeg, delayShare: 9 / 76 })
    expectClose(delayDeg + durationDeg, 76, { abs: 0.03 })
  })

  it('the shortest burn tried, 30° in all, still counts', () => {
    const shortest = sampleCycle({ burn: { ...burn, delayDeg: 3.6, durationDeg: 26.4 } })
    const { mbtDeg } = findMbt(shortest)
    const { delayDeg, durationDeg } = calibrateBurn(shortest, { mbtDeg })
    expectClose(delayDeg + durationDeg, 30, { abs: 0.03 })
    expectCalcError(() => calibrateBurn(shortest, { mbtDeg: mbtDeg - 0.05 }), 'mbtDeg')
  })

  it('refuses an angle that no burn gives', () => {
    expectCalcError(() => calibrateBurn(sampleCycle(), { mbtDeg: 59 }), 'mbtDeg')
    expectCalcError(() => calibrateBurn(sampleCycle(), { mbtDeg: -5 }), 'mbtDeg')
    expectCalcError(() => calibrateBurn(sampleCycle(), { mbtDeg: 30, delayShare: 1 }), 'delayShare')
  })
})
