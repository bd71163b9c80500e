import { LoadingPage } from '@/components/lists/loading-page'

export default function Loading() {
  return <LoadingPage over="Engine" title="Reading the engine" />
}
