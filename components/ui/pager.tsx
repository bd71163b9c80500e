import { ButtonLink } from './button'

interface PagerProps {
  /** "1 to 50 of 312 scenarios" */
  at: string
  /** What pages are of: "scenarios"; names the landmark. */
  of: string
  earlierHref?: string | null
  laterHref?: string | null
  earlier?: string
  later?: string
}

/** Pages of a list that is paged by key: earlier, later, no numbers. */
export function Pager({ at, of, earlierHref, laterHref, earlier = 'Earlier', later = 'Later' }: PagerProps) {
  return (
    <nav className="pager" aria-label={`Pages of ${of}`}>
      <span className="at">{at}</span>
      {earlierHref ? <ButtonLink href={earlierHref} rel="prev">{earlier}</ButtonLink> : null}
      {laterHref ? <ButtonLink href={laterHref} rel="next">{later}</ButtonLink> : null}
    </nav>
  )
}
