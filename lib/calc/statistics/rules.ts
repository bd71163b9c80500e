import type { NumberRule } from '../validate/number'

export const probabilityRule: NumberRule = { name: 'The probability', unit: '', above: 0, below: 1 }
export const coverageRule: NumberRule = { name: 'The coverage', unit: '', above: 0, below: 1 }
/** Below a thousandth of a degree of freedom no quantile in use is a finite number. */
export const degreesOfFreedom = { unit: '', min: 0.001 } as const
