import { usesFormula, isOutside, judgeCheck, type CheckOutcome } from '@/lib/method/judge-check'
import { rememberLast } from '@/lib/method/remember-last'
import type { PublishedCheck } from '@/tests/published/published-case'

export interface CheckCounts { computed: number, within: number, outside: number }

type Library = Readonly<Record<string, unknown>>

/** A slice of work short enough that a key pressed meanwhile is not felt to wait, ms. */
const sliceMs = 12
/** Rows are drawn anew this often at most: drawing hundreds costs more than computing them. */
const drawMs = 250

const whenIdle = (work: () => void) => (typeof requestIdleCallback === 'function' ? requestIdleCallback(work, { timeout: 50 }) : setTimeout(work, 1))

const none: CheckCounts = { computed: 0, within: 0, outside: 0 }

const add = (left: CheckCounts, right: CheckCounts): CheckCounts =>
  ({ computed: left.computed + right.computed, within: left.within + right.within, outside: left.outside + right.outside })

/** The library as the browser first gets it, with the formula parser only where a check needs it. */
async function loadLibrary(needsFormula: boolean): Promise<Library> {
  const library = await import('@/lib/calc/live')
  if (needsFormula) await library.loadFormulaParser()
  return rememberLast({ ...library })
}

/**
 * Computes every check of a page once, in slices between which the page stays alive. Groups are told of their own outcomes only:
 * a page has hundreds of rows.
 */
export class CheckRun {
  private readonly waiting: { group: string, key: string, check: PublishedCheck }[] = []
  private readonly outcomes = new Map<string, CheckOutcome>()
  private readonly taken = new Set<string>()
  private readonly groups = new Map<string, CheckCounts>()
  private all: CheckCounts = none
  private readonly listeners = new Set<() => void>()
  private readonly undrawn = new Map<string, CheckCounts>()
  private drawnAt = 0
  private state: 'idle' | 'running' | 'failed' = 'idle'

  readonly subscribe = (listener: () => void) => {
    this.listeners.add(listener)
    return () => {
      this.listeners.delete(listener)
    }
  }

  readonly hasFailed = (): boolean => this.state === 'failed'
  /** Of one group, or of all; the same object until it changes. */
  readonly countsOf = (group?: string): CheckCounts | undefined => (group === undefined ? this.all : this.groups.get(group))
  readonly outcomeOf = (key: string): CheckOutcome | undefined => this.outcomes.get(key)

  /** Takes a group's checks, once; keys are unique over the page. */
  add(group: string, checks: readonly { key: string, check: PublishedCheck }[]): void {
    for (const { key, check } of checks) {
      if (this.taken.has(key)) continue
      this.taken.add(key)
      this.waiting.push({ group, key, check })
    }
    if (this.state === 'idle' && this.waiting.length > 0) this.start()
  }

  /** After the library could not be fetched. */
  readonly tryAgain = (): void => this.start()

  private start(): void {
    this.state = 'running'
    loadLibrary(this.waiting.some(({ check }) => usesFormula(check))).then(
      (library) => whenIdle(() => this.slice(library)),
      () => {
        this.state = 'failed'
        this.tell()
      },
    )
  }

  private slice(library: Library): void {
    for (const until = performance.now() + sliceMs; this.waiting.length > 0 && performance.now() < until;) {
      const next = this.waiting.shift()
      if (!next) break
      const outcome = judgeCheck(library, next.check)
      this.outcomes.set(next.key, outcome)
      this.undrawn.set(next.group, count(this.undrawn.get(next.group) ?? this.groups.get(next.group), outcome))
    }
    const isDone = this.waiting.length === 0
    if (isDone || performance.now() - this.drawnAt >= drawMs) this.draw()
    if (isDone) this.state = 'idle'
    else whenIdle(() => this.slice(library))
  }

  private draw(): void {
    for (const [group, counts] of this.undrawn) this.groups.set(group, counts)
    this.undrawn.clear()
    this.all = [...this.groups.values()].reduce(add, none)
    this.drawnAt = performance.now()
    this.tell()
  }

  private tell(): void {
    for (const listener of this.listeners) listener()
  }
}

const count = (before: CheckCounts | undefined, outcome: CheckOutcome): CheckCounts =>
  add(before ?? none, isOutside(outcome) ? { computed: 1, within: 0, outside: 1 } : { computed: 1, within: 1, outside: 0 })
