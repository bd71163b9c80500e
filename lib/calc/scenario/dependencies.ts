import type { PartName } from './result-types'

/** Inputs each part stands on, by path prefix: while one of them is half typed, that part keeps its last valid figures. */
const inputsOfPart: Record<PartName, readonly string[]> = {
  speeds: ['primary', 'backup', 'runUpRpm', 'manifold'],
  curves: ['primary', 'backup', 'manifold.fullKpa'],
  stagger: ['primary', 'backup', 'manifold.fullKpa', 'rotor.plateRadiusMm'],
  power: ['primary', 'backup', 'mbt', 'plugsPerCylinder', 'manifold.fullKpa'],
  deadCylinders: ['primary', 'backup', 'mbt', 'plugsPerCylinder', 'manifold.fullKpa'],
  runUp: ['primary', 'backup', 'mbt', 'plugsPerCylinder', 'selection', 'propeller', 'runUpRpm', 'manifold'],
  propeller: ['primary', 'backup', 'mbt', 'plugsPerCylinder', 'propeller', 'manifold.fullKpa'],
  register: ['primary', 'backup', 'rotor', 'distribution', 'manifold', 'runUpRpm'],
  leads: ['distribution'],
  proof: ['primary', 'backup', 'tolerances.timingCheckDeg', 'manifold'],
  marks: [],
  coils: ['coils', 'distribution', 'rotor.sparkDurationMs'],
  climb: ['primary', 'backup', 'mbt', 'plugsPerCylinder', 'propeller', 'manifold.fullKpa', 'airframe', 'conditions'],
  redundancy: ['redundancy', 'distribution', 'selection'],
  stack: ['tolerances'],
  charge: ['mbt', 'plugsPerCylinder', 'cycle', 'primary', 'manifold.fullKpa', 'propeller'],
  detonation: ['primary', 'backup', 'mbt', 'plugsPerCylinder', 'cycle', 'fuel', 'worse', 'reference', 'conditions', 'manifold.fullKpa', 'propeller'],
  pressure: ['primary', 'backup', 'mbt', 'plugsPerCylinder', 'cycle', 'manifold.fullKpa', 'propeller'],
  spark: ['primary', 'backup', 'mbt', 'plugsPerCylinder', 'cycle', 'coils', 'plugGapMm', 'worse', 'manifold.fullKpa', 'propeller'],
}

const touches = (input: string, changed: string) => changed === input || changed.startsWith(`${input}.`) || input.startsWith(`${changed}.`)

/** Parts that stand on any of the named inputs (`primary.schedule`, `rotor`, …). */
export function partsStandingOn(inputs: readonly string[]): Set<PartName> {
  return new Set((Object.keys(inputsOfPart) as PartName[]).filter((name) => inputs.some((changed) => inputsOfPart[name].some((input) => touches(input, changed)))))
}
