import { render, screen, within } from '@testing-library/react'
import { beforeAll, describe, expect, test } from 'vitest'
import '@/lib/calc/index'
import { ResultLedgers } from '@/components/scenario/result-ledgers'
import { cycleParts, evaluateScenario, type PartError, type PartName, type ScenarioParts, type ScenarioSheet } from '@/lib/calc/live'
import { sampleCoil, sampleEngine, sampleSheet } from '@/tests/support/samples'

const none: ReadonlySet<PartName> = new Set()
const sheet = sampleSheet()
let parts: ScenarioParts
beforeAll(() => { parts = evaluateScenario({ engine: sampleEngine(), sheet }).parts })

interface Show {
  change?: Partial<ScenarioParts>
  pending?: readonly PartName[]
  isSaved?: boolean
  system?: 'metric' | 'us'
  of?: ScenarioSheet
}
const show = ({ change = {}, pending = [], isSaved, system = 'metric', of = sheet }: Show = {}) =>
  render(<ResultLedgers parts={{ ...parts, ...change }} stale={none} pending={new Set(pending)} isSaved={isSaved} scenario={{ engine: sampleEngine(), sheet: of }} system={system} />)
const region = (name: RegExp | string) => screen.getByRole('region', { name })
const row = (where: HTMLElement, name: RegExp | string) => within(within(where).getAllByRole('rowheader', { name })[0]?.closest('tr') ?? where).getAllByRole('cell').map((cell) => cell.textContent?.replaceAll('\u00a0', ' '))
const withheld = (code: PartError['code'], message = 'A reason.', value: unknown = null): { ok: false, error: PartError } => ({ ok: false, error: { code, field: 'sheet.cycle', value, limit: null, unit: null, message } })

describe('detonation', () => {
  test('never without its caution, the scale, the uncertainty and both channels in three cases', () => {
    show()
    const where = region('Detonation')
    expect(within(where).getByRole('note')).toHaveTextContent(/can destroy an engine in seconds.*compares settings of one engine; it clears nothing for flight/)
    const table = within(where).getByRole('table', { name: /Spark, detonation limit and margin/ })
    expect(within(table).getAllByRole('row')).toHaveLength(7)
    expect(within(table).getByRole('columnheader', { name: 'margin, octane ±5' })).toBeVisible()
    expect(within(table).getAllByRole('rowheader', { name: /Worse: 91.RON, charge 15.K hotter, 3.kPa denser/ })).toHaveLength(2)
    expect(row(table, /As planned: 95.RON/)).toEqual(['A primary', '2780 rpm', expect.stringMatching(/°$/), expect.stringMatching(/°$|not reached/), expect.stringMatching(/°$/), expect.stringMatching(/° to /), expect.stringMatching(/RON$/)])
    expect(where).toHaveTextContent(/Going to the backup gains [\d.]+° and [\d.]+ octane numbers/)
    expect(where).toHaveTextContent(/good to ±5 at best/)
    expect(row(where, 'One octane number less')).toEqual([expect.stringMatching(/°$/), expect.stringMatching(/°$/)])
  })

  test('a spark that always or never detonates is said in words', () => {
    if (!parts.detonation.ok) throw new Error('the sample has detonation')
    const { detonation } = parts
    const planned = { ...detonation.primary.planned, limitDeg: null, marginDeg: null, lowDeg: null, state: 'always' as const }
    const worse = { ...detonation.primary.worse, limitDeg: null, marginDeg: 34, state: 'never' as const }
    show({ change: { detonation: { ...detonation, primary: { ...detonation.primary, planned, worse, perOctaneDeg: null } } } })
    const where = region('Detonation')
    expect(row(where, /As planned: 95/).slice(3, 6)).toEqual(['at every spark', 'none', expect.stringMatching(/^none to /)])
    expect(row(where, /Worse/).slice(3, 5)).toEqual(['not reached', 'at least 34.0°'])
    expect(row(where, 'One octane number less')[0]).toBe('none found')
  })

  test('an anchored model says so', () => {
    const reference = { sparkDeg: 26, rpm: 2780, octane: 91, marginDeg: 2 }
    const anchored = sampleSheet({ reference })
    show({ change: evaluateScenario({ engine: sampleEngine(), sheet: anchored }).parts, of: anchored })
    expect(region('Detonation')).toHaveTextContent(/anchored to a setting known to run clean.*±1/)
    expect(within(region('Detonation')).getByRole('columnheader', { name: 'margin, octane ±1' })).toBeVisible()
  })

  test('a charge that does not match the power curve stands in place of the margin', () => {
    show({ change: { detonation: withheld('chargeMismatch', 'It makes 12 % less.') } })
    expect(screen.getByRole('heading', { name: 'Detonation: the charge does not match the power curve' })).toBeVisible()
    expect(screen.queryByRole('table', { name: /Spark, detonation limit/ })).toBeNull()
  })
})

