import { describe, expect, it } from 'vitest'
import * as calc from '@/lib/calc'
import { someCases } from '@/tests/support/cases'
import { declarations } from './declarations'

/** Calculations of the topics; the composed evaluation and its limits have no equation and no source of their own. */
const names = Object.entries(calc)
  .filter(([name, value]) => typeof value === 'function' && name !== 'CalcError' && name !== 'loadFormulaParser')
  .map(([name]) => name)
  .filter((name) => !/^(scenario\/|limits\.ts$)/.test(declarations.get(name)?.file ?? ''))

/** Half of the last decimal that the docstring prints. */
const toleranceOf = (literal: string): number => {
  const decimals = [...literal.matchAll(/\d\.(\d+)/g)].map(([, digits]) => digits?.length ?? 0)
  return decimals.length === 0 ? 0 : 0.5 * 10 ** -Math.max(...decimals)
}

const expectSame = (actual: unknown, expected: unknown, tolerance: number, line: string): void => {
  if (typeof expected === 'number') {
    expect(typeof actual, line).toBe('number')
    expect(Math.abs((actual as number) - expected), line).toBeLessThanOrEqual(tolerance + 1e-12 * Math.abs(expected))
  } else if (typeof expected === 'object' && expected !== null) {
    expect(Object.keys(actual as object), line).toEqual(Object.keys(expected))
    for (const [key, value] of Object.entries(expected)) expectSame((actual as Record<string, unknown>)[key], value, tolerance, line)
  } else {
    expect(actual, line).toBe(expected)
  }
}

/** In an async function, so that an example may wait. */
const AsyncFunction = (async () => {}).constructor as FunctionConstructor
const evaluate = (code: string): Promise<unknown> => new AsyncFunction(...Object.keys(calc), `return (${code})`)(...Object.values(calc)) as Promise<unknown>

describe.each(someCases(names))('%s', (name) => {
  const { doc = [], parameters = [] } = declarations.get(name) ?? {}
  const text = doc.join('\n')
  /** "as in `other`" stands for what the other docstring says. */
  const told = [text, ...[...text.matchAll(/as in `(\w+)`/g)].map(([, other]) => declarations.get(other ?? '')?.doc.join('\n') ?? '')].join('\n')

  it('says in its first line what comes out', () => {
    expect(doc[0]).toMatch(/^[A-Z].{20,}[.:;,]?/)
    expect(doc[1] === '' || doc.indexOf('') < 5).toBe(true)
  })

  it('names every argument, its unit or kind, and what it throws', () => {
    for (const { name: parameter, members } of parameters) {
      expect(text).toMatch(new RegExp(`@param ${parameter}[ .]`))
      for (const member of members) expect(told).toMatch(new RegExp(`\\b${member}\\b`))
    }
    expect(text).toMatch(/@throws CalcError (on|below) /)
  })

  it('states its range of validity and its source, and whether that was read', () => {
    expect(text).toMatch(/^Validity: ./m)
    const source = /^Source: (?:common practice, no published source\b.*|(?<id>[a-z0-9-]+)(?:, .+)? \((?<provenance>read|memory)\))\.?$/m.exec(text)
    expect(source, text).not.toBeNull()
    const { id, provenance } = source?.groups ?? {}
    if (id !== undefined) expect(calc.sources[id]?.provenance).toBe(provenance)
  })

  it('gives examples that hold', async () => {
    const examples = doc.slice(doc.indexOf('@example') + 1).filter((line) => line !== '')
    for (const line of someCases(examples)) {
      const [, code, literal] = /^(.+?) \/\/ → (.+)$/.exec(line) ?? []
      expect(code, line).toBeDefined()
      expectSame(await evaluate(code ?? ''), await evaluate(literal ?? ''), toleranceOf(literal ?? ''), line)
    }
  })
})
