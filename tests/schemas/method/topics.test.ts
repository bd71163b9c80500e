import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import * as calc from '@/lib/calc'
import { displayMath, inlineMath } from '@/lib/method/math'
import { casesOfTopic } from '@/lib/method/topic-cases'
import type { Equation } from '@/lib/method/topic'
import { topics } from '@/lib/method/topics'
import type { PublishedCase } from '@/tests/published/published-case'
import { someCases } from '@/tests/support/cases'

/** They compose, read, rank or store what the topics explain. */
const notExplained = [
  'CalcError', 'loadFormulaParser', 'judge', 'evaluateScenario', 'evaluateClosedForms', 'addCycleLayer', 'inputErrors', 'partsStandingOn', 'rankFindings', 'displacementCc',
  'dependsOnPressure', 'findSpeedPoint', 'speedPointAt', 'storedResult',
]

const equations: readonly (Equation & { topic: string })[] = topics.flatMap((topic) => topic.equations.map((equation) => ({ topic: topic.id, ...equation })))
const folder = path.resolve(import.meta.dirname, '../../published/cases')
const cases: PublishedCase[] = readdirSync(folder).filter((name) => name.endsWith('.json')).map((name) => JSON.parse(readFileSync(path.join(folder, name), 'utf8')))

describe('what is explained', () => {
  const explained = topics.flatMap(({ functions }) => [...functions])
  const exported = Object.entries(calc).filter(([, value]) => typeof value === 'function').map(([name]) => name)

  it('is every function of the library, and nothing else', () => {
    expect(exported.filter((name) => !notExplained.includes(name) && !explained.some((each) => each === name))).toEqual([])
    expect(explained.filter((name) => !exported.includes(name))).toEqual([])
    expect(notExplained.filter((name) => !exported.includes(name))).toEqual([])
  })

  it('stands under one topic only', () => {
    expect(explained.filter((name, i) => explained.indexOf(name) !== i)).toEqual([])
  })

  it('holds each published check once', () => {
    const shown = topics.flatMap((topic) => casesOfTopic(topic, cases)).flatMap(({ id, checks }) => checks.map(({ label }) => `${id}: ${label}`))
    const all = cases.flatMap(({ id, checks }) => checks.map(({ label }) => `${id}: ${label}`))
    expect(shown.sort()).toEqual(all.sort())
  })
})

it('anchors are unique, and words joined by hyphens', () => {
  const ids = ['main', 'sources', ...topics.map(({ id }) => String(id)), ...equations.map(({ id }) => String(id))]
  expect(ids.filter((id, i) => ids.indexOf(id) !== i)).toEqual([])
  expect(ids.filter((id) => !/^[a-z]+(-[a-z]+)*$/.test(id))).toEqual([])
})

it.each(someCases(topics))('$id names a weakness', ({ weaknesses }) => {
  expect(weaknesses.length).toBeGreaterThan(0)
})

/** Names in a formula: letters with what is above them, without subscripts, operators and numbers. */
function namesIn(tex: string): Set<string> {
  const bare = tex
    .replace(/\\text\{[^}]*\}/g, ' ')
    .replace(/_(\\mathrm\{[^}]*\}|\{(?:[^{}]|\{[^{}]*\})*\}|\\[a-zA-Z]+|[a-zA-Z0-9])/g, ' ')
    .replace(/\\mathrm\{[di]\}/g, ' ')
    .replace(/\\mathrm\{([A-Z]+)\}/g, ' \\$1 ')
    .replace(/\\mathrm\{[^}]*\}/g, ' ')
    .replace(/\be\^/g, ' ')
    .replace(/\\(left|right|frac|tfrac|sqrt|sum|int|min|max|exp|ln|cos|sin|arg|Pr|bigcup|bigcap|big|in|le|leq|geq|cdot|times|pm|dots|infty|pi|ast|quad|qquad|begin|end|bar|overline|hat|approx)(?![a-zA-Z])/g, ' ')
    .replace(/\{(cases)\}/g, ' ')
  return new Set(bare.match(/\\[a-zA-Z]+|[a-zA-Z]/g) ?? [])
}

describe.each(someCases(equations))('$id', ({ tex, symbols, sources: ids, basis }) => {
  it('is set without a fault', () => {
    for (const mathml of displayMath(tex)) expect(mathml).toMatch(/^<math display="block"/)
    for (const symbol of symbols) expect(inlineMath(symbol.tex)).toMatch(/^<math/)
  })

  it('says what each of its symbols is', () => {
    const told = new Set(symbols.flatMap((symbol) => [...namesIn(symbol.tex)]))
    expect([...namesIn(tex)].filter((name) => !told.has(name))).toEqual([])
  })

  it('rests on a known source or says on what', () => {
    expect(ids.filter((id) => !calc.sources[id])).toEqual([])
    expect(ids.length > 0 || basis !== undefined).toBe(true)
  })
})

it.each(someCases(topics.flatMap((topic) => ('handbook' in topic ? topic.handbook.map((fact) => ({ id: topic.id, ...fact })) : []))))('$id: what a handbook says names its source: $says', ({ says, source }) => {
  expect(calc.sources[source]?.provenance).toBeDefined()
  expect(says).toMatch(/[.]$/)
})
