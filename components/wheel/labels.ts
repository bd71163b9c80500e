import { polar, radius, type Point, type Rotation, wheelAngle } from './geometry'
import type { WheelView } from './sizes'

export interface Box { left: number, right: number, top: number, bottom: number }

export interface SparkLabel {
  angleDeg: number
  chip: Point
  /** Where the number is written, and from which end. */
  text: Point
  anchor: 'start' | 'middle' | 'end'
  box: Box
}

export interface WheelLabels {
  a: SparkLabel | null
  b: SparkLabel | null
  tdc: Point
  /** Ring numbers that stay clear of the labels. */
  numbers: { text: string, at: Point }[]
}

const overlaps = (one: Box, other: Box) => one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom
const around = ({ x, y }: Point, halfWidth: number, halfHeight: number): Box => ({ left: x - halfWidth, right: x + halfWidth, top: y - halfHeight, bottom: y + halfHeight })

/** Width of a text of tabular figures, in units: a figure is half an em, points and signs less. */
export const textWidth = (text: string, font: number): number => [...text].reduce((sum, sign) => sum + (/[0-9A-Za-z−+]/.test(sign) ? 0.52 : 0.32), 0) * font

interface Placing { chip: Point, angleDeg: number, text: string, side: -1 | 1, view: WheelView, taken: Box[] }

/** The number goes to the outer side of its letter; where that leaves the drawing or meets something, above it, then below. */
function place({ chip, angleDeg, text, side, view, taken }: Placing): SparkLabel {
  const width = textWidth(text, view.font.label)
  const half = view.font.label * 0.36
  const gap = view.chip + 5
  const inView = (box: Box) => box.left >= view.left && box.right <= view.left + view.width && box.top >= view.top
  const beside = (to: -1 | 1) => {
    const x = chip.x + to * gap
    return { text: { x, y: chip.y + half }, anchor: to < 0 ? 'end' as const : 'start' as const, box: { left: to < 0 ? x - width : x, right: to < 0 ? x : x + width, top: chip.y - half, bottom: chip.y + half } }
  }
  const stacked = (to: -1 | 1) => {
    const x = Math.min(view.left + view.width - width / 2, Math.max(view.left + width / 2, chip.x))
    const y = chip.y + to * (view.chip + half + 3)
    return { text: { x, y: y + half }, anchor: 'middle' as const, box: around({ x, y }, width / 2, half) }
  }
  const tries = [beside(side), stacked(-1), stacked(1), beside(side === 1 ? -1 : 1)]
  const free = tries.find(({ box }) => inView(box) && !taken.some((other) => overlaps(box, other))) ?? tries.find(({ box }) => inView(box)) ?? beside(side)
  return { angleDeg, chip, ...free }
}

/** Spots for the letters TDC: over the top, then aside, so that sparks at the top keep theirs. */
function placeTdc(view: WheelView, taken: readonly Box[]): Point {
  const font = view.size === 'mini' ? view.font.small : view.font.medium
  const halfWidth = textWidth('TDC', font) / 2 + 2
  const y = view.size === 'mini' ? -168 : -172
  const spots = [0, 24, -24, 36, -36, 50, -50, 66, -66]
  const x = spots.find((spot) => !taken.some((box) => overlaps(box, around({ x: spot, y: y - font * 0.34 }, halfWidth, font * 0.34)))) ?? 0
  return { x, y }
}

const ringNumbers = [30, 60, 90, 120, 150].flatMap((value) => [value, -value]).concat(180)

interface LabelInput {
  rotation: Rotation
  primary: { deg: number, text: string } | null
  backup: { deg: number, text: string } | null
  view: WheelView
  /** Further boxes that must stay readable. */
  taken?: readonly Box[]
}

/** Where everything that moves with the sparks is written. A's letter stands nearer to the ring than B's, so that they never meet. */
export function placeLabels({ rotation, primary, backup, view, taken = [] }: LabelInput): WheelLabels {
  const angleA = primary && wheelAngle(rotation, primary.deg)
  const angleB = backup && wheelAngle(rotation, backup.deg)
  const chipA = angleA === null ? null : polar(angleA, radius.chipA)
  const chipB = angleB === null ? null : polar(angleB, radius.chipB)
  const boxOf = (chip: Point | null) => (chip ? [around(chip, view.chip, view.chip)] : [])
  const chips = [...boxOf(chipA), ...boxOf(chipB)]
  // The one further left writes to the left; alone, a spark writes away from the top.
  const aLeft = angleA === null ? false : angleB === null ? angleA <= 0 : angleA <= angleB
  const bLeft = angleB === null ? false : angleA === null ? angleB <= 0 : !aLeft
  const a = primary && chipA && angleA !== null ? place({ chip: chipA, angleDeg: angleA, text: primary.text, side: aLeft ? -1 : 1, view, taken: [...boxOf(chipB), ...taken] }) : null
  const b = backup && chipB && angleB !== null ? place({ chip: chipB, angleDeg: angleB, text: backup.text, side: bLeft ? -1 : 1, view, taken: [...boxOf(chipA), ...taken, ...(a ? [a.box] : [])] }) : null
  const marks = [...chips, ...(a ? [a.box] : []), ...(b ? [b.box] : []), ...taken]
  // B's ray crosses the circle of numbers on its way out.
  const rays = angleB === null ? [] : [around(polar(angleB, radius.numbers), 4, 8)]
  const tdc = placeTdc(view, [...marks, ...rays])
  const tdcBox = around({ x: tdc.x, y: tdc.y - 5 }, 18, 7)
  const numbers = view.size === 'mini' ? [] : ringNumbers.flatMap((value) => {
    const centre = polar(value, radius.numbers)
    const text = String(Math.abs(value))
    const box = around(centre, textWidth(text, view.font.small) / 2 + 1, view.font.small * 0.36)
    const inView = box.bottom + 2 <= view.top + view.height
    return inView && ![...marks, ...rays, tdcBox].some((other) => overlaps(box, other)) ? [{ text, at: { x: centre.x, y: Math.round((centre.y + view.font.small * 0.34) * 100) / 100 } }] : []
  })
  return { a, b, tdc, numbers }
}
