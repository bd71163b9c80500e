import { describe, expect, it } from 'vitest'
import * as calc from '@/lib/calc'
import { someCases } from '@/tests/support/cases'
import { validCalls } from './valid-calls'

type Shape = 'number' | 'numberOrNull' | 'list' | 'promise' | readonly string[]

/** What the specification says each name gives: a number, a list, or an object with these members at least. */
const specified: Readonly<Record<string, Shape>> = {
  // 1 · angle, time, arc
  crankDegFromMs: 'number', msFromCrankDeg: 'number', distributorDegFromCrank: 'number', crankDegFromDistributor: 'number', arcMm: 'number', degFromArcMm: 'number', firingSchedule: 'list',
  // 2 · advance of one channel
  sparkAdvanceDeg: 'number', advanceCurve: 'list', staggerDeg: 'number', proofSpeedRpm: 'numberOrNull', staggerReport: ['atCranking', 'atIdle', 'atMax', 'smallest', 'largest', 'backupEverFirst'],
  // 3 · power against timing
  timingTorqueRatio: 'number', curvatureFromPoint: 'number', fitTimingParabola: ['mbtDeg', 'curvaturePerDeg2', 'torqueAtMbt', 'rSquared', 'residuals', 'extrapolated', 'mbtSeDeg'], brakeRatioFromIndicated: 'number',
  // 4 · dead cylinders
  deadCylinderPower: ['brakePowerKw', 'fraction', 'indicatedPowerKw', 'frictionPowerKw'], morseTest: ['indicatedKw', 'indicatedTotalKw', 'mechanicalEfficiency', 'frictionPowerKw', 'weakest'],
  frictionMepKpa: 'number', mepFromPower: 'number', powerFromMep: 'number',
  // 5 · propeller and run-up
  fixedPitchOperatingPoint: ['rpm', 'kw'], constantSpeedOperatingPoint: ['rpm', 'kw', 'governed'], runUpDrop: ['rpm', 'dropRpm'], torqueRatioFromDrop: 'number',
  // 6 · atmosphere and climb
  standardAtmosphere: ['temperatureK', 'pressureKpa', 'densityKgM3', 'densityRatio'], densityAltitudeM: 'number', powerAtDensityRatio: 'number', powerRequiredKw: 'number',
  bestClimb: ['speedMps', 'climbMps', 'gradient'], outcome: ['verdict', 'speedMps', 'climbMps', 'gradient', 'ceilingM'],
  // 7 · coil
  coilCurrentA: 'number', dwellForCurrentMs: 'number', sparkEnergyMj: 'number', sparksPerSecond: 'number', dwellAvailableMs: 'number', coilHeat: ['windingK', 'resistanceOhm', 'powerW', 'finalCurrentA'],
  // 8 · spark demand
  breakdownKv: 'number', sparkDemandKv: 'number', sparkMargin: ['offeredKv', 'marginKv', 'ratio'],
  // 9 · rotor register
  rotorRegister: 'list', bestPhasingDeg: 'number',
  // 10 · closed cycle
  simulateCycle: ['workJ', 'imepKpa', 'efficiency', 'peakKpa', 'peakDeg', 'ca50Deg', 'heatLossJ', 'knock'], findMbt: ['mbtDeg', 'workJ', 'imepKpa'], knockLimitedSpark: ['limitDeg', 'marginDeg', 'state'],
  sparkMap: 'promise', scaleBurn: ['delayDeg', 'durationDeg'], calibrateBurn: ['delayDeg', 'durationDeg'], crankTorque: ['angleDeg', 'torqueNm', 'meanNm', 'rippleNm', 'orders'],
  combustionEfficiency: 'number', chargePressureFromVolumetricEfficiency: 'number',
  // 11 · redundancy
  eventProbability: 'number', faultTreeProbability: 'number', timeAveragedProbability: 'number', minimalCutSets: 'list', importance: 'list', singlePoints: 'list',
  ignitionTree: ['noSpark', 'channelLost', 'cylinderLost'], rateSensitivity: 'list',
  // 12 · tolerance, bench and check statistics
  combineUncertainty: ['standard', 'effectiveDof', 'coverageFactor', 'expanded', 'worstCase'], evaluateBenchRun: ['rows', 'stagger', 'scatter', 'crankRetard', 'pass'], benchReadingsToAdvance: 'list',
  evaluateTimingCheck: ['planDeg', 'deviationDeg', 'verdict', 'warning', 'aboveIdle'], evaluateRunUp: ['primary', 'backup', 'differenceRpm', 'pass'],
  linearTrend: ['slopePerH', 'intercept', 'slopeSe', 'interceptSe', 'residualSd', 'prediction', 'hoursToLimit'], processCapability: ['mean', 'sd', 'cp', 'cpk', 'cpm'],
  individualsChart: ['mean', 'meanMovingRange', 'lower', 'upper', 'movingRangeUpper', 'outside'],
}

const faceOf = calc as unknown as Record<string, (...args: readonly unknown[]) => unknown>

describe.each(someCases(Object.entries(specified)))('%s', (name, shape) => {
  it('is exported and gives what the specification says', async () => {
    expect(typeof faceOf[name], name).toBe('function')
    const calls = (validCalls as Record<string, readonly (readonly unknown[])[] | undefined>)[name] ?? []
    for (const args of someCases(calls)) {
      const result = faceOf[name]?.(...args)
      if (shape === 'promise') {
        expect(result).toBeInstanceOf(Promise)
        expect(Object.keys(await result as object)).toEqual(expect.arrayContaining(['rpm', 'pressureKpa', 'mbtDeg', 'knockLimitDeg', 'sparkDeg']))
      } else if (shape === 'list') expect(Array.isArray(result)).toBe(true)
      else if (shape === 'number') expect(typeof result).toBe('number')
      else if (shape === 'numberOrNull') expect(result === null || typeof result === 'number').toBe(true)
      else expect(Object.keys(result as object)).toEqual(expect.arrayContaining([...shape]))
    }
  })
})

it('the whole course over crank angle comes with a cycle unless it is not wanted', () => {
  const [[input] = []] = validCalls.simulateCycle ?? []
  if (!input) throw new Error('simulateCycle has no valid call')
  const course = calc.simulateCycle({ ...input, arrays: true })
  for (const list of [course.thetaDeg, course.pressureKpa, course.temperatureK, course.burned]) expect(list).toBeInstanceOf(Float64Array)
})

it('the error, the version and the table of sources are public too', () => {
  expect(new calc.CalcError({ field: 'rpm', value: 0, limit: '> 0', unit: 'rpm', message: 'x' })).toBeInstanceOf(RangeError)
  expect(calc.calcVersion).toMatch(/^\d+\.\d+\.\d+$/)
  expect(Object.keys(calc.sources).length).toBeGreaterThan(10)
})
