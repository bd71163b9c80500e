import type { Rotation } from '../calc/live'

/** Cylinder at each terminal, clockwise from above, when the rotor of this rotation serves them in firing order. */
export const capFromOrder = (firingOrder: readonly number[], rotation: Rotation): number[] => {
  const [first = 0, ...others] = firingOrder
  return rotation === 'clockwise' ? [...firingOrder] : [first, ...others.reverse()]
}

/** Cylinders as the rotor meets them, from the first of the firing order on. */
export function metByRotor(capTerminals: readonly number[], rotation: Rotation, first: number): number[] {
  const start = Math.max(0, capTerminals.indexOf(first))
  const turned = [...capTerminals.slice(start), ...capTerminals.slice(0, start)]
  return capFromOrder(turned, rotation)
}
