import { z } from 'zod'
import type { Engine } from '../calc/live'
import { engineFields } from './engine-fields'
import { isAscending, numbersOf } from './number-schema'

const num = numbersOf(engineFields)
const rotation = z.enum(['clockwise', 'anticlockwise'])
const cylinderList = z.array(z.number().int().min(1).max(12)).min(1).max(12)

/** Why a list is not each of 1…count once, or null. */
export function permutationFault(list: readonly number[], count: number, what: string): string | null {
  if (list.length !== count) return `${what} names ${list.length} ${list.length === 1 ? 'cylinder' : 'cylinders'}; the engine has ${count}.`
  const twice = list.find((value, i) => list.indexOf(value) !== i)
  if (twice !== undefined) return `${what} names cylinder ${twice} twice; each of 1 to ${count} stands once.`
  const strange = list.find((value) => value > count)
  return strange === undefined ? null : `${what} names cylinder ${strange}; the engine has 1 to ${count}.`
}

export const engineSpec = z.object({
  cylinders: num('cylinders'),
  firingOrder: cylinderList,
  intervalsDeg: z.array(z.number().positive().max(720)).max(12).nullable(),
  boreMm: num('boreMm'),
  strokeMm: num('strokeMm'),
  rodMm: num('rodMm'),
  compressionRatio: num('compressionRatio'),
  ratedPowerKw: num('ratedPowerKw'),
  ratedRpm: num('ratedRpm'),
  powerTimingDeg: num('powerTimingDeg'),
  powerCurve: z.array(z.object({ rpm: z.number().min(1).max(12_000), kw: z.number().min(0).max(1000) })).max(60),
  friction: z.discriminatedUnion('kind', [
    z.object({ kind: z.literal('efficiency'), mechanicalEfficiency: num('mechanicalEfficiency') }),
    z.object({ kind: z.literal('power'), frictionPowerKw: num('frictionPowerKw') }),
  ]),
  crankingSlowestRpm: num('crankingSlowestRpm'),
  crankingRpm: num('crankingRpm'),
  crankingFastestRpm: num('crankingFastestRpm'),
  idleSlowestRpm: num('idleSlowestRpm'),
  idleRpm: num('idleRpm'),
  maxRpm: num('maxRpm'),
  damperDiameterMm: num('damperDiameterMm'),
  damperEnd: z.enum(['propeller', 'accessory']),
  crankRotation: rotation,
  distributorRotation: rotation,
  capTerminals: cylinderList,
}).superRefine((engine, context) => {
  const fault = (path: (keyof Engine)[], message: string | null) => {
    if (message) context.addIssue({ code: 'custom', path, message })
  }
  fault(['firingOrder'], permutationFault(engine.firingOrder, engine.cylinders, 'The firing order'))
  fault(['capTerminals'], permutationFault(engine.capTerminals, engine.cylinders, 'The cap'))
  if (engine.intervalsDeg) {
    const sum = engine.intervalsDeg.reduce((total, value) => total + value, 0)
    if (engine.intervalsDeg.length !== engine.cylinders)
      fault(['intervalsDeg'], `${engine.intervalsDeg.length} firing intervals for ${engine.cylinders} cylinders; give one for each, or none for even firing.`)
    else if (Math.abs(sum - 720) > 1e-6) fault(['intervalsDeg'], `The firing intervals add up to ${Number(sum.toFixed(6))}°; they must add up to 720°.`)
  }
  if (engine.rodMm <= engine.strokeMm / 2) fault(['rodMm'], 'The rod must be longer than half the stroke.')
  if (engine.powerCurve.length === 1) fault(['powerCurve'], 'A power curve needs two lines at least, or none.')
  if (!isAscending(engine.powerCurve.map((point) => point.rpm))) fault(['powerCurve'], 'The speeds of the power curve must rise from line to line.')
  else if (engine.powerCurve.length > 1) {
    const first = engine.powerCurve[0]?.rpm ?? 0
    const last = engine.powerCurve.at(-1)?.rpm ?? 0
    if (engine.maxRpm < first || engine.maxRpm > last) fault(['powerCurve'], `The power curve runs from ${first} to ${last} rpm; it must hold the full-power speed, ${engine.maxRpm} rpm.`)
  }
  const order: (readonly [keyof Engine, keyof Engine, string])[] = [
    ['crankingRpm', 'crankingSlowestRpm', 'The usual cranking speed must not be below the slowest.'],
    ['crankingFastestRpm', 'crankingRpm', 'The fastest cranking speed must not be below the usual one.'],
    ['idleRpm', 'idleSlowestRpm', 'The usual idle must not be below the slowest.'],
  ]
  for (const [upper, lower, message] of order) if ((engine[upper] as number) < (engine[lower] as number)) fault([upper], message)
  if (engine.idleSlowestRpm <= engine.crankingFastestRpm) fault(['idleSlowestRpm'], `The slowest idle must lie above the fastest cranking speed, ${engine.crankingFastestRpm} rpm.`)
  if (engine.maxRpm <= engine.idleRpm) fault(['maxRpm'], `The full-power speed must lie above the idle, ${engine.idleRpm} rpm.`)
}) satisfies z.ZodType<Engine>

export const engineName = z.string().trim().min(1, 'Give the engine a name.').max(80, 'The name is longer than 80 characters.')
export const engineCode = z.string().trim().min(1, 'Give the engine a short code.').max(12, 'The code is longer than 12 characters.')
  .regex(/^[A-Za-z0-9]+$/, 'The code holds letters and digits only, for example J260.')

/** What the engine form and the engine routes take. */
export const engineInput = z.object({ name: engineName, code: engineCode, spec: engineSpec })
export type EngineInput = z.infer<typeof engineInput>
