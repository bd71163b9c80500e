import { fireEvent, render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, test, vi } from 'vitest'
import { EngineForm } from '@/components/engine/engine-form'
import type { ActionState } from '@/lib/errors'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import { engineToForm } from '@/lib/schemas/engine-form'
import type { UnitSystem } from '@/lib/units'
import { sampleEngine } from '@/tests/support/sample-engine'

const stored: EngineDto = { id: '8d7cf5f0-9f3f-4c36-a0b3-4ef6c1b2d001', name: 'Flat six', code: 'J260', spec: sampleEngine, version: 4, archivedAt: null, updatedAt: '2026-12-03T10:42:00.000Z', scenarioCount: 0 }

/** The form on the sample engine; the action answers with each state in turn, and keeps what was sent. */
function show(answers: ((sent: Record<string, string>) => ActionState<EngineDto>)[] = [], system: UnitSystem = 'metric') {
  const sent: Record<string, string>[] = []
  const save = vi.fn(async (_: ActionState<EngineDto>, form: FormData): Promise<ActionState<EngineDto>> => {
    const values = Object.fromEntries([...form].map(([name, value]) => [name, String(value)]))
    sent.push(values)
    return answers[sent.length - 1]?.(values) ?? { ok: true, data: stored }
  })
  render(<EngineForm over="Engine J260" title="Flat six" saveLabel="Save the engine" initial={engineToForm('Flat six', 'J260', sampleEngine, system)} base={sampleEngine} version={3} system={system} save={save} />)
  return { sent }
}

const type = (label: string, value: string) => fireEvent.change(screen.getByLabelText(label, { selector: 'input' }), { target: { value } })
const press = () => userEvent.click(screen.getAllByRole('button', { name: 'Save the engine' })[0] as HTMLElement)

