import { ButtonLink } from '@/components/ui/button'
import { FailedNote } from '@/components/ui/note'

interface ListFailedProps {
  title: string
  sentence: string
  fieldErrors: Readonly<Record<string, string>>
  /** The list from its start. */
  href: string
}

/** A list that its address does not lead to: the reason, and the way to the list. */
export function ListFailed({ title, sentence, fieldErrors, href }: ListFailedProps) {
  const reasons = [...new Set(Object.values(fieldErrors))]
  return (
    <FailedNote level={2} title={title}>
      <p>{sentence}</p>
      {reasons.map((reason) => <p key={reason}>{reason}</p>)}
      <p className="mt-3"><ButtonLink href={href}>The list from its start</ButtonLink></p>
    </FailedNote>
  )
}
