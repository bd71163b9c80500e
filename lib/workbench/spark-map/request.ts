import type { FullThrottlePressures, PartError, Scenario, SparkMap, SparkMapChoice } from '../../calc/live'

export interface SparkMapRequest {
  scenario: Scenario
  choice: SparkMapChoice
}

export type SparkMapAnswer = { ok: true, map: SparkMap, pressures: FullThrottlePressures } | { ok: false, error: PartError }

export interface SparkMapProgress {
  done: number
  total: number
}

/** Everything of a scenario that its map stands on. Where its operating points lie, and when the channels fire there, is drawn on it and not part of it. */
export function sparkMapKeyOf({ engine, sheet }: Scenario): string {
  const { cycle, fuel, worse, mbt, reference, manifold, plugsPerCylinder, propeller, primary } = sheet
  // The anchor stands on the charge carried at its own speed, in which the propeller and the primary's timing have a say.
  const anchor = reference !== null && reference.rpm !== engine.maxRpm ? [propeller, primary, manifold] : null
  return JSON.stringify([engine, plugsPerCylinder, cycle, fuel, worse.hotterK, mbt.deg, reference, manifold.fullKpa, anchor])
}
