import type { FigureData } from '@/components/ui/figure-data'
import type { AdvanceChannel, SpeedMark } from './advance-curves'
import { degAt, jumpsOf } from './curve'
import type { Domain } from './scale'

const stepRpm = 100

/** The curves in numbers: each 100 rpm, the marked speeds by name, both sides of each jump. */
export function advanceTable(channels: readonly AdvanceChannel[], marks: readonly SpeedMark[], { from, to }: Domain): FigureData {
  const jumps = new Set(channels.flatMap(({ rising }) => jumpsOf(rising)))
  const grid = Array.from({ length: Math.floor((to - from) / stepRpm) + 1 }, (_, index) => from + index * stepRpm)
  const speeds = [...new Set([...grid, ...marks.map(({ rpm }) => rpm), ...jumps])].filter((rpm) => rpm >= from && rpm <= to).sort((one, other) => one - other)
  const nameOf = (rpm: number) => marks.filter((mark) => mark.rpm === rpm).map(({ label }) => label).join(', ')
  const below = ({ rising }: AdvanceChannel, rpm: number) => rising.find((point) => point.rpm === rpm)?.deg ?? degAt(rising, rpm)
  const rows = speeds.flatMap((rpm) => {
    const values = channels.map(({ rising }) => degAt(rising, rpm))
    // Before the curve begins there is nothing to show.
    if (values.every((value) => value === null)) return []
    const row = [rpm, nameOf(rpm), ...values]
    return jumps.has(rpm) ? [[rpm, 'from below', ...channels.map((channel) => below(channel, rpm))], [rpm, nameOf(rpm) || 'from above', ...values]] : [row]
  })
  return {
    caption: 'Advance of both channels against speed, degrees before top dead centre',
    columns: [{ head: 'Speed', unit: 'rpm' }, { head: 'Marked' }, ...channels.map(({ channel, name }) => ({ head: name, channel, unit: '°', decimals: 1 }))],
    rows,
  }
}
