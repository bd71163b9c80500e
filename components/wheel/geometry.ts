/** Hand of rotation as the person with the timing light sees it, from the damper end. */
export type Rotation = 'clockwise' | 'anticlockwise'

export interface Point { x: number, y: number }

/** Radii in drawing units; the ring is the same in all sizes. */
export const radius = {
  face: 146,
  rim: 162,
  numbers: 175,
  rayInner: 74,
  rayA: 176,
  rayB: 196,
  chipA: 185,
  chipB: 205,
  stagger: 92,
} as const

const toRad = Math.PI / 180
const two = (value: number) => Math.round(value * 100) / 100

/** Angle from the top, degrees, growing clockwise on the screen. */
export function polar(angleDeg: number, r: number): Point {
  return { x: two(r * Math.sin(angleDeg * toRad)), y: two(-r * Math.cos(angleDeg * toRad)) }
}

/**
 * Where the crank points, as an angle from the top, when a cylinder whose top dead centre lies at `atDeg` of the turn fires
 * `advanceDeg` before it. The crank comes from the early side: for clockwise rotation early is left of the top, for anticlockwise right.
 */
export function wheelAngle(rotation: Rotation, advanceDeg: number, atDeg = 0): number {
  const side = rotation === 'clockwise' ? 1 : -1
  // Adding 0 turns a negative zero into zero.
  return side * (atDeg - advanceDeg) + 0
}

/** Path along a circle from one angle to another, the short way round unless the span is above 180°. */
export function arcPath(r: number, fromDeg: number, toDeg: number): string {
  const from = polar(fromDeg, r)
  const to = polar(toDeg, r)
  const sweep = toDeg >= fromDeg ? 1 : 0
  const large = Math.abs(toDeg - fromDeg) > 180 ? 1 : 0
  return `M${from.x} ${from.y}A${r} ${r} 0 ${large} ${sweep} ${to.x} ${to.y}`
}

const tick = (angleDeg: number, length: number) => {
  const inner = polar(angleDeg, radius.face)
  const outer = polar(angleDeg, radius.face + length)
  return `M${inner.x} ${inner.y}L${outer.x} ${outer.y}`
}

const everyTwo = Array.from({ length: 180 }, (_, index) => index * 2)
/** Each 2°, longer each 10°; the ones at 30° are drawn apart, in ink. */
export const tickPath = everyTwo.filter((angle) => angle % 30 !== 0).map((angle) => tick(angle, angle % 10 === 0 ? 10 : 4)).join('')
export const inkTickPath = everyTwo.filter((angle) => angle % 30 === 0).map((angle) => tick(angle, radius.rim - radius.face)).join('')

/** The arrow of rotation: an arc and its head, on the circle r, ending at `toDeg`. */
export function arrow(r: number, fromDeg: number, toDeg: number): { arc: string, head: string } {
  const side = toDeg >= fromDeg ? 1 : -1
  const base = toDeg - side * 6.4
  const tip = polar(toDeg, r)
  const inner = polar(base, r - 6)
  const outer = polar(base, r + 6)
  return { arc: arcPath(r, fromDeg, base + side), head: `M${tip.x} ${tip.y}L${inner.x} ${inner.y}L${outer.x} ${outer.y}Z` }
}
