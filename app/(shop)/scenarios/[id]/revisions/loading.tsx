import { LoadingPage } from '@/components/lists/loading-page'

export default function Loading() {
  return <LoadingPage over="Revisions" title="Reading the revisions" />
}
