import { CalcError, sparkMap, sparkMapOf } from '../../calc/live'
import type { SparkMapAnswer, SparkMapProgress, SparkMapRequest } from './request'

interface ComputeOptions {
  onProgress?: (progress: SparkMapProgress) => void
  signal?: AbortSignal
}

/** The map of a scenario, or why there is none; rejects only with the reason it was stopped for. */
export async function computeSparkMap({ scenario, choice }: SparkMapRequest, { onProgress, signal }: ComputeOptions = {}): Promise<SparkMapAnswer> {
  const setup = sparkMapOf(scenario, choice)
  if (!setup.ok) return setup
  try {
    return { ok: true, map: await sparkMap({ ...setup.input, onProgress, signal }), pressures: setup.pressures }
  } catch (error) {
    if (!(error instanceof CalcError)) throw error
    return { ok: false, error: { code: 'input', field: error.field, value: error.value, limit: error.limit, unit: error.unit, message: error.message } }
  }
}
