import { evaluateScenario, loadFormulaParser } from '../calc/live'
import { cycleAnswerOf, type CycleAnswer, type CycleRequest } from './cycle-answer'

/** The simulated cycle of a sheet: some tens of milliseconds without a pause. */
export async function computeCycle({ scenario, limits }: CycleRequest): Promise<CycleAnswer> {
  const { primary, backup } = scenario.sheet
  if ([primary, backup].some(({ schedule }) => schedule.kind === 'formula')) await loadFormulaParser()
  return cycleAnswerOf(evaluateScenario(scenario, limits))
}
