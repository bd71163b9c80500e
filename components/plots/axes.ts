/** How every chart draws its frame: left and bottom lines, grid at the ticks, 13 px text. */
export const axisLine = { stroke: 'var(--line)', strokeWidth: 1 }
export const axisTick = { fontSize: 13, fill: 'var(--pencil)' }
export const grid = { stroke: 'var(--rule)', strokeWidth: 1 }

/** Line of each channel: colour and dash together, always. */
export const channelLine = {
  A: { stroke: 'var(--a)', strokeWidth: 2.5 },
  B: { stroke: 'var(--b)', strokeWidth: 2.5, strokeDasharray: '7 5' },
} as const

/** Nothing moves by itself, nothing follows the pointer. */
export const still = { isAnimationActive: false, dot: false, activeDot: false } as const
