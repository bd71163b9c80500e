import { render } from '@testing-library/react'
import { describe, expect, test } from 'vitest'
import { LimitStrip } from '@/components/ui/limit-strip'
import { stripGeometry } from '@/components/ui/strip-geometry'
import { expectClose } from '@/tests/support/expect-close'

const width = 116
const first = (values: number[]) => values[0] ?? NaN

describe('limit strip', () => {
  test('one limit stands in the middle and a value right of it lies right', () => {
    const strip = stripGeometry({ value: 4.5, atLeast: 3, width })
    expect(strip.ticks).toHaveLength(1)
    expectClose(first(strip.ticks), 58, { abs: 0.05 })
    // 1.5 of a reach of 3 on half of 108 px.
    expectClose(strip.marker, 58 + 27, { abs: 0.05 })
    expect(strip.forbidden).toEqual([{ from: 4, to: 58 }])
  })

  test('at most: the far side is the forbidden one', () => {
    expect(stripGeometry({ value: 19, atMost: 20, width }).forbidden).toEqual([{ from: 58, to: 112 }])
  })

  test('a value outside lies in the hatching, one inside outside of it', () => {
    for (const [value, inside] of [[19.7, true], [20.6, false], [40, false], [-5, true]] as const) {
      const { marker, forbidden } = stripGeometry({ value, atMost: 20, width })
      expect(forbidden.some(({ from, to }) => marker >= from && marker <= to)).toBe(!inside)
    }
  })

  test('a deviation runs with time: plus is early and stands left', () => {
    const early = stripGeometry({ value: 1.8, atLeast: -1, atMost: 1, width, deviation: true })
    const late = stripGeometry({ value: -1.8, atLeast: -1, atMost: 1, width, deviation: true })
    expect(early.marker).toBeLessThan(58)
    expectClose(early.marker + late.marker, 116, { abs: 0.05 })
    expect(early.forbidden).toHaveLength(2)
  })

  test.each([[{ atMost: 920 }, 105], [{ atLeast: 3 }, 11]] as const)('without a value the mark stands at the forbidden end: %o', (limit, marker) => {
    expectClose(stripGeometry({ value: null, ...limit, width }).marker, marker, { abs: 0.05 })
  })

  test.each([1e9, -1e9, 0])('the mark never leaves the line: %d', (value) => {
    const { marker, from, to } = stripGeometry({ value, atMost: 0, width })
    expect(marker).toBeGreaterThanOrEqual(from)
    expect(marker).toBeLessThanOrEqual(to)
  })

  test('readers skip it unless it is given words', () => {
    const { container, rerender } = render(<LimitStrip value={1} atLeast={0} verdict="within" />)
    expect(container.querySelector('svg')).toHaveAttribute('aria-hidden', 'true')
    rerender(<LimitStrip value={1} atLeast={0} verdict="within" label="1.0°, at least 0.0°" />)
    expect(container.querySelector('svg')).toHaveAccessibleName('1.0°, at least 0.0°')
  })

  test.each([['within', 'circle'], ['close', 'path'], ['outside', 'path']] as const)('%s is marked by its shape', (verdict, shape) => {
    const { container } = render(<LimitStrip value={1} atLeast={0} verdict={verdict} />)
    expect(container.querySelectorAll(shape).length).toBe(verdict === 'close' ? 2 : 1)
  })
})
