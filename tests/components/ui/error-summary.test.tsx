import { render, screen } from '@testing-library/react'
import { expect, test } from 'vitest'
import { ErrorSummary } from '@/components/ui/error-summary'
import { InputField } from '@/components/ui/field'

const wrong = { boreMm: 'A bore is 20 to 300 mm.' }

test('links each error to its field and takes the focus', () => {
  render(<><ErrorSummary title="The engine was not saved" fieldErrors={wrong} labels={{ boreMm: 'Bore' }} /><InputField label="Bore" name="boreMm" error={wrong.boreMm} /></>)
  const link = screen.getByRole('link', { name: 'Bore: A bore is 20 to 300 mm.' })
  expect(document.getElementById(link.getAttribute('href')?.slice(1) ?? '')).toBe(screen.getByLabelText('Bore'))
  expect(screen.getByRole('alert')).toHaveFocus()
})

test('drawing it again with the same answer leaves the focus where the person is', () => {
  const page = (note: string) => <><ErrorSummary title="Not saved" formError="Try again." /><InputField label="Bore" note={note} /></>
  const { rerender } = render(page('one'))
  screen.getByLabelText('Bore').focus()
  rerender(page('two'))
  expect(screen.getByLabelText('Bore')).toHaveFocus()
})

test('stands nowhere while nothing is wrong', () => {
  const { container } = render(<ErrorSummary title="Not saved" fieldErrors={{}} />)
  expect(container).toBeEmptyDOMElement()
})
