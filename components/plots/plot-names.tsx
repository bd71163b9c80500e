import { memo } from 'react'
import type { PlotSeries } from './line-curves'
import { xPixel, yPixel, type Domain, type PlotArea } from './scale'

export interface PlotLevel { y: number, label: string }

interface PlotNamesProps {
  area: PlotArea
  series: readonly PlotSeries[]
  xDomain: Domain
  yDomain: Domain
  levels: readonly PlotLevel[]
}

const rowPx = 17
/** Room a level's name takes along its line, px. */
const levelRoom = 110

/** The end of a level's line at which the curves stay further away from its name. */
function clearerEnd({ area, series, xDomain, yDomain }: Omit<PlotNamesProps, 'levels'>, levelY: number): 'start' | 'end' {
  const nearest = (fromX: number, toX: number) => Math.min(...series.flatMap(({ points }) => points.flatMap(({ x, y }) => {
    const at = xPixel(area, xDomain, x)
    return y === null || at < fromX || at > toX ? [] : [Math.abs(yPixel(area, yDomain, y) - (levelY - 9))]
  })), 1000)
  const left = area.left
  const right = area.width - area.right
  return nearest(right - levelRoom, right) > nearest(left, left + levelRoom) ? 'end' : 'start'
}

/** Names at the right ends of the lines; a level's name stands over its line. */
export const PlotNames = memo(function PlotNames({ area, series, xDomain, yDomain, levels }: PlotNamesProps) {
  const right = area.width - area.right - 2
  const ends = series.flatMap(({ name, look, points }) => {
    const last = points.findLast(({ x, y }) => y !== null && x <= xDomain.to)
    return last?.y === null || last?.y === undefined ? [] : [{ name, look, y: yPixel(area, yDomain, last.y), x: Math.min(right, xPixel(area, xDomain, last.x)) }]
  }).sort((one, other) => one.y - other.y)
  // The highest line has its name over it where there is room, the lowest of several under it, the ones between wherever they do not meet.
  const placed: typeof ends = []
  ends.forEach((end, index) => {
    const over = end.y - 8
    const under = end.y + 18
    const last = index > 0 && index === ends.length - 1
    const first = last || over - 10 < area.top - 8 ? under : over
    const previous = placed[index - 1]
    const y = previous && first - previous.y < rowPx ? previous.y + rowPx : first
    placed.push({ ...end, y })
  })
  return (
    <>
      {levels.map(({ y, label }) => {
        const levelY = yPixel(area, yDomain, y)
        const anchor = clearerEnd({ area, series, xDomain, yDomain }, levelY)
        return <text key={label} className="s halo" x={anchor === 'start' ? area.left + 6 : right} y={levelY - 5} textAnchor={anchor}>{label}</text>
      })}
      {placed.map(({ name, look, x, y }) => <text key={name} className={`k halo${look === 'A' || look === 'B' ? ` ch-${look.toLowerCase()}` : ''}`} x={x} y={y} textAnchor="end">{name}</text>)}
    </>
  )
})
