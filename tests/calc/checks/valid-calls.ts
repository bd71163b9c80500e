import { fixed, mapSchedule, retard } from '../advance/channels'
import type { Calls } from '../valid-calls'

export const checkCalls: Calls = {
  evaluateTimingCheck: [
    [{ channel: fixed(25, { crankRetard: retard, latencyUs: 40 }), rpm: 700, readDeg: 24, toleranceDeg: 1, idleRpm: 700 }],
    [{ channel: { schedule: mapSchedule }, rpm: 700, readDeg: 14, toleranceDeg: 1, idleRpm: 700, mapKpa: 60 }],
  ],
  evaluateRunUp: [
    [{ bothRpm: 1800, primaryRpm: 1790, backupRpm: 1740, expected: { primaryDropRpm: 10, backupDropRpm: 55, toleranceRpm: 20 } }],
    [{ primaryRpm: 1790, backupRpm: 1740, expected: { primaryDropRpm: 0, backupDropRpm: 55, toleranceRpm: 20 } }],
  ],
}
