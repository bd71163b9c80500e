import { render, screen } from '@testing-library/react'
import { expect, test } from 'vitest'
import { LimitsTable } from '@/components/plan/limits-table'
import { defaultLimits } from '@/lib/calc/limits'

test('each limit stands with its figure and whose it is', () => {
  render(<LimitsTable limits={defaultLimits} system="metric" />)
  expect(screen.getAllByRole('row')).toHaveLength(Object.keys(defaultLimits).length + 1)
  expect(screen.getByRole('row', { name: /Cranking advance/ })).toHaveTextContent('Cranking advanceat most 20.0°shop’s choice')
  expect(screen.getByRole('row', { name: /Full timing shows at idle/ })).toHaveTextContent('at most 100 rpm above idle')
})
