import { chargeKpaFromManifold, type FullThrottlePressures } from '../cycle/manifold-charge'
import type { SparkMapInput } from '../cycle/spark-map'
import { cycleModel } from './cycle-model'
import { octaneShiftOf, refuseMismatch } from './detonation-part'
import { part } from './part'
import { readyScenario } from './ready-scenario'
import type { Part } from './result-types'
import type { Scenario } from './scenario-types'

export interface SparkMapChoice {
  readonly rpm: readonly number[]
  /** Each line of the map is the charge that this manifold pressure stands for. */
  readonly manifoldKpa: readonly number[]
  /** Planned fuel and charge, or the worse fuel and the hotter charge that detonation is judged at. */
  readonly day: 'planned' | 'worse'
}

/**
 * The input of `sparkMap` for a scenario: its engine as calibrated for the cycle, its burn following speed and charge from full power, its octane
 * shifted by the reference setting as in the detonation part; and the pressures of full throttle, by which manifold and charge belong together.
 * Withheld with a reason as that part is. The speeds are left for `sparkMap` to check.
 *
 * @param scenario the working sheet on its engine
 * @param choice speeds, rpm; manifold pressures, kPa > 0; planned or worse fuel and heat
 */
export function sparkMapOf(scenario: Scenario, { rpm, manifoldKpa, day }: SparkMapChoice): Part<{ input: SparkMapInput, pressures: FullThrottlePressures }> {
  return part(() => {
    const ready = readyScenario(scenario)
    const model = cycleModel(ready)
    refuseMismatch(model)
    const { fuel, worse, manifold } = scenario.sheet
    const { full } = model
    const pressures = { fullChargeKpa: full.pressureKpa, fullManifoldKpa: manifold.fullKpa }
    const octane = Math.max(1, (day === 'worse' ? fuel.worseOctane : fuel.octane) - octaneShiftOf(ready, model))
    const atFull = model.inputAt(full.rpm, full.pressureKpa, 0, { octane, hotterK: day === 'worse' ? worse.hotterK : 0 })
    const pressureKpa = manifoldKpa.map((kpa) => chargeKpaFromManifold({ manifoldKpa: kpa, ...pressures }))
    return { input: { ...atFull, rpm: [...rpm], pressureKpa, burnScaling: { reference: { rpm: full.rpm, pressureKpa: full.pressureKpa } } }, pressures }
  })
}
