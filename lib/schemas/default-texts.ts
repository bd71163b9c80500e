import { formatInput, type UnitSystem } from '../units'
import { defaultWords } from './default-sources'
import type { FormValues } from './field'
import { modelToForm } from './model-form'
import { statedDefaults } from './stated-defaults'

const textsIn = (system: UnitSystem): FormValues => {
  const { tolerances, ...groups } = statedDefaults()
  return {
    ...modelToForm(groups, system),
    'tolerances.markDeg': formatInput(tolerances.markDeg, 'angle', system),
    'tolerances.scatterDeg': formatInput(tolerances.scatterDeg, 'angle', system),
  }
}

const texts: Record<UnitSystem, FormValues> = { metric: textsIn('metric'), us: textsIn('us') }

/** Where a figure comes from that stands in the field as the sheet started with it; undefined where another one was typed, or none. */
export function defaultNote(name: string, value: string, system: UnitSystem): string | undefined {
  const text = texts[system][name]
  return text !== undefined && text !== '' && value.trim() === text ? defaultWords(name) ?? undefined : undefined
}
