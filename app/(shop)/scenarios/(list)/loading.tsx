import { LoadingPage } from '@/components/lists/loading-page'

export default function Loading() {
  return <LoadingPage over="Scenarios" title="Reading the scenarios" />
}
