import { coilFields, plugFields } from './coil-fields'
import { chargeFields, fuelFields } from './detonation-fields'
import type { FieldDef } from './field'
import { placeFields, redundancyFields } from './flight-fields'

export const scheduleKinds = [
  { value: 'fixed', label: 'fixed' },
  { value: 'mechanical', label: 'mechanical advance' },
  { value: 'table', label: 'table of speed' },
  { value: 'map', label: 'map of speed and pressure' },
  { value: 'formula', label: 'formula' },
] as const

export type ScheduleKind = (typeof scheduleKinds)[number]['value']
export type ChannelPrefix = 'primary' | 'backup'

const angle = (name: string, label: string, min: number, max: number, path: string, help?: string): FieldDef =>
  ({ name, label, kind: 'number', quantity: 'angle', min, max, path, help })
const speed = (name: string, label: string, min: number, max: number, path: string, help?: string): FieldDef =>
  ({ name, label, kind: 'number', quantity: 'engineSpeed', min, max, path, help })

/** Fields of each schedule kind; only those of the chosen kind are read, the others keep what was typed. */
export const scheduleFields = (channel: ChannelPrefix): Record<ScheduleKind, readonly FieldDef[]> => {
  const path = `${channel}.schedule`
  return {
    fixed: [angle(`${channel}.fixed.deg`, 'Advance', -20, 60, path, 'Crank degrees before top dead centre at every speed.')],
    mechanical: [
      angle(`${channel}.mechanical.initialDeg`, 'Initial advance', -20, 60, path, 'As set with the weights at rest.'),
      speed(`${channel}.mechanical.startRpm`, 'Weights start at', 0, 12_000, path, 'Engine speed, not distributor speed.'),
      speed(`${channel}.mechanical.fullRpm`, 'Full advance from', 1, 12_000, path, 'Engine speed at which the weights stand at their stop.'),
      angle(`${channel}.mechanical.fullDeg`, 'Full advance', -20, 60, path, 'Crank degrees before top dead centre, initial advance included.'),
    ],
    table: [{
      name: `${channel}.table`, label: 'Speed and advance', kind: 'table', path,
      columns: [{ kind: 'engineSpeed', label: 'speed' }, { kind: 'angle', label: 'advance' }],
      help: 'One speed a line, rising: speed, advance. Linear between the lines, flat outside. Two columns of a spreadsheet can be pasted.',
    }],
    map: [{
      name: `${channel}.map`, label: 'Speed, pressure and advance', kind: 'matrix', path,
      columns: [{ kind: 'engineSpeed', label: 'speed' }, { kind: 'pressure', label: 'manifold pressure' }, { kind: 'angle', label: 'advance' }],
      help: 'First line: an empty corner, then the manifold pressures. Each further line: a speed, then the advance at each pressure. A block of a spreadsheet can be pasted.',
    }],
    formula: [{
      name: `${channel}.formula`, label: 'Advance in degrees', kind: 'formula', path, maxLength: 500,
      help: 'In rpm and map (manifold pressure, kPa): + − * / ^, min, max, abs, sqrt, and a condition as in rpm < 900 ? 12 : 24.',
    }],
  }
}

/** Crank retard and delay of a channel. An empty or zero retard means there is none. */
export const channelFields = (channel: ChannelPrefix): readonly FieldDef[] => [
  { name: `${channel}.kind`, label: 'Advance by', kind: 'select', options: scheduleKinds, path: `${channel}.schedule` },
  ...Object.values(scheduleFields(channel)).flat(),
  { ...angle(`${channel}.retardDeg`, 'Crank retard', 0, 40, `${channel}.crankRetard`, 'Degrees taken out while the engine cranks. Empty: none.'), optional: true },
  { ...speed(`${channel}.retardBelowRpm`, 'below', 1, 3000, `${channel}.crankRetard`, 'The retard acts while the speed is below this.'), optional: true },
  { ...speed(`${channel}.retardHysteresisRpm`, 'hysteresis', 0, 3000, `${channel}.crankRetard`, 'Once released, the retard returns only this much lower.'), optional: true },
  { name: `${channel}.latencyUs`, label: 'Electronic delay', kind: 'number', quantity: 'timeUs', min: 0, max: 5000, path: `${channel}.latencyUs`, help: 'Fixed time from trigger to spark; retards more the faster it turns.' },
]

