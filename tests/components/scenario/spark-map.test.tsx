import { act, render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeAll, beforeEach, describe, expect, test, vi } from 'vitest'
import '@/lib/calc/index'
import { SparkMapPanel } from '@/components/scenario/spark-map/spark-map-panel'
import { defaultLimits, evaluateScenario, type PartName, type Scenario, type ScenarioParts, type SparkMap } from '@/lib/calc/live'
import type { SparkMapAnswer, SparkMapRequest } from '@/lib/workbench/spark-map/request'
import type { RunOptions } from '@/lib/workbench/spark-map/runner'
import { sampleEngine, sampleSheet } from '@/tests/support/samples'
import { giveWidth } from '../support/layout'

/** Each run waits here for what the test makes of it. */
interface Waiting { request: SparkMapRequest, options: RunOptions, answer: (answer: SparkMapAnswer) => void }
const { runs } = vi.hoisted(() => ({ runs: [] as unknown[] }))
vi.mock('@/lib/workbench/spark-map/runner', () => ({
  runSparkMap: (request: SparkMapRequest, options: RunOptions) => new Promise<SparkMapAnswer>((resolve, reject) => {
    runs.push({ request, options, answer: resolve } satisfies Waiting)
    options.signal.addEventListener('abort', () => reject(options.signal.reason))
  }),
}))
const lastRun = () => runs.at(-1) as Waiting

const scenario: Scenario = { engine: sampleEngine(), sheet: sampleSheet() }
let parts: ScenarioParts
beforeAll(() => { parts = evaluateScenario(scenario).parts })
beforeEach(() => { runs.length = 0 })

const pressures = { fullChargeKpa: 132, fullManifoldKpa: 98 }
const grid = <T,>(value: (i: number, j: number) => T): T[][] => [0, 1, 2].map((i) => [0, 1, 2, 3].map((j) => value(i, j)))
const map: SparkMap = {
  rpm: [820, 1800, 2780], pressureKpa: [33, 66, 99, 132].map((kpa) => (kpa * 132) / 98),
  mbtDeg: grid((i, j) => 20 + 8 * i - 2 * j), knockLimitDeg: grid((i, j) => (j === 0 ? null : 40 + 6 * i - 12 * j)), sparkDeg: grid((i, j) => Math.min(20 + 8 * i - 2 * j, j === 0 ? 60 : 40 + 6 * i - 12 * j)),
}
const answer: SparkMapAnswer = { ok: true, map, pressures }
const none: ReadonlySet<PartName> = new Set()

interface Show { of?: Scenario, typed?: { primary: string, backup: string }, system?: 'metric' | 'us', given?: ScenarioParts }
const panelOf = (onUse: (channel: string, text: string) => void, { of = scenario, typed = { primary: '', backup: '' }, system = 'metric', given = parts }: Show = {}) =>
  <SparkMapPanel scenario={of} parts={given} pending={none} limits={defaultLimits} system={system} name="S-1" typed={typed} onUse={onUse} />
const show = (options?: Show) => {
  const onUse = vi.fn()
  const { rerender, unmount } = render(panelOf(onUse, options))
  return { onUse, again: (next: Show) => rerender(panelOf(onUse, next)), unmount }
}
const press = (name: RegExp | string) => userEvent.click(screen.getByRole('button', { name }))
const draw = async (given: SparkMapAnswer = answer) => {
  await press('Compute the map')
  await act(async () => lastRun().answer(given))
}

describe('a run', () => {
  test('is told row by row in a progress bar, and at its start and end in words', async () => {
    show()
    await press('Compute the map')
    expect(lastRun().request.choice).toMatchObject({ day: 'worse', manifoldKpa: [33, 40, 48, 55, 63, 70, 78, 85, 93, 100, 108] })
    expect(screen.getByText('The map is being computed.')).toHaveAttribute('role', 'status')
    act(() => lastRun().options.onProgress({ done: 6, total: 21 }))
    expect(screen.getByRole('progressbar', { name: 'Row 7 of 21' })).toHaveAttribute('aria-valuenow', '29')
    await act(async () => lastRun().answer(answer))
    expect(screen.queryByRole('progressbar')).toBeNull()
    expect(screen.getByText('The map is drawn.')).toHaveAttribute('role', 'status')
  })

  test('is cancelled by hand, by an edit of what it stands on, by another choice, and by leaving', async () => {
    const { again, unmount } = show()
    await press('Compute the map')
    await press('Cancel')
    expect(lastRun().options.signal.aborted).toBe(true)
    expect(screen.getByText('Cancelled.')).toBeVisible()

    await press('Compute the map')
    again({ of: { ...scenario, sheet: sampleSheet({ notes: 'not of it' }) } })
    expect(lastRun().options.signal.aborted).toBe(false)
    again({ of: { ...scenario, sheet: sampleSheet({ fuel: { scale: 'ron', octane: 95, worseOctane: 90 } }) } })
    expect(lastRun().options.signal.aborted).toBe(true)
    expect(await screen.findByText(/something the map stands on was changed/)).toBeVisible()

    await press('Compute the map')
    await press('as planned')
    expect(lastRun().options.signal.aborted).toBe(true)
    await press('Compute the map')
    expect(lastRun().request.choice.day).toBe('planned')
    unmount()
    expect(lastRun().options.signal.aborted).toBe(true)
  })

  test('of a number of lines that cannot be read is not started, and the field says why', async () => {
    show()
    const field = screen.getByLabelText('Speeds, idle to full power')
    await userEvent.clear(field)
    await userEvent.type(field, '99')
    expect(field).toHaveAccessibleDescription(/at most 40/)
    expect(screen.getByRole('button', { name: /Compute the map/ })).toHaveAttribute('aria-disabled', 'true')
    await press(/Compute the map/)
    expect(runs).toEqual([])
  })

  test('that fails says why, and what is withheld is not offered', async () => {
    show()
    await draw({ ok: false, error: { code: 'notComputed', field: 'sheet.cycle', value: 'failed', limit: null, unit: null, message: 'The map could not be computed in this browser.' } })
    expect(screen.getByText('The map could not be computed in this browser.')).toBeVisible()
    const detonation: ScenarioParts['detonation'] = { ok: false, error: { code: 'twoPlugs', field: 'sheet.plugsPerCylinder', value: 2, limit: null, unit: null, message: 'Two plugs.' } }
    show({ given: { ...parts, detonation } })
    expect(screen.getByText(/With two plugs in a cylinder/)).toBeVisible()
  })
})

