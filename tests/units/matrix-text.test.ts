import { describe, expect, it } from 'vitest'
import type { MatrixShape } from '@/lib/units/table'
import { formatMatrix, keepUntouchedMatrix, parseMatrix } from '@/lib/units/table'
import { someCases } from '@/tests/support/cases'
import { expectClose } from '@/tests/support/expect-close'

const shape: MatrixShape = {
  row: { kind: 'engineSpeed', label: 'Speed' },
  column: { kind: 'pressure', label: 'Manifold pressure' },
  cell: { kind: 'angle', label: 'Advance' },
}
const matrix = { rows: [1000, 2450], columns: [60, 80, 95], cells: [[24, 21.5, 19], [31, 27, 22.5]] }

const errorsOf = (text: string) => {
  const result = parseMatrix(text, shape, 'metric')
  return result.ok ? expect.fail(`read as ${JSON.stringify(result.matrix)}`) : result.errors
}

describe('a pasted map', () => {
  it.each(someCases<readonly [string, string]>([
    ['an empty corner', '\t60\t80\t95\n1000\t24\t21.5\t19\n2450\t31\t27\t22.5'], ['no corner', '60\t80\t95\n1000\t24\t21.5\t19\n2450\t31\t27\t22.5'],
    ['words in the corner', 'map A\t60\t80\t95\n1000\t24\t21.5\t19\n2450\t31\t27\t22.5'], ['units in the corner', '1/min \\ bar\t0.6\t0.8\t0.95\n1000\t24\t21.5\t19\n2450\t31\t27\t22.5'],
    ['a slash', 'rpm/kPa\t60\t80\t95\n1000\t24\t21.5\t19\n2450\t31\t27\t22.5'], ['brackets', 'Speed (rpm) \\ Pressure (kPa)\t60\t80\t95\n1000\t24\t21.5\t19\n2450\t31\t27\t22.5'],
    ['semicolons and decimal commas', ';60;80;95\n1000;24;21,5;19\n2450;31;27;22,5'], ['commas', ',60,80,95\n1000,24,21.5,19\n2450,31,27,22.5'],
    ['spaces', '60 80 95\n1000 24 21.5 19\n2450 31 27 22.5'], ['aligned spaces', '        60    80    95\n1000    24  21,5    19\n2450    31    27  22,5'],
    ['blank lines and empty cells at the end', '\n\t60\t80\t95\t\n\n1000\t24\t21.5\t19\t\n2450\t31\t27\t22.5\n'],
  ]))('with %s', (_, text) => {
    expect(parseMatrix(text, shape, 'metric')).toEqual({ ok: true, matrix })
  })

  it('reads plain numbers in the person’s units, and the corner’s units before them', () => {
    const us = parseMatrix('\t30\n1000\t24', shape, 'us')
    expectClose(us.ok ? us.matrix.columns[0] : null, 101.59165921023, { rel: 1e-12 })
    for (const corner of someCases(['rpm \\ kPa', 'rpm/kPa', 'Speed (rpm) | Pressure [kPa]'])) {
      expect(parseMatrix(`${corner}\t95\n1000\t24`, shape, 'us'), corner).toMatchObject({ matrix: { columns: [95] } })
    }
    expect(parseMatrix('in \\ kPa\t95\n2\t24', { ...shape, row: { kind: 'length', label: 'Gap' } }, 'metric')).toMatchObject({ matrix: { rows: [50.8], columns: [95] } })
  })
})

describe('what a map is refused for', () => {
  it('names line, column and reason', () => {
    expect(errorsOf('\t60\t80\n1000\t24\tabc\n2450\t31')).toEqual([
      { line: 2, column: 3, sentence: 'Line 2, column 3, Advance: “abc” holds no number. Type a number in degrees, for example 26.5.' },
      { line: 3, column: null, sentence: 'Line 3 holds 2 values where 3 are expected. Part the columns with tabs or semicolons.' },
    ])
    expect(errorsOf('\t60\t-\n1000\t24\t31')).toEqual([{ line: 1, column: 3, sentence: expect.stringContaining('Line 1, column 3, Manifold pressure: “-”') }])
    expect(errorsOf('60\t80\t90\t95\n1000\t24\t31')).toEqual([{ line: 1, column: null, sentence: expect.stringContaining('Line 1 holds 4 values where 2') }])
    expect(errorsOf('\t60\t80\n1000\t\t31')).toEqual([{ line: 2, column: 2, sentence: expect.stringContaining('Advance is empty') }])
  })

  it('a number in the corner', () => {
    expect(errorsOf('0\t60\t80\n1000\t24\t31')).toEqual([{ line: 1, column: 1, sentence: 'Line 1: the corner holds 0, a number that belongs to nothing. Leave it empty; the first line holds Manifold pressure, the first column Speed.' }])
  })

  it('a block that is turned', () => {
    expect(errorsOf('kPa \\ rpm\t1000\t2450\n60\t24\t31').map((error) => error.sentence)).toEqual([
      expect.stringContaining('Line 1, Speed: “kPa” measures pressure'), expect.stringContaining('Line 1, Manifold pressure: “rpm” measures a speed of rotation'),
    ])
  })

  it('a block of one line, one column, or nothing', () => {
    for (const text of someCases(['', '60\t80', '\n\n60 80'])) expect(errorsOf(text)).toEqual([{ line: expect.any(Number), column: null, sentence: 'A map needs a first line with Manifold pressure, then one line for each Speed.' }])
    expect(errorsOf('60\n1000\n2450')).toEqual([{ line: 2, column: null, sentence: expect.stringContaining('holds one value') }])
  })
})

describe('a text box filled from a map', () => {
  it('is read back, in either system by either', () => {
    expect(formatMatrix(matrix, shape, 'metric')).toBe('rpm \\ kPa\t60\t80\t95\n1000\t24\t21.5\t19\n2450\t31\t27\t22.5')
    for (const written of ['metric', 'us'] as const) {
      for (const read of ['metric', 'us'] as const) {
        const result = parseMatrix(formatMatrix(matrix, shape, written), shape, read)
        expect(result.ok && result.matrix.rows).toEqual(matrix.rows)
        for (const [i, value] of matrix.columns.entries()) expectClose(result.ok ? result.matrix.columns[i] : null, value, { rel: 1e-5 })
      }
    }
  })

  it('gives the very map back when nobody touched it, as a copy', () => {
    const stored = { ...matrix, columns: [60.123456789, 80, 95] }
    const text = formatMatrix(stored, shape, 'us').replaceAll('\n', '\r\n')
    const kept = keepUntouchedMatrix(text, shape, 'us', stored)
    expect(kept).toEqual({ ok: true, matrix: stored })
    expect(kept.ok && kept.matrix.columns).not.toBe(stored.columns)
    const touched = keepUntouchedMatrix(text.replace('2450', '2451'), shape, 'us', stored)
    expect(touched.ok && touched.matrix.rows).toEqual([1000, 2451])
    expect(keepUntouchedMatrix('', shape, 'us', null).ok).toBe(false)
  })
})
