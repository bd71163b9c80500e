export type WheelSize = 'full' | 'crop' | 'mini'

export interface WheelView {
  size: WheelSize
  left: number
  top: number
  width: number
  height: number
  /** Type sizes in drawing units: at least 13 px on the screen at this width. */
  font: { small: number, medium: number, letter: number, label: number, centre: number }
  /** Half the width of a channel's letter box. */
  chip: number
}

const boxes = {
  full: { left: -196, top: -216, width: 392, height: 404 },
  crop: { left: -186, top: -216, width: 372, height: 290 },
  mini: { left: -186, top: -216, width: 372, height: 290 },
} as const

/** Full from 340 px; on phones and below it the lower half is left out; below 300 few words in larger type. */
export const sizeFor = (widthPx: number, phone = false): WheelSize => (widthPx < 300 ? 'mini' : phone || widthPx < 340 ? 'crop' : 'full')

/** The drawing for a width: units a pixel decide the type, so that it never falls below 13 px. */
export function wheelView(size: WheelSize, widthPx: number): WheelView {
  const box = boxes[size]
  const unitsPerPx = box.width / widthPx
  const atLeast = (px: number, units: number) => Math.round(Math.max(px * unitsPerPx, units) * 10) / 10
  const mini = size === 'mini'
  return {
    size,
    ...box,
    font: {
      small: atLeast(size === 'crop' ? 14 : 13, 13),
      medium: atLeast(14, 14),
      letter: atLeast(12, 14),
      label: mini ? atLeast(16, 27) : atLeast(16, 19),
      centre: mini ? 50 : 38,
    },
    chip: mini ? 14 : 10.5,
  }
}
