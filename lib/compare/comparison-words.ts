import type { ScenarioResult } from '../calc/live'
import { formatQuantityText, type UnitSystem } from '../units'
import type { FindingChanges } from './finding-changes'

const counted = (count: number, one: string, many: string) => (count === 0 ? null : `${count} ${count === 1 ? one : many}`)

/** Head of a comparison: what the second has gained and lost against the first. */
export function comparisonHead({ gained, lost }: FindingChanges, differs: boolean): string {
  if (!differs) return 'No input differs'
  const parts = [counted(gained.length, 'finding new or worse', 'findings new or worse'), counted(lost.length, 'finding gone or better', 'findings gone or better')].filter((part) => part !== null)
  const text = parts.join(', ')
  return text === '' ? 'The findings are the same' : text
}

/** "At full power A fires 2.0° later and makes 0.5 kW less; B is as before." */
export function comparisonSentence(left: Pick<ScenarioResult, 'parts'>, right: Pick<ScenarioResult, 'parts'>, system: UnitSystem): string | null {
  const [from, to] = [left.parts, right.parts]
  if (!from.speeds.ok || !to.speeds.ok) return null
  const [was, is] = [from.speeds.points.full, to.speeds.points.full]
  const powerStep = (key: 'primaryKw' | 'backupKw') => (from.power.ok && to.power.ok ? to.power.atMax[key] - from.power.atMax[key] : 0)
  const shown = (value: number, kind: 'angle' | 'power') => formatQuantityText(Math.abs(value), kind, system)
  const isNothing = (value: number, kind: 'angle' | 'power') => !/[1-9]/.test(shown(value, kind))
  const phrase = (letter: 'A' | 'B', deg: number, kw: number) => {
    const parts = [
      isNothing(deg, 'angle') ? null : `fires ${shown(deg, 'angle')} ${deg > 0 ? 'earlier' : 'later'}`,
      isNothing(kw, 'power') ? null : `makes ${shown(kw, 'power')} ${kw > 0 ? 'more' : 'less'}`,
    ].filter((part) => part !== null)
    return `${letter} ${parts.length > 0 ? parts.join(' and ') : 'is the same'}`
  }
  return `At full power ${phrase('A', is.primaryDeg - was.primaryDeg, powerStep('primaryKw'))}; ${phrase('B', is.backupDeg - was.backupDeg, powerStep('backupKw'))}.`
}
