import { GET as listEnginesRoute } from '@/app/api/engines/route'
import type { Actor } from '@/lib/auth/actor'
import { archiveEngine, restoreEngine } from '@/lib/data/engines/archive-engine'
import { createEngine } from '@/lib/data/engines/create-engine'
import { duplicateEngine } from '@/lib/data/engines/duplicate-engine'
import { getEngine } from '@/lib/data/engines/get-engine'
import { listEngines } from '@/lib/data/engines/list-engines'
import { removeEngine } from '@/lib/data/engines/remove-engine'
import { updateEngine } from '@/lib/data/engines/update-engine'
import { anEngine, engineSpec, nextCode } from '../../support/records'
import { declare, type World } from '../declare'

// Engines have no owner: the designer of the cast makes them all.
const prepare = async ({ author }: World) => (await anEngine(author)).id
const byId = ({ actor, target }: { actor: Actor, target: string }): [Actor, string] => [actor, target]

export const engines = [
  declare(listEngines, { needs: 'engine.read', args: ({ actor }) => [actor, {}] }),
  declare(getEngine, { needs: 'engine.read', prepare, args: byId }),
  declare(createEngine, { needs: 'engine.write', args: ({ actor }) => [actor, { name: 'Flat six', code: nextCode(), spec: engineSpec }] }),
  declare(updateEngine, { needs: 'engine.write', prepare, args: ({ actor, target }) => [actor, target, { version: 1, name: 'Renamed', code: nextCode(), spec: engineSpec }] }),
  declare(duplicateEngine, { needs: 'engine.write', prepare, args: byId }),
  declare(archiveEngine, { needs: 'engine.archive', prepare, args: byId }),
  declare(restoreEngine, { needs: 'engine.archive', prepare, args: byId }),
  declare(removeEngine, { needs: 'engine.archive', prepare, args: byId }),

  declare(listEnginesRoute, { needs: 'engine.read', args: () => [new Request('http://127.0.0.1/api/engines?search=six')] }),
]
