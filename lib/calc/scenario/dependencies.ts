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
}

const touches = (input: string, changed: string) => changed === input || changed.startsWith(`${input}.`) || input.startsWith(`${changed}.`)

/** Parts that stand on any of the named inputs (`primary.schedule`, `rotor`, …). */
export function partsStandingOn(inputs: readonly string[]): Set<PartName> {
  return new Set((Object.keys(inputsOfPart) as PartName[]).filter((name) => inputs.some((changed) => inputsOfPart[name].some((input) => touches(input, changed)))))
}
