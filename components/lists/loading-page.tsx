import { PageHead } from '@/components/shell/page-head'
import { LoadingLines } from '@/components/ui/loading-lines'

interface LoadingPageProps {
  /** "Scenarios": what the page is of. */
  over: string
  /** "The scenarios are being read" */
  title: string
  lines?: number
}

/** Stands until the page has been read. `when-loading` is taken away where no script runs, for the page then stands below it. */
export function LoadingPage({ over, title, lines }: LoadingPageProps) {
  return (
    <div className="when-loading">
      <PageHead over={over} title={title} />
      <div className="body"><LoadingLines label={title} lines={lines} /></div>
    </div>
  )
}
