import 'server-only'
import { planDto, type PlanDto } from '@/lib/schemas/plan-dto'
import { toDto } from './dto'
import { revisionFields, type NamedRevision } from './revision-records'

/** Scenario's code, a point, the revision's number. */
export const planCode = (scenarioCode: string, number: number): string => `${scenarioCode}.${number}`

export const toPlanDto = (revision: NamedRevision, scenarioCode: string): PlanDto =>
  toDto(planDto, { ...revisionFields(revision), code: planCode(scenarioCode, revision.number) })
