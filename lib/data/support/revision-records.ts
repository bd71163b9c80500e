import 'server-only'
import type { Loaded } from '@mikro-orm/core'
import type { EntityManager } from '@mikro-orm/postgresql'
import { Revision, type Scenario } from '@/entities/index'
import { AppError } from '@/lib/errors'
import { revisionDto, type RevisionDto } from '@/lib/schemas/revision-dto'
import { toDto } from './dto'
import { isoOf, isoOrNull } from './list-page'
import { readResult } from './read-result'
import { readSheet } from './read-sheet'

// Of the people only their names: nothing else of a person belongs near a sheet.
const withNames = { populate: ['author', 'releasedBy'], fields: ['*', 'author.name', 'releasedBy.name'] } as const
export type NamedRevision = Loaded<Revision, 'author' | 'releasedBy', '*' | 'author.name' | 'releasedBy.name'>

/** A revision of a scenario that was already found to be within the actor's reach. */
export async function findRevision(em: EntityManager, scenario: Pick<Scenario, 'id'>, number: number): Promise<NamedRevision> {
  const known = Number.isSafeInteger(number) && number > 0 && number < 2 ** 31
  const revision = known ? await em.findOne(Revision, { scenario: scenario.id, number }, withNames) : null
  if (!revision) throw new AppError('notFound', { what: 'revision' })
  return revision
}

/** The members a revision and a plan have in common. */
export function revisionFields(revision: NamedRevision) {
  const { number, title, engineVersion, engine, limits, calcVersion, author, releasedBy } = revision
  return {
    scenarioId: revision.scenario.id, number, title, engineVersion, engine, limits, calcVersion,
    results: readResult(revision.results),
    sheet: readSheet(revision.sheet, revision.sheetVersion),
    sheetVersion: revision.sheetVersion,
    author: { id: author.id, name: author.name },
    createdAt: isoOf(revision.createdAt),
    releasedAt: isoOrNull(revision.releasedAt ?? null),
    releasedBy: releasedBy ? { id: releasedBy.id, name: releasedBy.name } : null,
    releaseReasons: revision.releaseReasons ?? null,
  }
}

export const toRevisionDto = (revision: NamedRevision): RevisionDto => toDto(revisionDto, revisionFields(revision))
