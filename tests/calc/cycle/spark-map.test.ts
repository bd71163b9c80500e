import { describe, expect, it } from 'vitest'
import { CalcError, findMbt, knockLimitedSpark, scaleBurn, sparkMap, type SparkMapInput } from '@/lib/calc'
import { expectClose } from '@/tests/support/expect-close'
import { sampleCycle } from './cycles'

const { rpm: _rpm, ...cycle } = sampleCycle({ octane: 80 })
const input: SparkMapInput = { ...cycle, rpm: [1400, 2650], pressureKpa: [60, 112], burnScaling: { reference: { rpm: 2650, pressureKpa: 112 } } }

describe('sparkMap', () => {
  it('is findMbt and knockLimitedSpark at each place, with the burn scaled', async () => {
    const map = await sparkMap(input)
    for (const [i, rpm] of map.rpm.entries()) {
      for (const [j, pressureKpa] of map.pressureKpa.entries()) {
        const angles = scaleBurn({ reference: { rpm: 2650, pressureKpa: 112, delayDeg: 9, durationDeg: 67 }, rpm, pressureKpa })
        const here = sampleCycle({ octane: 80, rpm, charge: { ...cycle.charge, pressureKpa }, burn: { sparkDeg: 20, efficiency: 0.85, ...angles } })
        expectClose(map.mbtDeg[i]?.[j], findMbt(here).mbtDeg, { abs: 0.01 })
        const { limitDeg } = knockLimitedSpark(here)
        if (limitDeg === null) expect(map.knockLimitDeg[i]?.[j]).toBeNull()
        else expectClose(map.knockLimitDeg[i]?.[j], limitDeg, { abs: 0.01 })
        expectClose(map.sparkDeg[i]?.[j], Math.min(findMbt(here).mbtDeg, limitDeg ?? Infinity), { abs: 0.01 })
      }
    }
  })

  it('with the burn scaled, best torque wants more advance at speed and at a thin charge', async () => {
    const { mbtDeg: [[slowThin = NaN, slowDense = NaN] = [], [, fastDense = NaN] = []] } = await sparkMap(input)
    expect(fastDense).toBeGreaterThan(slowDense)
    expect(slowThin).toBeGreaterThan(slowDense)
  })

  it('null where every spark knocks, with the limit at the start of the search', async () => {
    const map = await sparkMap({ ...input, octane: 20 })
    expect(map.sparkDeg[0]).toEqual([null, null])
    expect(map.knockLimitDeg[0]).toEqual([-20, -20])
    expect((await sparkMap({ ...input, octane: 200 })).knockLimitDeg[1]).toEqual([null, null])
  })

  it('tells its progress and stops when asked, with the reason given', async () => {
    const seen: number[] = []
    await sparkMap({ ...input, onProgress: ({ done, total }) => seen.push(done / total) })
    expect(seen).toEqual([0.5, 1])
    const stop = new AbortController()
    const reason = new Error('enough')
    const run = sparkMap({ ...input, onProgress: () => stop.abort(reason), signal: stop.signal })
    await expect(run).rejects.toBe(reason)
    await expect(sparkMap({ ...input, signal: AbortSignal.abort(reason) })).rejects.toBe(reason)
  })

  it.each([
    ['rpm.1', { rpm: [1000, -1] }], ['rpm', { rpm: [] }], ['rpm', { rpm: new Array<number>(201).fill(1000) }], ['pressureKpa.0', { pressureKpa: [0] }], ['octane', { octane: undefined }], ['burn', { burn: null }],
    ['burnScaling.reference.rpm', { burnScaling: { reference: { rpm: 0, pressureKpa: 100 } } }], ['burnScaling.speedExponent', { burnScaling: { reference: { rpm: 2650, pressureKpa: 112 }, speedExponent: 11 } }],
    ['engine.boreMm', { engine: { ...cycle.engine, boreMm: 0 } }],
    ['signal', { signal: 'stop' as unknown as AbortSignal }],
  ])('refuses %s', async (field, changes) => {
    const failure = await sparkMap({ ...input, ...changes } as SparkMapInput).then(() => null, (error: unknown) => error)
    expect(failure).toBeInstanceOf(CalcError)
    expect((failure as CalcError).field).toBe(field)
  })
})
