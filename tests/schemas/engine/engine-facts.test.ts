import { describe, expect, it } from 'vitest'
import { capFromOrder, metByRotor } from '@/lib/engine/cap-leads'
import { engineDrawing, engineFacts } from '@/lib/engine/engine-facts'
import { engineToForm } from '@/lib/schemas/engine-form'
import { expectClose } from '@/tests/support/expect-close'
import { sampleEngine } from '@/tests/support/sample-engine'

const form = engineToForm('Flat six', 'J260', sampleEngine, 'metric')
const factsOf = (changes: Record<string, string> = {}) => new Map(engineFacts({ ...form, ...changes }, 'metric').map((fact) => [fact.id, fact]))
const valueOf = (id: string, changes: Record<string, string> = {}) => factsOf(changes).get(id)?.value ?? NaN

describe('figures beside the engine form', () => {
  it('gives displacement, torque, mean effective pressure, friction and mark spacing', () => {
    expectClose(valueOf('displacement'), 6 * Math.PI * 4.5 ** 2 * 6.8, { rel: 1e-12 })
    expectClose(valueOf('torque'), 50_000 / (2780 * 2 * Math.PI / 60), { rel: 1e-12 })
    // p = W/(V·n/120), worked from SI units.
    expectClose(valueOf('bmep'), 50 / ((6 * Math.PI * 0.045 ** 2 * 0.068) * 2780 / 120), { rel: 1e-12 })
    expectClose(valueOf('friction'), 50 / 0.82 - 50, { rel: 1e-12 })
    expectClose(valueOf('markSpacing'), Math.PI * 170 / 360, { rel: 1e-12 })
  })

  it('turns friction power into efficiency when that is what was given', () => {
    const facts = factsOf({ frictionKind: 'power', frictionPowerKw: '12.5' })
    expect(facts.has('friction')).toBe(false)
    expectClose(facts.get('efficiency')?.value ?? NaN, 0.8, { rel: 1e-12 })
  })

  it('goes on with what can be read, and says what the others need', () => {
    const facts = factsOf({ boreMm: 'ninety' })
    expect(facts.get('displacement')).toMatchObject({ value: null, needs: 'needs bore' })
    expect(facts.get('bmep')?.needs).toBe('needs bore')
    expect(facts.get('torque')?.value).not.toBeNull()
    expect(facts.get('markSpacing')?.needs).toBeNull()
  })

  it('takes typed units and needs every figure of an empty form', () => {
    expectClose(valueOf('markSpacing', { damperDiameterMm: '10 in' }), Math.PI * 254 / 360, { rel: 1e-12 })
    expect(engineFacts({}, 'metric').every((fact) => fact.value === null && fact.needs !== null)).toBe(true)
  })
})

describe('drawings beside the engine form', () => {
  it('lays even firings 120 degrees apart', () => {
    expect(engineDrawing(form, 'metric').firings?.map(({ cylinder, atDeg }) => [cylinder, atDeg])).toEqual([[1, 0], [4, 120], [5, 240], [2, 360], [3, 480], [6, 600]])
  })

  it('says why there is no schedule', () => {
    const drawing = engineDrawing({ ...form, firingOrder: '1 4 4 2 3 6' }, 'metric')
    expect(drawing).toMatchObject({ firings: null, cap: null })
    expect(drawing.firingFault).toContain('4 twice')
    expect(engineDrawing({}, 'metric')).toEqual({ firings: null, firingFault: null, cap: null })
  })

  it('follows the leads with the rotor, either way round', () => {
    expect(engineDrawing(form, 'metric').cap).toEqual({ terminals: [1, 6, 3, 2, 5, 4], rotation: 'anticlockwise', met: [1, 4, 5, 2, 3, 6], inOrder: true })
    expect(engineDrawing({ ...form, distributorRotation: 'clockwise' }, 'metric').cap).toMatchObject({ met: [1, 6, 3, 2, 5, 4], inOrder: false })
  })

  it('draws a cap that its rotor meets in firing order, wherever the list starts', () => {
    const order = [1, 4, 5, 2, 3, 6]
    for (const rotation of ['clockwise', 'anticlockwise'] as const) {
      const cap = capFromOrder(order, rotation)
      for (let start = 0; start < cap.length; start += 1)
        expect(metByRotor([...cap.slice(start), ...cap.slice(0, start)], rotation, 1)).toEqual(order)
    }
  })
})
