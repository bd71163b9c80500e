import { computeCycle } from './compute-cycle'
import type { CycleRequest } from './cycle-answer'

// Runs beside the page: one request at a time; whoever asks ends this worker when a newer sheet makes the run worthless.
self.addEventListener('message', ({ data }: MessageEvent<CycleRequest>) => {
  computeCycle(data).then((answer) => self.postMessage({ key: data.key, answer }), () => self.postMessage({ key: data.key, answer: null }))
})
