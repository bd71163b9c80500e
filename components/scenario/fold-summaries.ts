import { fieldIndex, type FormValues } from '@/lib/schemas/field'
import { scenarioFields } from '@/lib/schemas/scenario-fields'
import { formatQuantityText, parseQuantity, unitOf, type UnitSystem } from '@/lib/units'

const index = fieldIndex(scenarioFields)

/** A figure as it stands in its field, with the field’s unit unless another was typed. */
function figure(name: string, values: FormValues, system: UnitSystem): string {
  const text = (values[name] ?? '').trim()
  const quantity = index.get(name)?.quantity
  if (text === '') return '…'
  // A temperature is stored in another unit than it is shown in: its decimals say nothing.
  if (quantity === 'temperature') {
    const read = parseQuantity(text, quantity, system)
    return read.ok ? formatQuantityText(read.value, quantity, system) : text
  }
  if (!quantity || /[^\d.,+\-−e\s]/i.test(text)) return text
  const { symbol, joined } = unitOf(quantity, system)
  return symbol === '' ? text : `${text}${joined ? '' : '\u00a0'}${symbol}`
}

const scaleWords: Record<string, string> = { ron: 'RON', mon: 'MON', aki: '(R+M)/2', lean: 'lean' }

/** The line that stands for a folded group. */
export const foldSummaries = {
  fuel: (values, system) => {
    const of = (name: string) => figure(name, values, system)
    const anchored = (values['reference.sparkDeg'] ?? '') === '' ? '' : ', anchored'
    return `${scaleWords[values['fuel.scale'] ?? ''] ?? ''} ${of('fuel.octane')}, worse ${of('fuel.worseOctane')}${anchored}`.trim()
  },
  place: (values, system) => `${figure('airframe.massKg', values, system)} at ${figure('conditions.pressureAltitudeM', values, system)}, ${figure('conditions.temperatureK', values, system)}`,
  rotor: (values, system) => (values.distribution === 'directCoils' ? 'direct coils, no rotor' : `tip ${figure('rotor.rotorWidthDeg', values, system)}, centred at ${figure('rotor.phasedAtDeg', values, system)}`),
  coils: (values, system) => `dwell A ${figure('coils.primary.dwellMs', values, system)}, B ${figure('coils.backup.dwellMs', values, system)}`,
  charge: (values, system) => ((values['cycle.volumetricEfficiency'] ?? '') === '' ? `solved from the power, ${figure('cycle.chargeK', values, system)}` : `filling typed, ${figure('cycle.volumetricEfficiency', values, system)}`),
  failures: (values, system) => `backup tried alone every ${figure('redundancy.checkIntervalHours', values, system)}`,
  tolerances: (values, system) => `check ±${figure('tolerances.timingCheckDeg', values, system)}, bench ±${figure('tolerances.benchDeg', values, system)}`,
} satisfies Record<string, (values: FormValues, system: UnitSystem) => string>
