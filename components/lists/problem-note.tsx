import { FailedNote } from '@/components/ui/note'
import { problemWords } from '@/lib/words/problem'

/** What a button on this page could not do, as its address tells. */
export function ProblemNote({ problem, what }: { problem: unknown, what: string }) {
  const sentence = problemWords(problem, what)
  return sentence ? <FailedNote level={2} title="Nothing was changed"><p>{sentence}</p></FailedNote> : null
}
