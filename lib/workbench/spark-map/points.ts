import { chargeKpaFromManifold, type FullThrottlePressures, type Scenario, type ScenarioParts, type SparkMapChoice } from '../../calc/live'

export interface MapPoint {
  name: string
  rpm: number
  /** Of the charge at inlet closing. */
  pressureKpa: number
  /** When each channel fires there; a channel is left out where the point is the other's alone. */
  sparks: { channel: 'A' | 'B', deg: number }[]
}

const letters = { primary: 'A', backup: 'B' } as const

/**
 * Where the plan runs the engine, on the axes of its map: idle, run-up and full power at the manifold pressures of the sheet, and the point of each
 * channel nearest to detonation. On the worse day every charge is the denser one that detonation is judged at.
 */
export function sparkMapPoints({ sheet }: Scenario, { speeds, detonation }: Pick<ScenarioParts, 'speeds' | 'detonation'>, full: FullThrottlePressures, day: SparkMapChoice['day']): MapPoint[] {
  const denserKpa = day === 'worse' ? sheet.worse.denserKpa : 0
  const { idleKpa, runUpKpa, fullKpa } = sheet.manifold
  const marked = speeds.ok
    ? ([['idle', 'idle', idleKpa], ['run-up', 'runUp', runUpKpa], ['full power', 'full', fullKpa]] as const).map(([name, speed, manifoldKpa]): MapPoint => {
      const { rpm, primaryDeg, backupDeg } = speeds.points[speed]
      return { name, rpm, pressureKpa: chargeKpaFromManifold({ manifoldKpa, ...full }) + denserKpa, sparks: [{ channel: 'A', deg: primaryDeg }, { channel: 'B', deg: backupDeg }] }
    })
    : []
  const points = [...marked]
  if (!detonation.ok) return points
  for (const channel of ['primary', 'backup'] as const) {
    const { rpm, pressureKpa, sparkDeg } = detonation[channel][day]
    const spark = { channel: letters[channel], deg: sparkDeg }
    const here = points.find((point) => Math.abs(point.rpm - rpm) < 1 && Math.abs(point.pressureKpa - pressureKpa) < 0.5)
    if (!here) points.push({ name: 'nearest to detonation', rpm, pressureKpa, sparks: [spark] })
    else if (!here.sparks.some((each) => each.channel === spark.channel)) here.sparks.push(spark)
  }
  return points
}
