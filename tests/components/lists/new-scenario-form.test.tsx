import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { expect, test, vi } from 'vitest'
import { NewScenarioForm } from '@/components/lists/new-scenario-form'
import type { ActionState } from '@/lib/errors'

const engines = [{ id: 'one', name: 'Flat six', code: 'J260' }, { id: 'two', name: 'Flat four', code: 'J200' }]

test('sends name and engine; comes from an engine with it chosen', async () => {
  const sent: Record<string, FormDataEntryValue>[] = []
  const action = vi.fn(async (_: ActionState, form: FormData): Promise<ActionState> => {
    sent.push(Object.fromEntries(form))
    return { ok: true, data: undefined }
  })
  render(<NewScenarioForm action={action} engines={engines} chosen="two" />)
  await userEvent.type(screen.getByLabelText('Name'), 'Cruise trial')
  await userEvent.click(screen.getByRole('button', { name: 'Open the sheet' }))
  expect(sent).toEqual([{ title: 'Cruise trial', engineId: 'two' }])
})

test('a refusal keeps both and marks its place', async () => {
  const action = async (_: ActionState, form: FormData): Promise<ActionState> =>
    ({ ok: false, formError: 'Nothing was saved.', fieldErrors: { engineId: 'Choose the engine it is laid out on.' }, values: Object.fromEntries(form) as Record<string, string> })
  render(<NewScenarioForm action={action} engines={engines} />)
  await userEvent.type(screen.getByLabelText('Name'), 'Cruise trial')
  await userEvent.click(screen.getByRole('button', { name: 'Open the sheet' }))
  expect(await screen.findByRole('alert')).toHaveTextContent('Engine: Choose the engine it is laid out on.')
  expect(screen.getByLabelText('Engine')).toHaveAttribute('aria-invalid', 'true')
  expect(screen.getByLabelText('Name')).toHaveValue('Cruise trial')
})
