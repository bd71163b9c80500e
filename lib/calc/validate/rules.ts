import type { NumberRule } from './number'

/** Rules that several topics share. Those of one function stand beside it. */
export const anyAngle: NumberRule = { name: 'The angle', unit: 'deg' }
export const anySpeed: NumberRule = { name: 'The engine speed', unit: 'rpm', min: 0 }
/** Where the speed divides, a stopped engine has no answer. */
export const turningSpeed: NumberRule = { name: 'The engine speed', unit: 'rpm', above: 0 }
export const manifoldPressure: NumberRule = { name: 'The manifold pressure', unit: 'kPa', above: 0 }
export const cylinderCount: NumberRule = { name: 'The number of cylinders', unit: '', min: 1, integer: true }
