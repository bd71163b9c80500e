import type { ChannelName, MarkedSpeed, PartError, PartName, ScenarioResult } from '../calc/live'
import { formatQuantityText, type QuantityKind, type UnitSystem } from '../units'
import { group } from './key-group'
import { modelGroups } from './model-groups'

/** One figure of an evaluation, in base units. */
export interface KeyResult {
  /** The same figure of another evaluation has the same id. */
  id: string
  label: string
  channel: ChannelName | null
  kind: QuantityKind
  value: number | null
  /** Stands in place of a value that does not exist. */
  none?: string
  /** Others than the quantity's own. */
  decimals?: number
  /** A signed quantity: its sign shows always. */
  signed?: boolean
  /** How far an uncertain figure reaches: it never stands without. */
  spread?: string
}

export interface KeyGroup {
  id: PartName
  title: string
  /** The part was withheld: the reason, and no rows. */
  withheld: PartError | null
  rows: KeyResult[]
}

const channels = ['primary', 'backup'] as const
const marked: readonly { speed: MarkedSpeed; at: string }[] = [
  { speed: 'cranking', at: 'cranking' }, { speed: 'idle', at: 'idle' }, { speed: 'runUp', at: 'run-up' }, { speed: 'full', at: 'full power' },
]

/**
 * The figures people compare and quote, in fixed order. Curves and findings are not among them.
 *
 * @param result an evaluation, or what a revision stores of it
 * @param system only for speeds and powers named inside labels
 */
export function keyResults(result: Pick<ScenarioResult, 'parts'>, system: UnitSystem): KeyGroup[] {
  const { parts } = result
  return [
    group('speeds', 'Timing', parts.speeds, ({ points }) => [
      ...channels.flatMap((channel) => marked.map(({ speed, at }): KeyResult => ({
        id: `advance.${channel}.${speed}`, label: `Advance, ${at}`, channel, kind: 'angle', value: points[speed][`${channel}Deg`],
      }))),
      ...marked.map(({ speed, at }): KeyResult => ({ id: `stagger.${speed}`, label: `Stagger, ${at}`, channel: null, kind: 'angle', value: points[speed].staggerDeg })),
      { id: 'staggerMs.full', label: 'Stagger in time, full power', channel: null, kind: 'timeMs', value: points.full.staggerMs },
    ]),
    group('power', 'Power at full throttle', parts.power, ({ atMax, backupToPrimary, shortOfMbtDeg }) => [
      ...channels.map((channel): KeyResult => ({ id: `power.${channel}`, label: 'Power', channel, kind: 'power', value: atMax[`${channel}Kw`] })),
      ...channels.map((channel): KeyResult => ({ id: `torque.${channel}`, label: 'Torque', channel, kind: 'torque', value: atMax[`${channel}Nm`] })),
      { id: 'backupToPrimary', label: 'Power against A', channel: 'backup', kind: 'ratio', value: backupToPrimary },
      ...channels.map((channel): KeyResult => ({ id: `shortOfMbt.${channel}`, label: 'Short of best torque', channel, kind: 'angle', value: shortOfMbtDeg[channel], signed: true })),
    ]),
    group('deadCylinders', 'One cylinder cold', parts.deadCylinders, ({ rows }) => channels.map((channel): KeyResult => ({
      id: `oneCold.${channel}`, label: 'Power left', channel, kind: 'percent', value: rows[1]?.[channel].fraction ?? null, none: 'no other cylinder', decimals: 1,
    }))),
    group('runUp', 'Run-up', parts.runUp, ({ rows }) => rows.flatMap((row) => channels.flatMap((channel): KeyResult[] => [
      { id: `runUp.${row.pitch}.${channel}`, label: `Expected speed, ${row.pitch}`, channel, kind: 'engineSpeed', value: row[channel].rpm },
      { id: `runUpDrop.${row.pitch}.${channel}`, label: `Drop, ${row.pitch}`, channel, kind: 'engineSpeed', value: row[channel].dropRpm },
    ]))),
    group('propeller', 'Full throttle on the propeller', parts.propeller, ({ rows }) => rows.flatMap((row) => [
      ...channels.map((channel): KeyResult => ({
        id: `propeller.${row.pitch}.${channel}`, label: `Speed, ${row.pitch}`, channel, kind: 'engineSpeed', value: row[channel]?.rpm ?? null, none: 'never meets',
      })),
      { id: `propeller.${row.pitch}.oneCold`, label: `Speed, ${row.pitch}, one cylinder cold`, channel: 'primary', kind: 'engineSpeed', value: row.oneCold?.rpm ?? null, none: 'never meets' },
    ])),
    group('register', 'Rotor', parts.register, ({ bestPhasingDeg, worst }) => channels.flatMap((channel): KeyResult[] => [
      { id: `bestPhasing.${channel}`, label: 'Centred best at an advance of', channel, kind: 'angle', value: bestPhasingDeg[channel] },
      { id: `endOffset.${channel}`, label: `Off centre at the spark’s end, ${formatQuantityText(worst[channel].rpm, 'engineSpeed', system)}`, channel, kind: 'distributorAngle', value: worst[channel].endOffsetDeg, signed: true },
    ])),
    ...modelGroups(parts, system),
    group('marks', 'Timing marks', parts.marks, ({ mmPerDeg }) => [{ id: 'marks', label: 'One degree on the damper', channel: null, kind: 'markSpacing', value: mmPerDeg }]),
  ]
}
