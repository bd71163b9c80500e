import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { simulateCycle, type CycleInput } from '@/lib/calc'
import { someCases } from '@/tests/support/cases'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { adaptiveCycle } from './adaptive-cycle'
import { sampleCycle } from './cycles'

const lasts = (list: Float64Array) => list[list.length - 1] ?? NaN
const burn = { sparkDeg: 27, delayDeg: 9, durationDeg: 67, efficiency: 0.85 }

describe('against an adaptive integration', () => {
  const cases: [string, CycleInput][] = [
    ['full throttle', sampleCycle()],
    ['late spark', sampleCycle({ burn: { ...burn, sparkDeg: 5 } })],
    ['early spark, thin charge', sampleCycle({ burn: { ...burn, sparkDeg: 48, durationDeg: 85 }, charge: { pressureKpa: 45, temperatureK: 340, residualFraction: 0.15, airFuelRatio: 14 }, rpm: 1500 })],
    ['burn cut at exhaust opening', sampleCycle({ burn: { ...burn, sparkDeg: -20, durationDeg: 110 } })],
    ['constant γ', sampleCycle({ gamma: 1.3 })],
    ['another burn curve', sampleCycle({ burn: { ...burn, a: 6.9, m: 3 } })],
  ]
  it.each(someCases(cases))('%s', (_name, input) => {
    const ours = simulateCycle(input)
    const reference = adaptiveCycle(input)
    expectClose(ours.workJ, reference.workJ, { rel: 5e-8 })
    expectClose(ours.heatLossJ, reference.heatLossJ, { rel: 8e-8 })
    expectClose(ours.knock?.integral ?? NaN, reference.knock, { rel: 1.5e-7 })
    expectClose(lasts(ours.pressureKpa), reference.pressureKpa, { rel: 1e-7 })
  })

  it('a burn whose curve starts with a broken power, which no method of fourth order follows to the last digit', () => {
    const input = sampleCycle({ burn: { ...burn, m: 1.5 } })
    expectClose(simulateCycle(input).workJ, adaptiveCycle(input).workJ, { rel: 5e-7 })
  })

  it('peak and its angle against steps of 0.01°', () => {
    const coarse = simulateCycle(sampleCycle())
    const fine = simulateCycle(sampleCycle({ stepDeg: 0.01 }))
    expectClose(coarse.peakKpa, fine.peakKpa, { rel: 5e-6 })
    expectClose(coarse.peakDeg, fine.peakDeg, { abs: 0.007 })
  })

  it('the error falls with the fourth power of the step', () => {
    const exact = adaptiveCycle(sampleCycle()).workJ
    const errorAt = (stepDeg: number) => Math.abs(simulateCycle(sampleCycle({ stepDeg })).workJ - exact)
    expect(errorAt(2) / errorAt(1)).toBeGreaterThan(10)
    expect(errorAt(4) / errorAt(2)).toBeGreaterThan(10)
  })
})

