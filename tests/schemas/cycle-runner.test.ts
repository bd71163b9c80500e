import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest'
import { defaultLimits } from '@/lib/calc/limits'
import { failedAnswer, type CycleAnswer, type CycleRequest } from '@/lib/workbench/cycle-answer'
import { createCycleRunner } from '@/lib/workbench/cycle-runner'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'

const request = (key: string): CycleRequest => ({ key, scenario: { engine: sampleEngine(), sheet: sampleSheet() }, limits: defaultLimits })
const answer: CycleAnswer = { ...failedAnswer(), sourceIds: ['seen'] }

class FakeWorker extends EventTarget implements Worker {
  onmessage: Worker['onmessage'] = null
  onmessageerror: Worker['onmessageerror'] = null
  onerror: Worker['onerror'] = null
  isEnded = false
  asked: CycleRequest[] = []
  postMessage(message: CycleRequest) { this.asked.push(message) }
  terminate() { this.isEnded = true }
  reply(key: string, given: CycleAnswer | null = answer) { this.onmessage?.call(this, new MessageEvent('message', { data: { key, answer: given } })) }
  fail() { this.onerror?.call(this, new ErrorEvent('error')) }
}
// Node has no such event; the runner reads nothing of it.
class ErrorEvent extends Event implements globalThis.ErrorEvent {
  colno = 0
  error = null
  filename = ''
  lineno = 0
  message = ''
}

const setUp = () => {
  const workers: FakeWorker[] = []
  const computeHere = vi.fn((_request: CycleRequest) => Promise.resolve(answer))
  const runner = createCycleRunner({ startWorker: () => { const worker = new FakeWorker(); workers.push(worker); return worker }, computeHere })
  return { workers, computeHere, runner, take: vi.fn() }
}
const settle = () => vi.advanceTimersByTimeAsync(200)

beforeEach(() => { vi.useFakeTimers() })
afterEach(() => { vi.useRealTimers() })

describe('runs of the simulated cycle', () => {
  test('a sheet is computed in the worker, after a pause in the typing', async () => {
    const { workers, runner, take, computeHere } = setUp()
    runner.ask(request('a'), take)
    expect(workers[0]?.asked).toEqual([])
    await settle()
    expect(workers[0]?.asked.map(({ key }) => key)).toEqual(['a'])
    workers[0]?.reply('a')
    expect(take).toHaveBeenCalledExactlyOnceWith(answer)
    expect(computeHere).not.toHaveBeenCalled()
  })

  test('quick typing starts one run, of the newest sheet, in one worker', async () => {
    const { workers, runner, take } = setUp()
    for (const key of ['a', 'b', 'c']) runner.ask(request(key), take)
    await settle()
    expect(workers).toHaveLength(1)
    expect(workers[0]?.asked.map(({ key }) => key)).toEqual(['c'])
  })

  test('a keystroke ends the run it makes worthless; the new one does not wait behind it', async () => {
    const { workers, runner, take } = setUp()
    runner.ask(request('a'), take)
    await settle()
    runner.ask(request('b'), take)
    expect(workers[0]?.isEnded).toBe(true)
    await settle()
    expect(workers[1]?.asked.map(({ key }) => key)).toEqual(['b'])
    workers[0]?.reply('a')
    expect(take).not.toHaveBeenCalled()
    workers[1]?.reply('b')
    expect(take).toHaveBeenCalledTimes(1)
  })

  test('a worker that has answered serves the next run', async () => {
    const { workers, runner, take } = setUp()
    for (const key of ['a', 'b']) {
      runner.ask(request(key), take)
      await settle()
      workers[0]?.reply(key)
    }
    expect([workers.length, take.mock.calls.length]).toEqual([1, 2])
  })

  test('nothing is heard of a run that was cancelled, nor after the end', async () => {
    const { workers, runner, take } = setUp()
    runner.ask(request('a'), take)
    runner.cancel()
    await settle()
    expect(workers[0]?.asked).toEqual([])
    runner.ask(request('b'), take)
    await settle()
    runner.close()
    expect(workers[0]?.isEnded).toBe(true)
    workers[0]?.reply('b')
    expect(take).not.toHaveBeenCalled()
  })

  test('without workers, or with one that breaks, the page computes', async () => {
    const here = vi.fn((_request: CycleRequest) => Promise.resolve(answer))
    const none = createCycleRunner({ startWorker: () => null, computeHere: here })
    const take = vi.fn()
    none.ask(request('a'), take)
    await settle()
    expect(take).toHaveBeenCalledExactlyOnceWith(answer)
    const { workers, runner, computeHere } = setUp()
    runner.ask(request('b'), take)
    await settle()
    workers[0]?.fail()
    await settle()
    expect(computeHere).toHaveBeenCalledTimes(1)
    runner.ask(request('c'), take)
    await settle()
    expect([workers.length, computeHere.mock.calls.length, take.mock.calls.length]).toEqual([1, 2, 3])
  })

  test('what nobody can compute is said', async () => {
    const runner = createCycleRunner({ startWorker: () => null, computeHere: () => Promise.reject(new Error('no connection')) })
    const take = vi.fn()
    runner.ask(request('a'), take)
    await settle()
    expect(take.mock.calls[0]?.[0].parts.detonation.error.value).toBe('failed')
    const { workers, runner: other, take: taken } = setUp()
    other.ask(request('b'), taken)
    await settle()
    workers[0]?.reply('b', null)
    expect(taken.mock.calls[0]?.[0].parts.spark.ok).toBe(false)
  })
})
