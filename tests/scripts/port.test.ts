import net from 'node:net'
import { afterEach, expect, test } from 'vitest'
import { freePort, portSentence, readPort, requirePort } from '@/scripts/lib/port.mjs'

const servers: net.Server[] = []
const occupy = () => new Promise<number>((resolve) => {
  const server = net.createServer().listen(0, '127.0.0.1', () => resolve((server.address() as net.AddressInfo).port))
  servers.push(server)
})
afterEach(() => servers.splice(0).map((server) => server.close()))

test('a taken port is refused with a sentence that names it and another one', async () => {
  const port = await occupy()
  await expect(requirePort(port)).rejects.toThrow(new RegExp(`Port ${port} is taken .* --port \\d+`))
})

test('a free port is let through', async () => {
  await expect(requirePort(await freePort())).resolves.toBeUndefined()
})

test('the preferred port is kept when free, else another is chosen', async () => {
  const taken = await occupy()
  expect(await freePort(taken)).not.toBe(taken)
  const free = await freePort()
  expect(await freePort(free)).toBe(free)
})

test('the port beside the last one is not proposed', () => {
  expect(portSentence(65535, 'EADDRINUSE')).toContain('--port 3000')
  expect(portSentence(80, 'EACCES')).toContain('1024')
})

test.each(['abc', '70000', '0', '-1', '3000.5', '1e3', '0x50'])('%s is told to be no port', (text) => {
  expect(() => readPort(text, 3000)).toThrow(`“${text}” is no port: give a whole number from 1 to 65535`)
})

test('no port asked for means the usual one', () => {
  expect(readPort(undefined, 3000)).toBe(3000)
  expect(readPort(' ', 3000)).toBe(3000)
  expect(readPort('3001', 3000)).toBe(3001)
})
