/** A symbol of an equation. */
export interface MathSymbol {
  readonly tex: string
  readonly meaning: string
  /** As people write it; "no unit" for a ratio. */
  readonly unit: string
  /** Values the library takes or gives; left out where any finite number will do. */
  readonly range?: string
}

export interface Equation {
  /** Anchor on the page. Results link to it, and a released plan keeps its links: never renamed. */
  readonly id: string
  readonly title: string
  readonly tex: string
  /** What the equation does not say by itself. */
  readonly note?: string
  readonly symbols: readonly MathSymbol[]
  /** Ids in `sources`. */
  readonly sources: readonly string[]
  /** What it rests on where no publication is needed for it. */
  readonly basis?: 'definition' | 'geometry' | 'arithmetic' | 'choice of this program'
}

export interface Topic {
  /** Anchor on the page. */
  readonly id: string
  readonly title: string
  readonly intro: string
  /** Names in the calculation library that it explains; a published check stands under the topic of the function it calls. */
  readonly functions: readonly string[]
  readonly equations: readonly Equation[]
  /** What handbooks and rules say beside it: shown, not computed. */
  readonly handbook?: readonly { readonly says: string, readonly source: string }[]
  /** Where the model is known to be wrong or blind. */
  readonly weaknesses: readonly string[]
}

/** Keeps the ids as literal types, so that a link to an equation that does not exist fails to compile. */
export const defineTopic = <const T extends Topic>(topic: T): T => topic
