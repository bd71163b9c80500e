import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { expect, test } from 'vitest'
import { CheckRunProvider } from '@/components/method/check-run-context'
import { CheckSummary } from '@/components/method/check-summary'
import { MethodContents } from '@/components/method/method-contents'
import { TopicChecks } from '@/components/method/topic-checks'
import type { TopicCase } from '@/lib/method/topic-case'
import type { PublishedCheck } from '@/tests/published/published-case'

const check = (label: string, rpm: number, expected: number): PublishedCheck => ({ label, fn: 'crankDegFromMs', args: [1, rpm], expected, tolerance: { abs: 0.05 } })
const published = (id: string, checks: PublishedCheck[]): TopicCase => ({ id, title: `Case ${id}`, provenance: 'memory', source: 'Somebody 1900 (from memory)', note: null, checks })

function show(cases: readonly TopicCase[]) {
  const total = cases.reduce((sum, { checks }) => sum + checks.length, 0)
  render(
    <CheckRunProvider>
      <CheckSummary total={total} known="All from memory." />
      <MethodContents lines={[{ id: 'angle', title: 'Angle', total }]} />
      <TopicChecks topic="angle" cases={cases} />
    </CheckRunProvider>,
  )
}

/** The library is fetched first. */
const head = (text: string) => screen.findByText(text, {}, { timeout: 10_000 })

test('computes, judges and counts; what lies outside or cannot be computed is said', async () => {
  show([published('one', [check('right', 2000, 12), check('wrong', 2000, 13), check('impossible', -1, 12)])])
  expect(await head('2 of 3 checks outside their tolerance')).toBeInTheDocument()
  expect(screen.getByRole('status')).toHaveTextContent('3 checks, 1 within, 2 outside.')
  const [right, wrong, impossible] = screen.getAllByRole('listitem').filter((item) => item.classList.contains('chk'))
  expect(right).toHaveTextContent(/^Withinright.*expected 12\.0.*computed 12\.0difference 0.*tolerance ±0\.05/)
  expect(wrong).toHaveTextContent(/^Outsidewrong.*difference −1\.000/)
  expect(impossible).toHaveTextContent(/^Outsideimpossible.*Not computed: /)
  expect(screen.getByText('2 of 3 outside')).toBeInTheDocument()
  expect(within(screen.getAllByRole('navigation', { name: 'Contents' })[0] ?? document.body).getByText('Outside')).toBeInTheDocument()
  expect(screen.getByText('from memory')).toBeInTheDocument()
})

test('a long table folds, but never what lies outside', async () => {
  const rows = Array.from({ length: 12 }, (_, i) => check(`row ${i}`, 1000, i === 10 ? 7 : 6))
  show([published('long', rows)])
  await head('1 of 12 checks outside its tolerance')
  const folded = () => screen.getAllByRole('listitem').filter((item) => item.classList.contains('folded')).length
  expect(folded()).toBe(5)
  await userEvent.click(screen.getByRole('button', { name: /show all 12\s*of Case long/ }))
  expect(folded()).toBe(0)
})

test('inputs are written out when asked for', async () => {
  show([published('one', [{ ...check('ratio', 2000, 0.5), over: { fn: 'crankDegFromMs', args: [1, 4000] } }, check('plain', 1000, 6)])])
  await head('All 2 checks within their tolerance')
  expect(screen.queryByText(/crankDegFromMs\(/)).toBeNull()
  const box = screen.getByText('inputs').closest('details')
  if (box) box.open = true
  expect(await screen.findByText('crankDegFromMs(1, 2000) ÷ crankDegFromMs(1, 4000)')).toBeInTheDocument()
})

test('a topic without a published figure says so', () => {
  show([])
  expect(screen.getByText(/no published figure/)).toBeInTheDocument()
})
