import { LoadingPage } from '@/components/lists/loading-page'

export default function Loading() {
  return <LoadingPage over="Scenario" title="Reading the sheet" />
}
