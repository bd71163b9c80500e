import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { convert, families } from '@/lib/units/families'
import type { FamilyName, Unit } from '@/lib/units/families'
import { formatInput, formatNumber, formatQuantity } from '@/lib/units/format'
import { keepUntouched, parseQuantity } from '@/lib/units/parse'
import { quantityKinds, quantityOf, shownIn } from '@/lib/units/quantities'
import type { Column } from '@/lib/units/table'
import { formatMatrix, formatTable, parseMatrix, parseTable } from '@/lib/units/table'
import { expectClose } from '@/tests/support/expect-close'

const system = fc.constantFrom('metric' as const, 'us' as const)
const kind = fc.constantFrom(...quantityKinds)
const number = fc.oneof(fc.double({ min: -1e6, max: 1e6, noNaN: true }), fc.double({ min: -1, max: 1, noNaN: true }), fc.integer({ min: -99_999, max: 99_999 })).filter((x) => x === 0 || Math.abs(x) > 1e-9)

/** Six digits of the number in the unit shown. */
const shownTolerance = { rel: 5.1e-6, abs: 1e-9 }

describe('there and back', () => {
  it('units: any two of a family', () => {
    fc.assert(fc.property(fc.constantFrom(...(Object.keys(families) as FamilyName[])), fc.nat(), fc.nat(), number, (name, i, j, value) => {
      const units: readonly Unit[] = families[name].units
      const [from, to] = [units[i % units.length] as Unit, units[j % units.length] as Unit]
      // The zero of a temperature scale costs the digits of its offset.
      expectClose(convert(convert(value, from, to), to, from), value, { rel: 1e-12, abs: from.offset || to.offset ? 1e-9 : 0 })
    }))
  })

  it('a form field: what it shows is what it gives, to six digits, and shows again', () => {
    fc.assert(fc.property(kind, system, number, (of, by, value) => {
      const base = convert(value, shownIn(of, by).unit, quantityOf(of).base)
      const text = formatInput(base, of, by)
      expect(text).toMatch(/^-?\d+(\.\d+)?(e-\d+)?$/)
      const read = parseQuantity(text, of, by)
      const readValue = read.ok ? convert(read.value, quantityOf(of).base, shownIn(of, by).unit) : NaN
      expectClose(readValue, value, shownTolerance)
      expect(read.ok && formatInput(read.value, of, by)).toBe(text)
    }), { numRuns: 1000 })
  })

  it('a form field nobody touched keeps its value to the last bit', () => {
    fc.assert(fc.property(kind, system, number, (of, by, base) => {
      const kept = keepUntouched(formatInput(base, of, by), of, by, base)
      expect(kept.ok && kept.value).toBe(base)
    }))
  })

  it('a shown value is read as what is shown, in its own unit and in the other system', () => {
    fc.assert(fc.property(kind, system, system, number, fc.boolean(), (of, by, other, value, sign) => {
      const { unit } = shownIn(of, by)
      const { text, unit: symbol, joined } = formatQuantity(convert(value, unit, quantityOf(of).base), of, by, { decimals: 4, sign })
      // A power of ten has its decimals behind its first digit.
      const rel = shownIn(of, by).powerOfTen ? 0.51e-4 : 1e-11
      // Ratio and percent take "%" in both systems; kinds without a symbol are read in the system they were shown in.
      const read = parseQuantity(`${text}${joined ? '' : ' '}${symbol}`, of, symbol === '' ? by : other)
      const readValue = read.ok ? convert(read.value, quantityOf(of).base, unit) : NaN
      expectClose(readValue, value, { abs: 0.5001e-4, rel })
    }), { numRuns: 1000 })
  })

  it('rounding is half away from zero, like the decimal digits say', () => {
    fc.assert(fc.property(fc.integer({ min: -999_999, max: 999_999 }), fc.integer({ min: 0, max: 4 }), (steps, decimals) => {
      // A half step of the last decimal, written out in digits, so that no binary fraction has a say.
      const half = Number(`${steps}5e${-decimals - 1}`)
      const shown = Number(formatNumber(half, decimals).replace('\u2212', '-').replace(/\u202f/g, ''))
      const away = (Math.abs(steps) + 1) * (steps < 0 ? -1 : 1)
      expectClose(shown, Number(`${away}e${-decimals}`), { rel: 1e-12 })
    }))
  })
})

describe('any text at all', () => {
  it('is read as a finite number or refused, in every kind', () => {
    const typed = fc.oneof(fc.string({ unit: 'grapheme' }), fc.string({ unit: fc.constantFrom(...'0123456789.,-+e \'"°/%minskWhp\u202f\u2212'.split('')) }))
    fc.assert(fc.property(kind, system, typed, (of, by, text) => {
      const read = parseQuantity(text, of, by)
      expect(read.ok ? Number.isFinite(read.value) : read.code.length > 0).toBe(true)
    }), { numRuns: 3000 })
  })
})

describe('pasted blocks, there and back', () => {
  const column = kind.map((of): Column => ({ kind: of, label: of }))

  it('tables of any columns', () => {
    const table = fc.array(column, { minLength: 1, maxLength: 5 }).chain((columns) => fc.record({
      columns: fc.constant(columns), by: system,
      rows: fc.array(fc.tuple(...columns.map(() => number)), { minLength: 1, maxLength: 8 }),
    }))
    fc.assert(fc.property(table, ({ columns, by, rows }) => {
      const base = rows.map((row) => columns.map((of, j) => convert(row[j] ?? NaN, shownIn(of.kind, by).unit, quantityOf(of.kind).base)))
      const text = formatTable(base, columns, by)
      const read = parseTable(text, columns, by)
      expect(read.ok && formatTable(read.rows, columns, by)).toBe(text)
    }))
  })

  it('maps of any size', () => {
    const shape = { row: { kind: 'engineSpeed', label: 'n' }, column: { kind: 'pressure', label: 'p' }, cell: { kind: 'angle', label: 'a' } } as const
    const some = (length: number) => fc.array(number, { minLength: length, maxLength: length })
    const map = fc.tuple(fc.integer({ min: 1, max: 6 }), fc.integer({ min: 1, max: 6 })).chain(([n, m]) => fc.record({
      rows: some(n), columns: some(m), cells: fc.array(some(m), { minLength: n, maxLength: n }),
    }))
    fc.assert(fc.property(map, system, (matrix, by) => {
      const text = formatMatrix(matrix, shape, by)
      const read = parseMatrix(text, shape, by)
      expect(read.ok && formatMatrix(read.matrix, shape, by)).toBe(text)
    }))
  })
})
