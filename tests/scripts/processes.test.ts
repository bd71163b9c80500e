import { spawn } from 'node:child_process'
import fs from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { expect, test } from 'vitest'
import { endGroup, runToEnd, startGroup } from '@/scripts/lib/children.mjs'
import { withLock } from '@/scripts/lib/lock.mjs'
import { identityOf, isAlive, isSameAlive } from '@/scripts/lib/processes.mjs'

test('one run of a process is told from another with the same number', () => {
  expect(isSameAlive(identityOf(process.pid))).toBe(true)
  expect(isSameAlive(`${process.pid}:1`)).toBe(false)
  expect(isSameAlive(null)).toBe(false)
})

test('a process that ended is not alive', async () => {
  const child = spawn(process.execPath, ['-e', ''])
  await new Promise((resolve) => child.once('exit', resolve))
  expect(isAlive(child.pid ?? 0)).toBe(false)
})

/** A shell that ignores the polite signal, with a child that left its group. */
const stubborn = 'trap "" TERM; setsid sleep 60 & echo $!; while :; do sleep 1; done'

test('ending a group ends what left it too, and what does not listen', async () => {
  const child = startGroup('sh', ['-c', stubborn])
  const loose = await new Promise<number>((resolve) => child.stdout.once('data', (part: Buffer) => resolve(Number(part.toString()))))
  expect(isAlive(loose)).toBe(true)
  await endGroup(child.pid, 200)
  expect(isAlive(loose)).toBe(false)
  expect(isAlive(child.pid ?? 0)).toBe(false)
})

test('a program past its time is ended and told as such', async () => {
  const outcome = await runToEnd('sleep', ['60'], { minutes: 0.002 })
  expect(outcome).toMatchObject({ ok: false, timedOut: true })
})

test('a finished program leaves the last of its output, a missing one its name', async () => {
  expect(await runToEnd('sh', ['-c', 'echo out; echo err >&2; exit 3'], { minutes: 1 })).toMatchObject({ ok: false, code: 3, tail: expect.stringMatching(/out[^]*err|err[^]*out/) })
  expect((await runToEnd('no-such-program-here', [], { minutes: 1 })).tail).toContain('spawn no-such-program-here ENOENT')
})

test('two who want the lock take turns, and one left by a dead process is no obstacle', async () => {
  const file = path.join(fs.mkdtempSync(path.join(os.tmpdir(), 'halfspeed-lock-')), 'x.lock')
  fs.symlinkSync('999999999:1', file)
  const order: string[] = []
  const hold = (name: string) => withLock(file, async () => {
    order.push(`${name} in`)
    await new Promise((resolve) => setTimeout(resolve, 20))
    order.push(`${name} out`)
  })
  await Promise.all([hold('a'), hold('b')])
  expect(order.map((step) => step.split(' ')[1])).toEqual(['in', 'out', 'in', 'out'])
  expect(fs.readdirSync(path.dirname(file))).toEqual([])
  fs.rmSync(path.dirname(file), { recursive: true })
})