describe('the other ledgers', () => {
  test('the charge says whether it was solved or typed', () => {
    show()
    expect(region('Charge at full power')).toHaveTextContent(/Solved: with this charge the cycle makes the 50\.0.kW of the power curve/)
    if (!parts.charge.ok) throw new Error('the sample has a charge')
    show({ change: { charge: { ...parts.charge, from: 'typed', mismatch: -0.031 } } })
    expect(screen.getAllByRole('region', { name: 'Charge at full power' })[1]).toHaveTextContent(/Typed as volumetric efficiency; the charge makes 3\.1.% less/)
  })

  test('coils: stored energy says that half of it arrives; a winding that runs away is said', () => {
    show({ change: { coils: { ok: true, primary: { currentA: 6.5, energyMj: 95, crankingCurrentA: 5, crankingEnergyMj: 56, stalledA: 19.3, windingK: 419.15, powerW: 8.3, periodShare: 0.76 }, backup: { currentA: 6.5, energyMj: 95, crankingCurrentA: 5, crankingEnergyMj: 56, stalledA: 7, windingK: null, powerW: null, periodShare: 0.9 } } } })
    const where = region('Coils')
    expect(row(where, 'Energy stored')).toEqual(['95 mJ', '95 mJ'])
    expect(row(where, 'Winding')).toEqual(['146 °C', 'no steady temperature'])
    expect(row(where, 'Heat in the winding')).toEqual(['8.3 W', 'runs away'])
    expect(row(where, 'Dwell and spark, of the period')).toEqual(['76 %', '90 %'])
    expect(row(where, 'Engine stopped, trigger closed')).toEqual(['19.3 A', '7.0 A'])
    expect(where).toHaveTextContent(/what the coil stores; about half of it arrives/)
  })

  test('spark: asked for and offered, running and cranking', () => {
    show({ of: sampleSheet({ coils: { primary: sampleCoil({ transferEfficiency: 0.5 }), backup: sampleCoil({ transferEfficiency: 0.6 }) } }) })
    const where = region('Spark voltage')
    expect(within(where).getAllByRole('rowheader', { name: 'Offered over asked for' })).toHaveLength(2)
    expect(row(where, /Asked for while cranking at 190/)).toEqual([expect.stringMatching(/kV$/), expect.stringMatching(/kV$/)])
    expect(where).toHaveTextContent(/50.% and 60.% is counted as arriving/)
  })

  test('climb is signed in the person’s units; a ceiling that is not found is said', () => {
    if (!parts.climb.ok) throw new Error('the sample climbs')
    const [primary, backup, oneCold] = parts.climb.rows
    if (!primary || !backup || !oneCold) throw new Error('three states')
    show({ system: 'us', change: { climb: { ...parts.climb, rows: [primary, backup, { ...oneCold, climbMps: -0.8, verdict: 'descends', ceilingM: null }] } } })
    const where = region(/^Climb at a density altitude of .*ft/)
    expect(row(where, 'On the primary')[1]).toMatch(/^\+\d+ ft\/min climbs/)
    expect(row(where, 'One cylinder cold').slice(1)).toEqual([expect.stringMatching(/^−157 ft\/min descends/), 'none found'])
  })

  test('no chance stands without its spread; single parts have a mark with a word', () => {
    show({ change: { redundancy: { ok: true, losses: [{ loss: 'noSpark', perHour: 3.2e-6, lowPerHour: 3.2e-7, highPerHour: 3.2e-5 }], cutSets: 14, checkIntervalHours: 25, singlePoints: [{ id: 'supply', heatSensitive: false }, { id: 'coil', heatSensitive: true }] } } })
    const where = region('Chances of losing the spark')
    expect(row(where, 'No spark at all')).toEqual(['3.2·10⁻⁶ /h', '3.2·10⁻⁷ to 3.2·10⁻⁵'])
    expect(within(where).getAllByRole('listitem').map((item) => item.textContent)).toEqual(['Single: supply', 'Single, aged by heat: coil'])
    expect(where).toHaveTextContent(/rates are guesses.*14 sets of failures end all spark.*25.h/)
  })

  test('the tolerance stack gives what comes together and what all worst does', () => {
    show()
    expect(row(region('Tolerance stack'), 'Setting by light')).toEqual(['±1.00°'])
    expect(row(region('Tolerance stack'), 'Together, 95 in 100')[0]).toMatch(/^±\d\.\d\d°$/)
  })

  test('each head leads to its equation', () => {
    show()
    for (const name of ['Detonation', 'Charge at full power', 'Cylinder pressure', 'Coils', 'Chances of losing the spark', 'Tolerance stack'])
      expect(within(region(name)).getByRole('link', { name: /^equation ?of/ })).toHaveAttribute('href', expect.stringMatching(/^\/method#./))
  })
})

describe('states', () => {
  test('figures being computed again stay, with a word and aria-busy', () => {
    show({ pending: cycleParts })
    expect(screen.getAllByText(/^computing/)).toHaveLength(cycleParts.length)
    const where = region('Detonation')
    expect(within(where).getByText(/^computing/)).toBeVisible()
    expect(within(where).getByRole('table', { name: /Spark, detonation limit/ }).closest('[aria-busy="true"]')).not.toBeNull()
    expect(within(region('Coils')).queryByText(/^computing/)).toBeNull()
  })

  test('not computed yet, and not computed in a revision saved before, are told apart', () => {
    const missing = Object.fromEntries(cycleParts.map((name) => [name, withheld('notComputed')]))
    const { unmount } = show({ change: missing, pending: cycleParts })
    expect(screen.getByRole('heading', { name: 'Detonation: being computed' })).toBeVisible()
    expect(screen.queryByText(/^computing/)).toBeNull()
    unmount()
    show({ change: missing, isSaved: true })
    expect(screen.getByRole('heading', { name: 'Detonation: not computed' })).toBeVisible()
  })

  test('with two plugs the cycle is withheld with the reason, coils and chances are not', () => {
    const twin = sampleSheet({ plugsPerCylinder: 2 })
    show({ change: evaluateScenario({ engine: sampleEngine(), sheet: twin }).parts, of: twin })
    expect(screen.getByRole('heading', { name: 'Detonation: withheld' })).toBeVisible()
    expect(within(region('Coils')).getByRole('table')).toBeVisible()
    expect(within(region('Chances of losing the spark')).getByRole('table')).toBeVisible()
  })
})
