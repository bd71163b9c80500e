import type { Firing } from '@/lib/calc/live'
import { formatNumber } from '@/lib/units'

const width = 328
const left = 10
const right = width - 14
const x = (deg: number) => Math.round((left + ((right - left) * deg) / 720) * 10) / 10
const degText = (deg: number) => formatNumber(deg, Number.isInteger(deg) ? 0 : 1)

/** The cycle unrolled: two turns of the crank, time to the right, each firing with its cylinder over it. */
export function FiringStrip({ firings }: { firings: readonly Firing[] }) {
  const sentence = `Firings over two turns of the crank: ${firings.map(({ cylinder, atDeg }) => `cylinder ${cylinder} at ${degText(atDeg)} degrees`).join(', ')}.`
  return (
    <svg className="drawing" width={width} height="66" viewBox={`0 0 ${width} 66`} role="img" aria-label={sentence}>
      <path className="g-axis" d={`M${left} 40H${right}`} />
      {Array.from({ length: 25 }, (_, i) => <line key={i} className="g-tick" x1={x(i * 30)} x2={x(i * 30)} y1="40" y2={i % 6 === 0 ? 47 : 44} />)}
      {[0, 180, 360, 540, 720].map((deg) => <text key={deg} className="s" x={x(deg)} y="61" textAnchor={deg === 0 ? 'start' : deg === 720 ? 'end' : 'middle'}>{deg}{deg === 720 ? '°' : ''}</text>)}
      {firings.map(({ cylinder, atDeg }) => (
        <g key={cylinder}>
          <line x1={x(atDeg)} x2={x(atDeg)} y1="24" y2="40" stroke="var(--ink)" strokeWidth="2" />
          <text className="k" x={x(atDeg)} y="18" textAnchor="middle">{cylinder}</text>
        </g>
      ))}
    </svg>
  )
}
