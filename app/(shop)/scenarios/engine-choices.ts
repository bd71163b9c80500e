import type { Actor } from '@/lib/auth/actor'
import { can } from '@/lib/auth/permissions'
import { getEngine } from '@/lib/data/engines/get-engine'
import { listEngines } from '@/lib/data/engines/list-engines'
import { AppError } from '@/lib/errors'
import type { EngineDto } from '@/lib/schemas/engine-dto'

/** Pages of engines looked through; a shop with more finds the rest on the engines' own page. */
const mostPages = 6

export type EngineChoice = Pick<EngineDto, 'id' | 'name' | 'code'>

const choiceOf = ({ id, name, code }: EngineDto): EngineChoice => ({ id, name, code })

/** Engines to choose from, by name; `chosen` is among them even when it is archived. */
export async function engineChoices(actor: Actor, chosen?: string): Promise<EngineChoice[]> {
  if (!can(actor, 'engine.read')) return []
  const choices: EngineChoice[] = []
  let cursor: string | null | undefined
  for (let page = 0; page < mostPages && cursor !== null; page += 1) {
    const list = await listEngines(actor, { sort: 'name', ...(cursor ? { cursor } : {}) })
    choices.push(...list.rows.map(choiceOf))
    cursor = list.nextCursor
  }
  if (!chosen || choices.some(({ id }) => id === chosen)) return choices
  const other = await getEngine(actor, chosen).catch((error: unknown) => {
    // The list itself says what is wrong with an engine that is not there.
    if (error instanceof AppError && error.code === 'notFound') return null
    throw error
  })
  return other ? [...choices, choiceOf(other)] : choices
}
