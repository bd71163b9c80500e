import { GET as listEnginesRoute } from '@/app/api/engines/route'
import * as pageActions from '@/app/(shop)/engines/actions'
import { archiveEngine, restoreEngine } from '@/lib/data/engines/archive-engine'
import { createEngine } from '@/lib/data/engines/create-engine'
import { duplicateEngine } from '@/lib/data/engines/duplicate-engine'
import { getEngine } from '@/lib/data/engines/get-engine'
import { listEngines } from '@/lib/data/engines/list-engines'
import { removeEngine } from '@/lib/data/engines/remove-engine'
import { updateEngine } from '@/lib/data/engines/update-engine'
import { engineToForm } from '@/lib/schemas/engine-form'
import { formOf } from '../../support/next-mocks'
import { anEngine, engineSpec, nextCode } from '../../support/records'
import { declare, type World } from '../declare'

// Engines have no owner: the designer of the cast makes them all.
const prepare = async ({ author }: World) => (await anEngine(author)).id

const typed = (fields: Record<string, string> = {}) => formOf({ unitSystem: 'metric', ...engineToForm('Flat six', nextCode(), engineSpec, 'metric'), ...fields })

export const engines = [
  declare(listEngines, { needs: 'engine.read', call: (fn, { actor }) => fn(actor, {}) }),
  declare(getEngine, { needs: 'engine.read', prepare, call: (fn, { actor, target }) => fn(actor, target) }),
  declare(createEngine, { needs: 'engine.write', call: (fn, { actor }) => fn(actor, { name: 'Flat six', code: nextCode(), spec: engineSpec }) }),
  declare(updateEngine, { needs: 'engine.write', prepare, call: (fn, { actor, target }) => fn(actor, target, { version: 1, name: 'Renamed', code: nextCode(), spec: engineSpec }) }),
  declare(duplicateEngine, { needs: 'engine.write', prepare, call: (fn, { actor, target }) => fn(actor, target) }),
  declare(archiveEngine, { needs: 'engine.archive', prepare, call: (fn, { actor, target }) => fn(actor, target) }),
  declare(restoreEngine, { needs: 'engine.archive', prepare, call: (fn, { actor, target }) => fn(actor, target) }),
  declare(removeEngine, { needs: 'engine.archive', prepare, call: (fn, { actor, target }) => fn(actor, target) }),

  declare(pageActions.createEngine, { needs: 'engine.write', call: (fn) => fn({ ok: false }, typed()) }),
  declare(pageActions.updateEngine, { needs: 'engine.write', prepare, call: (fn, { target: id }) => fn(id, { ok: false }, typed({ version: '1' })) }),
  declare(pageActions.duplicateEngine, { needs: 'engine.write', prepare, call: (fn, { target: id }) => fn(formOf({ id })) }),
  declare(pageActions.archiveEngine, { needs: 'engine.archive', prepare, call: (fn, { target: id }) => fn(formOf({ id })) }),
  declare(pageActions.restoreEngine, { needs: 'engine.archive', prepare, call: (fn, { target: id }) => fn(formOf({ id })) }),
  declare(pageActions.removeEngine, { needs: 'engine.archive', prepare, call: (fn, { target: id }) => fn(formOf({ id })) }),

  declare(listEnginesRoute, { needs: 'engine.read', call: (fn) => fn(new Request('http://127.0.0.1/api/engines?search=six')) }),
]
