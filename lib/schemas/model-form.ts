import type { ScenarioSheet } from '../calc/live'
import { formatInput, type UnitSystem } from '../units'
import type { FormValues } from './field'
import { modelFields } from './model-fields'
import type { ReadFields } from './read-fields'
import type { StatedDefaults } from './stated-defaults'

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null

const valueAt = (sheet: object, path: string): unknown =>
  path.split('.').reduce<unknown>((value, key) => (isRecord(value) ? value[key] : undefined), sheet)

const referenceNames = modelFields.map((field) => field.name).filter((name) => name.startsWith('reference.'))

/** Numbers of the fields named by their path, null where the sheet holds none. */
export function numbersOfModel(sheet: ScenarioSheet): Record<string, number | null> {
  const numbers = modelFields.filter((field) => field.kind === 'number').map(({ name }): [string, number | null] => {
    const value = valueAt(sheet, name)
    return [name, typeof value === 'number' ? value : null]
  })
  return Object.fromEntries(numbers)
}

/** Texts of these fields in the person’s units; `sheet`: one, or these groups of it. */
export function modelToForm(sheet: Omit<StatedDefaults, 'tolerances'>, system: UnitSystem): FormValues {
  return Object.fromEntries(modelFields.map(({ name, quantity = 'plain' }): [string, string] => {
    const value = valueAt(sheet, name)
    if (typeof value === 'number') return [name, formatInput(value, quantity, system)]
    if (typeof value === 'boolean') return [name, value ? 'on' : '']
    return [name, typeof value === 'string' ? value : '']
  }))
}

/** These groups as read from the form, unchecked: the schema judges them. A reference setting is whole or not there. */
export function readModel(read: ReadFields): Record<string, unknown> {
  const hasReference = referenceNames.some((name) => read.text(name) !== '')
  const groups: Record<string, unknown> = {}
  for (const { name, kind, label } of modelFields) {
    if (!hasReference && name.startsWith('reference.')) continue
    if (hasReference && name.startsWith('reference.') && read.text(name) === '')
      read.errors[name] = `${label} is empty. A reference setting needs all four figures, or none.`
    place(groups, name.split('.'), kind === 'number' ? read.number(name) : kind === 'check' ? read.check(name) : read.text(name))
  }
  return hasReference ? groups : { ...groups, reference: null }
}

function place(groups: Record<string, unknown>, [head = '', ...rest]: string[], value: unknown): void {
  if (rest.length === 0) {
    groups[head] = value
    return
  }
  const inner = groups[head]
  const group = isRecord(inner) ? inner : {}
  groups[head] = group
  place(group, rest, value)
}
