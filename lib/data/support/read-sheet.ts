import 'server-only'
import type { ScenarioSheet } from '@/lib/calc/live'
import { AppError } from '@/lib/errors'
import { liftSheet } from '@/lib/schemas/lift-sheet'
import { scenarioSheet, sheetVersion } from '@/lib/schemas/scenario'
import { toDto } from './dto'

/**
 * A stored sheet in today's form. A version written before is lifted step by step up to `sheetVersion`; one written by a newer
 * program is refused rather than guessed at.
 */
export function readSheet(stored: unknown, version: number): ScenarioSheet {
  if (version > sheetVersion) throw new AppError('newerSheet')
  return toDto(scenarioSheet, liftSheet(stored, version, sheetVersion))
}
