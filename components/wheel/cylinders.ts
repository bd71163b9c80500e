export interface CylinderAt {
  label: string
  /** Firing position in the cycle of two turns, crank degrees, the first cylinder at 0. */
  atDeg: number
}

export interface CylinderGroup {
  /** "1·2": the cylinders that share this place of the turn, in firing order. */
  label: string
  /** 0…360 of one turn. */
  atDeg: number
}

/** Positions that lie closer than this are one place of the wheel, degrees. */
const together = 0.5

/** Two turns folded to one: cylinders half a cycle apart share a place of the crank. */
export function foldCylinders(cylinders: readonly CylinderAt[]): CylinderGroup[] {
  const groups: { labels: string[], atDeg: number }[] = []
  for (const { label, atDeg } of [...cylinders].sort((one, other) => one.atDeg - other.atDeg)) {
    const folded = ((atDeg % 360) + 360) % 360
    const apart = (other: number) => Math.abs(((folded - other + 540) % 360) - 180)
    const group = groups.find((candidate) => apart(candidate.atDeg) < together)
    if (group) group.labels.push(label)
    else groups.push({ labels: [label], atDeg: folded })
  }
  return groups.map(({ labels, atDeg }) => ({ label: labels.join('·'), atDeg }))
}
