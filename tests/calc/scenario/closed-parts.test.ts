import { describe, expect, test } from 'vitest'
import { combineUncertainty, deadCylinderPower, evaluateClosedForms, powerAtDensityRatio, standardAtmosphere, type Engine, type Part, type Scenario, type ScenarioSheet } from '@/lib/calc'
import { curvePowerKw, frictionPowerAt, timingRatioOf } from '@/lib/calc/scenario/power-parts'
import { readyScenario } from '@/lib/calc/scenario/ready-scenario'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectClose } from '@/tests/support/expect-close'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const scenario = (engine: Partial<Engine> = {}, sheet: Partial<ScenarioSheet> = {}): Scenario => deepFreeze({ engine: sampleEngine(engine), sheet: sampleSheet(sheet) })
const got = <T extends object>(part: Part<T>): T => {
  if (!part.ok) throw new Error(JSON.stringify(part.error))
  return part
}
const { airframe, coils, redundancy } = sampleSheet()

describe('climb', () => {
  const high = scenario({}, { conditions: { pressureAltitudeM: 2400, temperatureK: 290 } })
  const climb = got(evaluateClosedForms(high).parts.climb)
  const { densityRatio } = standardAtmosphere({ altitudeM: climb.densityAltitudeM })
  const lapse = powerAtDensityRatio(densityRatio)
  const rowOf = (state: 'primary' | 'backup' | 'oneCold') => {
    const row = climb.rows.find((each) => each.state === state)
    if (!row) throw new Error(`no row ${state}`)
    return row
  }
  const ratioOf = timingRatioOf(readyScenario(high))
  const fullKw = (rpm: number) => curvePowerKw(high.engine.powerCurve, rpm) ?? NaN

  test('with a cylinder cold the power lapses first and friction does not', () => {
    const { rpm, powerKw } = rowOf('oneCold')
    const { brakePowerKw } = deadCylinderPower({ cylinders: 6, dead: 1, brakePowerKw: fullKw(rpm) * lapse, frictionPowerKw: frictionPowerAt(high.engine, rpm), timingRatio: ratioOf('primary', rpm) })
    expectClose(powerKw, brakePowerKw, { rel: 1e-9 })
    expectClose(powerKw, 49.3 * (rpm / 2780) ** 3 * densityRatio, { rel: 1e-9 })
  })

  test('on the backup it is the backup’s timing that counts', () => {
    for (const channel of ['primary', 'backup'] as const) {
      const { rpm, powerKw } = rowOf(channel)
      expectClose(powerKw, fullKw(rpm) * lapse * ratioOf(channel, rpm), { rel: 1e-9 })
    }
    expect(rowOf('backup').powerKw).toBeLessThan(rowOf('primary').powerKw)
  })

  test('a quarter of a metre a second either way is level', () => {
    const seen = new Set<string>()
    for (let massKg = 400; massKg <= 900; massKg += 10) {
      const { parts, findings } = evaluateClosedForms(scenario({}, { airframe: { ...airframe, massKg } }))
      for (const { climbMps, verdict, state } of got(parts.climb).rows) {
        expect(verdict, `${massKg} kg ${state}`).toBe(climbMps > 0.25 ? 'climbs' : climbMps < -0.25 ? 'descends' : 'level')
        if (state !== 'oneCold') continue
        seen.add(verdict)
        const finding = findings.find(({ id }) => id === 'climbMps')
        expect(finding?.value).toBe(climbMps)
        expect(finding?.verdict).toBe(climbMps < 0.5 ? 'outside' : climbMps < 0.75 ? 'close' : 'within')
      }
    }
    expect([...seen].sort()).toEqual(['climbs', 'descends', 'level'])
  })
})