describe('conservation and limits', () => {
  it('work + heat loss + change of internal energy = heat released, for constant γ', () => {
    fc.assert(fc.property(fc.double({ min: 1.2, max: 1.4, noNaN: true }), fc.double({ min: -10, max: 45, noNaN: true }), fc.boolean(), (gamma, sparkDeg, withLoss) => {
      const input = sampleCycle({ gamma, burn: { ...burn, sparkDeg }, heatLoss: withLoss ? { wallK: 450 } : null })
      const { workJ, heatLossJ, heatReleasedJ, pressureKpa } = simulateCycle(input)
      const { startVolumeM3, endVolumeM3 } = adaptiveCycle({ ...input, burn: null, heatLoss: null })
      const rise = ((lasts(pressureKpa) * endVolumeM3 - input.charge.pressureKpa * startVolumeM3) * 1000) / (gamma - 1)
      expectClose(workJ + heatLossJ + rise, heatReleasedJ, { rel: 1e-6 })
    }), { numRuns: 30 })
  })

  it('motored without loss: p = p₁(V₁/V)^γ, the top at top dead centre, no efficiency, no knock', () => {
    const { pressureKpa, thetaDeg, temperatureK, burned, peakDeg, efficiency, ca50Deg, knock, heatLossJ } = simulateCycle(sampleCycle({ burn: null, gamma: 1.35, heatLoss: null }))
    const volume = (deg: number) => adaptiveCycle({ ...sampleCycle({ burn: null, heatLoss: null }), engine: { ...sampleCycle().engine, evoDeg: deg } }, 1e-6).endVolumeM3
    const i = thetaDeg.findIndex((deg) => deg > 30)
    const ratio = adaptiveCycle(sampleCycle({ burn: null, heatLoss: null }), 1e-6).startVolumeM3 / volume(thetaDeg[i] ?? NaN)
    expectClose(pressureKpa[i] ?? NaN, 112 * ratio ** 1.35, { rel: 1e-8 })
    expectClose(temperatureK[i] ?? NaN, 370 * ratio ** 0.35, { rel: 1e-8 })
    expectClose(peakDeg, 0, { abs: 1e-3 })
    expect([efficiency, ca50Deg, knock, heatLossJ, Math.max(...burned)]).toEqual([null, null, null, 0, 0])
  })

  it('a burn of almost no length at top dead centre reaches 1 − r^(1 − γ) of a cycle from dead centre to dead centre', () => {
    const engine = { ...sampleCycle().engine, ivcDeg: -180, evoDeg: 180 }
    const { efficiency, heatReleasedJ } = simulateCycle({ ...sampleCycle(), engine, gamma: 1.35, heatLoss: null, burn: { sparkDeg: 0.05, delayDeg: 0, durationDeg: 0.1, efficiency: 1 }, stepDeg: 0.002 })
    expectClose(efficiency ?? NaN, 1 - 8.4 ** -0.35, { rel: 2e-6 })
    expect(heatReleasedJ).toBeGreaterThan(0)
  })

  it('heat loss takes work away, and more at a greater factor of the head area', () => {
    const workAt = (heatLoss: CycleInput['heatLoss']) => simulateCycle(sampleCycle({ heatLoss })).workJ
    expect(workAt(null)).toBeGreaterThan(workAt({ wallK: 470 }))
    expect(workAt({ wallK: 470 })).toBeGreaterThan(workAt({ wallK: 470, headAreaFactor: 1.5 }))
  })

  it('a wall hotter than the charge gives heat to it: the loss of a motored charge can be a gain', () => {
    expect(simulateCycle(sampleCycle({ burn: null, heatLoss: { wallK: 1500 } })).heatLossJ).toBeLessThan(0)
  })

  it('the knock integral scales with octane^−3.402, and at the octane asked for it is 1', () => {
    const { integral, octaneRequired } = simulateCycle(sampleCycle()).knock ?? { integral: NaN, octaneRequired: NaN }
    expectClose(simulateCycle(sampleCycle({ octane: 80 })).knock?.integral ?? NaN, integral * (92 / 80) ** 3.402, { rel: 1e-12 })
    expectClose(simulateCycle(sampleCycle({ octane: octaneRequired })).knock?.integral ?? NaN, 1, { rel: 1e-12 })
  })
})

describe('the course over crank angle', () => {
  it('starts at inlet closing, ends at exhaust opening, and has a sample where the equations change', () => {
    const { thetaDeg, burned } = simulateCycle(sampleCycle())
    expectClose(thetaDeg[0] ?? NaN, -122, { abs: 0 })
    expectClose(lasts(thetaDeg), 116, { abs: 1e-9 })
    for (const cut of [-18, -18 + 67 * (Math.LN10 / 5) ** (1 / 3), 49]) expect([...thetaDeg].some((deg) => Math.abs(deg - cut) < 1e-9), String(cut)).toBe(true)
    const steps = [104, 67 * (Math.LN10 / 5) ** (1 / 3), 67 * (1 - (Math.LN10 / 5) ** (1 / 3)), 67].map((length) => Math.ceil(length / 0.5 - 1e-9))
    expect(thetaDeg.length).toBe(1 + steps.reduce((sum, count) => sum + count, 0))
    expectClose(lasts(burned), 1 - Math.exp(-5), { rel: 1e-12 })
  })

  it('half of the fuel is burned at ca50Deg, which is null where exhaust opens before', () => {
    const { ca50Deg, thetaDeg, burned } = simulateCycle(sampleCycle({ stepDeg: 0.05 }))
    const i = thetaDeg.findIndex((deg) => deg >= (ca50Deg ?? NaN))
    expectClose(burned[i] ?? NaN, 0.5, { abs: 2e-3 })
    expect(simulateCycle(sampleCycle({ burn: { ...burn, sparkDeg: -60, durationDeg: 120 } })).ca50Deg).toBeNull()
  })

  it('is left out when it is not asked for, with the same figures', () => {
    const { thetaDeg: _t, pressureKpa: _p, temperatureK: _k, burned: _b, ...figures } = simulateCycle(sampleCycle())
    expect(simulateCycle({ ...sampleCycle(), arrays: false })).toEqual(figures)
  })
})

