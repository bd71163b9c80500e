import { coilFields, plugFields } from './coil-fields'
import { chargeFields, fuelFields } from './detonation-fields'
import type { FieldDef } from './field'
import { placeFields, redundancyFields } from './flight-fields'

/** Fields whose names are their paths in the sheet: written and read alike, none by name. */
export const modelFields: readonly FieldDef[] = [
  ...fuelFields, ...chargeFields, ...coilFields('primary'), ...coilFields('backup'), ...plugFields, ...placeFields, ...redundancyFields,
]

const names = new Set(modelFields.map((field) => field.name))

/** Fields at which the whole of a group is spoken of. */
const headOf: Record<string, string> = {
  fuel: 'fuel.octane', worse: 'worse.hotterK', reference: 'reference.sparkDeg', cycle: 'cycle.chargeK', coils: 'coils.primary.dwellMs',
  'coils.primary': 'coils.primary.dwellMs', 'coils.backup': 'coils.backup.dwellMs', airframe: 'airframe.massKg',
  conditions: 'conditions.pressureAltitudeM', redundancy: 'redundancy.checkIntervalHours', 'redundancy.ratesPerH': 'redundancy.ratesPerH.supply',
}

/** Form field of a path within these groups, the group’s first where the path stops short; null: not of these. */
export function modelFieldOf(path: readonly string[]): string | null {
  for (let length = path.length; length > 0; length -= 1) {
    const name = path.slice(0, length).join('.')
    if (names.has(name)) return name
    const head = headOf[name]
    if (head !== undefined) return head
  }
  return null
}
