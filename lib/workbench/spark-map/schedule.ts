import { manifoldKpaFromCharge, type FullThrottlePressures, type Schedule, type SparkMap } from '../../calc/live'

export type MapSchedule = Extract<Schedule, { kind: 'map' }>

/** A place at which no spark keeps the margin. */
export interface RefusedPlace {
  rpm: number
  chargeKpa: number
  manifoldKpa: number
}

/** Latest spark a channel can be given, crank degrees. */
const latestDeg = -20

/** Down to a tenth: upwards would take from the margin. The hair keeps 24.3 from becoming 24.2. */
const downToTenth = (deg: number): number => Math.floor(deg * 10 + 1e-7) / 10 + 0

/**
 * The map as a channel's schedule over speed and manifold pressure: best torque, or the margin short of detonation where that is later, rounded
 * down to a tenth. Refused, with the places, where no spark keeps the margin.
 */
export function mapScheduleOf(map: SparkMap, full: FullThrottlePressures, marginDeg: number): { ok: true, schedule: MapSchedule } | { ok: false, refused: RefusedPlace[] } {
  // Six digits are what the field shows: the schedule has the very pressures that are read back from it.
  const mapKpa = map.pressureKpa.map((chargeKpa) => Number(manifoldKpaFromCharge({ chargeKpa, ...full }).toPrecision(6)))
  const refused: RefusedPlace[] = []
  const deg = map.rpm.map((rpm, i) => map.pressureKpa.map((chargeKpa, j) => {
    const limit = map.knockLimitDeg[i]?.[j] ?? Infinity
    const value = map.sparkDeg[i]?.[j] === null ? -Infinity : downToTenth(Math.min(map.mbtDeg[i]?.[j] ?? -Infinity, limit - marginDeg))
    if (!(value >= latestDeg)) refused.push({ rpm, chargeKpa, manifoldKpa: mapKpa[j] ?? 0 })
    return value
  }))
  return refused.length > 0 ? { ok: false, refused } : { ok: true, schedule: { kind: 'map', rpm: [...map.rpm], mapKpa, deg } }
}
