import type { PlotXY } from './contour-lines'

/** A rectangle on the drawing, px from the top left. */
export interface Box {
  x: number
  y: number
  width: number
  height: number
}

export const meets = (one: Box, other: Box): boolean =>
  one.x < other.x + other.width && other.x < one.x + one.width && one.y < other.y + other.height && other.y < one.y + one.height

export const lies = (box: Box, within: Box): boolean =>
  box.x >= within.x && box.y >= within.y && box.x + box.width <= within.x + within.width && box.y + box.height <= within.y + within.height

/** Widths are taken from the count of letters: a drawing made on a server cannot measure them. */
export const textBox = (text: string, centre: PlotXY, letterPx = 7.6, height = 17): Box => {
  const width = text.length * letterPx + 4
  return { x: centre.x - width / 2, y: centre.y - height / 2, width, height }
}

export interface PlacedLabel extends PlotXY {
  text: string
}

/** Points along a line, this far apart. */
const stepPx = 9
/** A shorter line is not worth a label of its own. */
const shortestPx = 46

const distance = (one: PlotXY, other: PlotXY) => Math.hypot(one.x - other.x, one.y - other.y)

export const lengthOf = (points: readonly PlotXY[]): number => points.slice(1).reduce((sum, point, k) => sum + distance(points[k] ?? point, point), 0)

/** Places on a line from its middle outwards, both ends left free. */
function spotsOn(points: readonly PlotXY[]): PlotXY[] {
  const lengths = points.slice(1).map((point, k) => distance(points[k] ?? point, point))
  const whole = lengthOf(points)
  if (whole < shortestPx) return []
  const at = (way: number): PlotXY => {
    let left = way
    for (const [k, length] of lengths.entries()) {
      const from = points[k]
      const to = points[k + 1]
      if (from && to && left <= length) return { x: from.x + ((to.x - from.x) * left) / (length || 1), y: from.y + ((to.y - from.y) * left) / (length || 1) }
      left -= length
    }
    return points.at(-1) ?? { x: 0, y: 0 }
  }
  const count = Math.floor((whole / 2 - shortestPx / 3) / stepPx)
  return Array.from({ length: 2 * count + 1 }, (_, k) => at(whole / 2 + (k % 2 === 0 ? 1 : -1) * Math.ceil(k / 2) * stepPx))
}

/** A label on each line that has room for one, clear of each other and of what is there already. */
export function placeLabels(lines: readonly { text: string, points: readonly PlotXY[] }[], taken: readonly Box[], frame: Box): PlacedLabel[] {
  const boxes = [...taken]
  return lines.flatMap(({ text, points }) => {
    for (const spot of spotsOn(points)) {
      const box = textBox(text, spot)
      if (!lies(box, frame) || boxes.some((other) => meets(box, other))) continue
      boxes.push(box)
      return [{ text, ...spot }]
    }
    return []
  })
}
