import fc from 'fast-check'
import { eventProbability, type FaultEvent, type FaultGate, type FaultTree } from '@/lib/calc/live'
import { chance, flown, latent } from './trees'

/** Leaves of a tree with the ids of the events each fails. */
interface Leaf { readonly id: string, readonly probability: number, readonly fails: readonly string[] }

const scaled = (event: FaultEvent, share: number): FaultEvent => ({ ...event, ratePerH: (event.ratePerH ?? 0) * share })

/** `probabilityOf` is asked for each event at its share of the rate. */
export const leavesOf = ({ events, commonCause = [] }: FaultTree, probabilityOf: (event: FaultEvent) => number = eventProbability): Leaf[] => [
  ...events.map((event) => {
    const cause = commonCause.find(({ events: ids }) => ids.includes(event.id))
    return { id: event.id, probability: probabilityOf(cause ? scaled(event, 1 - cause.beta) : event), fails: [event.id] }
  }),
  ...commonCause.map(({ id, events: ids, beta }) => {
    const first = events.find((event) => event.id === ids[0])
    if (!first) throw new Error('a common cause without events')
    return { id, probability: probabilityOf(scaled(first, beta)), fails: ids }
  }),
]

const hasFailed = (tree: FaultTree, failed: ReadonlySet<string>): boolean => {
  const gates = new Map(tree.gates.map((gate) => [gate.id, gate]))
  const known = new Map<string, boolean>()
  const look = (id: string): boolean => {
    const gate = gates.get(id)
    if (!gate) return failed.has(id)
    const before = known.get(id)
    if (before !== undefined) return before
    const count = gate.inputs.filter(look).length
    const result = count >= (gate.kind === 'or' ? 1 : gate.kind === 'and' ? gate.inputs.length : (gate.k ?? 0))
    known.set(id, result)
    return result
  }
  return look(tree.top)
}

/** For each state of the leaves, bit by bit, whether the top has failed. */
export const tableOf = (tree: FaultTree, leaves: readonly Leaf[]): boolean[] => Array.from({ length: 2 ** leaves.length }, (_, state) =>
  hasFailed(tree, new Set(leaves.flatMap(({ fails }, i) => ((state >> i) & 1 ? fails : [])))))

export const sumOver = (table: readonly boolean[], probabilities: readonly number[]): number => table.reduce((sum, failed, state) =>
  (failed ? sum + probabilities.reduce((product, p, i) => product * ((state >> i) & 1 ? p : 1 - p), 1) : sum), 0)

/** Cut sets by looking at every state, in the order asked for. */
export const cutSetsByHand = (tree: FaultTree): string[][] => {
  const leaves = leavesOf(tree)
  const table = tableOf(tree, leaves)
  const isMinimal = (state: number) => table[state] === true && leaves.every((_, i) => ((state >> i) & 1 ? table[state & ~(1 << i)] === false : true))
  const sets = table.flatMap((_, state) => (isMinimal(state) ? [leaves.flatMap(({ id }, i) => ((state >> i) & 1 ? [id] : [])).sort()] : []))
  return sets.sort((a, b) => a.length - b.length || (a.map((id, i) => (id < (b[i] ?? '') ? -1 : id > (b[i] ?? '') ? 1 : 0)).find((order) => order !== 0) ?? 0))
}

const p = fc.double({ min: 0, max: 1, noNaN: true })
const eventKinds = fc.oneof(
  p.map((value) => (id: string) => chance(id, value)),
  fc.double({ min: 0, max: 1, noNaN: true }).map((rate) => (id: string) => flown(id, rate)),
  fc.tuple(fc.double({ min: 0, max: 0.05, noNaN: true }), fc.constantFrom(50, 100)).map(([rate, interval]) => (id: string) => latent(id, rate, interval)),
)

/** Trees with shared events and gates, inputs named twice, votes, and common causes of up to two groups of equal parts. */
export const anyTree = (mostEvents: number): fc.Arbitrary<FaultTree> => fc.record({
  kinds: fc.array(eventKinds, { minLength: 1, maxLength: mostEvents }),
  twins: fc.array(fc.record({ kind: eventKinds, beta: p }), { maxLength: 2 }),
  gates: fc.array(fc.record({
    kind: fc.constantFrom<FaultGate['kind']>('and', 'or', 'atLeast'),
    inputs: fc.array(fc.nat(1000), { minLength: 1, maxLength: 5 }),
    k: fc.nat(1000),
  }), { minLength: 1, maxLength: 9 }),
  shuffled: fc.boolean(),
}).map(({ kinds, twins, gates, shuffled }) => {
  const pairs = twins.map(({ kind, beta }, i) => ({ id: `cause${i}`, beta, parts: [kind(`t${i}a`), kind(`t${i}b`)] })).filter(({ parts }) => parts.every(({ exposure }) => exposure.kind !== 'probability'))
  const events = [...kinds.map((kind, i) => kind(`e${i}`)), ...pairs.flatMap(({ parts }) => parts)]
  const ready = gates.map(({ kind, inputs, k }, i): FaultGate => {
    // A gate may take any event and any gate that comes later: no loop can arise.
    const choices = [...events.map(({ id }) => id), ...gates.slice(i + 1).map((_, j) => `g${i + 1 + j}`), ...gates.slice(i + 1).map((_, j) => `g${i + 1 + j}`)]
    const ids = inputs.map((n) => choices[n % choices.length] ?? '')
    return { id: `g${i}`, kind, inputs: ids, ...(kind === 'atLeast' ? { k: 1 + (k % ids.length) } : {}) }
  })
  return { top: 'g0', events, gates: shuffled ? ready.reverse() : ready, commonCause: pairs.map(({ id, beta, parts }) => ({ id, beta, events: parts.map((part) => part.id) })) }
})
