import type { FieldDef } from './field'
import { numberField, optionalField } from './field-lines'
import type { ChannelPrefix } from './scenario-fields'

/** Coil, drive and what hangs on it, one set a channel. */
export const coilFields = (channel: ChannelPrefix): readonly FieldDef[] => {
  const at = (name: string) => `coils.${channel}.${name}`
  return [
    numberField(at('ohm'), 'Coil, resistance', 'resistance', [0.05, 20], 'Of the primary winding, cold, ballast and leads included.'),
    numberField(at('mh'), 'Coil, inductance', 'inductance', [0.1, 100], 'Of the primary winding, from the coil’s sheet or measured.'),
    optionalField(at('limitA'), 'Current limited to', 'current', [0.5, 50], 'By the drive. Empty: not limited.'),
    numberField(at('dwellMs'), 'Dwell', 'timeMs', [0.1, 50], 'Time the current flows before each spark.'),
    numberField(at('supplyV'), 'Voltage, running', 'voltage', [3, 60], 'At the coil, drops of wires and switches taken off.'),
    numberField(at('crankingV'), 'Voltage, cranking', 'voltage', [3, 60], 'At the coil while the starter turns; 8 to 9 V of a 12 V system.'),
    numberField(at('ambientK'), 'Air around it', 'temperature', [233.15, 423.15], 'Where the coil is mounted, on a hot day.'),
    numberField(at('thermalResistanceKPerW'), 'Warms by', 'thermalResistance', [0.1, 50], 'Degrees of the winding above the air for each watt of heat.'),
    numberField(at('secondaryPf'), 'Secondary, capacitance', 'capacitance', [5, 1000], 'Winding, lead and plug together; 50 to 150 pF is usual.'),
    numberField(at('transferEfficiency'), 'Energy that arrives', 'ratio', [0.05, 1], 'Share of what the coil stores that reaches the plug; about half.'),
    optionalField(at('clampKv'), 'Drive lets through', 'voltageKv', [1, 100], 'Most voltage before the drive’s own protection cuts it. Empty: not limited.'),
    { name: at('wastedSpark'), label: 'Fires two cylinders at a time', kind: 'check', help: 'A double-ended coil: one of its two sparks is for nothing.' },
  ]
}

export const plugFields: readonly FieldDef[] = [
  numberField('plugGapMm', 'Plug gap', 'arc', [0.1, 2], 'At the widest the plugs are let wear to.'),
]
