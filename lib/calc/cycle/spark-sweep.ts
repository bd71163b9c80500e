import { CalcError } from '../calc-error'
import type { CheckedCycle } from './check-cycle'
import { burnStartDeg, ninetyShare } from './check-cycle'
import type { Burn } from './cycle-types'
import { fillGeometry, fillRelease, integrateSegment, makeNodes, segmentsOf, stepsIn, type CycleState } from './integrate-cycle'
import { prepareCycle } from './prepare-cycle'
import { refuseRunaway } from './runaway'

/** Sparks that are searched, crank degrees BTDC. */
export const searchedFromDeg = -20
export const searchedToDeg = 60

/** Work J and knock integral of the same charge at one spark. */
export interface SparkPoint {
  readonly sparkDeg: number
  readonly workJ: number
  readonly knock: number
}

/** One charge at any spark: what lies before the burn is the same for all of them and is computed once. */
export interface SparkSweep {
  readonly fromDeg: number
  readonly toDeg: number
  readonly at: (sparkDeg: number) => SparkPoint
}

/** A burn that starts anywhere: `null` is a motored cycle, which has no spark to look for. */
export const burnOf = (checked: CheckedCycle): Required<Burn> => {
  if (checked.burn) return checked.burn
  throw new CalcError({ field: 'burn', value: null, limit: 'a burn', unit: '', message: 'A motored cycle has no spark: give a burn.' })
}

/** The unfired charge from inlet closing on, at every step: where a burn may start. */
export interface Compression {
  readonly checked: CheckedCycle
  readonly thetaDeg: readonly number[]
  readonly states: readonly CycleState[]
}

export const compress = (checked: CheckedCycle): Compression => {
  const burn = burnOf(checked)
  const cycle = prepareCycle(checked)
  const { ivcDeg, evoDeg } = checked.engine
  const steps = stepsIn(evoDeg - ivcDeg, checked.stepDeg)
  const segment = { fromDeg: ivcDeg, toDeg: evoDeg, steps, burning: false, knocking: true, fired: false }
  const nodes = makeNodes(steps)
  fillGeometry(cycle, segment, nodes)
  const thetaDeg = [ivcDeg]
  const states: CycleState[] = [{ pressureKpa: cycle.startKpa, workJ: 0, heatLossJ: 0, knock: 0 }]
  integrateSegment({ ...cycle, startDeg: evoDeg, durationDeg: burn.durationDeg }, segment, nodes, { pressureKpa: cycle.startKpa, workJ: 0, heatLossJ: 0, knock: 0 }, {
    open: () => {},
    step: (theta, pressureKpa, _kelvin, _start, _end, workJ, heatLossJ, knock) => {
      thetaDeg.push(theta)
      states.push({ pressureKpa, workJ, heatLossJ, knock })
    },
  })
  return { checked, thetaDeg, states }
}

/** Shorter pieces than this are not worth a step of their own. */
const hairDeg = 1e-9

export const sweepSparks = ({ checked, thetaDeg, states }: Compression, burn: Required<Burn> = burnOf(checked)): SparkSweep => {
  const { ivcDeg, evoDeg } = checked.engine
  const base = { ...prepareCycle(checked), durationDeg: burn.durationDeg, ninetyDeg: burn.durationDeg * ninetyShare(burn), a: burn.a, m: burn.m }
  const pitch = (evoDeg - ivcDeg) / (thetaDeg.length - 1)
  const nodes = makeNodes(thetaDeg.length)
  const at = (sparkDeg: number): SparkPoint => {
    const startDeg = burnStartDeg({ sparkDeg, delayDeg: burn.delayDeg })
    const cycle = { ...base, startDeg }
    const index = Math.min(thetaDeg.length - 1, Math.floor((startDeg - ivcDeg) / pitch + hairDeg))
    const state = { ...(states[index] ?? { pressureKpa: cycle.startKpa, workJ: 0, heatLossJ: 0, knock: 0 }) }
    const fromDeg = thetaDeg[index] ?? ivcDeg
    for (const segment of segmentsOf(cycle, startDeg - fromDeg > hairDeg ? fromDeg : startDeg)) {
      fillGeometry(cycle, segment, nodes)
      if (segment.burning) fillRelease(cycle, segment, nodes)
      integrateSegment(cycle, segment, nodes, state, null)
    }
    if (!Number.isFinite(state.workJ + state.knock)) throw refuseRunaway(checked)
    return { sparkDeg, workJ: state.workJ, knock: state.knock }
  }
  return {
    // The last spark before exhaust opening leaves a burn of nothing: a hundredth of a degree keeps it inside.
    fromDeg: Math.max(searchedFromDeg, burn.delayDeg - evoDeg + 0.01),
    toDeg: Math.min(searchedToDeg, burn.delayDeg - ivcDeg),
    at,
  }
}
