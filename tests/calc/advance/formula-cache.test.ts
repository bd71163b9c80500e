import { expect, it } from 'vitest'
import '@/lib/calc'
import { compileFormula } from '@/lib/calc/advance/formula'

it('compiles a text once and forgets the oldest of many', () => {
  const first = compileFormula('rpm + 0.5', 'f')
  expect(compileFormula('rpm + 0.5', 'f')).toBe(first)
  for (let i = 0; i < 64; i += 1) compileFormula(`rpm + ${i}`, 'f')
  expect(compileFormula('rpm + 0.5', 'f')).not.toBe(first)
  expect(compileFormula('rpm + 63', 'f')).toBe(compileFormula('rpm + 63', 'f'))
})
