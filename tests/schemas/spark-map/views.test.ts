import { describe, expect, it } from 'vitest'
import { countPlaces, limitLessBest, placesOf, valueAt } from '@/lib/workbench/spark-map/views'
import { expectClose } from '@/tests/support/expect-close'
import { smallMap } from './small-map'

describe('a map as it is drawn', () => {
  it('tells values, places without a limit and places that always detonate apart', () => {
    expect(placesOf(smallMap, 'spark')).toEqual([[30, 20, 'always'], [36, 32, 22.06]])
    expect(placesOf(smallMap, 'limit')).toEqual([['never', 20, 'always'], [55, 34.04, 22.06]])
    expect(placesOf(smallMap, 'mbt')).toEqual(smallMap.mbtDeg)
    expect(countPlaces(smallMap)).toEqual({ all: 6, torque: 3, detonation: 2, always: 1 })
    const [[none, slow, always], [, fast]] = limitLessBest(smallMap) as [(number | null)[], (number | null)[]]
    expect([none, slow, always]).toEqual([null, -6, null])
    expectClose(fast ?? NaN, 2.04, { abs: 1e-9 })
  })

  it('is linear between its lines, whole on them, and nothing beyond or beside a hole', () => {
    expect(valueAt(smallMap, 'mbt', 1500, 75)).toBe(31)
    expect(valueAt(smallMap, 'mbt', 1250, 100)).toBe(27.5)
    expect(valueAt(smallMap, 'mbt', 2000, 120)).toBe(31)
    expect(valueAt(smallMap, 'mbt', 1000, 50)).toBe(30)
    expect(valueAt(smallMap, 'mbt', 2000 * (1 + 1e-12), 120 * (1 - 1e-12))).not.toBeNull()
    expect(valueAt(smallMap, 'mbt', 999, 75)).toBeNull()
    expect(valueAt(smallMap, 'mbt', 1500, 120.1)).toBeNull()
    expect(valueAt(smallMap, 'spark', 1500, 110)).toBeNull()
    // On a line of full values the hole beside it does not count.
    expectClose(valueAt(smallMap, 'spark', 2000, 110) ?? NaN, 27.03, { abs: 1e-9 })
    expect(valueAt(smallMap, 'limit', 1000, 100)).toBe(20)
  })
})
