import { describe, expect, it } from 'vitest'
import { mostLines } from '@/lib/units/block-text'
import type { Column } from '@/lib/units/table'
import { formatTable, keepUntouchedTable, parseTable } from '@/lib/units/table'
import { someCases } from '@/tests/support/cases'

const columns: Column[] = [{ kind: 'engineSpeed', label: 'Speed' }, { kind: 'angle', label: 'Advance' }]
const gaps: Column[] = [{ kind: 'engineSpeed', label: 'Speed' }, { kind: 'length', label: 'Gap' }]
const rows = [[1000, 20.5], [2450, 26.5]]

const sentences = (text: string, of = columns) => {
  const result = parseTable(text, of, 'metric')
  return result.ok ? expect.fail(`read as ${JSON.stringify(result.rows)}`) : result.errors
}

describe('a pasted block', () => {
  it.each(someCases<readonly [string, string]>([
    ['tabs', '1000\t20.5\n2450\t26.5'], ['tabs and decimal commas', '1000\t20,5\r\n2450\t26,5'], ['tabs and thousands', '1 000\t20.5\n2 450\t26.5'], ['empty cells at the end', '1000\t20.5\t\t\n2450\t26.5\t\t'],
    ['semicolons', '1000;20,5\n2450;26,5'], ['semicolons at the end', '1000;20.5;\n2450;26.5;'], ['commas and points', '1000,20.5\n2450,26.5'], ['commas with spaces', '1000, 20.5\n2450, 26.5'],
    ['aligned spaces', '1000   20.5\n2450   26.5'], ['aligned spaces and decimal commas', '1000   20,5\n2450   26,5'], ['single spaces', '1000 20.5\n2450 26.5'], ['single spaces and decimal commas', '1000 20,5\n2450 26,5'],
    ['single and several spaces', '1000 20.5\n2450    26.5'], ['blank lines', '\n1000\t20.5\n  \n\n2450\t26.5\n\n'], ['a heading', 'rpm\tdeg\n1000\t20.5\n2450\t26.5'], ['a heading that begins with a digit', '1/min\tdeg\n1000\t20.5\n2450\t26.5'], ['a heading with words', 'Engine speed;Advance A\n1000;20.5\n2450;26.5'],
    ['units in cells', '1000 rpm\t20.5°\n2450 1/min\t26.5 deg'], ['units and several spaces', '1000 rpm   20.5 deg\n2450 rpm   26.5 deg'], ['old line ends', '1000\t20.5\r2450\t26.5'], ['spaces before', '   1000 20.5\n   2450 26.5'],
    ['no-break spaces in numbers', '1\u202f000 20.5\n2\u00a0450 26.5'],
  ]))('%s', (_, text) => {
    expect(parseTable(text, columns, 'metric')).toMatchObject({ ok: true, rows })
  })

  it('says which heading it passed over', () => {
    expect(parseTable('rpm;deg\n1000;20.5', columns, 'metric')).toMatchObject({ heading: 'rpm;deg' })
    expect(parseTable('1000;20.5', columns, 'metric')).toMatchObject({ heading: null })
  })

  it('takes a unit from the heading', () => {
    for (const heading of someCases(['rpm\tin', 'Speed (rpm)\tGap (in)', 'Speed\tGap [in]', 'Speed\tGap (feeler) (inch)'])) {
      expect(parseTable(`${heading}\n1000\t0.5`, gaps, 'metric'), heading).toMatchObject({ ok: true, rows: [[1000, 12.7]] })
    }
    expect(parseTable('Engine speed (rpm) Gap (in)\n1000 0.5', gaps, 'metric')).toMatchObject({ ok: true, rows: [[1000, 12.7]] })
    expect(parseTable('Speed (rpm)\tGap (in)\n1000\t5 mm', gaps, 'metric')).toMatchObject({ rows: [[1000, 5]] })
    expect(parseTable('Speed\tGap (small)\n1000\t5', gaps, 'metric')).toMatchObject({ rows: [[1000, 5]] })
    expect(parseTable('Speed\tGap\n1000\t0.5', gaps, 'us')).toMatchObject({ rows: [[1000, 12.7]] })
  })

  it('refuses a heading whose units do not fit or cannot be placed', () => {
    expect(sentences('Speed (kg)\tGap (in)\n1000\t0.5', gaps)).toEqual([{ line: 1, column: 1, sentence: 'Line 1, Speed: “kg” measures mass, which does not fit here. It takes rpm; without a unit, a number in rpm, for example 2450.' }])
    expect(sentences('Engine speed, Gap size (in)\n1000 0.5', gaps)).toHaveLength(1)
    expect(sentences('The engine speed and Gap (in)\n1000 0.5', gaps)).toEqual([{ line: 1, column: null, sentence: expect.stringContaining('units in the heading') }])
  })

  it('reads one column, in which a comma is a decimal comma', () => {
    const one: Column[] = [{ kind: 'power', label: 'Power' }]
    expect(parseTable('20,5\n26.5 kW\n10 000', one, 'metric')).toMatchObject({ rows: [[20.5], [26.5], [10000]] })
  })
})