describe('the engine form', () => {
  test('draws every field from the table, in the units of the person', () => {
    show([], 'us')
    expect(screen.getByLabelText('Bore')).toHaveValue('3.54331')
    expect(screen.getByLabelText('Bore')).toHaveAccessibleDescription(/inches/)
    expect(screen.getByLabelText('Firing order')).toHaveValue('1 4 5 2 3 6')
    expect(screen.getByLabelText('Rotor turns, seen from above')).toHaveValue('anticlockwise')
    expect(screen.getByRole('heading', { level: 2, name: 'Cylinders and firing order' })).toBeVisible()
  })

  test('sends what was typed with the version and the units it stands in', async () => {
    const { sent } = show()
    type('Bore', '3.6 in')
    await press()
    await waitFor(() => expect(sent).toHaveLength(1))
    expect(sent[0]).toMatchObject({ boreMm: '3.6 in', version: '3', unitSystem: 'metric', frictionKind: 'efficiency', frictionPowerKw: '' })
  })

  test('says what a typed unit becomes, and works out the figures beside it at once', () => {
    show()
    const figures = within(screen.getByRole('complementary', { name: 'What the sheet comes to' }))
    expect(figures.getByText('Displacement').nextElementSibling).toHaveTextContent('2596 cc')
    type('Bore', '3.6 in')
    expect(screen.getByText('3.6 in is 91.44 mm.')).toBeVisible()
    expect(figures.getByText('Displacement').nextElementSibling).toHaveTextContent('2679 cc')
    type('Bore', 'wide')
    expect(figures.getByText('Displacement').nextElementSibling).toHaveTextContent('needs bore')
    expect(figures.getByText('Torque at rated power').nextElementSibling).toHaveTextContent('172 Nm')
  })

  test('a fault is said when the field is left, not while it is typed', () => {
    show()
    type('Bore', '1')
    expect(screen.getByLabelText('Bore')).not.toHaveAttribute('aria-invalid')
    fireEvent.blur(screen.getByLabelText('Bore'))
    expect(screen.getByLabelText('Bore')).toHaveAttribute('aria-invalid', 'true')
    expect(screen.getByLabelText('Bore')).toHaveAccessibleDescription(/at least 20/)
  })

  test('a refusal keeps what was typed and links each fault to its place; it goes when the field changes', async () => {
    show([(values) => ({ ok: false, code: 'invalid', formError: 'Nothing was saved.', fieldErrors: { code: 'This code is taken.' }, values })])
    type('Name', 'Flat six of ours')
    await press()
    const alert = await screen.findByRole('alert')
    expect(within(alert).getByRole('link', { name: /This code is taken/ })).toHaveAttribute('href', '#f-code')
    expect(screen.getByLabelText('Name', { selector: 'input' })).toHaveValue('Flat six of ours')
    expect(screen.getByLabelText('Short code')).toHaveAttribute('aria-invalid', 'true')
    type('Short code', 'J261')
    expect(screen.getByLabelText('Short code')).not.toHaveAttribute('aria-invalid')
  })

  test('a conflict shows both versions; keeping mine names the version to save over', async () => {
    const theirs = { ...stored, spec: { ...sampleEngine, boreMm: 91 } }
    const { sent } = show([(values) => ({ ok: false, code: 'conflict', formError: 'Someone else saved.', values, conflict: theirs })])
    type('Bore', '92')
    await press()
    const row = (await screen.findByRole('rowheader', { name: 'Bore' })).closest('tr')
    expect(within(row as HTMLElement).getAllByRole('cell').map((cell) => cell.textContent)).toEqual(['91\u00a0mm', '92\u00a0mm', '+1'])
    expect(screen.queryByRole('rowheader', { name: 'Stroke' })).toBeNull()
    await userEvent.click(screen.getByRole('button', { name: /Keep mine/ }))
    await waitFor(() => expect(sent).toHaveLength(2))
    expect(sent[1]).toMatchObject({ boreMm: '92', over: '4' })
  })

  test('taking theirs fills the form with it and goes on from its version', async () => {
    const theirs = { ...stored, version: 9, spec: { ...sampleEngine, boreMm: 91 } }
    const { sent } = show([(values) => ({ ok: false, code: 'conflict', formError: 'Someone else saved.', values, conflict: theirs })])
    type('Bore', '92')
    await press()
    await userEvent.click(await screen.findByRole('link', { name: /Take theirs/ }))
    expect(screen.getByLabelText('Bore')).toHaveValue('91')
    await press()
    await waitFor(() => expect(sent).toHaveLength(2))
    expect(sent[1]).toMatchObject({ boreMm: '91', version: '9' })
    expect(sent[1]).not.toHaveProperty('over')
  })

  test('after a save it shows what was stored, and the next save goes on from there', async () => {
    const { sent } = show([() => ({ ok: true, data: { ...stored, spec: { ...sampleEngine, boreMm: 91.44 } } })])
    type('Bore', '3.6 in')
    await press()
    await waitFor(() => expect(screen.getByLabelText('Bore')).toHaveValue('91.44'))
    expect(screen.getByRole('status')).toHaveTextContent('Saved, version 4.')
    await press()
    await waitFor(() => expect(sent).toHaveLength(2))
    expect(sent[1]?.version).toBe('4')
  })

  test('only the friction that is chosen is asked for', () => {
    show()
    expect(screen.getByLabelText('Friction power at rated speed').closest('.efield')).toHaveClass('idle')
    fireEvent.change(screen.getByLabelText('Friction given as'), { target: { value: 'power' } })
    expect(screen.getByLabelText('Friction power at rated speed').closest('.efield')).not.toHaveClass('idle')
    expect(screen.getByLabelText('Mechanical efficiency at rated power').closest('.efield')).toHaveClass('idle')
  })

  test('leads out of order on the cap are said, and can be set in firing order', async () => {
    show()
    expect(screen.getByRole('img', { name: /Distributor cap from above: terminals clockwise 1, 6, 3, 2, 5, 4; the rotor turns anticlockwise and meets 1, 4, 5, 2, 3, 6, the firing order/ })).toBeVisible()
    fireEvent.change(screen.getByLabelText('Rotor turns, seen from above'), { target: { value: 'clockwise' } })
    expect(screen.getByText('Not in firing order')).toBeVisible()
    await userEvent.click(screen.getByRole('button', { name: 'Set the leads in firing order' }))
    expect(screen.getByLabelText('Cap terminals, clockwise from above')).toHaveValue('1 4 5 2 3 6')
    expect(screen.queryByText('Not in firing order')).toBeNull()
  })
})