describe('the drawing', () => {
  test('says what it shows, names its points, and is a table one key away', async () => {
    giveWidth(700)
    show()
    await draw()
    const figure = screen.getByRole('figure')
    expect(within(figure).getByRole('img', { name: /Spark over speed and charge pressure as contour lines/ })).toBeVisible()
    expect(within(figure).getByText(/^Of 12 places best torque sets the spark at/)).toBeVisible()
    for (const word of ['idle', 'run-up', 'full power', 'A 26.5°', 'B 17.0°']) expect(within(figure).getAllByText(word).length).toBeGreaterThan(0)
    expect(within(figure).getAllByText(/^\d+(\.5)?°$/).length).toBeGreaterThan(2)
    await press('Detonation limit')
    expect(within(figure).getByText('no limit up to 60°')).toBeVisible()
    within(figure).getByRole('button', { name: /numbers as a table/ }).focus()
    await userEvent.keyboard('t')
    const table = within(figure).getByRole('table', { name: /Detonation limit in degrees/ })
    expect(within(table).getAllByRole('row').map((row) => row.textContent)).toEqual([
      'Speedrpm44.4kPa88.9kPa133.3kPa177.8kPa', 'in the manifold33.066.099.0132.0', '820no limit28.016.04.0', '1800no limit34.022.010.0', '2780no limit40.028.016.0',
    ])
  })

  test('is marked when the sheet it is of has changed, or another choice stands above it, and is not copied then', async () => {
    const { again, onUse } = show()
    await draw()
    again({ of: { ...scenario, sheet: sampleSheet({ mbt: { ...sampleSheet().mbt, deg: 34 } }) } })
    expect(screen.getByText(/This map is an older one: the sheet has changed since/)).toBeVisible()
    await press(/Use as the backup’s map/)
    expect(onUse).not.toHaveBeenCalled()
    again({})
    expect(screen.queryByText(/This map is an older one/)).toBeNull()
    await press('as planned')
    expect(screen.getByText(/This map is an older one: other choices stand above/)).toBeVisible()
    expect(screen.getByText(/With worse fuel, 91.RON, charge 15.K hotter/)).toBeVisible()
  })

  test('says the proportion of charge and manifold pressure and where the burn’s scaling comes from', async () => {
    show()
    await draw()
    expect(screen.getByText(/from memory, not read.*98.kPa in the manifold is 132.kPa of charge at full throttle/)).toBeVisible()
  })
})

describe('copying into a channel', () => {
  test('gives the map as text in the person’s units, short of the limit by the margin', async () => {
    const { onUse } = show()
    await draw()
    const margin = screen.getByLabelText(/Keep short of the detonation limit by/)
    expect(margin).toHaveValue('3')
    await userEvent.clear(margin)
    await userEvent.type(margin, '2.5')
    await press('Use as the backup’s map')
    expect(onUse).toHaveBeenCalledExactlyOnceWith('backup', 'rpm \\ kPa\t33\t66\t99\t132\n820\t20\t18\t13.5\t1.5\n1800\t28\t26\t19.5\t7.5\n2780\t36\t34\t25.5\t13.5')
    expect(screen.getByText(/The backup advances by this map now, 3 speeds by 4 pressures\. It is typed in, not saved\./)).toBeVisible()
  })

  test('asks before it replaces a map that was typed', async () => {
    const { onUse } = show({ typed: { primary: 'mine', backup: '' }, system: 'us' })
    await draw()
    await press('Use as the primary’s map')
    const question = screen.getByRole('group', { name: 'Replace the map that is typed there' })
    expect(onUse).not.toHaveBeenCalled()
    await userEvent.click(within(question).getByRole('button', { name: 'Keep it' }))
    expect(screen.queryByRole('group', { name: 'Replace the map that is typed there' })).toBeNull()
    await press('Use as the primary’s map')
    expect(screen.getByRole('button', { name: 'Replace it' })).toHaveFocus()
    await userEvent.keyboard('{Enter}')
    expect(onUse).toHaveBeenCalledExactlyOnceWith('primary', expect.stringMatching(/^rpm \\ inHg\t9\.7/))
  })

  test('is refused where no spark keeps the margin, or the margin cannot be read', async () => {
    const { onUse } = show()
    await draw({ ok: true, pressures, map: { ...map, sparkDeg: grid((i, j) => (i === 0 && j === 3 ? null : map.sparkDeg[i]?.[j] ?? null)) } })
    await press('Use as the backup’s map')
    expect(screen.getByText(/^Not copied: at one place no spark stays 3\.0° short of detonation, within 820.rpm and 132.kPa in the manifold/)).toBeVisible()
    await userEvent.clear(screen.getByLabelText(/Keep short/))
    await press('Use as the backup’s map')
    expect(onUse).not.toHaveBeenCalled()
    expect(screen.getByLabelText(/Keep short/)).toHaveAttribute('aria-invalid', 'true')
  })
})
