import type { SparkMapInput } from '../cycle/spark-map'
import { cycleModel } from './cycle-model'
import { octaneShiftOf, refuseMismatch } from './detonation-part'
import { part } from './part'
import { readyScenario } from './ready-scenario'
import type { Part } from './result-types'
import type { Scenario } from './scenario-types'

export interface SparkMapChoice {
  readonly rpm: readonly number[]
  /** Of the charge at inlet closing. */
  readonly pressureKpa: readonly number[]
  /** Planned fuel and charge, or the worse fuel and the hotter charge that detonation is judged at. */
  readonly day: 'planned' | 'worse'
}

/**
 * The input of `sparkMap` for a scenario: its engine as calibrated for the cycle, its burn following speed and charge from full power, its octane
 * shifted by the reference setting as in the detonation part. Withheld with a reason as that part is. Does not check the two lists: `sparkMap` does.
 *
 * @param scenario the working sheet on its engine
 * @param choice speeds, charge pressures, and planned or worse fuel and heat
 */
export function sparkMapOf(scenario: Scenario, { rpm, pressureKpa, day }: SparkMapChoice): Part<{ input: SparkMapInput }> {
  return part(() => {
    const ready = readyScenario(scenario)
    const model = cycleModel(ready)
    refuseMismatch(model)
    const { fuel, worse } = scenario.sheet
    const { full } = model
    const octane = Math.max(1, (day === 'worse' ? fuel.worseOctane : fuel.octane) - octaneShiftOf(ready, model))
    const atFull = model.inputAt(full.rpm, full.pressureKpa, 0, { octane, hotterK: day === 'worse' ? worse.hotterK : 0 })
    return { input: { ...atFull, rpm: [...rpm], pressureKpa: [...pressureKpa], burnScaling: { reference: { rpm: full.rpm, pressureKpa: full.pressureKpa } } } }
  })
}
