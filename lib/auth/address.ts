import 'server-only'
import { isIP, isIPv6 } from 'node:net'
import { headers } from 'next/headers'

/**
 * The network address attempts are counted under. The server listens on loopback only: whoever comes from outside comes
 * through a proxy, which appends the address it saw. So the last entry counts; the ones before it are whatever the sender wrote.
 */
export async function callerAddress(): Promise<string> {
  const list = (await headers()).get('x-forwarded-for') ?? ''
  return countedAddress(list.split(',').at(-1)?.trim() ?? '')
}

/** IPv4 as it is; of IPv6 the first 64 bits, since one household holds all of the rest. */
export function countedAddress(address: string): string {
  const plain = address.replace(/^::ffff:(?=\d+\.)/i, '')
  if (!isIP(plain)) return 'unknown'
  if (!isIPv6(plain)) return plain
  const [head = '', tail] = plain.split('::')
  const groups = head.split(':').filter(Boolean)
  // `::` stands for as many zero groups as are missing from eight.
  if (tail !== undefined) {
    const end = tail.split(':').filter(Boolean)
    while (groups.length + end.length < 8) groups.push('0')
    groups.push(...end)
  }
  return groups.slice(0, 4).map((group) => parseInt(group, 16).toString(16)).join(':') + '::/64'
}
