import { render, screen, within } from '@testing-library/react'
import { describe, expect, test } from 'vitest'
import { FindingChangesList } from '@/components/revision/finding-changes-list'
import { InputDifferences } from '@/components/revision/input-differences'
import { ResultDifferences } from '@/components/revision/result-differences'
import { SavedInputs } from '@/components/revision/saved-inputs'
import { findingChanges } from '@/lib/compare/finding-changes'
import { scenarioFields } from '@/lib/schemas/scenario-fields'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import { sampleRevision } from '@/tests/support/sample-revisions'

const base = sampleRevision(1)
const early = sampleRevision(2, { backup: { schedule: { kind: 'fixed', deg: 24 }, latencyUs: 0 } })
const columns = [{ label: 'Revision 1', digit: 1 }, { label: 'Revision 2', digit: 2 }] as const
const cellsOf = (name: RegExp | string, at = 0) => within(screen.getAllByRole('rowheader', { name })[at]?.closest('tr') as HTMLElement).getAllByRole('cell').map((cell) => cell.textContent)
const version = (revision: typeof base, label: string) => ({ label, values: scenarioToForm(revision.title, revision.sheet, 'metric') })

describe('inputs that differ', () => {
  test('stand side by side with the step between them, the channel told by letter and word', () => {
    render(<InputDifferences fields={scenarioFields} left={version(base, 'Theirs')} right={version(early, 'Yours')} system="metric" />)
    expect(screen.getAllByRole('columnheader').map((head) => head.textContent)).toEqual(['Theirs', 'Yours', 'difference'])
    expect(screen.getAllByRole('rowheader').map((head) => head.textContent)).toEqual(['B backup Advance'])
    expect(cellsOf(/Advance/)).toEqual(['17°', '24°', '+7'])
  })

  test('all of them are shown when asked, the others as the same', () => {
    render(<InputDifferences fields={scenarioFields} left={version(base, 'Theirs')} right={version(early, 'Yours')} system="metric" all />)
    expect(cellsOf('Run-up speed')).toEqual(['1700\u00a0rpm', '1700\u00a0rpm', 'same'])
  })

  test('none is said in words', () => {
    render(<InputDifferences fields={scenarioFields} left={version(base, 'Theirs')} right={version(base, 'Yours')} system="metric" />)
    expect(screen.getByText('No input differs.')).toBeVisible()
    expect(screen.queryByRole('table')).toBeNull()
  })
})

describe('results', () => {
  test('stand side by side with limit, mark and difference', () => {
    render(<ResultDifferences left={base.results} right={early.results} columns={columns} system="metric" />)
    expect(screen.getByRole('columnheader', { name: 'Revision 2' })).toBeVisible()
    expect(cellsOf(/^B ?backup Cranking advance at most 20\.0°/)).toEqual(['17.0°', 'Outside24.0°', '+7.0'])
    expect(cellsOf(/^Timing marks at least/)).toEqual(['1.48\u00a0mm/°', '1.48\u00a0mm/°', 'same'])
  })

  test('a margin to detonation and a chance stand with their spread, under the caution', () => {
    render(<ResultDifferences left={base.results} right={early.results} columns={columns} system="metric" />)
    expect(screen.getByRole('note')).toHaveTextContent(/can destroy an engine in seconds.*clears nothing for flight/)
    expect(cellsOf(/^B ?backup Margin to detonation/)[0]).toMatch(/° .+ for 5 octane less$/)
    expect(cellsOf(/^No spark at all/)[0]).toMatch(/\/h \d\.\d·10⁻.* to \d\.\d·10⁻/)
  })

  test('a figure that one side withholds says so', () => {
    render(<ResultDifferences left={base.results} right={sampleRevision(3, { plugsPerCylinder: 2 }).results} columns={columns} system="metric" />)
    expect(cellsOf(/^A ?primary Power$/)).toEqual([expect.stringMatching(/kW$/), 'withheld', 'changed'])
  })

  test('findings with another verdict are listed with both figures', () => {
    render(<FindingChangesList changes={findingChanges(base.results, early.results)} system="metric" />)
    const list = screen.getByRole('list', { name: 'New or worse' })
    expect(list).toHaveTextContent('Cranking advance')
    expect(list).toHaveTextContent('within before (17.0°, at most 20.0°), outside now (24.0°, at most 20.0°)')
  })
})

test('saved inputs are read by section, in the units of the person, without the fields of other schedule kinds', () => {
  render(<SavedInputs revision={base} system="us" />)
  expect(screen.getByRole('heading', { name: /Primary channel/ })).toBeVisible()
  expect(screen.getByText('Bore').nextElementSibling).toHaveTextContent('3.54331 in')
  expect(screen.getByText('Mechanical advance turns the rotor too').nextElementSibling).toHaveTextContent('yes')
  expect(screen.queryByText('Weights start at')).toBeNull()
})
