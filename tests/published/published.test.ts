import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import * as calc from '@/lib/calc'
import { someCases } from '@/tests/support/cases'
import { expectClose } from '@/tests/support/expect-close'
import { computedValue, type PublishedCase } from './published-case'

const folder = path.join(import.meta.dirname, 'cases')
const files = readdirSync(folder).filter((name) => name.endsWith('.json')).sort()
const cases = files.map((file) => ({ file, ...(JSON.parse(readFileSync(path.join(folder, file), 'utf8')) as PublishedCase) }))

/** What computes nothing of its own, a proportion this program assumes, a promise, or trees for the functions that are held. */
const composed = new Set(['loadFormulaParser', 'CalcError', 'sparkMap', 'sparkMapOf', 'manifoldKpaFromCharge', 'chargeKpaFromManifold', 'ignitionTree', 'judge', 'rankFindings', 'partsStandingOn', 'displacementCc', 'dependsOnPressure', 'findSpeedPoint', 'speedPointAt', 'storedResult', 'evaluateScenario', 'evaluateClosedForms', 'addCycleLayer', 'inputErrors'])
const covered = Object.entries(calc).filter(([name, value]) => typeof value === 'function' && !composed.has(name)).map(([name]) => name)

it('no function goes without a check from outside', () => {
  const used = new Set(cases.flatMap(({ checks }) => checks.map(({ fn }) => fn)))
  expect(covered.filter((name) => !used.has(name))).toEqual([])
})

describe.each(someCases(cases))('$id: $title', ({ id, file, source, provenance, checks }) => {
  it('names a known source and says how it is known', () => {
    expect(file).toBe(`${id}.json`)
    const known = calc.sources[source]?.provenance
    expect(known, source).toBeDefined()
    if (provenance !== 'computed') expect(provenance).toBe(known)
  })

  it.each(someCases(checks))('$label', (check) => {
    expectClose(computedValue(calc, check), check.expected, check.tolerance)
  })
})
