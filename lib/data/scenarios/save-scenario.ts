import 'server-only'
import { isDeepStrictEqual } from 'node:util'
import type { Actor } from '@/lib/auth/actor'
import { calcVersion } from '@/lib/calc/live'
import { AppError } from '@/lib/errors'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import { scenarioSaveInput, type ScenarioSaveInput } from '@/lib/schemas/scenario-input'
import { authorise } from '../support/authorise'
import { findEngine, toEngineDto } from '../support/engine-records'
import { newEm } from '../support/orm'
import { findRevision, toRevisionDto } from '../support/revision-records'
import { addRevision, findScenario, scenarioScope } from '../support/scenario-records'
import { asStored, requireStorable } from '../support/storable'

/**
 * Saves what was typed as the next revision, computed again from the inputs alone, in one transaction. Whoever saved since
 * `baseRevision` wins and is shown; an engine changed since the form was opened is shown too. Nothing different from the
 * current revision: that one is returned and nothing is written.
 */
export async function saveScenario(actor: Actor, id: string, input: ScenarioSaveInput): Promise<RevisionDto> {
  const forked = await newEm()
  const { role } = await authorise(forked, actor, 'scenario.write', 'scenario.writeOwn')
  const scope = scenarioScope(actor, role, 'scenario.write')
  const { engine: { id: engineId } } = await findScenario(forked, scope, id)
  const { baseRevision, engineVersion, title, sheet: typed } = scenarioSaveInput.parse(input)
  requireStorable({ title, sheet: typed })
  const sheet = asStored(typed)
  return forked.transactional(async (em) => {
    // The engine's row first, as everywhere: a scenario never changes its engine, so its id is known without a lock.
    const engine = await findEngine(em, actor, engineId, 'keep')
    const scenario = await findScenario(em, scope, id, true)
    if (scenario.archivedAt) throw new AppError('archived', { what: 'scenario' })
    const current = await findRevision(em, scenario, scenario.currentRevision)
    if (current.number !== baseRevision) throw new AppError('conflict', { what: 'scenario', conflict: toRevisionDto(current) })
    if (engine.archivedAt) throw new AppError('engineGone')
    if (engine.version !== engineVersion) throw new AppError('engineChanged', { conflict: await toEngineDto(em, engine) })
    const saved = toRevisionDto(current)
    const isSame = isDeepStrictEqual([title, sheet, engineVersion, calcVersion], [saved.title, asStored(saved.sheet), saved.engineVersion, saved.calcVersion])
    if (isSame) return saved
    const next = addRevision(em, actor, scenario, engine, current.number + 1, title, sheet)
    await em.flush()
    return toRevisionDto(await findRevision(em, scenario, next.number))
  }, { clear: true })
}
