import Link from 'next/link'
import { listAddress, type ListParams } from '@/lib/list-address'

interface StateLinksProps {
  path: string
  params: ListParams
  label: string
  states: readonly { value: string, label: string }[]
}

/** The states of a list side by side, as links: they work without a script and can be kept. The first is the usual one. */
export function StateLinks({ path, params, label, states }: StateLinksProps) {
  const now = params.state ?? states[0]?.value
  return (
    <nav className="pick" aria-label={label}>
      {states.map(({ value, label: words }, index) => (
        <Link prefetch={false} key={value} href={listAddress(path, params, { state: index === 0 ? null : value })} aria-current={value === now ? 'page' : undefined}>{words}</Link>
      ))}
    </nav>
  )
}
