import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, test, vi } from 'vitest'
import { Button } from '@/components/ui/button'
import { Num } from '@/components/ui/num'
import { Stamp } from '@/components/ui/stamp'
import { verdictWords, type VerdictName } from '@/components/ui/verdict'
import { VerdictMark } from '@/components/ui/verdict-mark'

describe('verdicts', () => {
  const words: [VerdictName, string][] = [
    ['within', 'Within'], ['close', 'Close'], ['outside', 'Outside'], ['early', 'Early'], ['late', 'Late'],
    ['due', 'Due'], ['notJudged', 'Not judged'], ['single', 'Single'], ['singleHeat', 'Single, aged by heat'],
  ]
  test.each(words)('%s says %s beside its shape', (verdict, word) => {
    const { container } = render(<VerdictMark verdict={verdict} />)
    expect(screen.getByText(word)).toBeVisible()
    expect(container.querySelector('svg')).toHaveAttribute('aria-hidden', 'true')
  })

  test('no two of another word share a shape, but for the two of one part', () => {
    const shapes = words.map(([verdict]) => {
      const { container, unmount } = render(<VerdictMark verdict={verdict} />)
      const shape = container.querySelector('svg')?.innerHTML
      unmount()
      return shape
    })
    expect(words).toHaveLength(Object.keys(verdictWords).length)
    expect(new Set(shapes).size).toBe(words.length - 1)
  })

  test('in a margin the word is still there for readers', () => {
    render(<VerdictMark verdict="close" wordless />)
    expect(screen.getByText('Close')).toHaveClass('sr')
  })
})

test('a stamp never says more than its count', () => {
  render(<Stamp verdict="within" head="All 18 within the limits set">the shop’s</Stamp>)
  expect(screen.getByText('All 18 within the limits set')).toBeVisible()
})

test('a number and its unit read as two words, a degree sign as one', () => {
  const { container, rerender } = render(<Num value="820" unit="rpm" />)
  expect(container.textContent).toBe('820\u00a0rpm')
  rerender(<Num value="28.5" unit="°" />)
  expect(container.textContent).toBe('28.5°')
})

test('a button that is off says why and does nothing', async () => {
  const onClick = vi.fn()
  const submit = vi.fn((event: Event) => event.preventDefault())
  render(<form onSubmit={(event) => submit(event.nativeEvent)}><Button type="submit" onClick={onClick} off="1 outside">Release a plan</Button></form>)
  const button = screen.getByRole('button', { name: 'Release a plan: 1 outside' })
  expect(button).toHaveAttribute('aria-disabled', 'true')
  expect(button).toHaveAccessibleDescription('1 outside')
  await userEvent.click(button)
  expect(onClick).not.toHaveBeenCalled()
  expect(submit).not.toHaveBeenCalled()
})
