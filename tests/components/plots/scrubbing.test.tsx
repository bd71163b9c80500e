import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { memo, useState } from 'react'
import { beforeEach, expect, test, vi } from 'vitest'
import type { AdvanceChannel } from '@/components/plots/advance-curves'
import { AdvancePlot } from '@/components/plots/advance-plot'

const drawn = vi.hoisted(() => vi.fn())

// Stands in for the chart: memoised like it, and counting how often it is drawn.
vi.mock('@/components/plots/advance-curves', () => ({ AdvanceCurves: memo(function Curves() { drawn(); return null }) }))

beforeEach(() => drawn.mockClear())

const channels: AdvanceChannel[] = [{ channel: 'A', name: 'A primary', rising: [{ rpm: 0, deg: 20 }, { rpm: 3000, deg: 20 }] }]
const marks = [{ label: 'idle', rpm: 820 }]

function Bench() {
  const [rpm, setRpm] = useState(1000)
  return <AdvancePlot channels={channels} marks={marks} fromRpm={0} toRpm={3000} rpm={rpm} onRpm={setRpm} />
}

test('moving the handle draws no curve again', async () => {
  render(<Bench />)
  const before = drawn.mock.calls.length
  expect(before).toBeGreaterThan(0)
  screen.getByRole('slider').focus()
  await userEvent.keyboard('{ArrowRight}{ArrowRight}{ArrowRight}1')
  expect(screen.getByRole('slider')).toHaveValue('820')
  expect(drawn).toHaveBeenCalledTimes(before)
})

test('the real chart is memoised as well', async () => {
  const { AdvanceCurves } = await vi.importActual<typeof import('@/components/plots/advance-curves')>('@/components/plots/advance-curves')
  expect(AdvanceCurves).toHaveProperty('$$typeof', Symbol.for('react.memo'))
})
