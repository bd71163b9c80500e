import type { ScenarioSheet, SparkMap, SparkMapChoice } from '../calc/live'
import { formatQuantityText, type UnitSystem } from '../units'
import { countPlaces, placesOf, valueAt, type MapView } from '../workbench/spark-map/views'
import type { MapPoint } from '../workbench/spark-map/points'
import type { RefusedPlace } from '../workbench/spark-map/schedule'
import { octaneWords } from './detonation-words'

export const viewTitle: Record<MapView, string> = { spark: 'Spark', mbt: 'Best torque', limit: 'Detonation limit' }

/** What a place without a value says of itself: on the drawing, and in a table. */
export const placeShortWords = { never: 'no limit up to 60°', always: 'every spark detonates' } as const
export const placeLongWords = { never: 'no limit', always: 'every spark detonates' } as const

const angle = (deg: number, system: UnitSystem, sign = false) => formatQuantityText(deg, 'angle', system, { sign })

export function dayWords({ fuel, worse }: ScenarioSheet, day: SparkMapChoice['day'], system: UnitSystem): string {
  if (day === 'planned') return `planned fuel, ${octaneWords(fuel.octane, fuel.scale)}`
  const hotter = worse.hotterK > 0 ? `, charge ${formatQuantityText(worse.hotterK, 'temperatureDifference', system)} hotter` : ''
  return `worse fuel, ${octaneWords(fuel.worseOctane, fuel.scale)}${hotter}`
}

/** What the drawing says, in a sentence or two. */
export function viewFinding(map: SparkMap, view: MapView, points: readonly MapPoint[], system: UnitSystem): string {
  if (view === 'spark') return sparkFinding(map, points, system)
  const places = placesOf(map, view).flat()
  const known = places.filter((place) => typeof place === 'number')
  const count = (what: 'never' | 'always') => places.filter((place) => place === what).length
  const span = known.length > 0 ? `${angle(Math.min(...known), system)} to ${angle(Math.max(...known), system)}` : null
  if (view === 'mbt') return `The least advance of best torque, whatever the fuel stands: ${span ?? 'none'}.`
  const rest = [
    ...(count('never') > 0 ? [`at ${count('never')} of ${places.length} places no spark searched reaches it`] : []),
    ...(count('always') > 0 ? [`at ${count('always')} every spark detonates`] : []),
  ]
  return `${span === null ? 'Nowhere does detonation begin between two sparks searched' : `Coming from late sparks detonation begins at ${span}`}${rest.length > 0 ? `; ${rest.join(', ')}` : ''}.`
}

/** What sets the spark, and how the plan stands to it at full power. */
function sparkFinding(map: SparkMap, points: readonly MapPoint[], system: UnitSystem): string {
  const { all, torque, detonation, always } = countPlaces(map)
  const many = `Of ${all} places best torque sets the spark at ${torque}, detonation at ${detonation}${always > 0 ? `; at ${always} it detonates at every spark` : ''}.`
  const full = points.find(({ name }) => name === 'full power')
  const spark = full && valueAt(map, 'spark', full.rpm, full.pressureKpa)
  if (!full || spark === null || spark === undefined) return many
  const best = valueAt(map, 'mbt', full.rpm, full.pressureKpa) ?? spark
  const against = full.sparks.map(({ channel, deg }) => {
    const off = deg - spark
    if (Math.abs(off) < 0.05) return `${channel} fires there`
    return `${channel} fires ${angle(Math.abs(off), system)} ${off > 0 ? 'earlier' : 'later'}`
  })
  return `${many} At full power it is ${angle(spark, system)}, set by ${best - spark < 0.05 ? 'best torque' : 'detonation'}: ${against.join(', ')}.`
}

const range = (values: readonly number[], kind: 'engineSpeed' | 'pressure', system: UnitSystem): string => {
  const low = formatQuantityText(Math.min(...values), kind, system)
  const high = formatQuantityText(Math.max(...values), kind, system)
  return low === high ? low : `${low} to ${high}`
}

/** Why a map cannot be copied, and where. */
export function refusalWords(refused: readonly RefusedPlace[], marginDeg: number, system: UnitSystem): string {
  const places = refused.length === 1 ? 'one place' : `${refused.length} places`
  return `Not copied: at ${places} no spark stays ${angle(marginDeg, system)} short of detonation, within ${range(refused.map(({ rpm }) => rpm), 'engineSpeed', system)} and ${range(refused.map(({ manifoldKpa }) => manifoldKpa), 'pressure', system)} in the manifold. Ask for less margin, or for another fuel or charge.`
}