describe('what a block is refused for', () => {
  it('names line, column and reason of each cell', () => {
    expect(sentences('1000\t20.5\n\n2450\tabc\nx\t\n')).toEqual([
      { line: 3, column: 2, sentence: 'Line 3, Advance: “abc” holds no number. Type a number in degrees, for example 26.5.' },
      { line: 4, column: null, sentence: 'Line 4 holds 1 value where 2 are expected (Speed, Advance). Part the columns with tabs or semicolons.' },
    ])
    expect(sentences('1000\t\t\n2450\t26.5')[0]?.line).toBe(1)
    expect(sentences(';20.5\n2450;26.5')).toEqual([{ line: 1, column: 1, sentence: 'Line 1, Speed is empty. Type a number in rpm, for example 2450.' }])
  })

  it('keeps to the mark that fits most lines', () => {
    expect(sentences('1000, 20.5\n2450, abc')).toEqual([{ line: 2, column: 2, sentence: expect.stringContaining('Line 2, Advance: “abc”') }])
    expect(sentences('1000  20.5\n2450  2 6 5')).toEqual([{ line: 2, column: 2, sentence: expect.stringContaining('more than one number') }])
    expect(sentences('1000 rmp  20.5 dge').map((error) => error.column)).toEqual([1, 2])
    expect(sentences('1000,20,5')).toEqual([{ line: 1, column: null, sentence: expect.stringContaining('holds 3 values where 2') }])
  })

  it.each(someCases(['100 285,5', '10 000,20', '1 000,20\n2 450,26']))('%j, which can be read in two ways', (text) => {
    expect(sentences(text)).toEqual([{ line: 1, column: null, sentence: expect.stringContaining('in two ways') }])
  })

  it('takes such a line where the others settle it', () => {
    expect(parseTable('100 285,5\n2450 26,5', columns, 'metric')).toMatchObject({ rows: [[100, 285.5], [2450, 26.5]] })
  })

  it('a thousand that may be a decimal', () => {
    expect(sentences('1,200\t20.5')).toEqual([{ line: 1, column: 1, sentence: 'Line 1, Speed: “1,200” can be read as 1.200 or as 1200. Type the one you mean.' }])
    expect(sentences('1,200 20.5').length).toBeGreaterThan(0)
  })

  it('nothing in it', () => {
    for (const text of someCases(['', ' \n\t\n', 'rpm\tdeg'])) {
      expect(sentences(text)).toEqual([{ line: 1, column: null, sentence: 'There is no line with numbers. Type or paste one row a line, for example 2450; 26.5' }])
    }
  })

  it('a paste of too many lines, at once', () => {
    const line = '1000\t20.5\n'
    expect(parseTable(line.repeat(mostLines), columns, 'metric').ok).toBe(true)
    expect(sentences(line.repeat(mostLines + 1))).toEqual([{ line: 1001, column: null, sentence: 'Line 1001: at most 1000 lines can be read at once.' }])
  })
})

describe('a text box filled from rows', () => {
  it('is read back', () => {
    expect(formatTable(rows, columns, 'us')).toBe('1000\t20.5\n2450\t26.5')
    expect(parseTable(formatTable(rows, columns, 'us'), columns, 'us')).toMatchObject({ ok: true, rows })
  })

  it('gives the very rows back when nobody touched it', () => {
    const stored = [[1000, 12.3456789], [2450, 1 / 3]]
    const text = formatTable(stored, gaps, 'us').replaceAll('\n', '\r\n')
    expect(keepUntouchedTable(`${text}\r\n`, gaps, 'us', stored)).toEqual({ ok: true, rows: stored, heading: null })
    const touched = keepUntouchedTable(text.replace('2450', '2451'), gaps, 'us', stored)
    expect(touched.ok && touched.rows[1]?.[0]).toBe(2451)
    expect(keepUntouchedTable('', gaps, 'us', []).ok).toBe(false)
    expect(keepUntouchedTable('1000;1', gaps, 'metric', null)).toMatchObject({ ok: true, rows: [[1000, 1]] })
  })
})
