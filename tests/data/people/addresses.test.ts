import { beforeEach, expect, test, vi } from 'vitest'
import { callerAddress, countedAddress } from '@/lib/auth/address'
import { homeOf } from '@/lib/auth/home'
import { safeNext } from '@/lib/auth/safe-next'
import { requestHeaders } from '../support/next-mocks'

vi.mock('next/headers', async () => (await import('../support/next-mocks')).nextHeaders())
beforeEach(() => requestHeaders.delete('x-forwarded-for'))

test.each([
  ['203.0.113.4', '203.0.113.4'],
  ['::ffff:203.0.113.4', '203.0.113.4'],
  ['::1', '0:0:0:0::/64'],
  ['2001:db8::7', '2001:db8:0:0::/64'],
  ['2001:0db8:0001:0002:ffff:1:2:3', '2001:db8:1:2::/64'],
  ['2001:db8:1:2::', '2001:db8:1:2::/64'],
  ['', 'unknown'],
  ['x'.repeat(9000), 'unknown'],
])('%s is counted as %s', (address, counted) => {
  expect(countedAddress(address)).toBe(counted)
})

test('the address the last proxy saw counts, whatever the sender wrote before it', async () => {
  expect(await callerAddress()).toBe('unknown')
  requestHeaders.set('x-forwarded-for', '198.51.100.1, 203.0.113.9')
  expect(await callerAddress()).toBe('203.0.113.9')
})

test.each(['/', '/engines', '/scenarios/9?a=1&b=%2F#end', '/a:b'])('%s is a place of this site', (wish) => {
  expect(safeNext(wish)).toBe(wish)
})

test.each([
  '', 'engines', 'https://x.example/', '//x.example', '/\\x.example', '/\t/x.example', '/\n/x.example', '/..//x.example', '/.//x.example',
  'javascript:alert(1)', '/a\\b', '/sign-in?next=/', '/sign-out', '/' + 'x'.repeat(2000), null, undefined, 7, new File([], 'x'),
])('%s is none', (wish) => {
  expect(safeNext(wish)).toBeNull()
})

test('who has working sheets starts there, everyone else at the plans', () => {
  const homes = (['builder', 'designer', 'owner', 'technician', 'inspector', 'instructor'] as const).map((role) => homeOf({ role }))
  expect(homes).toEqual(['/scenarios', '/scenarios', '/scenarios', '/plans', '/plans', '/plans'])
})
