import { CalcError } from '../calc-error'
import type { ReadyGate } from './ready-tree'

/** Gates so that each stands after the gates it takes in; a CalcError when some wait for each other. */
export const gateOrder = (gates: readonly ReadyGate[], eventCount: number, ids: readonly string[], given: unknown): number[] => {
  const waiting = gates.map(({ inputs }) => inputs.reduce((count, input) => count + (input >= eventCount ? 1 : 0), 0))
  const users = gates.map((): number[] => [])
  gates.forEach(({ inputs }, gate) => {
    for (const input of inputs) users[input - eventCount]?.push(gate)
  })
  const order = waiting.flatMap((count, gate) => (count === 0 ? [gate] : []))
  for (let done = 0; done < order.length; done += 1) {
    for (const user of users[order[done] ?? 0] ?? []) {
      const left = (waiting[user] ?? 0) - 1
      waiting[user] = left
      if (left === 0) order.push(user)
    }
  }
  if (order.length === gates.length) return order
  const stuck = ids[waiting.findIndex((count) => count > 0)] ?? ''
  throw new CalcError({
    field: 'tree.gates', value: given, limit: 'no loop', unit: '',
    message: `The gates make a loop: “${stuck.slice(0, 60)}” waits for a gate that in the end waits for itself.`,
  })
}
