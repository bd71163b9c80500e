/** Median time of the closed forms of a scenario, ms; printed as JSON. */
import '../lib/calc/index'
import { evaluateClosedForms } from '../lib/calc/scenario/evaluate-scenario'
import { sampleEngine, sampleSheet } from '../tests/support/samples'

const runs = 400
const scenarios = [
  { engine: sampleEngine(), sheet: sampleSheet() },
  { engine: sampleEngine(), sheet: sampleSheet({ primary: { schedule: { kind: 'formula', expression: 'rpm < 900 ? 12 : min(27, 12 + (rpm - 900) / 80)' }, latencyUs: 55 } }) },
]

const medians = scenarios.map((scenario) => {
  const times = Array.from({ length: runs }, (_, i) => {
    // Another figure each time, as a hand at work would give.
    const sheet = { ...scenario.sheet, mbt: { ...scenario.sheet.mbt, deg: 33 + (i % 50) / 10 } }
    const from = performance.now()
    evaluateClosedForms({ engine: scenario.engine, sheet })
    return performance.now() - from
  }).slice(50).sort((one, other) => one - other)
  return times[Math.floor(times.length / 2)] ?? NaN
})
console.log(JSON.stringify({ table: medians[0], formula: medians[1] }))
