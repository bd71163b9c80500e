import 'server-only'
import { UniqueConstraintViolationException } from '@mikro-orm/core'
import { isDeepStrictEqual } from 'node:util'
import { z } from 'zod'
import type { Actor } from '@/lib/auth/actor'
import { AppError } from '@/lib/errors'
import { engineInput } from '@/lib/schemas/engine'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import { authorise } from '../support/authorise'
import { codeTaken, engineSearch, findEngine, toEngineDto } from '../support/engine-records'
import { newEm } from '../support/orm'
import { searchText } from '../support/search-text'
import { asStored, requireStorable } from '../support/storable'

const engineUpdate = engineInput.extend({ version: z.int().min(1) })
export type EngineUpdate = z.input<typeof engineUpdate>

/**
 * Changes an engine that nobody else has changed since `version`. Its revisions keep the engine as it was; a scenario says that
 * its engine has changed until it is saved again. Nothing different: nothing is written and the version stays.
 */
export async function updateEngine(actor: Actor, id: string, input: EngineUpdate): Promise<EngineDto> {
  const forked = await newEm()
  await authorise(forked, actor, 'engine.write')
  const { version, name, code, spec } = engineUpdate.parse(input)
  requireStorable({ name, spec })
  try {
    return await forked.transactional(async (em) => {
      const engine = await findEngine(em, actor, id, 'change')
      if (engine.archivedAt) throw new AppError('archived', { what: 'engine' })
      if (engine.version !== version) throw new AppError('conflict', { what: 'engine', conflict: await toEngineDto(em, engine) })
      if (code !== engine.code && engine.lastScenarioNumber > 0)
        throw new AppError('invalid', { fieldErrors: { code: `Scenarios are numbered after ${engine.code}, so this code stays. Duplicate the engine to use another.` } })
      const stored = asStored(spec)
      if (isDeepStrictEqual({ name, code, spec: stored }, { name: engine.name, code: engine.code, spec: engine.spec })) return toEngineDto(em, engine)
      // Scenarios are found by the engine's name too; it is the last line of their search text.
      if (name !== engine.name)
        await em.execute(`update scenarios set search = regexp_replace(search, '[^\\n]*$', '') || ? where engine_id = ?`, [searchText(name), engine.id])
      em.assign(engine, { name, code, spec: stored, version: version + 1, updatedAt: new Date(), search: engineSearch({ code, name }) })
      await em.flush()
      return toEngineDto(em, engine)
    })
  } catch (error) {
    throw error instanceof UniqueConstraintViolationException ? codeTaken(code) : error
  }
}
