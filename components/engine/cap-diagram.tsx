import type { EngineDrawing } from '@/lib/engine/engine-facts'

type Cap = NonNullable<EngineDrawing['cap']>

const size = 232
const centre = size / 2
const rim = 92
const terminalAt = 74
const labelAt = 104

/** Degrees clockwise from the top, as pixels. */
const at = (deg: number, radius: number) => {
  const rad = (deg * Math.PI) / 180
  return { x: Math.round((centre + radius * Math.sin(rad)) * 10) / 10, y: Math.round((centre - radius * Math.cos(rad)) * 10) / 10 }
}

/** Arc of the rotor's arrow, from one angle to another, degrees clockwise from the top. */
function arrow(rotation: Cap['rotation']) {
  const [from, to] = rotation === 'clockwise' ? [-50, 50] : [50, -50]
  const start = at(from, 40)
  const end = at(to, 40)
  const back = to + (rotation === 'clockwise' ? -16 : 16)
  const [outer, inner] = [at(back, 46), at(back, 34)]
  return { path: `M${start.x} ${start.y}A40 40 0 0 ${rotation === 'clockwise' ? 1 : 0} ${end.x} ${end.y}`, head: `M${end.x} ${end.y}L${outer.x} ${outer.y}L${inner.x} ${inner.y}Z` }
}

/** The cap from above: a terminal for each cylinder, the first of the list on top, and which way the rotor turns inside. */
export function CapDiagram({ cap }: { cap: Cap }) {
  const { terminals, rotation, met, inOrder } = cap
  const step = 360 / terminals.length
  const { path, head } = arrow(rotation)
  const sentence = `Distributor cap from above: terminals clockwise ${terminals.join(', ')}; the rotor turns ${rotation} and meets ${met.join(', ')}${inOrder ? ', the firing order' : ', which is not the firing order'}.`
  return (
    <svg className="drawing" width={size} height={size} viewBox={`0 0 ${size} ${size}`} role="img" aria-label={sentence}>
      <circle cx={centre} cy={centre} r={rim} fill="var(--sheet)" className="g-axis" style={{ fill: 'var(--sheet)' }} />
      {terminals.map((cylinder, i) => {
        const hole = at(i * step, terminalAt)
        const label = at(i * step, labelAt)
        return (
          <g key={cylinder}>
            <circle cx={hole.x} cy={hole.y} r="7" fill="var(--paper)" stroke="var(--ink)" strokeWidth="1.5" />
            <text className="k" x={label.x} y={label.y + 5} textAnchor="middle">{cylinder}</text>
          </g>
        )
      })}
      <path className="g-ink" d={path} />
      <path d={head} fill="var(--ink)" />
      <circle cx={centre} cy={centre} r="3" fill="var(--ink)" />
      <text className="s" x={centre} y={centre + 26} textAnchor="middle">from above</text>
    </svg>
  )
}
