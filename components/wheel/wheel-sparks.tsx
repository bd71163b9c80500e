import { arcPath, polar, radius, wheelAngle, type Rotation } from './geometry'
import type { CylinderGroup } from './cylinders'
import type { SparkLabel } from './labels'
import type { WheelView } from './sizes'

const ray = (angleDeg: number, inner: number, outer: number) => {
  const from = polar(angleDeg, inner)
  const to = polar(angleDeg, outer)
  return { x1: from.x, y1: from.y, x2: to.x, y2: to.y }
}

/** A's ray and letter: solid, disc. */
export function RayA({ label, text, view }: { label: SparkLabel, text: string, view: WheelView }) {
  return (
    <g data-channel="A">
      <line className="g-a" {...ray(label.angleDeg, radius.rayInner, radius.rayA)} style={{ strokeWidth: 3 }} />
      <circle cx={label.chip.x} cy={label.chip.y} r={view.chip + 0.5} fill="var(--a)" />
      <text x={label.chip.x} y={label.chip.y + view.font.letter * 0.35} textAnchor="middle" style={{ fill: 'var(--on-ink)', fontWeight: 700, fontSize: view.font.letter }}>A</text>
      <text className="ch-a halo" x={label.text.x} y={label.text.y} textAnchor={label.anchor} style={{ fontSize: view.font.label, fontWeight: 600 }}>{text}</text>
    </g>
  )
}

/** B's ray and letter: dashed, square. */
export function RayB({ label, text, view }: { label: SparkLabel, text: string, view: WheelView }) {
  const side = view.chip * 2 - 1
  return (
    <g data-channel="B">
      <line className="g-b" {...ray(label.angleDeg, radius.rayInner, radius.rayB)} style={{ strokeWidth: 3 }} />
      <rect x={label.chip.x - side / 2} y={label.chip.y - side / 2} width={side} height={side} fill="var(--paper)" stroke="var(--b)" strokeWidth="2" strokeDasharray="4 3" />
      <text className="ch-b" x={label.chip.x} y={label.chip.y + view.font.letter * 0.35} textAnchor="middle" style={{ fontWeight: 700, fontSize: view.font.letter }}>B</text>
      <text className="ch-b halo" x={label.text.x} y={label.text.y} textAnchor={label.anchor} style={{ fontSize: view.font.label, fontWeight: 600 }}>{text}</text>
    </g>
  )
}

/** The angle between the two sparks, and a line from it to the number in the middle. */
export function StaggerArc({ fromDeg, toDeg, leaderTo }: { fromDeg: number, toDeg: number, leaderTo: number }) {
  const middle = (fromDeg + toDeg) / 2
  const start = polar(middle, radius.stagger - 3)
  return (
    <>
      <path d={arcPath(radius.stagger, fromDeg, toDeg)} fill="none" stroke="var(--ink)" strokeWidth="6" />
      <path className="g-thin" d={`M${start.x} ${start.y}L0 ${leaderTo}`} />
    </>
  )
}

interface OthersProps {
  groups: readonly CylinderGroup[]
  primaryDeg: number | null
  backupDeg: number | null
  rotation: Rotation
  view: WheelView
  low: boolean
}

/** The bottom of the face belongs to the arrow and its words: names of cylinders stay this far from it, degrees. */
const footClear = 38

/** The other cylinders: short ticks of both channels where the crank stands when they fire. */
export function OtherCylinders({ groups, primaryDeg, backupDeg, rotation, view, low }: OthersProps) {
  return groups.filter(({ atDeg }) => atDeg !== 0).map(({ label, atDeg }) => {
    const angles = [primaryDeg, backupDeg].map((deg) => (deg === null ? null : wheelAngle(rotation, deg, atDeg)))
    const [a = null, b = null] = angles
    const known = angles.filter((angle): angle is number => angle !== null)
    if (known.length === 0) return null
    const mean = known.reduce((sum, angle) => sum + angle, 0) / known.length
    const turned = ((mean % 360) + 360) % 360
    const fromFoot = turned - 180
    const nudged = !low && view.size === 'full' && Math.abs(fromFoot) < footClear ? 180 + (fromFoot < 0 ? -footClear : footClear) : turned
    const at = polar(nudged, low ? 120 : 112)
    const inView = at.y + 8 < view.top + view.height
    // In the cropped drawing the arrow stands on the early side.
    const onArrow = view.size === 'crop' && at.y > -45 && (rotation === 'clockwise' ? at.x < -60 : at.x > 60)
    return (
      <g key={label} data-cylinder={label}>
        {a === null ? null : <line className="g-a" {...ray(a, radius.face, radius.rim)} />}
        {b === null ? null : <line className="g-b" {...ray(b, radius.face, radius.rim)} style={{ strokeDasharray: '4 3' }} />}
        {view.size === 'mini' || !inView || onArrow ? null : <text className="m" style={{ fontSize: view.font.medium }} x={at.x} y={Math.round((at.y + view.font.medium * 0.34) * 100) / 100} textAnchor="middle">cyl {label}</text>}
      </g>
    )
  })
}

/** The cylinders the rays belong to, named beside the earlier ray. */
export function FirstCylinder({ group, earliestDeg, rotation, view }: { group: CylinderGroup | undefined, earliestDeg: number, rotation: Rotation, view: WheelView }) {
  if (!group || view.size === 'mini') return null
  const at = polar(wheelAngle(rotation, earliestDeg + 25), 97)
  return <text className="m" style={{ fontSize: view.font.medium }} x={at.x} y={at.y} textAnchor="middle">cyl {group.label}</text>
}
