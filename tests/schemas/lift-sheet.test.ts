import { expect, test } from 'vitest'
import { liftSheet } from '@/lib/schemas/lift-sheet'
import { scenarioSheet, sheetVersion } from '@/lib/schemas/scenario'
import { statedDefaults } from '@/lib/schemas/stated-defaults'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { firstSheet } from '@/tests/support/first-sheet'

test('a sheet of version 1 is given the stated defaults and keeps all that was typed', () => {
  const stored = deepFreeze(firstSheet())
  const lifted = scenarioSheet.parse(liftSheet(stored, 1, sheetVersion))
  const { tolerances, ...others } = statedDefaults()
  expect(lifted).toEqual({ ...stored, ...others, tolerances: { timingCheckDeg: 1.5, benchDeg: 0.4, ...tolerances } })
})

test('a sheet of today is not touched', () => {
  const today = { anything: 1 }
  expect(liftSheet(today, sheetVersion, sheetVersion)).toBe(today)
})

test('what is no sheet stays as it is, for the schema to refuse', () => {
  for (const stored of [null, 'sheet', 4, [1, 2]]) expect(liftSheet(stored, 1, 2)).toEqual(stored)
  expect(scenarioSheet.safeParse(liftSheet({ tolerances: null }, 1, 2)).success).toBe(false)
})
