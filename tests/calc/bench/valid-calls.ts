import { fixed, mapSchedule, retard } from '../advance/channels'
import type { Calls } from '../valid-calls'

const plan = { primary: fixed(25, { crankRetard: retard, latencyUs: 40 }), backup: { schedule: mapSchedule } }

export const benchCalls: Calls = {
  evaluateBenchRun: [[{
    plan, toleranceDeg: 0.5, cylinders: 6,
    readings: [
      { rpm: 300, channel: 'primary', readDeg: 14, cylinder: 1, trend: 'rising' },
      { rpm: 900, channel: 'primary', readDeg: 25, cylinder: 1, trend: 'rising' },
      { rpm: 900, channel: 'primary', readDeg: 24.2, cylinder: 2, trend: 'rising' },
      { rpm: 900, channel: 'backup', readDeg: 17, cylinder: 3, mapKpa: 60, trend: 'falling' },
    ],
  }]],
  benchReadingsToAdvance: [
    [[{ rpm: 900, channel: 'primary', readDeg: 77, cylinder: 2, mapKpa: 60, trend: 'rising' }], { wheel: 'distributor', sense: -1, datum: { kind: 'index', atDeg: 90 } }],
    [[{ rpm: 900, channel: 'primary', readDeg: 77 }, { rpm: 900, channel: 'backup', readDeg: 70 }], { wheel: 'crank', sense: 1, datum: { kind: 'relative', rpm: 900, planDeg: 25 } }],
  ],
}
