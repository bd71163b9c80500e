import { computeSparkMap } from './compute'
import type { SparkMapRequest } from './request'
import type { WorkerWord } from './runner'

const say = (word: WorkerWord) => self.postMessage(word)

// One map, then whoever asked ends this worker; a stop is its end.
self.addEventListener('message', ({ data }: MessageEvent<SparkMapRequest>) => {
  computeSparkMap(data, { onProgress: (progress) => say({ progress }) }).then((answer) => say({ answer }), () => say({ answer: null }))
})
