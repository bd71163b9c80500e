import { LoadingPage } from '@/components/lists/loading-page'

export default function Loading() {
  return <LoadingPage over="New engine" title="Making an empty sheet" />
}
