import { readFileSync } from 'node:fs'
import path from 'node:path'
import { it } from 'vitest'
import { coilCurrentA } from '@/lib/calc/live'
import { someCases } from '@/tests/support/cases'
import { expectClose } from '@/tests/support/expect-close'
import type { PublishedCase } from './published-case'

/** Certified for y = b1·(1 − e^(−b2·x)): the current of a coil with V/R = b1 and R/L = b2. */
const certified = { b1: 2.3894212918e2, b2: 5.5015643181e-4, residualSquares: 1.2455138894e-1, residualSd: 1.0187876330e-1 }
const x = [77.6, 114.9, 141.1, 190.8, 239.9, 289.0, 332.8, 378.4, 434.8, 477.3, 536.8, 593.1, 689.1, 760.0]

it('at the certified parameters the current of a coil leaves the certified residual', () => {
  const file = JSON.parse(readFileSync(path.join(import.meta.dirname, 'cases/nist-misra1a.json'), 'utf8')) as PublishedCase
  const { values } = file.checks[0]?.args[0] as { readonly values: readonly number[] }
  const residuals = someCases(values).map((y, i) => y - coilCurrentA({ supplyV: certified.b1, ohm: 1, mh: 1 / certified.b2 }, x[i] ?? Number.NaN))
  const squares = residuals.reduce((sum, residual) => sum + residual * residual, 0)
  // The parameters are certified to 11 digits; at the least of squares the sum hardly moves with them.
  expectClose(squares, certified.residualSquares, { abs: 0.5e-11 })
  expectClose(Math.sqrt(squares / (values.length - 2)), certified.residualSd, { abs: 0.5e-11 })
})
