import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, test, vi } from 'vitest'
import { Figure } from '@/components/ui/figure'
import { figureCsv, type FigureData } from '@/components/ui/figure-data'

const data: FigureData = {
  caption: 'Advance against speed',
  columns: [{ head: 'Speed', unit: 'rpm' }, { head: 'A primary', channel: 'A', unit: '°', decimals: 1 }, { head: 'note' }],
  rows: [[190, 19.700000000000003, 'cranking'], [12780, -0.04, null]],
}
const draw = () => render(
  <Figure title="Advance" sentence="A rises to 28.5 degrees" data={data} csvName="advance" controls={<input aria-label="typed" />}>
    <p>drawing</p>
  </Figure>,
)

describe('figure', () => {
  test('shows the drawing with its sentence, and the table to readers only', () => {
    draw()
    expect(screen.getByRole('img', { name: 'A rises to 28.5 degrees' })).toBeVisible()
    expect(screen.getByRole('table', { name: 'Advance against speed' }).parentElement).toHaveClass('sr')
  })

  test('T swaps the drawing for its table and back, under the same head', async () => {
    draw()
    screen.getByRole('button', { name: /numbers as a table/ }).focus()
    await userEvent.keyboard('t')
    expect(screen.queryByRole('img')).not.toBeInTheDocument()
    const table = screen.getByRole('table', { name: 'Advance against speed' })
    expect(table.parentElement).not.toHaveClass('sr')
    expect(within(table).getAllByRole('row').map((row) => row.textContent)).toEqual(['SpeedrpmA A primary°note', '19019.7cranking', '12\u202f7800.0none'])
    expect(screen.getByRole('heading', { name: 'Advance' })).toBeVisible()
    await userEvent.keyboard('T')
    expect(screen.getByRole('img')).toBeVisible()
  })

  test('a t that is typed into a field stays a letter', async () => {
    draw()
    await userEvent.type(screen.getByLabelText('typed'), 'table')
    expect(screen.getByLabelText('typed')).toHaveValue('table')
    expect(screen.getByRole('img')).toBeVisible()
  })

  test('the button does the same as the key', async () => {
    draw()
    await userEvent.click(screen.getByRole('button', { name: /numbers as a table/ }))
    expect(screen.queryByRole('img')).not.toBeInTheDocument()
    expect(screen.getByRole('button', { name: /drawing/ })).toHaveAttribute('aria-pressed', 'true')
  })

  test('its numbers are saved under its name', async () => {
    const made = vi.fn((_: Blob) => 'blob:numbers')
    vi.stubGlobal('URL', Object.assign(URL, { createObjectURL: made, revokeObjectURL: vi.fn() }))
    const saved: string[] = []
    const click = vi.spyOn(HTMLAnchorElement.prototype, 'click').mockImplementation(function (this: HTMLAnchorElement) { saved.push(this.download) })
    draw()
    await userEvent.click(screen.getByRole('button', { name: 'save as CSV' }))
    expect(saved).toEqual(['advance.csv'])
    expect(await made.mock.calls[0]?.[0].text()).toBe(figureCsv(data))
    click.mockRestore()
    vi.unstubAllGlobals()
  })
})

test('the file holds plain numbers, units in the head and nothing where there is nothing', () => {
  expect(figureCsv(data)).toBe('Speed (rpm),A primary (°),note\r\n190,19.7,cranking\r\n12780,-0.04,\r\n')
})
