import type { Calls } from '../valid-calls'
import { chance, flown, heat, latent, treeOf } from './trees'

const small = treeOf(`
T or A B
A 2 a b c
B and A d`, [chance('a', 0.1), flown('b', 1e-4), latent('c', 1e-4), { ...latent('d', 1e-4), ...heat }], { commonCause: [{ id: 'heat', events: ['c'], beta: 0.1 }] })

const twins = treeOf('T and a b', [latent('a', 1e-3), latent('b', 1e-3)], { commonCause: [{ id: 'both', events: ['a', 'b'], beta: 0.1 }] })

/** Calls of this topic for the nonsense walk. */
export const redundancyCalls: Calls = {
  eventProbability: [[{ ...flown('a', 1e-4), ...heat }], [latent('b', 1e-4)], [chance('c', 0.2)]],
  faultTreeProbability: [[small]],
  timeAveragedProbability: [[small], [twins]],
  minimalCutSets: [[small, { maxOrder: 2 }], [twins]],
  importance: [[small]],
  singlePoints: [[small]],
  ignitionTree: [[{
    channels: [{ id: 'one', parts: [flown('coil 1', 1e-4)] }, { id: 'two', parts: [{ ...flown('coil 2', 1e-4) }] }],
    common: [chance('switch', 1e-5)], cylinders: [{ cylinder: 1, parts: [latent('plug 1', 1e-4)] }], commonCause: [{ id: 'coils', events: ['coil 1', 'coil 2'], beta: 0.1 }],
  }]],
  rateSensitivity: [[small], [twins]],
}
