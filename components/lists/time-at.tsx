import { timeWords } from '@/lib/words/times'

/** A moment, in UTC and saying so. */
export function TimeAt({ iso }: { iso: string }) {
  return <time dateTime={iso}>{timeWords(iso)}</time>
}
