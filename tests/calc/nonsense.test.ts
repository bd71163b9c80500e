import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import * as calc from '@/lib/calc'
import * as live from '@/lib/calc/live'
import { someCases } from '@/tests/support/cases'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { declarations } from './declarations'
import { validCalls } from './valid-calls'

type AnyFunction = (...args: readonly unknown[]) => unknown
const calls = Object.entries(validCalls).flatMap(([name, list]) => list.map((args) => ({ name, args: deepFreeze(args) as readonly unknown[] })))
const functionOf = (name: string) => (calc as unknown as Record<string, AnyFunction>)[name] as AnyFunction

const nonsense: readonly unknown[] = [
  undefined, null, Number.NaN, Infinity, -Infinity, 0, -0, -1, -1e9, 2.5, 1e9, 1e15, 1e308, -1e308, 5e-324, Number.MAX_SAFE_INTEGER,
  '', '5', 'abc', 'falling', true, false, [], [[]], [Number.NaN], [1, 2, 3], {}, { rpm: 1 }, new Array(1_000_000), Array.from({ length: 50_000 }, (_, i) => i),
  () => 1, () => Number.NaN, Symbol('x'), 10n, new Date(0), new Map(), /x/,
]

/** Every place in a value, from the whole to its leaves. */
const placesIn = (value: unknown, path: readonly string[] = []): (readonly string[])[] => {
  const inner = typeof value === 'object' && value !== null ? Object.entries(value).flatMap(([key, part]) => placesIn(part, [...path, key])) : []
  return [path, ...inner]
}

const spoil = (value: unknown, [key, ...rest]: readonly string[], by: unknown): unknown => {
  if (key === undefined) return by
  if (Array.isArray(value)) return value.map((part, i) => (String(i) === key ? spoil(part, rest, by) : part))
  return { ...(value as object), [key]: spoil((value as Record<string, unknown>)[key], rest, by) }
}

/** The first part of a result that is neither a finite number nor a text, a truth value or null; nothing when there is none. */
const flawIn = (value: unknown): unknown => {
  if (typeof value === 'number') return Number.isFinite(value) ? undefined : value
  if (typeof value === 'object' && value !== null) {
    for (const part of Object.values(value)) {
      const flaw = flawIn(part)
      if (flaw !== undefined) return flaw
    }
    return undefined
  }
  return value === null || typeof value === 'string' || typeof value === 'boolean' ? undefined : `a part of type ${typeof value}`
}
const expectFinite = (value: unknown, about: string): void => {
  const flaw = flawIn(value)
  if (flaw !== undefined) expect.fail(`${about}: ${String(flaw)}`)
}

/** A CalcError with a place and words, or a result that is finite to its last number. */
const expectAnswer = async (name: string, args: readonly unknown[], about: string): Promise<void> => {
  let result: unknown
  try {
    result = functionOf(name)(...args)
    if (result instanceof Promise) result = await result
  } catch (error) {
    if (!(error instanceof calc.CalcError)) throw new Error(`${about}: ${String(error)}`, { cause: error })
    expect(error.field, about).toMatch(/^[a-z]\w*(\.\w+)*$/i)
    expect(error.limit, about).not.toBe('')
    expect(error.message, about).toMatch(/^[A-Z].*[.]$/s)
    return
  }
  expectFinite(result, about)
}

it('every exported function has a valid call to spoil', () => {
  const names = Object.entries(calc).filter(([name, value]) => typeof value === 'function' && name !== 'CalcError' && name !== 'loadFormulaParser').map(([name]) => name)
  const topics = names.filter((name) => !/^(scenario\/|limits\.ts$)/.test(declarations.get(name)?.file ?? ''))
  expect(Object.keys(validCalls).sort()).toEqual(someCases(topics).slice().sort())
})

it('the face without the parser exports the same names', () => {
  expect(Object.keys(live).sort()).toEqual(Object.keys(calc).sort())
})

describe.each(someCases(calls))('$name', ({ name, args }) => {
  it('computes, and never writes to its frozen arguments', async () => {
    const result = await functionOf(name)(...args)
    expectFinite(result, name)
    expect(await functionOf(name)(...args)).toEqual(result)
  })

  it('answers any spoilt value with a CalcError or a finite result', async () => {
    for (const path of placesIn(args).filter((place) => place.length > 0)) {
      for (const bad of nonsense) await expectAnswer(name, spoil(args, path, bad) as unknown[], `${name}: ${path.join('.')} = ${typeof bad === 'object' ? Object.prototype.toString.call(bad) : String(bad)}`)
    }
  }, 30_000)

  it('answers anything at all', async () => {
    await fc.assert(fc.asyncProperty(fc.array(fc.anything(), { maxLength: 3 }), (any) => expectAnswer(name, any, name)), { numRuns: 50 })
    await expectAnswer(name, [], name)
  })
})
