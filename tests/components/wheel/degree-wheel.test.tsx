import { render, screen } from '@testing-library/react'
import { describe, expect, test } from 'vitest'
import { DegreeWheel } from '@/components/wheel/degree-wheel'
import { expectClose } from '@/tests/support/expect-close'
import { giveWidth } from '../support/layout'

const six = ['1', '6', '3', '2', '5', '4'].map((label, index) => ({ label, atDeg: index * 120 }))
const figures = { rpm: 2780, primaryDeg: 26.5, backupDeg: 17, staggerDeg: 9.5, staggerMs: 0.5695, cylindersAt: six }
const numbersOf = (element: Element | null, ...names: string[]) => names.map((name) => Number(element?.getAttribute(name)))

describe('degree wheel', () => {
  // The outer end of each ray, worked from sine and cosine of the angle: A ends at 176, B at 196.
  test.each([['clockwise', -1], ['anticlockwise', 1]] as const)('%s: both rays end where the crank points', (rotation, side) => {
    const { container } = render(<DegreeWheel {...figures} rotation={rotation} size="full" />)
    const [ax = NaN, ay = NaN] = numbersOf(container.querySelector('[data-channel="A"] line'), 'x2', 'y2')
    const [bx = NaN, by = NaN] = numbersOf(container.querySelector('[data-channel="B"] line'), 'x2', 'y2')
    expectClose(ax, side * 78.53, { abs: 0.1 })
    expectClose(ay, -157.51, { abs: 0.1 })
    expectClose(bx, side * 57.3, { abs: 0.1 })
    expectClose(by, -187.44, { abs: 0.1 })
  })

  test('says in one sentence what it shows, hand of rotation and place to look from included', () => {
    render(<DegreeWheel {...figures} rotation="anticlockwise" size="full" />)
    expect(screen.getByRole('img')).toHaveAccessibleName('Degree wheel at 2780 rpm, seen from the damper end, turning anticlockwise: A fires 26.5 degrees before top dead centre; B 17.0 degrees before top dead centre; stagger 9.5 degrees, 0.57 milliseconds, B later.')
    expect(screen.getByText('seen from the damper end')).toBeVisible()
    expect(screen.getByText('0.57 ms at 2780 rpm')).toBeVisible()
    expect(screen.getByText('cyl 6·5')).toBeVisible()
  })

  test('a backup that fires first is named', () => {
    render(<DegreeWheel {...figures} primaryDeg={17} backupDeg={26.5} staggerDeg={-9.5} staggerMs={-0.57} rotation="clockwise" size="full" />)
    expect(screen.getByText('stagger, B first')).toBeVisible()
    expect(screen.getByRole('img', { name: /B first/ })).toBeVisible()
  })

  test('a channel that is not known is not drawn, the other stays', () => {
    const { container } = render(<DegreeWheel {...figures} backupDeg={null} staggerDeg={null} staggerMs={null} rotation="clockwise" size="full" />)
    expect(container.querySelector('[data-channel="B"]')).toBeNull()
    expect(container.querySelector('[data-channel="A"]')).not.toBeNull()
    expect(screen.getByText('at 2780 rpm')).toBeVisible()
  })

  test('what is not given is not drawn: no limit, no burn', () => {
    const { container } = render(<DegreeWheel {...figures} rotation="clockwise" size="full" />)
    expect(container.querySelector('.g-red, pattern, .bad')).toBeNull()
  })

  test.each([[366, '-196 -216 392 404'], [328, '-186 -216 372 290'], [240, '-186 -216 372 290']])('is made for the width it finds: %d px', (width, viewBox) => {
    giveWidth(width)
    const { container } = render(<DegreeWheel {...figures} rotation="clockwise" />)
    expect(container.querySelectorAll('svg')).toHaveLength(1)
    expect(container.querySelector('svg')).toHaveAttribute('viewBox', viewBox)
    expect(container.querySelector('svg')).toHaveAttribute('width', String(width))
    expect(screen.queryAllByText(/^cyl /).length > 0).toBe(width >= 300)
  })
})