describe('notices', () => {
  it('say that the fit of γ ended and that a burn is too short for its steps', () => {
    const hot = simulateCycle(sampleCycle({ charge: { pressureKpa: 112, temperatureK: 370, residualFraction: 0, airFuelRatio: 8 }, heatLoss: null, burn: { ...burn, efficiency: 1, durationDeg: 40 } }))
    expect(hot.notices.map(({ code }) => code)).toEqual(['gammaOutsideFit'])
    expect(simulateCycle(sampleCycle({ burn: { ...burn, durationDeg: 9 } })).notices.map(({ code }) => code)).toContain('burnCoarse')
    expect(simulateCycle(sampleCycle()).notices).toEqual([])
  })
})

describe('refuses', () => {
  const engine = sampleCycle().engine
  const cases: [string, CycleInput][] = [
    ['rpm', sampleCycle({ rpm: 0 })],
    ['engine.ivcDeg', sampleCycle({ engine: { ...engine, ivcDeg: -181 } })],
    ['engine.rodMm', sampleCycle({ engine: { ...engine, rodMm: 41 } })],
    ['charge.residualFraction', sampleCycle({ charge: { ...sampleCycle().charge, residualFraction: 1 } })],
    ['burn.efficiency', sampleCycle({ burn: { ...burn, efficiency: 1.01 } })],
    ['burn.sparkDeg', sampleCycle({ burn: { ...burn, sparkDeg: 132 } })],
    ['burn.sparkDeg', sampleCycle({ burn: { ...burn, sparkDeg: -107 } })],
    ['gamma', sampleCycle({ gamma: 1 })],
    ['gamma', sampleCycle({ gamma: 'warm' as 'temperature' })],
    ['heatLoss.wallK', sampleCycle({ heatLoss: { wallK: -1 } })],
    ['stepDeg', sampleCycle({ stepDeg: 0 })],
    ['octane', sampleCycle({ octane: 0 })],
    ['charge.airFuelRatio', sampleCycle({ charge: { ...sampleCycle().charge, airFuelRatio: 0 } })],
    ['burn.heatingValueKjPerKg', sampleCycle({ burn: { ...burn, heatingValueKjPerKg: 1e300 } })],
    ['heatLoss.headAreaFactor', sampleCycle({ heatLoss: { wallK: 470, headAreaFactor: 1e9 } })],
  ]
  it.each(someCases(cases))('%s', (field, input) => { expectCalcError(() => simulateCycle(input), field) })

  it('what was left out: null has to be said', () => {
    const { burn: _burn, ...noBurn } = sampleCycle()
    expectCalcError(() => simulateCycle(noBurn as CycleInput), 'burn')
    const { heatLoss: _loss, ...noLoss } = sampleCycle()
    expectCalcError(() => simulateCycle(noLoss as CycleInput), 'heatLoss')
  })

  it('nothing at the very edges: burning from inlet closing on, and until just before exhaust opening', () => {
    expect(simulateCycle(sampleCycle({ burn: { ...burn, sparkDeg: 131 } })).workJ).toBeLessThan(0)
    expect(simulateCycle(sampleCycle({ burn: { ...burn, sparkDeg: -106.9 } })).heatReleasedJ).toBeGreaterThan(0)
  })
})
