import type { Engine } from '../calc/live'
import { formatInput, formatTable, type UnitSystem } from '../units'
import { engineFields } from './engine-fields'
import { engineInput, type EngineInput } from './engine'
import { fieldIndex, type FieldErrors, type FormValues } from './field'
import { fieldReader, formatNumberList, placeIssues } from './read-fields'
import { readRows } from './read-table'

const index = fieldIndex(engineFields)
const numberNames = engineFields.filter((field) => field.kind === 'number').map((field) => field.name)
const powerColumns = index.get('powerCurve')?.columns ?? []

export type EngineFormResult = { ok: true; input: EngineInput } | { ok: false; errors: FieldErrors }

const numbersOfEngine = (engine: Engine): Record<string, number | null> => {
  const flat = engine as unknown as Record<string, unknown>
  const numbers = Object.fromEntries(numberNames.map((name) => [name, typeof flat[name] === 'number' ? flat[name] : null]))
  numbers.mechanicalEfficiency = engine.friction.kind === 'efficiency' ? engine.friction.mechanicalEfficiency : null
  numbers.frictionPowerKw = engine.friction.kind === 'power' ? engine.friction.frictionPowerKw : null
  return numbers
}

/** Texts of the engine form in the person's units. */
export function engineToForm(name: string, code: string, engine: Engine, system: UnitSystem): FormValues {
  const numbers = numbersOfEngine(engine)
  const shown = Object.fromEntries(numberNames.map((field) => {
    const value = numbers[field]
    return [field, value === null || value === undefined ? '' : formatInput(value, index.get(field)?.quantity ?? 'plain', system)]
  }))
  return {
    ...shown,
    name, code,
    firingOrder: formatNumberList(engine.firingOrder),
    intervalsDeg: engine.intervalsDeg ? formatNumberList(engine.intervalsDeg) : '',
    powerCurve: formatTable(engine.powerCurve.map((point) => [point.rpm, point.kw]), powerColumns, system),
    frictionKind: engine.friction.kind,
    damperEnd: engine.damperEnd,
    crankRotation: engine.crankRotation,
    distributorRotation: engine.distributorRotation,
    capTerminals: formatNumberList(engine.capTerminals),
  }
}

/** Reads the engine form; `base` is the engine it was filled from, so that untouched fields keep their exact values. */
export function formToEngine(values: FormValues, system: UnitSystem, base?: Engine): EngineFormResult {
  const read = fieldReader(index, values, system, base ? numbersOfEngine(base) : {})
  const frictionKind = read.text('frictionKind') === 'power' ? 'power' : 'efficiency'
  const skipped = frictionKind === 'power' ? 'mechanicalEfficiency' : 'frictionPowerKw'
  const numbers = Object.fromEntries(numberNames.filter((name) => name !== skipped).map((name) => [name, read.number(name)]))
  const curve = readRows('powerCurve', values, powerColumns, system, base?.powerCurve.map((point) => [point.rpm, point.kw]), read.errors)
  const raw = {
    name: read.text('name'),
    code: read.text('code'),
    spec: {
      ...numbers,
      firingOrder: read.list('firingOrder') ?? [],
      intervalsDeg: read.text('intervalsDeg') === '' ? null : read.list('intervalsDeg'),
      powerCurve: curve.map(([rpm, kw]) => ({ rpm, kw })),
      friction: frictionKind === 'power'
        ? { kind: 'power', frictionPowerKw: numbers.frictionPowerKw }
        : { kind: 'efficiency', mechanicalEfficiency: numbers.mechanicalEfficiency },
      damperEnd: read.text('damperEnd'),
      crankRotation: read.text('crankRotation'),
      distributorRotation: read.text('distributorRotation'),
      capTerminals: read.list('capTerminals') ?? [],
    },
  }
  const checked = engineInput.safeParse(raw)
  if (checked.success && Object.keys(read.errors).length === 0) return { ok: true, input: checked.data }
  return { ok: false, errors: placeIssues(checked.success ? [] : checked.error.issues, read.errors, index, fieldOfPath, system) }
}

/** Form field of a path in the engine input. */
export function fieldOfPath(path: readonly PropertyKey[]): string {
  const [head, second, third] = path.map(String)
  if (head !== 'spec') return head ?? 'name'
  return second === 'friction' ? (third ?? 'frictionKind') : (second ?? 'name')
}
