/** Fault trees, ms: the solved one of 25 events and 36 gates, and generated ones of 60 events and 80 gates; printed as JSON. */
import { faultTreeProbability, importance, minimalCutSets, timeAveragedProbability, type FaultTree } from '../lib/calc/index'
import { generatedTree } from '../tests/calc/redundancy/generated-tree'
import { large } from '../tests/calc/redundancy/trees'

const layers = [36, 26, 10, 5, 2, 1]
const medianOf = (runs: number, work: () => unknown): number => {
  const times = Array.from({ length: runs }, () => {
    const from = performance.now()
    work()
    return performance.now() - from
  }).slice(Math.floor(runs / 4)).sort((one, other) => one - other)
  return times[Math.floor(times.length / 2)] ?? NaN
}
const latent = (tree: FaultTree): FaultTree => ({
  ...tree,
  events: tree.events.map(({ id }, i) => ({ id, ratePerH: 1e-5 * (1 + (i % 7)), exposure: { kind: 'latent', checkIntervalHours: i % 2 === 0 ? 100 : 50 } })),
})

/** Mostly local sharing, and sharing across the whole tree. */
const trees = [generatedTree(5, 60, layers, 0.05), generatedTree(14, 60, layers, 1)]
const perTree = <T>(work: (tree: FaultTree) => T): T[] => trees.map(work)
const first = performance.now()
minimalCutSets(large)
faultTreeProbability(large)
importance(large)
const firstMs = performance.now() - first
console.log(JSON.stringify({
  first: firstMs,
  solved: medianOf(60, () => [minimalCutSets(large), faultTreeProbability(large), importance(large)]),
  sets: perTree((tree) => minimalCutSets(tree).length),
  exact: perTree((tree) => medianOf(12, () => faultTreeProbability(tree))),
  cutSets: perTree((tree) => medianOf(8, () => minimalCutSets(tree))),
  averaged: medianOf(12, () => timeAveragedProbability(latent(large))),
}))
