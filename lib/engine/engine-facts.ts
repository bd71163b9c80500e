import { arcMm, CalcError, displacementCc, type Firing, firingSchedule, mepFromPower, type Rotation } from '../calc/live'
import { engineFields } from '../schemas/engine-fields'
import { fieldIndex, type FormValues } from '../schemas/field'
import { fieldReader } from '../schemas/read-fields'
import type { QuantityKind, UnitSystem } from '../units'
import { metByRotor } from './cap-leads'

const index = fieldIndex(engineFields)

/** A figure worked out of what is typed so far; null with what it still needs. */
export interface EngineFact {
  id: string
  label: string
  kind: QuantityKind
  value: number | null
  needs: string | null
}

export interface EngineDrawing {
  firings: Firing[] | null
  /** Why there is no schedule. */
  firingFault: string | null
  cap: { terminals: number[]; rotation: Rotation; met: number[]; inOrder: boolean } | null
}

/** Nm from kW and rpm: 60 000 / (2π). */
const nmPerKwRpm = 30_000 / Math.PI

const orNull = <T>(compute: () => T): T | null => {
  try {
    return compute()
  } catch (error) {
    if (error instanceof CalcError) return null
    throw error
  }
}

/** What stands in the form as numbers: those that cannot be read are null, whatever the others are. */
function reader(values: FormValues, system: UnitSystem) {
  const read = fieldReader(index, values, system)
  return {
    text: read.text,
    list: read.list,
    positive: (name: string) => {
      const value = read.text(name) === '' ? null : read.number(name)
      return value !== null && value > 0 ? value : null
    },
  }
}

const labelOf = (name: string) => (index.get(name)?.label ?? name).toLowerCase()

/**
 * Figures beside the engine form, from its texts: each goes on as long as its own inputs can be read.
 *
 * @param values texts of the engine form in the person's units
 * @param system units a number without one stands in
 */
export function engineFacts(values: FormValues, system: UnitSystem): EngineFact[] {
  const { positive, text } = reader(values, system)
  const all = (names: readonly string[]) => {
    const numbers = names.map(positive)
    return numbers.some((value) => value === null) ? null : numbers.map((value) => value ?? 0)
  }
  const fact = (id: string, label: string, kind: QuantityKind, names: readonly string[], compute: (numbers: number[]) => number): EngineFact => {
    const numbers = all(names)
    const value = numbers && orNull(() => compute(numbers))
    const open = names.filter((name) => positive(name) === null)
    return { id, label, kind, value, needs: value !== null ? null : `needs ${(open.length > 0 ? open : names).map(labelOf).join(', ')}` }
  }
  const cc = (cylinders = 0, boreMm = 0, strokeMm = 0) => displacementCc({ cylinders, boreMm, strokeMm })
  const size = ['cylinders', 'boreMm', 'strokeMm']
  const rated = ['ratedPowerKw', 'ratedRpm']
  const frictionName = text('frictionKind') === 'power' ? 'frictionPowerKw' : 'mechanicalEfficiency'
  const frictionKw = (ratedKw: number, given: number) => (frictionName === 'frictionPowerKw' ? given : ratedKw * (1 / given - 1))
  return [
    fact('displacement', 'Displacement', 'displacement', size, ([n, bore, stroke]) => cc(n, bore, stroke)),
    fact('torque', 'Torque at rated power', 'torque', rated, ([kw = 0, rpm = 0]) => (kw * nmPerKwRpm) / rpm),
    fact('bmep', 'Mean effective pressure at rated power', 'meanPressure', [...rated, ...size], ([kw = 0, rpm = 0, n, bore, stroke]) => mepFromPower({ powerKw: kw, displacementCc: cc(n, bore, stroke), rpm })),
    frictionName === 'frictionPowerKw'
      ? fact('efficiency', 'Mechanical efficiency at rated power', 'ratio', ['ratedPowerKw', frictionName], ([kw = 0, given = 0]) => kw / (kw + given))
      : fact('friction', 'Friction power at rated speed', 'power', ['ratedPowerKw', frictionName], ([kw = 0, given = 0]) => frictionKw(kw, given)),
    fact('markSpacing', 'One degree on the damper', 'markSpacing', ['damperDiameterMm'], ([diameter = 0]) => arcMm(diameter, 1)),
  ]
}

/** What the drawings beside the form show: firings over the cycle, and the leads on the cap. */
export function engineDrawing(values: FormValues, system: UnitSystem): EngineDrawing {
  const { list, text } = reader(values, system)
  const order = list('firingOrder')
  const intervals = text('intervalsDeg') === '' ? null : list('intervalsDeg')
  const drawing: EngineDrawing = { firings: null, firingFault: null, cap: null }
  if (order && order.length > 0 && (intervals || text('intervalsDeg') === '')) {
    try {
      drawing.firings = firingSchedule({ firingOrder: order, ...(intervals ? { intervalsDeg: intervals } : {}) })
    } catch (error) {
      if (!(error instanceof CalcError)) throw error
      drawing.firingFault = error.message
    }
  }
  const terminals = list('capTerminals')
  if (terminals && order && drawing.firings && terminals.length === order.length && new Set(terminals).size === terminals.length) {
    const rotation: Rotation = text('distributorRotation') === 'anticlockwise' ? 'anticlockwise' : 'clockwise'
    const met = metByRotor(terminals, rotation, order[0] ?? 0)
    drawing.cap = { terminals, rotation, met, inOrder: met.join() === order.join() }
  }
  return drawing
}