describe('coils', () => {
  const rowOf = (of: Scenario) => got(evaluateClosedForms(of).parts.coils).primary

  test('a wasted spark doubles what the coil has to do', () => {
    const wasted = scenario({}, { distribution: 'directCoils', coils: { ...coils, primary: { ...coils.primary, wastedSpark: true } } })
    const alone = scenario({}, { distribution: 'directCoils' })
    expectClose(rowOf(wasted).periodShare, 2 * rowOf(alone).periodShare, { rel: 1e-12 })
    expect(rowOf(wasted).powerW ?? NaN).toBeGreaterThan(1.5 * (rowOf(alone).powerW ?? NaN))
  })

  test('a dwell longer than the time between sparks has no temperature, one that just fits has', () => {
    const periodMs = 120_000 / (6 * 2780)
    const cool = { ...coils.primary, thermalResistanceKPerW: 0.5 }
    const at = (dwellMs: number) => rowOf(scenario({}, { coils: { ...coils, primary: { ...cool, dwellMs } } })).windingK
    expect(at(periodMs * 0.999)).not.toBeNull()
    expect(at(periodMs * 1.001)).toBeNull()
  })

  test('findings carry the share of the period and the winding of each channel', () => {
    const { parts, findings } = evaluateClosedForms(scenario({}, { coils: { ...coils, backup: { ...coils.backup, dwellMs: 5.2 } } }))
    for (const channel of ['primary', 'backup'] as const) {
      const row = got(parts.coils)[channel]
      expect(findings.find(({ id }) => id === `periodShare.${channel}`)?.value).toBe(row.periodShare)
      expect(findings.find(({ id }) => id === `windingK.${channel}`)?.value).toBe(row.windingK)
    }
    expect(findings.find(({ id }) => id === 'periodShare.backup')?.verdict).toBe('outside')
  })
})

describe('redundancy', () => {
  const lossesOf = (sheet: Partial<ScenarioSheet>) => {
    const { losses, singlePoints } = got(evaluateClosedForms(scenario({}, sheet)).parts.redundancy)
    return { ids: singlePoints.map(({ id }) => id), ...Object.fromEntries(losses.map(({ loss, perHour }) => [loss, perHour])) } as { ids: string[], noSpark: number, channelLost: number, cylinderLost: number }
  }
  const apart = { ...redundancy, sharedSupply: false }

  test('a cap each is no single point, a shared one is', () => {
    expect(lossesOf({ redundancy: apart }).ids).toEqual(['cap'])
    expect(lossesOf({ redundancy: apart, distribution: 'capEach' }).ids).toEqual([])
  })

  test('with both channels in use either may have failed unseen: likelier than with one of them', () => {
    const [one, both] = [lossesOf({ redundancy: apart, distribution: 'capEach' }), lossesOf({ redundancy: apart, distribution: 'capEach', selection: 'both' })]
    expect(both.noSpark).toBeGreaterThan(5 * one.noSpark)
    expectClose(both.channelLost, one.channelLost, { rel: 1e-12 })
  })

  test('losing a channel or a cylinder is a chance an hour: the sum of its rates, heat in trigger, module and coil', () => {
    const heat = Math.exp((-0.5 / 8.617e-5) * (1 / 358 - 1 / 333))
    const channel = 2 * (2e-6 + 1e-6 + (2e-5 + 4e-5 + 3e-5) * heat + 2e-6)
    const long = { ...apart, flightHours: 2, checkIntervalHours: 50 }
    for (const [setup, hours] of [[apart, 1], [long, 2]] as const) {
      const { channelLost, cylinderLost } = lossesOf({ redundancy: setup, distribution: 'capEach' })
      expectClose(channelLost, -Math.expm1(-channel * hours) / hours, { rel: 1e-9 })
      expectClose(cylinderLost, -Math.expm1(-6e-5 * hours) / hours, { rel: 1e-9 })
    }
  })

  test('a check more often than every flight finds no more than one before each', () => {
    const { noSpark } = lossesOf({ redundancy: { ...apart, flightHours: 4, checkIntervalHours: 1 }, distribution: 'capEach' })
    expectClose(noSpark, lossesOf({ redundancy: { ...apart, flightHours: 4, checkIntervalHours: 4 }, distribution: 'capEach' }).noSpark, { rel: 1e-12 })
  })

  test('the finding is judged by the rates as given and shows how far they may be off', () => {
    const { parts, findings } = evaluateClosedForms(scenario())
    const row = got(parts.redundancy).losses.find(({ loss }) => loss === 'noSpark')
    const finding = findings.find(({ id }) => id === 'noSparkPerH')
    expect([finding?.value, finding?.data.lowPerHour, finding?.data.highPerHour]).toEqual([row?.perHour, row?.lowPerHour, row?.highPerHour])
  })
})

test('between the channels of one unit bench and scatter count once for each; setting and mark are the same for both', () => {
  const bench = { value: 0.5, distribution: 'rectangular' as const }
  const scatter = { value: 0.3, distribution: 'normal' as const }
  expectClose(got(evaluateClosedForms(scenario()).parts.stack).staggerExpandedDeg, combineUncertainty([bench, bench, scatter, scatter]).expanded, { rel: 1e-12 })
})
