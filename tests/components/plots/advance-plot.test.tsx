import { render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { useState } from 'react'
import { describe, expect, test, vi } from 'vitest'
import type { AdvanceChannel } from '@/components/plots/advance-curves'
import { AdvancePlot } from '@/components/plots/advance-plot'
import { LinePlot } from '@/components/plots/line-plot'
import { giveWidth } from '../support/layout'

const channels: AdvanceChannel[] = [
  { channel: 'A', name: 'A primary', rising: [{ rpm: 100, deg: 19 }, { rpm: 450, deg: 19 }, { rpm: 450, deg: 27 }, { rpm: 3000, deg: 27 }] },
  { channel: 'B', name: 'B backup', rising: [{ rpm: 100, deg: 17 }, { rpm: 3000, deg: 17 }] },
]
const marks = [{ label: 'cranking', rpm: 190 }, { label: 'idle', rpm: 820 }]

function Bench({ onRpm }: { onRpm?: (rpm: number) => void }) {
  const [rpm, setRpm] = useState(2780)
  return <AdvancePlot channels={channels} marks={marks} fromRpm={0} toRpm={3200} rpm={rpm} onRpm={(next) => { onRpm?.(next); setRpm(next) }} />
}

describe('advance plot', () => {
  test('the speed axis is an input: arrows by 10 rpm, digits for the marked speeds', async () => {
    const onRpm = vi.fn()
    render(<Bench onRpm={onRpm} />)
    const speed = screen.getByRole('slider', { name: 'Speed' })
    expect(speed).toHaveAttribute('aria-valuetext', '2780 rpm')
    speed.focus()
    await userEvent.keyboard('{ArrowLeft}')
    await userEvent.keyboard('{ArrowRight}')
    await userEvent.keyboard('2')
    expect(onRpm.mock.calls).toEqual([[2770], [2780], [820]])
    expect(speed).toHaveValue('820')
    expect(speed).toHaveAttribute('aria-valuetext', '820 rpm, idle')
  })

  test('T at the handle swaps the curves for their numbers; the handle stays', async () => {
    render(<Bench />)
    screen.getByRole('slider', { name: 'Speed' }).focus()
    await userEvent.keyboard('t')
    expect(screen.getByRole('table')).not.toHaveClass('sr')
    expect(screen.getByRole('slider', { name: 'Speed' })).toHaveFocus()
  })

  test('draws a solid and a dashed line, circles and squares', async () => {
    giveWidth(572)
    const { container } = render(<Bench />)
    await waitFor(() => expect(container.querySelectorAll('path.recharts-line-curve')).toHaveLength(2))
    const dashes = [...container.querySelectorAll('path.recharts-line-curve')].map((path) => path.getAttribute('stroke-dasharray'))
    expect(dashes).toEqual([null, '7 5'])
    // Two hollow points a channel, and the full one of the chosen speed over them.
    await waitFor(() => expect(container.querySelectorAll('circle[stroke="var(--a)"]')).toHaveLength(3))
    expect(container.querySelectorAll('rect[stroke="var(--b)"]')).toHaveLength(3)
    expect(screen.getByText('27.0°')).toBeVisible()
  })
})

test('a line plot has its numbers beside it', () => {
  render(<LinePlot sentence="Stagger against speed" series={[{ name: 'stagger', look: 'ink', points: [{ x: 800, y: 10.25 }, { x: 900, y: null }] }]} x={{ from: 0, to: 1000 }} xUnit="rpm" yUnit="crank degrees" csvName="stagger" />)
  expect(screen.getByRole('img', { name: 'Stagger against speed' })).toBeInTheDocument()
  expect(screen.getByRole('row', { name: '800 10.3' })).toBeInTheDocument()
  expect(screen.getByRole('row', { name: '900 none' })).toBeInTheDocument()
})
