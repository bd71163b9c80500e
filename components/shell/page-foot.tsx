import type { ReactNode } from 'react'
import { TextLink } from '@/components/ui/button'

/** Whose limits, and what the models are for. */
export function PageFoot({ children }: { children?: ReactNode }) {
  return (
    <footer className="foot">
      <p>The models compare settings of one engine with each other. They clear none for flight: ground-run, then flight-test as the rules of your country and licensed practice say.</p>
      <p><TextLink href="/method">Method: every equation and its source</TextLink></p>
      {children}
    </footer>
  )
}
