import { expect, test } from 'vitest'
import { actions, can, permissions, type Action } from '@/lib/auth/permissions'
import { roles, type Role } from '@/lib/auth/roles'
import { roleNames } from '@/lib/words/roles'

const whoMay = (action: Action): Role[] => roles.filter((role) => can({ role }, action))

test.each([
  ['plan.read', [...roles]],
  ['person.readSelf', [...roles]],
  ['person.writeSelf', [...roles]],
  ['shop.switch', [...roles]],
  ['engine.read', ['builder', 'designer', 'owner']],
  ['engine.write', ['designer', 'owner']],
  ['engine.archive', ['designer', 'owner']],
  ['scenario.create', ['builder', 'designer', 'owner']],
  ['scenario.readOwn', ['builder', 'designer', 'owner']],
  ['scenario.writeOwn', ['builder', 'designer', 'owner']],
  ['scenario.archiveOwn', ['builder', 'designer', 'owner']],
  ['scenario.read', ['designer', 'owner']],
  ['scenario.write', ['designer', 'owner']],
  ['scenario.archive', ['designer', 'owner']],
  ['plan.release', ['designer', 'owner']],
] as const)('%s: %j', (action, expected) => {
  expect(whoMay(action)).toEqual(expected)
})

test('the table names every role, no action twice, and the owner lacks none', () => {
  expect(Object.keys(permissions).sort()).toEqual([...roles].sort())
  expect(Object.keys(roleNames).sort()).toEqual([...roles].sort())
  for (const role of roles) expect(new Set(permissions[role]).size).toBe(permissions[role].length)
  expect(actions.filter((action) => !can({ role: 'owner' }, action))).toEqual([])
})
