import { describe, expect, it } from 'vitest'
import { faultTreeProbability, ignitionTree, minimalCutSets, singlePoints, type FaultTree, type IgnitionTreeInput } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'
import { chance, flown, heat, latent } from './trees'

const plan: IgnitionTreeInput = {
  channels: [
    { id: 'left', parts: [flown('coil 1', 1e-4), chance('module 1', 0.01)] },
    { id: 'right', parts: [flown('coil 2', 1e-4), { ...latent('relay 2', 1e-4), ...heat }] },
  ],
  common: [chance('switch', 1e-5), chance('rotor', 2e-5)],
  cylinders: [{ cylinder: 1, parts: [chance('lead 1', 0.001)] }, { cylinder: 2, parts: [chance('lead 2', 0.002), chance('plug 2', 0.003)] }],
  commonCause: [{ id: 'coils', events: ['coil 1', 'coil 2'], beta: 0.1 }],
}
const lost = ({ cylinderLost }: { readonly cylinderLost: FaultTree | null }): FaultTree => cylinderLost ?? expect.fail('no tree of the cylinders')

describe('ignitionTree', () => {
  const trees = ignitionTree(deepFreeze(plan))

  it('loses all spark by a common part, or by one part of each channel', () => {
    expect(minimalCutSets(trees.noSpark)).toEqual([['coils'], ['rotor'], ['switch'], ['coil 1', 'coil 2'], ['coil 1', 'relay 2'], ['coil 2', 'module 1'], ['module 1', 'relay 2']])
    expect(singlePoints(trees.noSpark).map(({ id }) => id)).toEqual(['coils', 'rotor', 'switch'])
    expect(trees.noSpark.events.map(({ id }) => id)).toEqual(['switch', 'rotor', 'coil 1', 'module 1', 'coil 2', 'relay 2'])
  })

  it('loses a channel by any of its parts, a cylinder by any of theirs', () => {
    expect(minimalCutSets(trees.channelLost)).toEqual([['coil 1'], ['coil 2'], ['coils'], ['module 1'], ['relay 2']])
    expect(minimalCutSets(lost(trees))).toEqual([['lead 1'], ['lead 2'], ['plug 2']])
    expectClose(faultTreeProbability(lost(trees)), 1 - 0.999 * 0.998 * 0.997, { rel: 1e-12 })
    expect(lost(trees).commonCause).toBeUndefined()
  })

  it('keeps of a common cause what a tree has of it', () => {
    const mixed = ignitionTree({ ...plan, cylinders: [{ cylinder: 1, parts: [flown('lead 1', 1e-4)] }], commonCause: [{ id: 'wet', events: ['coil 1', 'lead 1', 'coil 2'], beta: 0.2 }] })
    expect(mixed.noSpark.commonCause).toEqual([{ id: 'wet', events: ['coil 1', 'coil 2'], beta: 0.2 }])
    expect(lost(mixed).commonCause).toEqual([{ id: 'wet', events: ['lead 1'], beta: 0.2 }])
    expectClose(faultTreeProbability(lost(mixed)), -Math.expm1(-2e-4), { rel: 1e-12 })
  })

  it('does without common parts and without cylinders', () => {
    const bare = ignitionTree({ ...plan, common: [], cylinders: [] })
    expect(singlePoints(bare.noSpark)).toEqual([{ id: 'coils', heatSensitive: false }])
    expect(bare.cylinderLost).toBeNull()
    expect(ignitionTree({ ...plan, cylinders: [{ cylinder: 3, parts: [] }] }).cylinderLost).toBeNull()
  })

  it('lets parts be called what its own gates are called', () => {
    const named = ignitionTree({ channels: [{ id: 'coils', parts: [chance('left', 0.1)] }, { id: 'no spark', parts: [chance('both channels', 0.1)] }], common: [chance('coils', 0.2)], cylinders: [{ cylinder: 1, parts: [chance('cylinder lost', 0.3)] }] })
    expectClose(faultTreeProbability(named.noSpark), 0.2 + 0.8 * 0.01, { rel: 1e-12 })
    expectClose(faultTreeProbability(named.channelLost), 0.19, { rel: 1e-12 })
    expectClose(faultTreeProbability(lost(named)), 0.3, { rel: 1e-12 })
  })

  it('names what cannot be used', () => {
    const of = (change: object) => () => ignitionTree({ ...plan, ...change } as IgnitionTreeInput)
    const [left, right] = plan.channels
    for (const bad of [undefined, null, [], [left], [left, right, { ...left, id: 'third' }]]) expectCalcError(of({ channels: bad }), 'channels')
    expectCalcError(() => ignitionTree(undefined as never), 'channels')
    expectCalcError(of({ channels: [left, 5] }), 'channels.1')
    expectCalcError(of({ channels: [left, { ...right, id: 'left' }] }), 'channels.1.id')
    expectCalcError(of({ channels: [{ ...left, id: '' }, right] }), 'channels.0.id')
    for (const parts of [undefined, [], 5]) expectCalcError(of({ channels: [left, { ...right, parts }] }), 'channels.1.parts')
    expectCalcError(of({ channels: [left, { ...right, parts: [flown('coil 2', -1)] }] }), 'channels.1.parts.0.ratePerH')
    expect(expectCalcError(of({ channels: [left, { ...right, parts: [flown('coil 2', 1), flown('coil 1', 1e-4)] }] }), 'channels.1.parts.1.id').message).toContain('common parts')
    expectCalcError(of({ common: undefined }), 'common')
    expectCalcError(of({ common: [chance('coil 1', 0.1)] }), 'common.0.id')
    expectCalcError(of({ common: [chance('x', 2)] }), 'common.0.exposure.p')
    expectCalcError(of({ cylinders: undefined }), 'cylinders')
    expectCalcError(of({ cylinders: [5] }), 'cylinders.0')
    for (const cylinder of [0, 1.5, undefined]) expectCalcError(of({ cylinders: [{ cylinder, parts: [] }] }), 'cylinders.0.cylinder')
    expectCalcError(of({ cylinders: [{ cylinder: 1, parts: [] }, { cylinder: 1, parts: [] }] }), 'cylinders.1.cylinder')
    expectCalcError(of({ cylinders: [{ cylinder: 1 }] }), 'cylinders.0.parts')
    expectCalcError(of({ cylinders: [{ cylinder: 1, parts: [chance('switch', 0.1)] }] }), 'cylinders.0.parts.0.id')
    expectCalcError(of({ commonCause: [{ id: 'coils', events: ['coil 1', 'nobody'], beta: 0.1 }] }), 'commonCause.0.events.1')
    expectCalcError(of({ commonCause: null }), 'commonCause')
  })
})
