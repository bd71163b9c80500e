import { randomUUID } from 'node:crypto'
import { beforeAll, describe, expect, test, vi } from 'vitest'
import type { Actor } from '@/lib/auth/actor'
import { can } from '@/lib/auth/permissions'
import { roles } from '@/lib/auth/roles'
import { createCast, signInAs } from '../support/actors'
import { freshDatabase } from '../support/fresh-database'
import { requestHeaders } from '../support/next-mocks'
import { collectDoors, hiddenActions, type Door } from './collect'
import type { Declaration, World } from './declare'
import { declared } from './declared'
import { fingerprint } from './fingerprint'
import { outcomeOf } from './outcome'

vi.mock('next/headers', async () => (await import('../support/next-mocks')).nextHeaders())
vi.mock('next/cache', async () => (await import('../support/next-mocks')).nextCache())

const database = freshDatabase()
let world: World
beforeAll(async () => {
  world = { ...(await createCast(database.orm)), orm: database.orm }
})

const doors = await collectDoors()
const declarationOf = (door: Door) => declared.find(({ of }) => of === door.of)

type Attempt = { who: string, actor: Actor | null, author: Actor, expected: string }

function attempts({ kind }: Door, { needs, own, namesRow }: Declaration): Attempt[] {
  const { author, stranger, neighbour, actors } = world
  const open = needs === 'public'
  const list: Attempt[] = [
    { who: 'the owner of another shop', actor: neighbour, author, expected: open || !namesRow ? 'done' : 'notFound' },
    // A data function is handed the claim itself; before an action or a route the session already fails to make an actor.
    { who: 'a stranger', actor: stranger, author, expected: open ? 'done' : kind === 'data' ? 'notFound' : 'signedOut' },
  ]
  if (kind !== 'data') list.push({ who: 'someone signed out', actor: null, author, expected: open ? 'done' : 'signedOut' })
  for (const role of roles) {
    const actor = actors[role]
    const mayAll = open || can(actor, needs)
    const mayOwn = own !== undefined && can(actor, own)
    const onOthers = mayAll || (mayOwn && !namesRow) ? 'done' : mayOwn ? 'notFound' : 'forbidden'
    list.push({ who: `a ${role}`, actor, author, expected: onOthers })
    if (own && namesRow && mayOwn) list.push({ who: `a ${role} on a row of their own`, actor, author: actor, expected: 'done' })
  }
  return list
}

/** Whatever reaches a caller from outside must name nothing of the shop. */
function leaks(value: unknown): string[] {
  const text = JSON.stringify(value) ?? ''
  const marks = [world.shop.id, world.shop.name, ...[world.author, ...Object.values(world.actors)].flatMap(({ userId, email }) => [userId, email])]
  return marks.filter((mark) => text.includes(mark))
}

describe('every door of the server', () => {
  test('is there to be walked', () => {
    expect(doors.map(({ kind }) => kind)).toEqual(expect.arrayContaining(['data', 'action', 'route']))
    expect(hiddenActions(), 'server actions live in files called actions.ts').toEqual([])
    expect(doors.filter(({ of }) => typeof of !== 'function').map(({ name }) => name), 'lib/data exports functions only').toEqual([])
  })

  test('is declared, and nothing else is', () => {
    expect(doors.filter((door) => !declarationOf(door)).map(({ name }) => name), 'add a line in declared/').toEqual([])
    expect(declared.filter(({ of }) => !doors.some((door) => door.of === of)).map(({ of }) => of.name)).toEqual([])
    expect(new Set(declared.map(({ of }) => of)).size).toBe(declared.length)
  })

  test.each(doors.filter(declarationOf))('$name', async (door) => {
    const declaration = declarationOf(door) as Declaration
    for (const { who, actor, author, expected } of attempts(door, declaration)) {
      requestHeaders.set('x-forwarded-for', `192.0.2.${Math.floor(Math.random() * 250)}`)
      const call = await declaration.ready(world, actor ?? world.stranger, author)
      if (door.kind !== 'data') await signInAs(actor)
      const before = await fingerprint(world.orm)
      const { code, value } = await outcomeOf(call)
      expect(`${who}: ${code}`).toBe(`${who}: ${expected}`)
      if (code !== 'done') expect(await fingerprint(world.orm), `${who} was refused, and rows changed`).toBe(before)
      if (actor === world.neighbour || actor === world.stranger || !actor) expect(leaks(value), who).toEqual([])
    }
  }, 120_000) // about ten calls each, some of which hash a password or evaluate a whole scenario
})

test('an id that is none is not found, never an error of the database', async () => {
  const { requireId } = await import('@/lib/data/support/ids')
  expect(requireId(randomUUID())).toMatch(/-/)
  for (const id of ['', '1', '../..', "' or 1=1", `${randomUUID()}0`]) expect(() => requireId(id)).toThrow('There is no such page')
})
