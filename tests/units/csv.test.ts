import { describe, expect, it } from 'vitest'
import { toCsv } from '@/lib/units/csv'
import { someCases } from '@/tests/support/cases'

describe('CSV', () => {
  it('ends lines with CR LF and writes numbers with a point', () => {
    expect(toCsv([[1000, 26.5], [2450, -4]], ['rpm', 'A'])).toBe('rpm,A\r\n1000,26.5\r\n2450,-4\r\n')
  })

  it('quotes what needs it and doubles quotes', () => {
    expect(toCsv([['a,b', 'say "x"', 'two\nlines', ' plain ']], ['h'])).toBe('h\r\n"a,b","say ""x""","two\nlines", plain \r\n')
  })

  it('leaves a cell empty for nothing', () => {
    expect(toCsv([[null, undefined, '', false]], ['a', 'b', 'c', 'd'])).toBe('a,b,c,d\r\n,,,false\r\n')
  })

  it.each(someCases(['=1+1', '+cmd', '-cmd', '@sum', '\t=1', '\tx', '\r=1', ' =1', '\uff1d1', '=HYPERLINK("x")']))('disarms %j, in rows and heading', (text) => {
    const [heading, cell] = [toCsv([], [text]), toCsv([[text]], ['h']).slice(3)]
    for (const written of [heading, cell]) expect(written.replace(/^"/, '').startsWith("'")).toBe(true)
  })

  it.each(someCases(['-4', '+4.5', '-1e-3', '\u22124', '4-5']))('leaves %s alone', (text) => {
    expect(toCsv([[text]], ['h'])).toBe(`h\r\n${text}\r\n`)
  })

  it('refuses numbers that are none', () => {
    for (const value of someCases([NaN, Infinity])) expect(() => toCsv([[value]], ['h'])).toThrow(RangeError)
  })
})
