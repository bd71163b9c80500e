import { LoadingPage } from '@/components/lists/loading-page'

export default function Loading() {
  return <LoadingPage over="New scenario" title="Reading the engines" />
}
