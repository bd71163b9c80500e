import 'server-only'
import { UniqueConstraintViolationException } from '@mikro-orm/core'
import { Engine } from '@/entities/index'
import type { Actor } from '@/lib/auth/actor'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import { authorise } from '../support/authorise'
import { copyTitle } from '../support/copy-title'
import { codeTaken, engineSearch, findEngine, toEngineDto } from '../support/engine-records'
import { newEm } from '../support/orm'

const longestCode = 12

/** J260 → J260B, J260C … J260Z, J260AA …: the first that no engine of the shop has. */
function freeCode(code: string, taken: ReadonlySet<string>): string {
  for (let i = 1; ; i += 1) {
    const letter = (at: number) => String.fromCharCode(65 + at)
    const suffix = i < 26 ? letter(i) : letter(Math.floor(i / 26) - 1) + letter(i % 26)
    const candidate = code.slice(0, longestCode - suffix.length) + suffix
    if (!taken.has(candidate.toLowerCase()) || i > 26 * 27) return candidate
  }
}

/** A new engine with the same figures, its name and code changed so that both can be told apart. */
export async function duplicateEngine(actor: Actor, id: string): Promise<EngineDto> {
  const em = await newEm()
  await authorise(em, actor, 'engine.write')
  const source = await findEngine(em, actor, id)
  const others = await em.find(Engine, { shop: actor.shop.id }, { fields: ['code'], disableIdentityMap: true })
  const name = copyTitle(source.name, 80)
  const code = freeCode(source.code, new Set(others.map((one) => one.code.toLowerCase())))
  const engine = em.create(Engine, { shop: actor.shop.id, createdBy: actor.userId, name, code, spec: source.spec, search: engineSearch({ code, name }) })
  try {
    await em.flush()
  } catch (error) {
    throw error instanceof UniqueConstraintViolationException ? codeTaken(code) : error
  }
  return toEngineDto(em, engine)
}
