import { Pager } from '@/components/ui/pager'
import { listAddress, type ListParams } from '@/lib/list-address'

interface ListPagerProps {
  path: string
  params: ListParams
  count: number
  nextCursor: string | null
  /** "scenarios" */
  of: string
}

/** Pages by key: on to the next, back to the first; the way between is the browser's own Back. None where all rows fit. */
export function ListPager({ path, params, count, nextCursor, of }: ListPagerProps) {
  const isFirst = !params.cursor
  if (isFirst && !nextCursor) return null
  return (
    <Pager
      of={of} at={`${count} ${of} on this page`} earlier="First page" later="Next page"
      earlierHref={isFirst ? null : listAddress(path, params)} laterHref={nextCursor ? listAddress(path, params, { cursor: nextCursor }) : null}
    />
  )
}
