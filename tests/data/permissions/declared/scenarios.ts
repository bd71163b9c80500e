import { GET as listRevisionsRoute } from '@/app/api/scenarios/[id]/revisions/route'
import { GET as listScenariosRoute } from '@/app/api/scenarios/route'
import * as listActions from '@/app/(shop)/scenarios/actions'
import { saveSheet } from '@/app/(shop)/scenarios/[id]/actions'
import type { Actor } from '@/lib/auth/actor'
import { archiveScenario, restoreScenario } from '@/lib/data/scenarios/archive-scenario'
import { createScenario } from '@/lib/data/scenarios/create-scenario'
import { duplicateScenario } from '@/lib/data/scenarios/duplicate-scenario'
import { evaluateForActor } from '@/lib/data/scenarios/evaluate-for-actor'
import { getRevision } from '@/lib/data/scenarios/get-revision'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { listRevisions } from '@/lib/data/scenarios/list-revisions'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { saveScenario } from '@/lib/data/scenarios/save-scenario'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import { formOf } from '../../support/next-mocks'
import { aScenario, anEngine, sheet } from '../../support/records'
import { declare, type World } from '../declare'

const engine = async ({ author }: World) => (await anEngine(author)).id
const prepare = async (world: World, author: Actor) => (await aScenario(author, world.author)).id

const typed = () => formOf({ ...scenarioToForm('Changed', sheet(), 'metric'), unitSystem: 'metric', filledFrom: '1', baseRevision: '1', engineVersion: '1' })

export const scenarios = [
  declare(listScenarios, { needs: 'scenario.read', own: 'scenario.readOwn', call: (fn, { actor }) => fn(actor, {}) }),
  declare(getScenario, { needs: 'scenario.read', own: 'scenario.readOwn', prepare, call: (fn, { actor, target }) => fn(actor, target) }),
  declare(listRevisions, { needs: 'scenario.read', own: 'scenario.readOwn', prepare, call: (fn, { actor, target }) => fn(actor, target) }),
  declare(getRevision, { needs: 'scenario.read', own: 'scenario.readOwn', prepare, call: (fn, { actor, target }) => fn(actor, target, 1) }),
  declare(createScenario, {
    needs: 'scenario.create', prepare: engine, call: (fn, { actor, target: engineId }) => fn(actor, { engineId, engineVersion: 1, title: 'New', sheet: sheet() }),
  }),
  declare(evaluateForActor, { needs: 'scenario.create', prepare: engine, call: (fn, { actor, target: engineId }) => fn(actor, { engineId, sheet: sheet() }) }),
  declare(saveScenario, {
    needs: 'scenario.write', own: 'scenario.writeOwn', prepare,
    call: (fn, { actor, target }) => fn(actor, target, { baseRevision: 1, engineVersion: 1, title: 'Changed', sheet: sheet() }),
  }),
  declare(duplicateScenario, { needs: 'scenario.read', own: 'scenario.readOwn', prepare, call: (fn, { actor, target }) => fn(actor, target) }),
  declare(archiveScenario, { needs: 'scenario.archive', own: 'scenario.archiveOwn', prepare, call: (fn, { actor, target }) => fn(actor, target) }),
  declare(restoreScenario, { needs: 'scenario.archive', own: 'scenario.archiveOwn', prepare, call: (fn, { actor, target }) => fn(actor, target) }),

  declare(listActions.newScenario, { needs: 'scenario.create', prepare: engine, call: (fn, { target: engineId }) => fn({ ok: false }, formOf({ engineId, title: 'New' })) }),
  declare(listActions.duplicateScenario, { needs: 'scenario.read', own: 'scenario.readOwn', prepare, call: (fn, { target: id }) => fn(formOf({ id })) }),
  declare(listActions.archiveScenario, { needs: 'scenario.archive', own: 'scenario.archiveOwn', prepare, call: (fn, { target: id }) => fn(formOf({ id })) }),
  declare(listActions.restoreScenario, { needs: 'scenario.archive', own: 'scenario.archiveOwn', prepare, call: (fn, { target: id }) => fn(formOf({ id })) }),
  declare(saveSheet, { needs: 'scenario.write', own: 'scenario.writeOwn', prepare, call: (fn, { target: id }) => fn(id, { ok: false }, typed()) }),

  declare(listScenariosRoute, { needs: 'scenario.read', own: 'scenario.readOwn', call: (fn) => fn(new Request('http://127.0.0.1/api/scenarios?sort=title')) }),
  declare(listRevisionsRoute, {
    needs: 'scenario.read', own: 'scenario.readOwn', prepare,
    call: (fn, { target: id }) => fn(new Request(`http://127.0.0.1/api/scenarios/${id}/revisions`), { params: Promise.resolve({ id }) }),
  }),
]
