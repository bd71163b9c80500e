import { advance } from './topics/advance'
import { angleAndTime } from './topics/angle-and-time'
import { atmosphere } from './topics/atmosphere'
import { bench } from './topics/bench'
import { checks } from './topics/checks'
import { climb } from './topics/climb'
import { closedCycle } from './topics/closed-cycle'
import { coil } from './topics/coil'
import { crankTorque } from './topics/crank-torque'
import { deadCylinders } from './topics/dead-cylinders'
import { detonation } from './topics/detonation'
import { propeller } from './topics/propeller'
import { redundancy } from './topics/redundancy'
import { rotor } from './topics/rotor'
import { sparkDemand } from './topics/spark-demand'
import { statistics } from './topics/statistics'
import { timingPower } from './topics/timing-power'
import { uncertainty } from './topics/uncertainty'

/** The Method page, in its order. */
export const topics = [
  angleAndTime, advance, timingPower, deadCylinders, propeller, atmosphere, climb, coil, sparkDemand, rotor,
  closedCycle, detonation, crankTorque, redundancy, uncertainty, bench, checks, statistics,
] as const

/** Anchor of an equation on the Method page. */
export type EquationId = (typeof topics)[number]['equations'][number]['id']
/** Anchor of a topic. */
export type TopicId = (typeof topics)[number]['id']
