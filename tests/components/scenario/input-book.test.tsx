import { fireEvent, render, screen } from '@testing-library/react'
import { useState } from 'react'
import { describe, expect, test, vi } from 'vitest'
import { InputBook } from '@/components/scenario/input-book'
import type { SheetForm } from '@/components/scenario/sheet-form'
import type { ScenarioSheet } from '@/lib/calc/scenario/scenario-types'
import { formToScenario, scenarioToForm } from '@/lib/schemas/scenario-form'
import type { UnitSystem } from '@/lib/units'
import { someCases } from '@/tests/support/cases'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const engine = { id: 'e', name: 'Flat six', spec: sampleEngine() }
const none: ReadonlySet<string> = new Set()

/** The book as the working sheet holds it: texts in a state, faults read from them and found in computing. */
function Book({ sheet, system = 'metric', computed = {} }: { sheet: ScenarioSheet, system?: UnitSystem, computed?: Record<string, string> }) {
  const [values, setValues] = useState(() => scenarioToForm('Climb', sheet, system))
  const [onChange] = useState(() => (name: string, value: string) => setValues((before) => ({ ...before, [name]: value })))
  const read = formToScenario(values, system, sheet)
  const form: SheetForm = { values, errors: { ...computed, ...(read.ok ? {} : read.errors) }, faultAt: {}, flagged: none, system, onChange }
  return <form aria-label="book"><InputBook form={form} engine={engine} canOpenEngine={false} /></form>
}

const valuesOf = (): Record<string, string> => {
  const book = screen.getByRole('form', { name: 'book' })
  if (!(book instanceof HTMLFormElement)) throw new Error('no form')
  return Object.fromEntries([...new FormData(book)].map(([name, value]) => [name, String(value)]))
}
const input = (name: string): HTMLInputElement => {
  const found = document.querySelector(`[name="${name}"]`)
  return found instanceof HTMLInputElement ? found : expect.fail(`no input ${name}`)
}
const foldOf = (title: string) => screen.getByRole('heading', { name: title, hidden: true }).closest('details')

const reference = { sparkDeg: 25, rpm: 2600, octane: 94, marginDeg: 2 }

describe('the inputs of a sheet', () => {
  test.each(someCases([['metric', 'sharedCap'], ['us', 'capEach'], ['metric', 'directCoils']] as const))('post everything that is in it, folded or not (%s, %s)', (system, distribution) => {
    const sheet = sampleSheet({ distribution, reference, redundancy: { ...sampleSheet().redundancy, sharedCoil: true, sharedSupply: false } })
    render(<Book sheet={sheet} system={system} />)
    expect(formToScenario(valuesOf(), system, sheet)).toEqual({ ok: true, input: { title: 'Climb', sheet } })
  })

  test.each(someCases([
    ['Fuel and detonation', 'RON 95, worse 91'], ['Aeroplane and place', '500\u00a0kg at 300\u00a0m, 20\u00a0°C'], ['Coils and plug', 'dwell A 4\u00a0ms, B 4\u00a0ms'],
    ['Charge and burn', 'solved from the power, 97\u00a0°C'], ['Chances of failure', 'backup tried alone every 25\u00a0h'], ['Tolerances', 'check ±1°, bench ±0.5°'],
  ]))('%s stands folded to one line', (title, summary) => {
    render(<Book sheet={sampleSheet()} />)
    expect(foldOf(title)?.open).toBe(false)
    expect(foldOf(title)?.querySelector('.sum')?.textContent).toBe(summary)
  })

  test('a line tells what was typed: an anchor, another unit, a filling', () => {
    render(<Book sheet={sampleSheet({ reference })} />)
    fireEvent.change(input('airframe.massKg'), { target: { value: '1100 lb' } })
    fireEvent.change(input('cycle.volumetricEfficiency'), { target: { value: '0.85' } })
    expect(foldOf('Fuel and detonation')?.querySelector('.sum')?.textContent).toBe('RON 95, worse 91, anchored')
    expect(foldOf('Aeroplane and place')?.querySelector('.sum')?.textContent).toMatch(/^1100 lb at/)
    expect(foldOf('Charge and burn')?.querySelector('.sum')?.textContent).toBe('filling typed, 0.85')
  })

  test('a fault opens its fold, is said there, and mending it does not close it', () => {
    vi.useFakeTimers()
    try {
      render(<Book sheet={sampleSheet()} />)
      fireEvent.change(input('coils.backup.dwellMs'), { target: { value: 'long' } })
      expect(foldOf('Coils and plug')?.open).toBe(true)
      expect(foldOf('Fuel and detonation')?.open).toBe(false)
      fireEvent.blur(input('coils.backup.dwellMs'))
      const field = input('coils.backup.dwellMs')
      expect(field).toHaveAttribute('aria-invalid', 'true')
      expect(field).toHaveAccessibleDescription(/B: Dwell: “long” holds no number/)
      expect(input('coils.primary.dwellMs')).not.toHaveAttribute('aria-invalid')
      fireEvent.change(field, { target: { value: '3' } })
      expect(foldOf('Coils and plug')?.open).toBe(true)
      expect(field).not.toHaveAttribute('aria-invalid')
    } finally {
      vi.useRealTimers()
    }
  })

  test('a fault found in computing, nothing typed in the fold, opens it too', () => {
    const sheet = sampleSheet()
    const { rerender } = render(<Book sheet={sheet} />)
    rerender(<Book sheet={sheet} computed={{ 'reference.rpm': 'The reference must lie between idle and full power.' }} />)
    expect(foldOf('Fuel and detonation')?.open).toBe(true)
    expect(screen.getByText(/must lie between idle and full power/)).toBeInTheDocument()
  })

  test('the coils stand side by side, each input named with its channel', () => {
    render(<Book sheet={sampleSheet()} />)
    expect(input('coils.primary.ohm')).toHaveAccessibleName('Coil, resistance, channel A')
    expect(input('coils.backup.ohm')).toHaveAccessibleName('Coil, resistance, channel B')
    expect(input('coils.primary.ohm').parentElement).toBe(input('coils.backup.ohm').parentElement)
    fireEvent.change(input('coils.primary.ohm'), { target: { value: '650 mΩ' } })
    expect(screen.getByText(/A: 650 mΩ is 0\.650\sΩ\./)).toBeInTheDocument()
  })

  test('a figure nobody typed says where it comes from, until another is typed', () => {
    render(<Book sheet={sampleSheet()} />)
    const mass = input('airframe.massKg')
    expect(mass).toHaveAccessibleDescription(/Default: a guess\./)
    expect(input('plugGapMm')).toHaveAccessibleDescription(/Default: common practice, no published source\./)
    fireEvent.change(mass, { target: { value: '431' } })
    expect(mass).toHaveAccessibleDescription(/typed/)
    expect(mass).not.toHaveAccessibleDescription(/Default/)
    expect(mass.title).toMatch(/As it climbs out.* must be at least 50\skg and at most 5000\skg\./)
  })

  test('without a cap its failures are not asked for, and kept', () => {
    render(<Book sheet={sampleSheet({ distribution: 'directCoils' })} />)
    expect(input('redundancy.ratesPerH.cap').type).toBe('hidden')
    fireEvent.change(document.querySelector('[name="distribution"]') ?? document.body, { target: { value: 'sharedCap' } })
    expect(input('redundancy.ratesPerH.cap').type).toBe('text')
  })
})
