import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import * as calc from '@/lib/calc'
import { someCases } from '@/tests/support/cases'
import { expectClose } from '@/tests/support/expect-close'
import { computedValue, type PublishedCase } from './published-case'

const folder = path.join(import.meta.dirname, 'cases')
const files = readdirSync(folder).filter((name) => name.endsWith('.json')).sort()
const cases = files.map((file) => ({ file, ...(JSON.parse(readFileSync(path.join(folder, file), 'utf8')) as PublishedCase) }))

/** Every function of the sections computed so far is held against a figure from outside. */
const covered = [
  'crankDegFromMs', 'msFromCrankDeg', 'distributorDegFromCrank', 'crankDegFromDistributor', 'arcMm', 'degFromArcMm', 'firingSchedule',
  'sparkAdvanceDeg', 'advanceCurve', 'staggerDeg', 'proofSpeedRpm', 'staggerReport',
  'timingTorqueRatio', 'curvatureFromPoint', 'fitTimingParabola', 'brakeRatioFromIndicated',
  'deadCylinderPower', 'morseTest', 'frictionMepKpa', 'mepFromPower', 'powerFromMep',
  'fixedPitchOperatingPoint', 'constantSpeedOperatingPoint', 'runUpDrop', 'torqueRatioFromDrop', 'rotorRegister', 'bestPhasingDeg',
  'standardAtmosphere', 'densityAltitudeM', 'powerAtDensityRatio', 'powerRequiredKw', 'climbRateMps', 'bestClimb', 'outcome',
  'coilCurrentA', 'stalledCurrentA', 'dwellForCurrentMs', 'sparkEnergyMj', 'sparksPerSecond', 'dwellAvailableMs', 'sparkPeriodShare', 'coilHeat',
  'breakdownKv', 'sparkDemandKv', 'sparkMargin', 'pistonTravelMm', 'cylinderVolumeCc',
  'eventProbability', 'faultTreeProbability', 'timeAveragedProbability', 'minimalCutSets', 'importance', 'singlePoints', 'rateSensitivity',
  'normalQuantile', 'studentTQuantile', 'combineUncertainty', 'leastSquares', 'linearTrend', 'processCapability', 'cpkInterval', 'individualsChart', 'controlChartFactors',
  'evaluateBenchRun', 'benchReadingsToAdvance', 'evaluateTimingCheck', 'evaluateRunUp',
]

it('no function goes without a check', () => {
  const used = new Set(cases.flatMap(({ checks }) => checks.map(({ fn }) => fn)))
  expect(covered.filter((name) => !used.has(name))).toEqual([])
})

describe.each(someCases(cases))('$id: $title', ({ id, file, source, provenance, checks }) => {
  it('names a known source and says how it is known', () => {
    expect(file).toBe(`${id}.json`)
    const known = calc.sources[source]?.provenance
    expect(known, source).toBeDefined()
    if (provenance !== 'computed') expect(provenance).toBe(known)
  })

  it.each(someCases(checks))('$label', (check) => {
    expectClose(computedValue(calc, check), check.expected, check.tolerance)
  })
})
