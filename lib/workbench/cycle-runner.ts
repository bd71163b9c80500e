import { failedAnswer, type CycleAnswer, type CycleRequest } from './cycle-answer'

export interface CycleRunner {
  /** Fetches what a run needs, before the first one is asked for. */
  warm: () => void
  /** Computes the newest sheet; a run of an older one ends at once and is never heard of again. */
  ask: (request: CycleRequest, take: (answer: CycleAnswer) => void) => void
  cancel: () => void
  close: () => void
}

export interface RunnerParts {
  /** null: this browser has no workers, or refused one. */
  startWorker: () => Worker | null
  /** In the page itself, where there is no worker. */
  computeHere: (request: CycleRequest) => Promise<CycleAnswer>
}

/** A pause in the typing after which a run is worth its start, ms: shorter, and it would take the processor from the next key's paint. */
const pauseMs = 140

const startWorker = (): Worker | null => {
  try {
    return typeof Worker === 'undefined' ? null : new Worker(new URL('./cycle.worker.ts', import.meta.url), { type: 'module' })
  } catch {
    return null
  }
}

/** When the page has nothing else to do, or soon. */
const idle = () => new Promise<void>((resolve) => {
  if (typeof requestIdleCallback === 'undefined') setTimeout(resolve, 0)
  else requestIdleCallback(() => resolve(), { timeout: 100 })
})

const computeHere = async (request: CycleRequest): Promise<CycleAnswer> => {
  const { computeCycle } = await import('./compute-cycle')
  await idle()
  return computeCycle(request)
}

/** One run at a time, the newest; a keystroke ends the run it makes worthless. */
export function createCycleRunner({ startWorker: start, computeHere: here }: RunnerParts = { startWorker, computeHere }): CycleRunner {
  let worker: Worker | null = null
  let hasWorkers = true
  let isBusy = false
  let timer: ReturnType<typeof setTimeout> | undefined
  // Counts what was asked for: an answer with an older count is thrown away.
  let newest = 0

  const ready = (): Worker | null => {
    if (!worker && hasWorkers) {
      worker = start()
      hasWorkers = worker !== null
    }
    return worker
  }
  const stop = () => {
    newest += 1
    clearTimeout(timer)
    if (!isBusy) return
    isBusy = false
    worker?.terminate()
    worker = null
  }
  const inPage = (request: CycleRequest, asked: number, take: (answer: CycleAnswer) => void) => {
    here(request).catch(failedAnswer).then((answer) => {
      if (asked === newest) take(answer)
    })
  }
  const run = (request: CycleRequest, asked: number, take: (answer: CycleAnswer) => void) => {
    const runs = ready()
    if (!runs) return inPage(request, asked, take)
    isBusy = true
    const end = () => { if (asked === newest) isBusy = false }
    runs.onmessage = ({ data }: MessageEvent<{ key: string, answer: CycleAnswer | null }>) => {
      if (asked !== newest || data.key !== request.key) return
      end()
      take(data.answer ?? failedAnswer())
    }
    // Its script did not load, or it broke: the page does it from now on.
    runs.onerror = () => {
      // A worker that was ended may still complain: that says nothing about the next one.
      if (asked !== newest) return
      end()
      hasWorkers = false
      runs.terminate()
      worker = null
      inPage(request, asked, take)
    }
    runs.postMessage(request)
  }
  return {
    warm: () => void ready(),
    ask: (request, take) => {
      stop()
      // A new worker loads while the typing pauses.
      ready()
      const asked = newest
      timer = setTimeout(() => run(request, asked, take), pauseMs)
    },
    cancel: stop,
    close: () => {
      stop()
      worker?.terminate()
      worker = null
    },
  }
}
