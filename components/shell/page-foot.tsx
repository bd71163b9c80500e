import type { ReactNode } from 'react'

/** Whose limits, and what the models are for. */
export function PageFoot({ children }: { children?: ReactNode }) {
  return (
    <footer className="foot">
      <p>The models compare settings of one engine with each other. They clear none for flight: ground-run, then flight-test as the rules of your country and licensed practice say.</p>
      {children}
    </footer>
  )
}
