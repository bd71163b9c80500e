import type { Calls } from '../valid-calls'

export const airCalls: Calls = {
  standardAtmosphere: [[{ altitudeM: 1500, offsetK: 12 }]],
  densityAltitudeM: [[{ pressureAltitudeM: 600, temperatureK: 295 }]],
  powerAtDensityRatio: [[0.9]],
}
