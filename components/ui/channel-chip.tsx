export type ChannelLetter = 'A' | 'B'

/** A in a full disc, B in a dashed square: colour, shape, letter at once. `spoken` adds "primary" or "backup" for readers where no word stands beside it. */
export function ChannelChip({ channel, spoken = false }: { channel: ChannelLetter, spoken?: boolean }) {
  return <span className={`chip ${channel === 'A' ? 'a' : 'b'}`}>{channel}{spoken ? <span className="sr"> {channel === 'A' ? 'primary' : 'backup'}</span> : null}</span>
}
