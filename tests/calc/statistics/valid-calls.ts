import type { Calls } from '../valid-calls'

const scattered = [5.1, 4.8, 5.4, 5.0, 4.6]

export const statisticsCalls: Calls = {
  normalQuantile: [[0.3], [0.99]],
  studentTQuantile: [[0.975, 7.5], [0.2, 30_000], [0.6, 0.4]],
  combineUncertainty: [
    [[{ value: 0.4, distribution: 'normal', sensitivity: -2, dof: 6 }, { value: 1, distribution: 'rectangular' }, { value: 1, distribution: 'triangular', dof: 20 }], { coverage: 0.9 }],
    [[{ value: 0.4, distribution: 'normal' }]],
  ],
  leastSquares: [[{ rows: [[1, 2, 5], [1, 3, 4], [1, 5, 5], [1, 8, 1]], values: [2, 3, 4, 8] }], [{ rows: [[2], [3]], values: [4, 5] }]],
  linearTrend: [
    [[{ hours: 10, value: 3 }, { hours: 30, value: 4.1 }, { hours: 50, value: 5 }, { hours: 70, value: 5.8 }], { limit: 9, atHours: 100, coverage: 0.9 }],
    [[{ hours: 10, value: 3 }, { hours: 30, value: 3 }, { hours: 50, value: 3 }]],
  ],
  processCapability: [[scattered, { lower: 4, upper: 6, target: 5.1 }]],
  cpkInterval: [[scattered, { lower: 4, upper: 6, coverage: 0.9 }]],
  individualsChart: [[scattered]],
  controlChartFactors: [[5]],
}
