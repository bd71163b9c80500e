import type { RedundancyPart } from '../calc/live'
import type { FieldDef } from './field'
import { numberField } from './field-lines'

/** The aeroplane, and where it is to fly. */
export const placeFields: readonly FieldDef[] = [
  numberField('airframe.massKg', 'Mass, loaded', 'mass', [50, 5000], 'As it climbs out: people, fuel and baggage.'),
  numberField('airframe.wingAreaM2', 'Wing area', 'area', [1, 100]),
  numberField('airframe.cd0', 'Drag without lift', 'coefficient', [0.005, 0.2], 'Coefficient on the wing area; 0.025 to 0.045 for light aeroplanes with fixed gear.'),
  numberField('airframe.inducedK', 'Drag of lift', 'coefficient', [0.005, 0.5], 'Factor of the square of the lift coefficient: 1 / (π · aspect ratio · 0.7 to 0.8).'),
  numberField('airframe.propEfficiency', 'Propeller, efficiency', 'ratio', [0.05, 1], 'At climbing speed; 0.6 to 0.75 for a fixed pitch.'),
  numberField('airframe.minSpeedMps', 'Slowest climb', 'airspeed', [5, 100], '1.3 times the stall at sea level: slower than this no climb is counted.'),
  numberField('conditions.pressureAltitudeM', 'Pressure altitude', 'altitude', [-1000, 6000], 'Of the field or the height it is to climb at.'),
  numberField('conditions.temperatureK', 'Air outside', 'temperature', [223.15, 323.15]),
]

const partLabels: Record<RedundancyPart, string> = {
  supply: 'Supply', switch: 'Switch', trigger: 'Trigger', module: 'Module', coil: 'Coil', cap: 'Cap and rotor', plug: 'Lead and plug',
}

const isPart = (name: string): name is RedundancyPart => Object.hasOwn(partLabels, name)
const heat = [253.15, 453.15] as const

/** Chances of failure. Every rate is a guess unless its source is known. */
export const redundancyFields: readonly FieldDef[] = [
  ...Object.keys(partLabels).filter(isPart).map((part) =>
    numberField(`redundancy.ratesPerH.${part}`, `${partLabels[part]} fails`, 'failureRate', [0, 0.1], 'Failures in an hour; 2e-5 is one in 50 000 hours.')),
  numberField('redundancy.hotK', 'Trigger, module and coil at', 'temperature', heat, 'Heat shortens the life of these three.'),
  numberField('redundancy.referenceK', 'their rates are given for', 'temperature', heat, 'The temperature that the rates above belong to.'),
  numberField('redundancy.activationEv', 'Activation energy', 'activationEnergy', [0, 1.5], 'How steeply heat shortens life; 0.3 to 0.7 eV is usual of electronics, 0 takes heat out.'),
  numberField('redundancy.flightHours', 'A flight lasts', 'durationHours', [0.1, 24]),
  numberField('redundancy.checkIntervalHours', 'Backup tried alone every', 'durationHours', [0.1, 2000], 'A fault of the backup sleeps until it is tried alone; a check at each start makes this the length of a flight.'),
  { name: 'redundancy.sharedSupply', label: 'Battery and switch serve both channels', kind: 'check' },
  { name: 'redundancy.sharedCoil', label: 'Both channels fire one coil', kind: 'check' },
]
