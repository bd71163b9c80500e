import { z } from 'zod'
import type { Channel, ScenarioSheet } from '../calc/live'
import { modelMembers } from './model-schema'
import { isAscending, numbersOf } from './number-schema'
import { maxPitches, scenarioFields, type ChannelPrefix } from './scenario-fields'

const num = numbersOf(scenarioFields)
const mostPoints = 60
const speedRpm = z.number().min(0).max(12_000)
const advanceDeg = z.number().min(-20).max(60)

const scheduleOf = (channel: ChannelPrefix) => z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('fixed'), deg: num(`${channel}.fixed.deg`) }),
  z.object({
    kind: z.literal('mechanical'),
    initialDeg: num(`${channel}.mechanical.initialDeg`),
    startRpm: num(`${channel}.mechanical.startRpm`),
    fullRpm: num(`${channel}.mechanical.fullRpm`),
    fullDeg: num(`${channel}.mechanical.fullDeg`),
  }).refine((schedule) => schedule.fullRpm > schedule.startRpm, { path: ['fullRpm'], message: 'Full advance must come at a higher speed than the start of the weights.' }),
  z.object({ kind: z.literal('table'), points: z.array(z.object({ rpm: speedRpm, deg: advanceDeg })).min(2, 'A table needs two lines at least.').max(mostPoints, `A table holds at most ${mostPoints} lines.`) })
    .refine((schedule) => isAscending(schedule.points.map((point) => point.rpm)), { path: ['points'], message: 'The speeds must rise from line to line; each stands once.' }),
  z.object({
    kind: z.literal('map'),
    rpm: z.array(speedRpm).min(2, 'A map needs two speeds at least.').max(40, 'A map holds at most 40 speeds.'),
    mapKpa: z.array(z.number().min(5).max(300)).min(2, 'A map needs two pressures at least.').max(30, 'A map holds at most 30 pressures.'),
    deg: z.array(z.array(advanceDeg)),
  }).superRefine((map, context) => {
    if (!isAscending(map.rpm)) context.addIssue({ code: 'custom', path: ['rpm'], message: 'The speeds of the map must rise from line to line.' })
    if (!isAscending(map.mapKpa)) context.addIssue({ code: 'custom', path: ['mapKpa'], message: 'The pressures in the first line must rise from left to right.' })
    if (map.deg.length !== map.rpm.length || map.deg.some((row) => row.length !== map.mapKpa.length))
      context.addIssue({ code: 'custom', path: ['deg'], message: 'Each speed needs one advance for each pressure.' })
  }),
  z.object({ kind: z.literal('formula'), expression: z.string().trim().min(1, 'Type a formula, for example min(28, 10 + rpm / 100).').max(500, 'The formula is longer than 500 characters.') }),
])

const channelOf = (channel: ChannelPrefix) => z.object({
  schedule: scheduleOf(channel),
  crankRetard: z.object({
    byDeg: num(`${channel}.retardDeg`),
    belowRpm: num(`${channel}.retardBelowRpm`),
    hysteresisRpm: num(`${channel}.retardHysteresisRpm`),
  }).refine((retard) => retard.hysteresisRpm < retard.belowRpm, { path: ['hysteresisRpm'], message: 'The hysteresis must be smaller than the speed below which the retard acts.' }).optional(),
  latencyUs: num(`${channel}.latencyUs`),
}) satisfies z.ZodType<Channel>

export const scenarioSheet = z.object({
  distribution: z.enum(['sharedCap', 'capEach', 'directCoils']),
  plugsPerCylinder: z.union([z.literal(1), z.literal(2)]),
  selection: z.enum(['oneAtATime', 'both']),
  primary: channelOf('primary'),
  backup: channelOf('backup'),
  mbt: z.object({
    deg: num('mbtDeg'),
    curvaturePerDeg2: num('curvaturePerDeg2'),
    provenance: z.enum(['measured', 'handbook', 'guess']),
    note: z.string().max(200, 'The words are longer than 200 characters.'),
  }),
  propeller: z.object({
    kind: z.enum(['fixedPitch', 'constantSpeed']),
    governedRpm: num('governedRpm').nullable(),
    pitches: z.array(z.object({
      name: z.string().trim().min(1, 'Give each pitch a name.').max(40, 'The name is longer than 40 characters.'),
      rpm: num('pitch.0.rpm'),
      kw: num('pitch.0.kw'),
    })).min(1, 'Give one pitch at least: its name, the power it takes, and the speed it takes it at.').max(maxPitches),
  }).superRefine((propeller, context) => {
    if (propeller.kind === 'constantSpeed' && propeller.governedRpm === null)
      context.addIssue({ code: 'custom', path: ['governedRpm'], message: 'A constant-speed propeller needs the speed its governor holds.' })
    const names = propeller.pitches.map((pitch) => pitch.name)
    const twice = names.findIndex((name, i) => names.indexOf(name) !== i)
    if (twice >= 0) context.addIssue({ code: 'custom', path: ['pitches', twice, 'name'], message: `Two pitches are called “${names[twice]}”.` })
  }),
  runUpRpm: num('runUpRpm'),
  manifold: z.object({ idleKpa: num('manifold.idleKpa'), runUpKpa: num('manifold.runUpKpa'), fullKpa: num('manifold.fullKpa') }),
  rotor: z.object({
    terminalWidthDeg: num('rotor.terminalWidthDeg'),
    rotorWidthDeg: num('rotor.rotorWidthDeg'),
    phasedAtDeg: num('rotor.phasedAtDeg'),
    backupPhasedAtDeg: num('rotor.backupPhasedAtDeg'),
    sparkDurationMs: num('rotor.sparkDurationMs'),
    mechanicalCarriesRotor: z.boolean(),
    plateRadiusMm: num('rotor.plateRadiusMm').nullable(),
  }),
  tolerances: z.object({
    timingCheckDeg: num('tolerances.timingCheckDeg'), benchDeg: num('tolerances.benchDeg'), markDeg: num('tolerances.markDeg'), scatterDeg: num('tolerances.scatterDeg'),
  }),
  ...modelMembers,
  notes: z.string().max(4000, 'The notes are longer than 4000 characters.'),
}) satisfies z.ZodType<ScenarioSheet>

/** A sheet that passed the schema. */
export type CheckedSheet = z.infer<typeof scenarioSheet>

export const scenarioTitle = z.string().trim().min(1, 'Give the scenario a name.').max(120, 'The name is longer than 120 characters.')

/** Version of the stored sheet; a reader of an older one migrates it. */
export const sheetVersion = 2
