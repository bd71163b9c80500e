import type { FieldDef } from './field'
import { numberField, optionalField } from './field-lines'

const octaneRange = [50, 130] as const
/** Above and below these the model of the cycle is asked nothing. */
const chargeRange = [250, 500] as const

/** What it burns, the worse day it is judged at, and a setting that is known to run clean. */
export const fuelFields: readonly FieldDef[] = [
  {
    name: 'fuel.scale', label: 'Octane on the scale', kind: 'select', path: 'fuel', help: 'Planned and worse fuel stand on one scale: none is converted into another.',
    options: [
      { value: 'ron', label: 'RON, research' }, { value: 'mon', label: 'MON, motor' },
      { value: 'aki', label: '(R+M)/2, at the pump' }, { value: 'lean', label: 'lean rating of aviation fuel' },
    ],
  },
  numberField('fuel.octane', 'Planned fuel', 'octane', octaneRange, 'Octane number of the fuel it is laid out for.', { path: 'fuel' }),
  numberField('fuel.worseOctane', 'Worse fuel', 'octane', octaneRange, 'The poorest fuel it may be given away from home; detonation is judged with it.', { path: 'fuel' }),
  numberField('worse.hotterK', 'Charge hotter by', 'temperatureDifference', [0, 80], 'A hot day or an overheated engine: how much hotter the charge is at inlet closing.'),
  numberField('worse.denserKpa', 'Charge denser by', 'pressure', [0, 50], 'A low field on a day of high pressure: how much more pressure the charge has at inlet closing.'),
  optionalField('reference.sparkDeg', 'Runs clean at', 'angle', [-20, 60], 'A timing this engine is known to run without detonation at full throttle. Leave all four empty where none is known.', { path: 'reference' }),
  optionalField('reference.rpm', 'known at a speed of', 'engineSpeed', [300, 12_000], 'Full throttle, between idle and full power.', { path: 'reference' }),
  optionalField('reference.octane', 'known with octane', 'octane', octaneRange, 'On the scale chosen above.', { path: 'reference' }),
  optionalField('reference.marginDeg', 'known to be short by', 'angle', [0, 40], 'Degrees it could still be advanced before it detonates; 0 when nothing better is known.', { path: 'reference' }),
]

/** The closed cycle at full throttle. */
export const chargeFields: readonly FieldDef[] = [
  numberField('cycle.ivcDeg', 'Inlet valve closes', 'angle', [-179, -60], 'Crank degrees from top dead centre of firing, negative before it: closing 58° after bottom is −122.'),
  numberField('cycle.evoDeg', 'Exhaust valve opens', 'angle', [60, 179], 'Crank degrees after top dead centre of firing: opening 64° before bottom is 116.'),
  numberField('cycle.chargeK', 'Charge, at inlet closing', 'temperature', chargeRange, 'Hotter than the air outside: it was heated by the inlet and mixed with what was left of the last charge. About 100 °C in an air-cooled engine.'),
  numberField('cycle.residualFraction', 'Left of the last charge', 'ratio', [0, 0.4], 'Share of the charge that is burned gas; 0.04 to 0.08 at full throttle.'),
  numberField('cycle.airFuelRatio', 'Air to fuel', 'ratio', [8, 20], 'By mass; best power lies near 12.5 to 13, a complete burn at 14.6.'),
  optionalField('cycle.volumetricEfficiency', 'Volumetric efficiency', 'ratio', [0.2, 2], 'Air taken in over what the displacement holds of standard air. Empty: the charge is solved from the power, so that the two belong together.'),
  numberField('cycle.delayShare', 'Spark to flame, share', 'ratio', [0, 0.5], 'Part of the time from spark to the end of the burn in which nothing burns yet. The rest follows from best-torque timing.'),
  numberField('cycle.wallK', 'Walls', 'temperature', [300, 700], 'Mean of head, piston and cylinder where the gas touches them.'),
  numberField('cycle.headAreaFactor', 'Area of the head', 'ratio', [0.5, 3], 'Over the area of the bore: 1 for a flat chamber, more for a deep one.'),
]
