import type { FieldDef } from './field'

const rotations = [
  { value: 'clockwise', label: 'clockwise' },
  { value: 'anticlockwise', label: 'anticlockwise' },
] as const

const speed = (name: string, label: string, min: number, max: number, help: string): FieldDef =>
  ({ name, label, kind: 'number', quantity: 'engineSpeed', min, max, help })

export const engineSections = [
  { id: 'identity', title: 'Name' },
  { id: 'layout', title: 'Cylinders and firing order' },
  { id: 'geometry', title: 'Geometry' },
  { id: 'power', title: 'Power and friction' },
  { id: 'speeds', title: 'Operating speeds' },
  { id: 'marks', title: 'Damper and rotation' },
  { id: 'cap', title: 'Distributor' },
] as const

export type EngineSection = (typeof engineSections)[number]['id']

export const engineFieldsBySection: Record<EngineSection, readonly FieldDef[]> = {
  identity: [
    { name: 'name', label: 'Name', kind: 'text', maxLength: 80, help: 'What the shop calls it, for example “Flat six 2.6 litres”.' },
    { name: 'code', label: 'Short code', kind: 'text', maxLength: 12, help: 'Letters and digits; scenarios of this engine are numbered after it, for example J260-04.' },
  ],
  layout: [
    { name: 'cylinders', label: 'Cylinders', kind: 'number', quantity: 'count', integer: true, min: 1, max: 12 },
    { name: 'firingOrder', label: 'Firing order', kind: 'list', help: 'Each cylinder once, for example 1 4 5 2 3 6.' },
    { name: 'intervalsDeg', label: 'Firing intervals', kind: 'list', optional: true, help: 'Crank degrees from each firing to the next, adding up to 720. Leave empty for even firing.' },
  ],
  geometry: [
    { name: 'boreMm', label: 'Bore', kind: 'number', quantity: 'boreLength', min: 20, max: 300 },
    { name: 'strokeMm', label: 'Stroke', kind: 'number', quantity: 'boreLength', min: 20, max: 300 },
    { name: 'rodMm', label: 'Connecting rod, centre to centre', kind: 'number', quantity: 'boreLength', min: 30, max: 600 },
    { name: 'compressionRatio', label: 'Compression ratio', kind: 'number', quantity: 'ratio', min: 3, max: 20 },
  ],
  power: [
    { name: 'ratedPowerKw', label: 'Rated power', kind: 'number', quantity: 'power', min: 0.5, max: 1000, help: 'Brake power at full throttle, standard sea level.' },
    speed('ratedRpm', 'at a speed of', 500, 12_000, 'Speed at which the rated power is made.'),
    { name: 'powerTimingDeg', label: 'measured with timing at', kind: 'number', quantity: 'angle', min: -10, max: 60, help: 'Ignition advance that was set when the power was measured. It is the planned timing more often than best-torque timing.' },
    {
      name: 'powerCurve', label: 'Power curve', kind: 'table', optional: true,
      columns: [{ kind: 'engineSpeed', label: 'speed' }, { kind: 'power', label: 'power' }],
      help: 'Full-throttle power, one speed a line, rising. Paste two columns of a spreadsheet. Empty: constant torque through the rated power is assumed, and said.',
    },
    {
      name: 'frictionKind', label: 'Friction given as', kind: 'select',
      options: [{ value: 'efficiency', label: 'mechanical efficiency' }, { value: 'power', label: 'friction power' }],
    },
    { name: 'mechanicalEfficiency', label: 'Mechanical efficiency at rated power', kind: 'number', quantity: 'ratio', min: 0.3, max: 1, help: 'Brake over indicated power, from a cut-out (Morse) test where there is one; published tests give 0.74 to 0.85.' },
    { name: 'frictionPowerKw', label: 'Friction power at rated speed', kind: 'number', quantity: 'power', min: 0, max: 500 },
  ],
  speeds: [
    speed('crankingSlowestRpm', 'Cranking, slowest', 20, 1000, 'On a cold morning with a weak battery.'),
    speed('crankingRpm', 'Cranking, usual', 20, 1000, 'With a good battery, oil warm.'),
    speed('crankingFastestRpm', 'Cranking, fastest', 20, 1500, 'Plugs fitted, hot engine, fresh battery.'),
    speed('idleSlowestRpm', 'Idle, slowest', 200, 3000, 'The slowest idle it will hold.'),
    speed('idleRpm', 'Idle, usual', 200, 3000, 'Where a timing light is used on the ground.'),
    speed('maxRpm', 'Full power', 500, 12_000, 'The speed of take-off or climb at full throttle; full timing is judged here.'),
  ],
  marks: [
    { name: 'damperDiameterMm', label: 'Diameter that carries the marks', kind: 'number', quantity: 'length', min: 20, max: 800, help: 'Damper, pulley or flywheel: where the degree marks are read.' },
    { name: 'damperEnd', label: 'It sits at', kind: 'select', options: [{ value: 'propeller', label: 'the propeller end' }, { value: 'accessory', label: 'the end away from the propeller' }] },
    { name: 'crankRotation', label: 'Crank turns, seen from that end', kind: 'select', options: rotations },
  ],
  cap: [
    { name: 'distributorRotation', label: 'Rotor turns, seen from above', kind: 'select', options: rotations },
    { name: 'capTerminals', label: 'Cap terminals, clockwise from above', kind: 'list', help: 'The cylinder whose lead sits in each terminal, counted clockwise looking down on the cap, starting anywhere.' },
  ],
}

export const engineFields: readonly FieldDef[] = engineSections.flatMap(({ id }) => engineFieldsBySection[id])
