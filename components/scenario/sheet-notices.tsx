import type { Notice } from '@/lib/calc/live'
import { noticeWords } from '@/lib/words/parts'

interface SheetNoticesProps {
  notices: readonly Notice[]
  engineChanged: boolean
  archived: boolean
  canWrite: boolean
}

/** What to know beside the figures. */
export function SheetNotices({ notices, engineChanged, archived, canWrite }: SheetNoticesProps) {
  const lines = [
    ...(archived ? ['This scenario is archived: it can be looked at and tried out, and saved again once it is restored.'] : []),
    ...(canWrite || archived ? [] : ['You may look at this scenario and try changes; saving needs another role.']),
    ...(engineChanged ? ['The engine’s sheet was changed since this revision was saved; the figures here use it as it is now.'] : []),
    ...notices.map(noticeWords),
  ]
  if (lines.length === 0) return null
  return <ul className="notices" aria-label="To know beside the figures">{lines.map((line) => <li key={line}>{line}</li>)}</ul>
}
