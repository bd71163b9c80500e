import { render, screen } from '@testing-library/react'
import { describe, expect, test } from 'vitest'
import { CheckField, InputField, SelectField, TextareaField } from '@/components/ui/field'

describe('a field', () => {
  test('its label names it and its unit, note, error and source describe it', () => {
    render(<InputField label="Crank retard below" name="primary.retard.belowRpm" unit="rpm" source="measured" note="seen on the bench" error="At least 50 rpm below the slowest idle." defaultValue="1400" />)
    const input = screen.getByLabelText('Crank retard below')
    expect(input).toHaveValue('1400')
    expect(input).toBeInvalid()
    expect(input).toHaveAttribute('aria-invalid', 'true')
    expect(input).toHaveAccessibleDescription('rpm seen on the bench At least 50 rpm below the slowest idle. measured')
    expect(input).toHaveAttribute('id', 'f-primary.retard.belowRpm')
  })

  test('without an error it is neither invalid nor described by one', () => {
    render(<InputField label="Bore" name="boreMm" />)
    const input = screen.getByLabelText('Bore')
    expect(input).not.toHaveAttribute('aria-invalid')
    expect(input).not.toHaveAttribute('aria-describedby')
  })

  test('a locked one can be read and copied but not typed into', () => {
    render(<InputField label="Wall temperature" unit="K" locked defaultValue="470" />)
    expect(screen.getByLabelText('Wall temperature')).toHaveAttribute('readonly')
  })

  test.each([
    ['choice', <SelectField key="s" label="Advance by" name="kind" choices={[{ value: 'fixed', label: 'fixed' }]} error="Choose one." />],
    ['long text', <TextareaField key="t" label="Advance by" name="kind" error="Choose one." />],
    ['tick box', <CheckField key="c" label="Advance by" name="kind" error="Choose one." />],
  ])('a %s carries its error the same way', (_, field) => {
    render(field)
    const input = screen.getByLabelText('Advance by')
    expect(input).toBeInvalid()
    expect(input).toHaveAccessibleDescription('Choose one.')
  })
})