export const maxPitches = 6

const pitchFields: FieldDef[] = Array.from({ length: maxPitches }, (_, i): FieldDef[] => [
  { name: `pitch.${i}.name`, label: `Pitch ${i + 1}, name`, kind: 'text', optional: true, maxLength: 40, path: 'propeller' },
  { name: `pitch.${i}.kw`, label: `Pitch ${i + 1}, power taken`, kind: 'number', quantity: 'power', min: 0.1, max: 1000, optional: true, path: 'propeller' },
  { name: `pitch.${i}.rpm`, label: `Pitch ${i + 1}, at a speed of`, kind: 'number', quantity: 'engineSpeed', min: 100, max: 12_000, optional: true, path: 'propeller' },
]).flat()

export const scenarioSections = [
  { id: 'general', title: 'Name and notes' },
  { id: 'primary', title: 'Primary channel' },
  { id: 'backup', title: 'Backup channel' },
  { id: 'distribution', title: 'How the sparks are shared out' },
  { id: 'torque', title: 'Best torque' },
  { id: 'propeller', title: 'Propeller and run-up' },
  { id: 'fuel', title: 'Fuel and detonation' },
  { id: 'place', title: 'Aeroplane and place' },
  { id: 'rotor', title: 'Rotor and plate' },
  { id: 'primaryCoil', title: 'Primary coil' },
  { id: 'backupCoil', title: 'Backup coil' },
  { id: 'plugs', title: 'Plugs' },
  { id: 'charge', title: 'Charge and burn' },
  { id: 'failures', title: 'Chances of failure' },
  { id: 'manifold', title: 'Manifold pressure' },
  { id: 'tolerances', title: 'Tolerances' },
] as const

export type ScenarioSection = (typeof scenarioSections)[number]['id']

