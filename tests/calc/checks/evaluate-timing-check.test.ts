import { describe, expect, it } from 'vitest'
import { evaluateTimingCheck, type TimingCheckInput } from '@/lib/calc'
import { fixed, mapSchedule } from '@/tests/calc/advance/channels'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'

const channel = fixed(25, { crankRetard: { belowRpm: 520, byDeg: 11, hysteresisRpm: 60 } })
const check = (change: Partial<TimingCheckInput>) => evaluateTimingCheck(deepFreeze({ channel, rpm: 800, readDeg: 25, toleranceDeg: 1, idleRpm: 700, ...change }))

describe('evaluateTimingCheck', () => {
  it('judges a reading against the plan', () => {
    expect(check({ readDeg: 25.5 })).toEqual({ planDeg: 25, deviationDeg: 0.5, verdict: 'within', warning: null, aboveIdle: true })
    expect(check({ readDeg: 26.5 })).toMatchObject({ deviationDeg: 1.5, verdict: 'early' })
    expect(check({ readDeg: 23.5 })).toMatchObject({ deviationDeg: -1.5, verdict: 'late' })
    for (const readDeg of [26, 24, 26 + 9e-10, 24 - 9e-10]) expect(check({ readDeg }).verdict).toBe('within')
    expect(check({ readDeg: 26 + 2e-9 }).verdict).toBe('early')
    expect(check({ readDeg: 24 - 2e-9 }).verdict).toBe('late')
  })

  it('warns below the threshold: the retard is in, or may be', () => {
    const warningAt = (rpm: number) => check({ rpm }).warning
    expect([0, 459.999, 460, 519.999, 520, 3000].map(warningAt)).toEqual(['crankRetard', 'crankRetard', 'hysteresis', 'hysteresis', null, null])
    const sharp = fixed(25, { crankRetard: { belowRpm: 520, byDeg: 11 } })
    expect([519.999, 520].map((rpm) => check({ channel: sharp, rpm }).warning)).toEqual(['crankRetard', null])
    expect(check({ channel: fixed(16), rpm: 100 }).warning).toBeNull()
  })

  it('plans with rising speed, in the band of the hysteresis too', () => {
    expect(check({ rpm: 500, readDeg: 14 })).toEqual({ planDeg: 14, deviationDeg: 0, verdict: 'within', warning: 'hysteresis', aboveIdle: false })
    expect(check({ rpm: 520 }).planDeg).toBe(25)
  })

  it('is above idle only beyond it', () => {
    expect([699, 700, 700.5].map((rpm) => check({ rpm }).aboveIdle)).toEqual([false, false, true])
  })

  it('takes a pressure where the channel needs one', () => {
    expect(check({ channel: { schedule: mapSchedule }, rpm: 1500, mapKpa: 70 }).planDeg).toBe(26)
    expectCalcError(() => check({ channel: { schedule: mapSchedule } }), 'mapKpa')
  })

  it('names what cannot be used', () => {
    for (const bad of [undefined, null, 5]) expectCalcError(() => check({ channel: bad as never }), 'channel')
    expectCalcError(() => check({ channel: fixed('25' as never) }), 'channel.schedule.deg')
    for (const bad of [Number.NaN, Infinity, undefined, null, '5']) {
      for (const field of ['rpm', 'readDeg', 'toleranceDeg', 'idleRpm'] as const) expectCalcError(() => check({ [field]: bad as never }), field)
    }
    for (const field of ['rpm', 'toleranceDeg', 'mapKpa'] as const) expectCalcError(() => check({ [field]: -1 }), field)
    expectCalcError(() => check({ idleRpm: 0 }), 'idleRpm')
    expectCalcError(() => check({ channel: fixed(-1e308), readDeg: 1e308 }), 'readDeg')
    expectCalcError(() => evaluateTimingCheck(undefined as never), 'channel')
  })
})
