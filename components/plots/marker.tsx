import type { ChannelLetter } from '@/components/ui/channel-chip'

interface MarkerProps {
  channel: ChannelLetter
  cx?: number
  cy?: number
  /** The chosen point is full, all others hollow. */
  full?: boolean
}

/** A is a circle, B a square. */
export function Marker({ channel, cx = 0, cy = 0, full = false }: MarkerProps) {
  const colour = channel === 'A' ? 'var(--a)' : 'var(--b)'
  const fill = full ? colour : 'var(--paper)'
  const half = full ? 5.5 : 4.5
  if (channel === 'A') return <circle cx={cx} cy={cy} r={half + 0.5} fill={fill} stroke={colour} strokeWidth="2" />
  return <rect x={cx - half} y={cy - half} width={half * 2} height={half * 2} fill={fill} stroke={colour} strokeWidth="2" />
}
