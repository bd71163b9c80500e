import { describe, expect, test } from 'vitest'
import { advanceTable } from '@/components/plots/advance-table'
import { degAt, fallingRuns, jumpsOf } from '@/components/plots/curve'
import { domainAround, niceStep, ticksIn, xPixel, yPixel } from '@/components/plots/scale'
import { expectClose } from '@/tests/support/expect-close'

const rising = [{ rpm: 100, deg: 19 }, { rpm: 450, deg: 19 }, { rpm: 450, deg: 27 }, { rpm: 1000, deg: 27 }, { rpm: 2000, deg: 29 }]
const falling = [{ rpm: 100, deg: 19 }, { rpm: 380, deg: 19 }, { rpm: 380, deg: 27 }, { rpm: 1000, deg: 27 }, { rpm: 2000, deg: 29 }]

describe('value of a curve', () => {
  test.each([[100, 19], [275, 19], [449.999, 19], [450, 27], [1500, 28], [2000, 29]])('at %d rpm it is %d°', (rpm, deg) => expectClose(degAt(rising, rpm), deg, { abs: 1e-9 }))
  test('beyond its ends there is none', () => {
    expect(degAt(rising, 99.9)).toBeNull()
    expect(degAt(rising, 2000.1)).toBeNull()
    expect(degAt([], 500)).toBeNull()
  })
  test('a jump is a speed with two points', () => expect(jumpsOf(rising)).toEqual([450]))
})

describe('the falling trend', () => {
  test('is drawn only where it leaves the rising one', () => {
    expect(fallingRuns(rising, falling)).toEqual([[{ rpm: 380, deg: 19 }, { rpm: 380, deg: 27 }, { rpm: 1000, deg: 27 }]])
  })
  test('and not at all where it does not', () => expect(fallingRuns(rising, rising)).toEqual([]))
})

test('the table names the marked speeds and shows both sides of a jump', () => {
  const { rows } = advanceTable([{ channel: 'A', name: 'A primary', rising }], [{ label: 'idle', rpm: 820 }], { from: 0, to: 2000 })
  expect(rows.filter(([rpm]) => rpm === 450)).toEqual([[450, 'from below', 19], [450, 'from above', 27]])
  expect(rows.find(([rpm]) => rpm === 820)).toEqual([820, 'idle', 27])
  expect(rows[0]).toEqual([100, '', 19])
})

describe('scales', () => {
  const area = { width: 572, height: 300, left: 38, right: 20, top: 8, bottom: 24 }
  test('run over the plotted area, y upwards', () => {
    const speed = { from: 0, to: 3200 }
    expectClose(xPixel(area, speed, 0), 38, { abs: 1e-9 })
    expectClose(xPixel(area, speed, 3200), 552, { abs: 1e-9 })
    expectClose(yPixel(area, { from: 0, to: 40 }, 0), 276, { abs: 1e-9 })
    expectClose(yPixel(area, { from: 0, to: 40 }, 40), 8, { abs: 1e-9 })
  })
  test.each([[3200, 7, 500], [40, 5, 10], [0.3, 3, 0.1], [7, 7, 1]])('a step for %d in at most %d parts', (span, most, step) => expectClose(niceStep(span, most), step, { rel: 1e-12 }))
  test('ticks have no binary dust', () => expect(ticksIn({ from: 0, to: 0.5 }, 0.1)).toEqual([0, 0.1, 0.2, 0.3, 0.4, 0.5]))
  test.each([[[3.1, 11.6], true], [[-4, 9], true], [[17, 17], false], [[0, 0], true], [[], true]] as const)('a domain holds its values and at most 6 lines: %o', (values, withZero) => {
    const { from, to, step } = domainAround(values, { withZero })
    for (const value of values) {
      expect(value).toBeGreaterThanOrEqual(from)
      expect(value).toBeLessThanOrEqual(to)
    }
    expect(to).toBeGreaterThan(from)
    expect(ticksIn({ from, to }, step).length).toBeLessThanOrEqual(8)
  })
})
