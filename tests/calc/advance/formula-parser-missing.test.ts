import { expect, it } from 'vitest'
import { loadFormulaParser, sparkAdvanceDeg } from '@/lib/calc/live'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { fixed, formula } from './channels'

it('without its parser a formula is an error that can be told from others; once loaded it computes', async () => {
  const compute = () => sparkAdvanceDeg(formula('rpm / 100'), { rpm: 1500 })
  expect(sparkAdvanceDeg(fixed(20), { rpm: 1500 })).toBe(20)
  const error = expectCalcError(compute, 'channel.schedule.expression')
  expect(error.code).toBe('formulaParserNotLoaded')
  expect(error.message).toContain('not loaded')
  expect(error.details()).toMatchObject({ field: 'channel.schedule.expression', code: 'formulaParserNotLoaded', value: 'rpm / 100' })
  await loadFormulaParser()
  expect(compute()).toBe(15)
  // Loading the parser's many files may take seconds on a busy machine.
}, 60_000)
