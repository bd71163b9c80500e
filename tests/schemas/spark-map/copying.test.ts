import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { sparkAdvanceDeg, type SparkMap } from '@/lib/calc/live'
import { channelToForm } from '@/lib/schemas/channel-form'
import { formToScenario, scenarioToForm } from '@/lib/schemas/scenario-form'
import { linesAllowed, sparkMapAxes } from '@/lib/workbench/spark-map/axes'
import { readLines, readMargin } from '@/lib/workbench/spark-map/read-choice'
import { mapScheduleOf } from '@/lib/workbench/spark-map/schedule'
import { refusalWords } from '@/lib/words/spark-map-words'
import { someCases } from '@/tests/support/cases'
import { expectClose } from '@/tests/support/expect-close'
import { sampleSheet } from '@/tests/support/samples'

const full = { fullChargeKpa: 132.46735755696585, fullManifoldKpa: 98 }
const chargeOf = (manifoldKpa: number) => (manifoldKpa * full.fullChargeKpa) / full.fullManifoldKpa
const map: SparkMap = {
  rpm: [820, 1800, 2780], pressureKpa: [40, 98].map(chargeOf),
  mbtDeg: [[22.36, 18], [33.2, 30.31], [45.3, 36]],
  knockLimitDeg: [[null, 5.899], [44, 27.3], [null, 35.04]],
  sparkDeg: [[22.36, 5.899], [33.2, 27.3], [45.3, 35.04]],
}
const scheduleOf = (marginDeg: number, of = map) => {
  const made = mapScheduleOf(of, full, marginDeg)
  return made.ok ? made.schedule : expect.fail(JSON.stringify(made.refused))
}

describe('a map as a channel’s schedule', () => {
  it('is best torque, or the margin short of detonation, down to a tenth, over manifold pressure', () => {
    expect(scheduleOf(3)).toEqual({ kind: 'map', rpm: [820, 1800, 2780], mapKpa: [40, 98], deg: [[22.3, 2.8], [33.2, 24.3], [45.3, 32]] })
    expect(scheduleOf(0).deg).toEqual([[22.3, 5.8], [33.2, 27.3], [45.3, 35]])
  })

  it('never takes from the margin, and never more than a tenth from the spark', () => {
    const places = fc.array(fc.tuple(fc.double({ min: -10, max: 55, noNaN: true }), fc.option(fc.double({ min: 0, max: 60, noNaN: true }))), { minLength: 2, maxLength: 2 })
    fc.assert(fc.property(places, fc.double({ min: 0, max: 9, noNaN: true }), ([one, two], marginDeg) => {
      if (!one || !two) return
      const own: SparkMap = {
        rpm: [1000], pressureKpa: [50, 60], mbtDeg: [[one[0], two[0]]], knockLimitDeg: [[one[1], two[1]]],
        sparkDeg: [[Math.min(one[0], one[1] ?? 60), Math.min(two[0], two[1] ?? 60)]],
      }
      for (const [j, [best, limit]] of [one, two].entries()) {
        const wanted = Math.min(best, (limit ?? Infinity) - marginDeg)
        const deg = scheduleOf(marginDeg, own).deg[0]?.[j] ?? NaN
        expect(deg).toBeLessThanOrEqual(wanted + 1e-6)
        expect(deg).toBeGreaterThan(wanted - 0.1)
        expectClose(deg * 10, Math.round(deg * 10), { abs: 1e-9 })
      }
    }))
  })

  it.each(someCases(['metric', 'us'] as const))('typed into a channel’s form it is read back as it was (%s)', (system) => {
    const schedule = scheduleOf(3)
    const sheet = sampleSheet()
    const form = { ...scenarioToForm('Map', sheet, system), ...channelToForm('backup', { ...sheet.backup, schedule }, system) }
    const read = formToScenario(form, system, sheet)
    if (!read.ok) return expect.fail(JSON.stringify(read.errors))
    const { backup } = read.input.sheet
    if (backup.schedule.kind !== 'map') return expect.fail(backup.schedule.kind)
    expect(backup.schedule.rpm).toEqual(schedule.rpm)
    expect(backup.schedule.deg).toEqual(schedule.deg)
    for (const [j, kpa] of schedule.mapKpa.entries()) expectClose(backup.schedule.mapKpa[j] ?? NaN, kpa, { rel: 1e-5 })
    expectClose(sparkAdvanceDeg(backup, { rpm: 2780, mapKpa: 98 }), 32, { abs: 1e-3 })
  })

  it('is refused where every spark detonates, or none is late enough, and says where', () => {
    const always: SparkMap = { ...map, sparkDeg: [[22.36, null], [33.2, 27.3], [45.3, 35.04]] }
    const made = mapScheduleOf(always, full, 3)
    expect(made).toEqual({ ok: false, refused: [{ rpm: 820, chargeKpa: full.fullChargeKpa, manifoldKpa: 98 }] })
    const late = mapScheduleOf({ ...map, knockLimitDeg: [[null, -17.5], [44, -18], [null, 35.04]], sparkDeg: [[22.36, -17.5], [33.2, -18], [45.3, 35.04]] }, full, 3)
    if (late.ok) return expect.fail('copied')
    expect(late.refused.map(({ rpm }) => rpm)).toEqual([820, 1800])
    expect(refusalWords(late.refused, 3, 'metric')).toMatch(/^Not copied: at 2 places no spark stays 3\.0° short of detonation, within 820\srpm to 1800\srpm and 98\skPa in the manifold\./)
  })
})

