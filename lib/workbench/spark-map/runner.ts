import type { PartError } from '../../calc/live'
import type { computeSparkMap } from './compute'
import type { SparkMapAnswer, SparkMapProgress, SparkMapRequest } from './request'

export type WorkerWord = { progress: SparkMapProgress } | { answer: SparkMapAnswer | null }

export interface RunParts {
  /** null: this browser has no workers, or refused one. */
  startWorker: () => Worker | null
  /** In the page itself, a row at a time, where there is no worker. */
  computeHere: typeof computeSparkMap
}

export interface RunOptions {
  onProgress: (progress: SparkMapProgress) => void
  /** Stops the run; its reason is what the promise rejects with. */
  signal: AbortSignal
}

const startWorker = (): Worker | null => {
  try {
    return typeof Worker === 'undefined' ? null : new Worker(new URL('./spark-map.worker.ts', import.meta.url), { type: 'module' })
  } catch {
    return null
  }
}

const computeHere: RunParts['computeHere'] = async (request, options) => (await import('./compute')).computeSparkMap(request, options)

const failed: PartError = { code: 'notComputed', field: 'sheet.cycle', value: 'failed', limit: null, unit: null, message: 'The map could not be computed in this browser.' }

/** Computes a map beside the page, in a worker of its own that ends with the run. */
export function runSparkMap(request: SparkMapRequest, { onProgress, signal }: RunOptions, parts: RunParts = { startWorker, computeHere }): Promise<SparkMapAnswer> {
  const inPage = async (): Promise<SparkMapAnswer> => {
    try {
      return await parts.computeHere(request, { onProgress, signal })
    } catch (error) {
      if (signal.aborted) throw error
      return { ok: false, error: failed }
    }
  }
  return new Promise((resolve, reject) => {
    signal.throwIfAborted()
    const worker = parts.startWorker()
    if (!worker) return resolve(inPage())
    const stop = () => {
      worker.terminate()
      reject(signal.reason)
    }
    const end = () => {
      signal.removeEventListener('abort', stop)
      worker.terminate()
    }
    signal.addEventListener('abort', stop, { once: true })
    worker.onmessage = ({ data }: MessageEvent<WorkerWord>) => {
      if (signal.aborted) return
      if ('progress' in data) return onProgress(data.progress)
      end()
      resolve(data.answer ?? { ok: false, error: failed })
    }
    // Its script did not load, or it broke: the page does it.
    worker.onerror = () => {
      // Ended while its script was on the way, a worker reports that as a fault.
      if (signal.aborted) return
      end()
      resolve(inPage())
    }
    worker.postMessage(request)
  })
}
