import type { SparkMap } from '../../calc/live'

/** What of a map is drawn: the spark to set, the one of best torque, the limit of detonation. */
export type MapView = 'spark' | 'mbt' | 'limit'

/** A place of the map: a value, no limit up to the last spark searched, or detonation at every spark. */
export type MapPlace = number | 'never' | 'always'

/** Index i over speed, j over charge pressure. */
export function placesOf(map: SparkMap, view: MapView): MapPlace[][] {
  return map.rpm.map((_, i) => map.pressureKpa.map((__, j): MapPlace => {
    if (view === 'mbt') return map.mbtDeg[i]?.[j] ?? 'always'
    const spark = map.sparkDeg[i]?.[j] ?? null
    if (spark === null) return 'always'
    return view === 'spark' ? spark : map.knockLimitDeg[i]?.[j] ?? 'never'
  }))
}

/** Detonation limit less best torque: below zero detonation sets the spark. null where the limit is not known. */
export const limitLessBest = (map: SparkMap): (number | null)[][] => placesOf(map, 'limit').map((row, i) => row.map((limit, j) => {
  const best = map.mbtDeg[i]?.[j]
  return typeof limit === 'number' && best !== undefined ? limit - best : null
}))

/** How many places each sets the spark. */
export function countPlaces(map: SparkMap): { all: number, torque: number, detonation: number, always: number } {
  const places = placesOf(map, 'spark').flat()
  const best = map.mbtDeg.flat()
  const always = places.filter((place) => place === 'always').length
  const torque = places.filter((place, k) => place === best[k]).length
  return { all: places.length, torque, always, detonation: places.length - torque - always }
}

/** Where a value lies between the lines of an axis: the line before it and the share of the way to the next; null outside. */
function between(axis: readonly number[], value: number): { at: number, share: number } | null {
  const last = axis.length - 1
  // A place on the outermost line must not fall off it by the dust of a division.
  const dust = 1e-9 * Math.abs(value)
  const from = axis[0] ?? Infinity
  const to = axis[last] ?? -Infinity
  if (value < from - dust || value > to + dust) return null
  const next = axis.findIndex((line, i) => i > 0 && line >= value)
  const at = next < 0 ? last - 1 : next - 1
  const low = axis[at] ?? 0
  const high = axis[at + 1] ?? 1
  return { at, share: Math.min(1, Math.max(0, (value - low) / (high - low))) }
}

/** A value of the map at any speed and charge, linear between its lines; null outside it or beside a place without a value. */
export function valueAt(map: SparkMap, view: MapView, rpm: number, pressureKpa: number): number | null {
  const x = between(map.rpm, rpm)
  const y = between(map.pressureKpa, pressureKpa)
  if (!x || !y) return null
  const places = placesOf(map, view)
  let value = 0
  for (const [di, weightX] of [[0, 1 - x.share], [1, x.share]] as const) for (const [dj, weightY] of [[0, 1 - y.share], [1, y.share]] as const) {
    const weight = weightX * weightY
    if (weight === 0) continue
    const place = places[x.at + di]?.[y.at + dj]
    if (typeof place !== 'number') return null
    value += weight * place
  }
  return value
}