describe('lines of a map', () => {
  it('run from idle to full power and a third to eleven tenths of full throttle, on numbers that can be read', () => {
    const { rpm, manifoldKpa } = sparkMapAxes({ idleRpm: 820, maxRpm: 2780 }, 98, { speeds: 21, pressures: 11 })
    expect([rpm.length, rpm[0], rpm[1], rpm.at(-1)]).toEqual([21, 820, 920, 2780])
    expect(manifoldKpa).toEqual([33, 40, 48, 55, 63, 70, 78, 85, 93, 100, 108])
  })

  it('always rise, however many there are', () => {
    const { speeds, pressures } = linesAllowed
    fc.assert(fc.property(
      fc.double({ min: 100, max: 3000, noNaN: true }), fc.double({ min: 50, max: 6000, noNaN: true }), fc.double({ min: 10, max: 200, noNaN: true }),
      fc.integer({ min: speeds.least, max: speeds.most }), fc.integer({ min: pressures.least, max: pressures.most }),
      (idleRpm, more, fullKpa, speedLines, pressureLines) => {
        const { rpm, manifoldKpa } = sparkMapAxes({ idleRpm, maxRpm: idleRpm + more }, fullKpa, { speeds: speedLines, pressures: pressureLines })
        expect([rpm.length, manifoldKpa.length]).toEqual([speedLines, pressureLines])
        expect([rpm[0], rpm.at(-1)]).toEqual([idleRpm, idleRpm + more])
        for (const axis of [rpm, manifoldKpa]) expect(axis.every((value, i) => i === 0 || value > (axis[i - 1] ?? Infinity))).toBe(true)
      },
    ))
  })

  it('are asked for as whole numbers, within what a channel’s map can hold', () => {
    expect(readLines('speeds', '40', 'metric')).toEqual({ ok: true, value: 40 })
    for (const text of ['', '2', '41', '4.5', 'ten']) expect(readLines('speeds', text, 'metric').ok, text).toBe(false)
    expect(readLines('pressures', '31', 'metric')).toEqual({ ok: false, sentence: expect.stringContaining('30') })
    expect(readMargin('3.5°', 'us')).toEqual({ ok: true, value: 3.5 })
    for (const text of ['-1', '21', '3 kPa']) expect(readMargin(text, 'metric').ok, text).toBe(false)
  })
})
