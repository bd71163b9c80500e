import type { Channel, CrankRetard, Schedule } from '@/lib/calc/live'

export const fixed = (deg: number, rest: Omit<Channel, 'schedule'> = {}): Channel => ({ schedule: { kind: 'fixed', deg }, ...rest })
export const formula = (expression: string, rest: Omit<Channel, 'schedule'> = {}): Channel => ({ schedule: { kind: 'formula', expression }, ...rest })
export const table = (pairs: readonly (readonly [number, number])[], rest: Omit<Channel, 'schedule'> = {}): Channel =>
  ({ schedule: { kind: 'table', points: pairs.map(([rpm, deg]) => ({ rpm, deg })) }, ...rest })

export const mechanicalSchedule = { kind: 'mechanical', initialDeg: 7, startRpm: 800, fullRpm: 2000, fullDeg: 25 } as const satisfies Schedule
export const mapSchedule = {
  kind: 'map', rpm: [500, 1500, 2500], mapKpa: [40, 70, 100], deg: [[14, 12, 10], [30, 26, 20], [34, 30, 24]],
} as const satisfies Schedule
export const retard: CrankRetard = { belowRpm: 520, byDeg: 11, hysteresisRpm: 60 }
