import { describe, expect, test, vi } from 'vitest'
import type { SparkMapAnswer, SparkMapRequest } from '@/lib/workbench/spark-map/request'
import { runSparkMap, type WorkerWord } from '@/lib/workbench/spark-map/runner'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'
import { smallMap } from './small-map'

const request: SparkMapRequest = { scenario: { engine: sampleEngine(), sheet: sampleSheet() }, choice: { rpm: [1000], manifoldKpa: [50], day: 'worse' } }
const answer: SparkMapAnswer = { ok: true, map: smallMap, pressures: { fullChargeKpa: 132, fullManifoldKpa: 98 } }

class FakeWorker extends EventTarget implements Worker {
  onmessage: Worker['onmessage'] = null
  onmessageerror: Worker['onmessageerror'] = null
  onerror: Worker['onerror'] = null
  isEnded = false
  asked: SparkMapRequest[] = []
  postMessage(message: SparkMapRequest) { this.asked.push(message) }
  terminate() { this.isEnded = true }
  say(data: WorkerWord) { this.onmessage?.call(this, new MessageEvent('message', { data })) }
  fail() { this.onerror?.call(this, Object.assign(new Event('error'), { colno: 0, error: null, filename: '', lineno: 0, message: '' })) }
}

const setUp = (computeHere = vi.fn(() => Promise.resolve(answer))) => {
  const worker = new FakeWorker()
  const stop = new AbortController()
  const onProgress = vi.fn()
  const run = (startWorker: () => Worker | null = () => worker) => runSparkMap(request, { onProgress, signal: stop.signal }, { startWorker, computeHere })
  return { worker, stop, onProgress, computeHere, run }
}

describe('a run of the map', () => {
  test('happens in a worker, is told row by row, and ends the worker', async () => {
    const { worker, onProgress, run, computeHere } = setUp()
    const done = run()
    expect(worker.asked).toEqual([request])
    worker.say({ progress: { done: 1, total: 2 } })
    expect(worker.isEnded).toBe(false)
    worker.say({ answer })
    expect(await done).toBe(answer)
    expect([onProgress.mock.calls, worker.isEnded, computeHere.mock.calls]).toEqual([[[{ done: 1, total: 2 }]], true, []])
  })

  test('stopped, it ends its worker at once, rejects with the reason and is not heard of again', async () => {
    const { worker, stop, onProgress, run, computeHere } = setUp()
    const done = run()
    stop.abort('person')
    await expect(done).rejects.toBe('person')
    expect(worker.isEnded).toBe(true)
    worker.say({ progress: { done: 1, total: 2 } })
    worker.fail()
    expect([onProgress.mock.calls, computeHere.mock.calls]).toEqual([[], []])
    await expect(run()).rejects.toBe('person')
    expect(worker.asked).toHaveLength(1)
  })

  test('without a worker, or with one that breaks, the page computes and can be stopped', async () => {
    const { worker, run, computeHere } = setUp()
    expect(await run(() => null)).toBe(answer)
    const done = run()
    worker.fail()
    expect(await done).toBe(answer)
    expect(worker.isEnded).toBe(true)
    expect(computeHere).toHaveBeenCalledTimes(2)
    const stopping = setUp(vi.fn(() => Promise.reject(new Error('stopped'))))
    stopping.stop.signal.addEventListener('abort', () => {})
    const run2 = stopping.run(() => null)
    stopping.stop.abort('edit')
    await expect(run2).rejects.toThrow('stopped')
  })

  test('what nobody can compute is said', async () => {
    const { run } = setUp(vi.fn(() => Promise.reject(new Error('no connection'))))
    const here = await run(() => null)
    const { worker, run: other } = setUp()
    const there = other()
    worker.say({ answer: null })
    for (const each of [here, await there]) expect(each.ok ? null : each.error.message).toBe('The map could not be computed in this browser.')
  })
})
