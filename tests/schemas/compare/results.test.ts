import { describe, expect, it } from 'vitest'
import { comparisonHead, comparisonSentence } from '@/lib/compare/comparison-words'
import { drawnResult } from '@/lib/compare/drawn-result'
import { findingChanges } from '@/lib/compare/finding-changes'
import { keyResults } from '@/lib/compare/key-results'
import { overlaidCurves } from '@/lib/compare/overlaid-curves'
import { findingRows, keyRows } from '@/lib/compare/result-rows'
import { evaluateScenario } from '@/lib/calc/scenario/evaluate-scenario'
import { expectClose } from '@/tests/support/expect-close'
import { sampleEngine } from '@/tests/support/sample-engine'
import { sampleRevision } from '@/tests/support/sample-revisions'

const base = sampleRevision(1)
// 7° earlier on the backup: it cranks at 24°, beyond the 20° allowed, and makes more power.
const early = sampleRevision(2, { backup: { schedule: { kind: 'fixed', deg: 24 }, latencyUs: 0 } })
const row = (left: typeof base, right: typeof base, id: string) => [...findingRows(left.results, right.results, 'metric'), ...keyRows(left.results, right.results, 'metric').flatMap((group) => group.rows)].find((one) => one.id === id)

describe('results side by side', () => {
  it('says "same" of every figure of one evaluation against itself', () => {
    const rows = [...findingRows(base.results, base.results, 'metric'), ...keyRows(base.results, base.results, 'metric').flatMap((group) => group.rows)]
    expect(rows.length).toBeGreaterThan(30)
    expect(rows.filter(({ left }) => /\d/.test(left?.text ?? '')).map(({ difference }) => difference).every((difference) => difference === 'same')).toBe(true)
  })

  it('gives limit, verdicts and the signed step of what the limits judge, worst first', () => {
    const rows = findingRows(base.results, early.results, 'metric')
    expect(rows.filter(({ left, right }) => [left?.verdict, right?.verdict].includes('outside')).map(({ id }) => id)).toContain('crankingAdvanceDeg.backup')
    expect(row(base, early, 'crankingAdvanceDeg.backup')).toMatchObject({
      label: 'Cranking advance', channel: 'backup', limit: 'at most 20.0°', unit: { symbol: '°', joined: true },
      left: { text: '17.0', verdict: 'within' }, right: { text: '24.0', verdict: 'outside' }, difference: '+7.0',
    })
    const ranks = rows.map(({ left, right }) => Math.min(...[left, right].map((side) => ['outside', 'close', 'within'].indexOf(side?.verdict ?? 'within'))))
    expect(ranks).toEqual([...ranks].sort((one, other) => one - other))
  })

  it('gives key figures in the units of the system', () => {
    expect(row(base, early, 'stagger.full')).toMatchObject({ left: { text: '9.0' }, right: { text: '2.0' }, difference: '−7.0' })
    expect(row(base, sampleRevision(5, { backup: { schedule: { kind: 'fixed', deg: 30 }, latencyUs: 0 } }), 'backupFirstDeg')?.label).toBe('Backup never first')
    const metric = row(base, early, 'power.backup')
    const us = keyRows(base.results, early.results, 'us').flatMap((group) => group.rows).find(({ id }) => id === 'power.backup')
    expect([metric?.unit.symbol, us?.unit.symbol]).toEqual(['kW', 'hp'])
    expectClose(Number(us?.left?.text) / Number(metric?.left?.text), 1 / 0.7457, { rel: 0.002 })
    expect(metric?.difference?.startsWith('+')).toBe(true)
  })

  it('has no difference where one side withholds a figure', () => {
    const twin = sampleRevision(3, { plugsPerCylinder: 2 })
    expect(row(base, twin, 'power.primary')).toMatchObject({ right: null, difference: null })
    expect(keyResults(twin.results, 'metric').find(({ id }) => id === 'power')?.withheld?.code).toBe('twoPlugs')
  })
})

describe('findings gained and lost', () => {
  it('names what came, and the other way round what went', () => {
    const forth = findingChanges(base.results, early.results)
    expect(forth.gained.map(({ id, was, now }) => [id, was?.verdict, now?.verdict])).toContainEqual(['crankingAdvanceDeg.backup', 'within', 'outside'])
    const back = findingChanges(early.results, base.results)
    expect(back.lost.map(({ id }) => id)).toEqual(forth.gained.map(({ id }) => id))
    expect(back.gained.map(({ id }) => id)).toEqual(forth.lost.map(({ id }) => id))
    expect(findingChanges(base.results, base.results)).toEqual({ gained: [], lost: [] })
  })

  it('counts what is judged on one side only if it lies outside or close there', () => {
    const [outside, within] = [early.results.findings.find(({ verdict }) => verdict === 'outside'), early.results.findings.find(({ verdict }) => verdict === 'within')]
    if (!outside || !within) throw new Error('the sample has both')
    const both = { findings: [outside, within] }
    expect(findingChanges(both, { findings: [] })).toEqual({ gained: [], lost: [{ id: outside.id, was: outside, now: null }] })
    expect(findingChanges({ findings: [] }, both)).toEqual({ gained: [{ id: outside.id, was: null, now: outside }], lost: [] })
  })
})

describe('words of a comparison', () => {
  it('counts findings in its head', () => {
    const changes = findingChanges(base.results, early.results)
    expect(comparisonHead(changes, true)).toMatch(/^\d findings? new or worse/)
    expect(comparisonHead({ gained: [], lost: [] }, true)).toBe('The findings are the same')
    expect(comparisonHead({ gained: [], lost: [] }, false)).toBe('No input differs')
  })

  it('says what the second does at full power', () => {
    expect(comparisonSentence(base.results, early.results, 'metric')).toMatch(/^At full power A is the same; B fires 7\.0° earlier and makes \d\.\d\u00a0kW more\.$/)
    expect(comparisonSentence(base.results, base.results, 'metric')).toBe('At full power A is the same; B is the same.')
  })
})

describe('curves', () => {
  it('are drawn again from the inputs while every stored figure stays', () => {
    const drawn = drawnResult(base)
    const whole = evaluateScenario({ engine: sampleEngine, sheet: base.sheet })
    expect(base.results.parts.curves).toMatchObject({ ok: true, rising: { primary: [] } })
    expect(drawn.parts.curves).toEqual(whole.parts.curves)
    const forged = { ...base, results: { ...base.results, counts: { outside: 9, close: 9, within: 9 } } }
    expect(drawnResult(forged).counts).toEqual({ outside: 9, close: 9, within: 9 })
  })

  it('lay one line for a channel that is the same and two with digits for one that is not', () => {
    const lines = overlaidCurves(drawnResult(base), drawnResult(early))
    expect(lines.map(({ channel, digit }) => [channel, digit])).toEqual([['A', null], ['B', 1], ['B', 2]])
    expect(lines.every(({ points }) => points.length > 100)).toBe(true)
  })
})