export const scenarioFieldsBySection: Record<ScenarioSection, readonly FieldDef[]> = {
  general: [
    { name: 'title', label: 'Name', kind: 'text', maxLength: 120, path: 'title' },
    { name: 'notes', label: 'Notes', kind: 'longText', optional: true, maxLength: 4000, path: 'notes' },
  ],
  primary: channelFields('primary'),
  backup: channelFields('backup'),
  distribution: [
    {
      name: 'distribution', label: 'Sparks go through', kind: 'select',
      options: [{ value: 'sharedCap', label: 'one shared cap' }, { value: 'capEach', label: 'a cap each' }, { value: 'directCoils', label: 'direct coils' }],
    },
    { name: 'plugsPerCylinder', label: 'Plugs in a cylinder', kind: 'select', options: [{ value: '1', label: 'one' }, { value: '2', label: 'two' }] },
    { name: 'selection', label: 'Channels in use', kind: 'select', options: [{ value: 'oneAtATime', label: 'one selected at a time' }, { value: 'both', label: 'both run together' }] },
  ],
  torque: [
    angle('mbtDeg', 'Best-torque timing (MBT)', 0, 60, 'mbt', 'The least advance that gives the best torque at full throttle and full-power speed. Planned timing is usually short of it, because of detonation.'),
    { name: 'curvaturePerDeg2', label: 'Loss of torque per degree²', kind: 'number', quantity: 'curvature', min: 1e-5, max: 5e-3, path: 'mbt', help: 'Torque falls by this share times the square of the degrees from MBT. Published engines lie between 1.8e-4 and 4e-4.' },
    {
      name: 'mbtProvenance', label: 'Where it comes from', kind: 'select', path: 'mbt',
      options: [{ value: 'measured', label: 'measured' }, { value: 'handbook', label: 'a handbook' }, { value: 'guess', label: 'a guess' }],
    },
    { name: 'mbtNote', label: 'In words', kind: 'text', optional: true, maxLength: 200, path: 'mbt' },
  ],
  propeller: [
    { name: 'propellerKind', label: 'Propeller', kind: 'select', path: 'propeller', options: [{ value: 'fixedPitch', label: 'fixed or ground-set pitch' }, { value: 'constantSpeed', label: 'constant speed' }] },
    { ...speed('governedRpm', 'Governed speed', 500, 12_000, 'propeller', 'The speed the governor holds; the first pitch is the low stop, the second the high stop.'), optional: true },
    ...pitchFields,
    speed('runUpRpm', 'Run-up speed', 300, 6000, 'runUpRpm', 'Where the channels are tried one after the other before flight.'),
  ],
  manifold: [
    { name: 'manifold.idleKpa', label: 'at idle', kind: 'number', quantity: 'pressure', min: 10, max: 200, path: 'manifold' },
    { name: 'manifold.runUpKpa', label: 'at run-up', kind: 'number', quantity: 'pressure', min: 10, max: 200, path: 'manifold' },
    { name: 'manifold.fullKpa', label: 'at full throttle', kind: 'number', quantity: 'pressure', min: 20, max: 250, path: 'manifold' },
  ],
  rotor: [
    { name: 'rotor.terminalWidthDeg', label: 'Cap terminal, width', kind: 'number', quantity: 'distributorAngle', min: 0.5, max: 60, path: 'rotor', help: 'Angle the terminal covers, in distributor degrees.' },
    { name: 'rotor.rotorWidthDeg', label: 'Rotor tip, width', kind: 'number', quantity: 'distributorAngle', min: 0.5, max: 90, path: 'rotor', help: 'Angle the rotor tip covers, in distributor degrees.' },
    angle('rotor.phasedAtDeg', 'Rotor centred at an advance of', -20, 60, 'rotor', 'Crank advance at which the rotor points straight at its terminal.'),
    angle('rotor.backupPhasedAtDeg', 'Backup’s rotor centred at', -20, 60, 'rotor', 'Of the second rotor, when each channel has a cap.'),
    { name: 'rotor.sparkDurationMs', label: 'Spark lasts', kind: 'number', quantity: 'timeMs', min: 0, max: 5, path: 'rotor', help: 'The rotor turns on while the spark burns; 1 to 2 ms is usual for inductive ignition.' },
    { name: 'rotor.mechanicalCarriesRotor', label: 'Mechanical advance turns the rotor too', kind: 'check', path: 'rotor' },
    { name: 'rotor.plateRadiusMm', label: 'Trigger plate, radius', kind: 'number', quantity: 'length', min: 5, max: 200, optional: true, path: 'rotor', help: 'Where a stagger is measured on the plate in millimetres. Empty: not shown.' },
  ],
  tolerances: [
    { name: 'tolerances.timingCheckDeg', label: 'Timing check', kind: 'number', quantity: 'angle', min: 0.1, max: 5, path: 'tolerances', help: 'Handbooks say 1 to 2 degrees either way.' },
    { name: 'tolerances.benchDeg', label: 'Bench reading', kind: 'number', quantity: 'angle', min: 0.05, max: 5, path: 'tolerances' },
    { name: 'tolerances.markDeg', label: 'Reading a mark', kind: 'number', quantity: 'angle', min: 0, max: 5, path: 'tolerances', help: 'How far off a mark may be read by light, either way.' },
    { name: 'tolerances.scatterDeg', label: 'Scatter of the spark', kind: 'number', quantity: 'angle', min: 0, max: 5, path: 'tolerances', help: 'From spark to spark and cylinder to cylinder, one standard deviation.' },
  ],
  fuel: fuelFields,
  place: placeFields,
  primaryCoil: coilFields('primary'),
  backupCoil: coilFields('backup'),
  plugs: plugFields,
  charge: chargeFields,
  failures: redundancyFields,
}

export const scenarioFields: readonly FieldDef[] = scenarioSections.flatMap(({ id }) => scenarioFieldsBySection[id])
