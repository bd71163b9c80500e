import type { Actor } from '@/lib/auth/actor'
import { archiveScenario } from '@/lib/data/scenarios/archive-scenario'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { releaseRevision } from '@/lib/data/plans/release-revision'
import * as engines from './demo-engines'
import * as sheets from './demo-scenarios'
import { demoEngine, demoMember, demoOwner, demoScenario } from './demo-shop'
import { demoShop, demoSignIns, secondShop, type DemoSignIn } from './demo-sign-ins.mjs'

const signInOf = (shop: string, role: DemoSignIn['role']): DemoSignIn => {
  const found = demoSignIns.find((each) => each.shop === shop && each.role === role)
  if (!found) throw new Error(`The demo has no ${role} of ${shop}.`)
  return found
}

/** Lays the demo into an empty installation, through the same functions as everybody's work; false where it is already whole. */
export async function layDemo(): Promise<boolean> {
  const neighbour = await demoOwner(signInOf(secondShop, 'owner'))
  // The neighbour's scenario is made last: where it stands, so does everything, whatever people did to it since.
  if (await hasAny(neighbour)) return false
  await layShop()
  const six = await demoEngine(neighbour, engines.neighboursSix)
  await demoScenario(neighbour, six, 'First pair', sheets.neighboursSheet)
  return true
}

const hasAny = async (actor: Actor): Promise<boolean> => {
  for (const state of ['active', 'archived'] as const) if ((await listScenarios(actor, { state })).rows.length > 0) return true
  return false
}

async function layShop(): Promise<void> {
  const owner = await demoOwner(signInOf(demoShop, 'owner'))
  for (const each of demoSignIns) if (each.shop === demoShop && each.role !== 'owner') await demoMember(each, owner)
  const designer = await demoMember(signInOf(demoShop, 'designer'), owner)
  const builder = await demoMember(signInOf(demoShop, 'builder'), owner)

  const six = await demoEngine(designer, engines.flatSix)
  const four = await demoEngine(designer, engines.flatFour)
  const eight = await demoEngine(designer, engines.flatEight)

  const pair = await demoScenario(designer, six, 'Plain pair for the club aircraft', sheets.fixedPair)
  const weights = await demoScenario(designer, six, 'Weights and a fixed plate', sheets.mechanical)
  await demoScenario(designer, six, 'Pressure map for cruise', sheets.pressureMap)
  await demoScenario(builder, six, 'Two-step start, own aircraft', sheets.twoStep)
  const climb = await demoScenario(designer, six, 'Climb timing for 97 RON', sheets.climbFirst, sheets.climbReleased, sheets.climbTrial)
  await demoScenario(designer, four, 'A cap each', sheets.fourCapEach)
  await demoScenario(owner, eight, 'Eight on direct coils', sheets.eightDirect)

  await release(designer, pair, 1, {})
  await release(designer, climb, 2, { 'proofAboveIdleRpm.primary': sheets.reasonForProof })
  await archiveScenario(designer, weights)
}

async function release(designer: Actor, id: string, number: number, reasons: Record<string, string>): Promise<void> {
  const { releasedRevision } = await getScenario(designer, id)
  if (releasedRevision === null) await releaseRevision(designer, id, number, { reasons })
}
