import { describe, expect, it } from 'vitest'
import { defaultLimits } from '@/lib/calc'
import { findingEquation, methodPath, partEquation } from '@/lib/method/anchors'
import { topics } from '@/lib/method/topics'
import { someCases } from '@/tests/support/cases'
import { sampleRevision } from '@/tests/support/sample-revisions'

const { results } = sampleRevision(1)
const anchors: string[] = topics.flatMap(({ equations }) => equations.map(({ id }) => id))

describe('every result leads to an equation that is there', () => {
  it.each(someCases(Object.keys(defaultLimits)))('limit %s', (id) => {
    expect(anchors).toContain(Object.entries(findingEquation).find(([limit]) => limit === id)?.[1])
  })

  it.each(someCases(Object.keys(results.parts)))('part %s', (name) => {
    expect(anchors).toContain(Object.entries(partEquation).find(([part]) => part === name)?.[1])
  })
})

it('an address is the page and the anchor', () => {
  expect(methodPath('timing-torque')).toBe('/method#timing-torque')
})
