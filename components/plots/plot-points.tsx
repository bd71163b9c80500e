import type { ChannelLetter } from '@/components/ui/channel-chip'
import { lies, meets, type Box } from './label-room'
import { Marker } from './marker'

export interface PlotPlace {
  name: string
  /** On the drawing, px. */
  x: number
  y: number
  /** What each channel has there, already in words. */
  marks: readonly { channel: ChannelLetter, text: string }[]
}

export interface PlacedPlace extends PlotPlace {
  box: Box
  anchor: 'start' | 'end'
}

const letterPx = 7
const rowPx = 17
const gapPx = 21

const boxesOf = (place: PlotPlace): { box: Box, anchor: 'start' | 'end' }[] => {
  const width = Math.max(place.name.length * letterPx, ...place.marks.map(({ text }) => (text.length + 2) * letterPx + 6))
  const height = rowPx * (place.marks.length + 1)
  const aside = [place.y - height / 2, place.y - height - 2, place.y + 2]
  return aside.flatMap((y) => [
    { box: { x: place.x - gapPx - width, y, width, height }, anchor: 'end' as const },
    { box: { x: place.x + gapPx, y, width, height }, anchor: 'start' as const },
  ])
}

/** Room a point takes itself, with its markers side by side. */
export const pointBox = ({ x, y, marks }: PlotPlace): Box => ({ x: x - 7 * marks.length - 2, y: y - 9, width: 14 * marks.length + 4, height: 18 })

/** Words beside each point, clear of the other points and their words, inside the frame; the first that fits, or the first of all. */
export function placeNotes(places: readonly PlotPlace[], frame: Box): PlacedPlace[] {
  const taken = places.map(pointBox)
  return places.map((place) => {
    const choices = boxesOf(place)
    const fits = choices.find(({ box }) => lies(box, frame) && !taken.some((other) => meets(box, other))) ?? choices.find(({ box }) => lies(box, frame)) ?? choices[0]
    const { box, anchor } = fits ?? { box: pointBox(place), anchor: 'start' as const }
    taken.push(box)
    return { ...place, box, anchor }
  })
}

/** Points where both channels may stand: the circle of A and the square of B side by side, what each has in a line with its letter. */
export function PlotPoints({ places }: { places: readonly PlacedPlace[] }) {
  return places.map(({ name, x, y, marks, box, anchor }) => {
    const textX = anchor === 'end' ? box.x + box.width : box.x
    return (
      <g key={`${name} ${x} ${y}`}>
        {marks.map(({ channel }, k) => <Marker key={channel} channel={channel} cx={x + (k - (marks.length - 1) / 2) * 13} cy={y} full />)}
        <text className="s halo" x={textX} y={box.y + 13} textAnchor={anchor}>{name}</text>
        {marks.map(({ channel, text }, k) => <text key={channel} className={`k halo ch-${channel.toLowerCase()}`} x={textX} y={box.y + 13 + rowPx * (k + 1)} textAnchor={anchor}>{channel} {text}</text>)}
      </g>
    )
  })
}
