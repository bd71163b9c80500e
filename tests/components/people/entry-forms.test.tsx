import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, test, vi } from 'vitest'
import { SignInForm } from '@/components/people/sign-in-form'
import { SignUpForm } from '@/components/people/sign-up-form'
import type { ActionState } from '@/lib/errors'

const answering = (state: ActionState) => {
  const sent: Record<string, FormDataEntryValue>[] = []
  const action = vi.fn(async (_: ActionState, formData: FormData): Promise<ActionState> => {
    sent.push(Object.fromEntries(formData))
    return state
  })
  return { action, sent }
}

describe('sign-in', () => {
  test('sends what was typed and where to go on to', async () => {
    const { action, sent } = answering({ ok: true, data: undefined })
    render(<SignInForm action={action} next="/scenarios/7" />)
    await userEvent.type(screen.getByLabelText('E-mail address'), 'noor@juniper.example')
    await userEvent.type(screen.getByLabelText('Password'), 'a long enough one')
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }))
    expect(sent).toEqual([{ email: 'noor@juniper.example', password: 'a long enough one', next: '/scenarios/7' }])
  })

  test('a refusal is said once, keeps the address and never the password', async () => {
    const { action } = answering({ ok: false, formError: 'That e-mail address and password do not belong together.', values: { email: 'noor@juniper.example' } })
    render(<SignInForm action={action} />)
    await userEvent.type(screen.getByLabelText('Password'), 'wrong')
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }))
    expect(await screen.findByRole('alert')).toHaveTextContent('do not belong together')
    expect(screen.getByLabelText('E-mail address')).toHaveValue('noor@juniper.example')
    expect(screen.getByLabelText('Password')).toHaveValue('')
    expect(screen.getByRole('button', { name: 'Sign in' })).toBeEnabled()
  })

  test('the button waits for the answer', async () => {
    let answer: (state: ActionState) => void = () => {}
    render(<SignInForm action={() => new Promise((resolve) => { answer = resolve })} />)
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }))
    expect(screen.getByRole('button', { name: 'Sign in' })).toBeDisabled()
    answer({ ok: false, formError: 'Try again.' })
    expect(await screen.findByRole('alert')).toBeVisible()
  })
})

describe('sign-up', () => {
  test('asks for name, address, password and shop, and marks each place that is wrong', async () => {
    const { action, sent } = answering({ ok: false, formError: 'Some of what was typed cannot be used.', fieldErrors: { shopName: 'Type the name of your shop.' }, values: { name: 'Noor', email: 'noor@juniper.example', shopName: '' } })
    render(<SignUpForm action={action} />)
    await userEvent.type(screen.getByLabelText('Your name'), 'Noor')
    await userEvent.click(screen.getByRole('button', { name: 'Make the account' }))
    expect(Object.keys(sent[0] ?? {}).sort()).toEqual(['email', 'name', 'password', 'shopName'])
    expect(await screen.findByRole('link', { name: 'Type the name of your shop.' })).toHaveAttribute('href', '#f-shopName')
    expect(screen.getByLabelText('Name of your shop')).toBeInvalid()
    expect(screen.getByLabelText('Your name')).toHaveValue('Noor')
  })
})
