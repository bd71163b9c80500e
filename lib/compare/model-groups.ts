import type { ChannelName, ClimbRow, DetonationPoint, LossRow, ScenarioParts } from '../calc/live'
import { formatQuantity, formatQuantityText, type QuantityKind, type UnitSystem } from '../units'
import { group } from './key-group'
import type { KeyGroup, KeyResult } from './key-results'

const channels = ['primary', 'backup'] as const
const cases = [['planned', 'as planned'], ['worse', 'worse case'], ['altitude', 'at altitude']] as const
const climbWords: Record<ClimbRow['state'], string> = { primary: 'on the primary', backup: 'on the backup', oneCold: 'one cylinder cold' }
const lossWords: Record<LossRow['loss'], string> = { noSpark: 'No spark at all', channelLost: 'One channel lost', cylinderLost: 'One cylinder lost' }

/** One figure of each channel. */
const both = (id: string, label: string, kind: QuantityKind, value: (channel: ChannelName) => number | null, more: Partial<KeyResult> = {}): KeyResult[] =>
  channels.map((channel) => ({ id: `${id}.${channel}`, label, channel, kind, value: value(channel), ...more }))

function marginReach({ lowDeg, highDeg }: DetonationPoint, octane: number, system: UnitSystem): string {
  const [low, high] = [lowDeg, highDeg].map((value) => (value === null ? 'none' : formatQuantityText(value, 'angle', system)))
  return `${low} to ${high} for ±${octane} octane`
}

/** Figures of detonation, cycle, coils, climb and redundancy. */
export function modelGroups(parts: Partial<ScenarioParts>, system: UnitSystem): KeyGroup[] {
  return [
    group('detonation', 'Detonation: settings compared, none cleared for flight', parts.detonation, (detonation) => [
      ...cases.flatMap(([name, words]) => channels.map((channel): KeyResult => ({
        id: `margin.${name}.${channel}`, label: `Margin, ${words}`, channel, kind: 'angle', value: detonation[channel][name].marginDeg, none: 'none',
        spread: marginReach(detonation[channel][name], detonation.octaneUncertainty, system),
      }))),
      ...both('octane', 'Octane asked for, worse case', 'octane', (channel) => detonation[channel].worse.octaneRequired, { spread: `±${detonation.octaneUncertainty}` }),
      { id: 'gainDeg', label: 'Gained by going to the backup', channel: null, kind: 'angle', value: detonation.gainDeg, signed: true },
      { id: 'gainOctane', label: 'Gained by going to the backup, octane numbers', channel: null, kind: 'octane', value: detonation.gainOctane, signed: true },
    ]),
    group('charge', 'Charge at full power', parts.charge, ({ pressureKpa, volumetricEfficiency, durationDeg }) => [
      { id: 'charge', label: 'Charge at inlet closing', channel: null, kind: 'pressure', value: pressureKpa },
      { id: 'volumetricEfficiency', label: 'Volumetric efficiency', channel: null, kind: 'ratio', value: volumetricEfficiency },
      { id: 'burn', label: 'Burning', channel: null, kind: 'angle', value: durationDeg },
    ]),
    group('pressure', 'Cylinder pressure', parts.pressure, (pressure) => [
      ...both('peak', 'Peak', 'meanPressure', (channel) => pressure[channel].peakKpa),
      ...both('peakAt', 'Peak after TDC', 'angle', (channel) => pressure[channel].peakDeg),
    ]),
    group('coils', 'Coils', parts.coils, (coils) => [
      ...both('coilCurrent', 'Current at the end of dwell', 'current', (channel) => coils[channel].currentA),
      ...both('coilEnergy', 'Energy stored', 'energyMj', (channel) => coils[channel].energyMj),
      ...both('winding', 'Winding', 'temperature', (channel) => coils[channel].windingK, { none: 'no end' }),
      ...both('share', 'Dwell and spark, of the period', 'percent', (channel) => coils[channel].periodShare),
    ]),
    group('spark', 'Spark voltage', parts.spark, (spark) => [
      ...both('demand', 'Asked for', 'voltageKv', (channel) => spark[channel].demandKv),
      ...both('offer', 'Offered', 'voltageKv', (channel) => spark[channel].offeredKv),
      ...both('crankRatio', 'Offered over asked for, cranking', 'ratio', (channel) => spark[channel].crankingRatio),
    ]),
    group('climb', 'Climb', parts.climb, ({ rows }) => rows.flatMap(({ state, climbMps, ceilingM }): KeyResult[] => [
      { id: `climb.${state}`, label: `Climb, ${climbWords[state]}`, channel: null, kind: 'climb', value: climbMps, signed: true },
      { id: `ceiling.${state}`, label: `Ceiling, ${climbWords[state]}`, channel: null, kind: 'altitude', value: ceilingM, none: 'none found' },
    ])),
    group('redundancy', 'Chances in an hour of flight', parts.redundancy, ({ losses }) => losses.map(({ loss, perHour, lowPerHour, highPerHour }): KeyResult => ({
      id: `loss.${loss}`, label: lossWords[loss], channel: null, kind: 'failureRate', value: perHour,
      spread: `${formatQuantity(lowPerHour, 'failureRate', system).text} to ${formatQuantity(highPerHour, 'failureRate', system).text}`,
    }))),
    group('stack', 'Tolerance stack', parts.stack, ({ expandedDeg, staggerExpandedDeg }) => [
      { id: 'stack', label: 'Timing, 95 in 100 within', channel: null, kind: 'angle', value: expandedDeg, decimals: 2 },
      { id: 'stackStagger', label: 'Between the channels, 95 in 100 within', channel: null, kind: 'angle', value: staggerExpandedDeg, decimals: 2 },
    ]),
  ]
}
