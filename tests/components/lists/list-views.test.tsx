import { act, render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { SWRConfig } from 'swr'
import type { ReactElement } from 'react'
import { afterEach, describe, expect, test, vi } from 'vitest'
import { EngineListView } from '@/components/lists/engine-list-view'
import { NoPermission } from '@/components/lists/no-permission'
import { PlanListView } from '@/components/lists/plan-list-view'
import { ScenarioListView } from '@/components/lists/scenario-list-view'
import type { ScenarioList, ScenarioRowDto } from '@/lib/schemas/scenario-dto'
import { sampleEngine } from '@/tests/support/sample-engine'

const path = vi.hoisted(() => ({ now: '/scenarios' }))
vi.mock('next/navigation', async (original) => ({ ...(await original<typeof import('next/navigation')>()), usePathname: () => path.now }))

const id = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`
const person = { id: id(90), name: 'Noor Adeyemi' }
const row = (n: number, change: Partial<ScenarioRowDto> = {}): ScenarioRowDto => ({
  id: id(n), code: `J260-0${n}`, title: `Scenario ${n}`, owner: person, engine: { id: id(70), name: 'Flat six', code: 'J260' },
  counts: { outside: 0, close: 0, within: 16 }, currentRevision: n, releasedRevision: null, archivedAt: null, updatedAt: '2026-12-03T10:42:00.000Z', ...change,
})
const list = (rows: ScenarioRowDto[], nextCursor: string | null = null): ScenarioList => ({ rows, nextCursor })
const restore = async () => {}

/** The GET route's answers, one after the other; the last one stays. */
function answers(...bodies: (() => Response | Promise<Response>)[]) {
  const asked: string[] = []
  vi.stubGlobal('fetch', vi.fn(async (url: string) => {
    asked.push(url)
    const answer = bodies[Math.min(asked.length, bodies.length) - 1]
    if (!answer) throw new TypeError('no answer left')
    return answer()
  }))
  return asked
}
const json = (body: unknown, status = 200) => () => Response.json(body, { status })
const draw = (view: ReactElement) => render(<SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0, errorRetryInterval: 1e9 }}>{view}</SWRConfig>)
const scenarios = (initial: ScenarioList, params: Record<string, string> = {}, change: Partial<Parameters<typeof ScenarioListView>[0]> = {}) =>
  <ScenarioListView initial={initial} params={params} engines={[{ id: id(70), name: 'Flat six', code: 'J260' }]} isOwn={false} canLayOutEngines restore={restore} {...change} />

afterEach(() => vi.unstubAllGlobals())

describe('the list of scenarios', () => {
  test('says the state at its head, the verdict in the margin, and code, revision, time and counts in the row', async () => {
    const rows = [row(1, { counts: { outside: 1, close: 2, within: 13 } }), row(2, { releasedRevision: 2 }), row(3, { counts: { outside: 0, close: 0, within: 0 } })]
    answers(json(list(rows)))
    draw(scenarios(list(rows)))
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('1 of 3 scenarios outside a limit')
    const items = screen.getAllByRole('listitem')
    expect(items.map((item) => item.querySelector('.v')?.textContent)).toEqual(['Outside', 'Within', 'Not judged'])
    expect(items[0]).toHaveTextContent('J260-01 revision 1, 3 Dec 2026, 10:42 UTC. 1 outside its limit, 2 close, 13 within.')
    expect(within(items[1] as HTMLElement).getByRole('link', { name: 'J260-02.2' })).toHaveAttribute('href', `/plans/${id(2)}/2`)
    expect(screen.getByRole('link', { name: 'Scenario 1' })).toHaveAttribute('href', `/scenarios/${id(1)}`)
    await waitFor(() => expect(fetch).toHaveBeenCalled())
  })

  test('is refreshed from its route with the same question, without a reload', async () => {
    const asked = answers(json(list([row(1), row(2)])))
    draw(scenarios(list([row(1)]), { search: 'climb', state: 'outside', cursor: 'abc' }))
    expect(await screen.findByRole('link', { name: 'Scenario 2' })).toBeVisible()
    expect(asked[0]).toBe('/api/scenarios?search=climb&state=outside&cursor=abc')
  })

  test('a page drawn again by the server, after a save, wins over what was fetched before', async () => {
    answers(json(list([row(1, { title: 'Fetched' })])), () => new Promise<Response>(() => {}))
    const view = draw(scenarios(list([row(1, { title: 'Drawn' })])))
    expect(await screen.findByRole('link', { name: 'Fetched' })).toBeVisible()
    view.rerender(<SWRConfig value={{ provider: () => new Map() }}>{scenarios(list([row(1, { title: 'Saved' })]))}</SWRConfig>)
    expect(await screen.findByRole('link', { name: 'Saved' })).toBeVisible()
  })

  test('without a connection what stands there stays, and it is said; trying again mends it', async () => {
    answers(() => Promise.reject(new TypeError('Failed to fetch')), json(list([row(1), row(2)])))
    draw(scenarios(list([row(1)])))
    expect(await screen.findByText(/There is no connection just now/)).toBeVisible()
    expect(screen.getByRole('link', { name: 'Scenario 1' })).toBeVisible()
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }))
    expect(await screen.findByRole('link', { name: 'Scenario 2' })).toBeVisible()
    expect(screen.queryByText(/Not refreshed/)).toBeNull()
  })

  test('as soon as the connection goes it is said, before anything is tried', async () => {
    answers(json(list([row(1)])))
    draw(scenarios(list([row(1)])))
    await waitFor(() => expect(fetch).toHaveBeenCalled())
    const online = vi.spyOn(navigator, 'onLine', 'get').mockReturnValue(false)
    act(() => void window.dispatchEvent(new Event('offline')))
    expect(screen.getByText(/There is no connection just now/)).toBeVisible()
    online.mockReturnValue(true)
    act(() => void window.dispatchEvent(new Event('online')))
    expect(screen.queryByText(/There is no connection just now/)).toBeNull()
    online.mockRestore()
  })

  test('a session that ended leads to the sign-in, a refusal is told in its own words', async () => {
    answers(json({ error: { code: 'signedOut', message: 'x' } }, 401))
    const view = draw(scenarios(list([row(1)])))
    expect(await screen.findByRole('link', { name: 'Sign in again' })).toHaveAttribute('href', '/sign-in?next=%2Fscenarios')
    view.unmount()
    answers(json({ error: { code: 'unavailable', message: 'The records cannot be reached just now.' } }, 503))
    draw(scenarios(list([row(1)])))
    expect(await screen.findByText(/The records cannot be reached just now/)).toBeVisible()
  })

  test('asks with GET: search, engine and order go into the address, the chosen state stays', () => {
    answers(json(list([row(1)])))
    draw(scenarios(list([row(1)]), { state: 'outside', search: 'climb' }))
    const form = screen.getByRole('search') as HTMLFormElement
    expect(form.getAttribute('action')).toBe('/scenarios')
    expect(Object.fromEntries(new FormData(form))).toEqual({ search: 'climb', engineId: '', sort: '', state: 'outside' })
    expect(screen.getByRole('link', { name: 'Outside a limit' })).toHaveAttribute('aria-current', 'page')
    expect(screen.getByRole('link', { name: 'Archived' })).toHaveAttribute('href', '/scenarios?state=archived&search=climb')
    expect(screen.getByRole('link', { name: 'Clear' })).toHaveAttribute('href', '/scenarios?state=outside')
  })

  test('pages by key: on, and back to the first', () => {
    answers(json(list([row(1)], 'next')))
    draw(scenarios(list([row(1)], 'next'), { cursor: 'here', search: 'x' }))
    const pages = within(screen.getByRole('navigation', { name: 'Pages of scenarios' }))
    expect(pages.getByRole('link', { name: 'Next page' })).toHaveAttribute('href', '/scenarios?cursor=next&search=x')
    expect(pages.getByRole('link', { name: 'First page' })).toHaveAttribute('href', '/scenarios?search=x')
  })

  test.each([
    ['nothing laid out yet', {}, {}, 'Start the first one', '/scenarios/new'],
    ['nothing that fits', { search: 'zzz' }, {}, 'Show them all', '/scenarios'],
    ['no engine', {}, { engines: [] }, 'Lay out the first engine', '/engines/new'],
  ])('empty for want of %s, it leads on', (_, params, change, link, href) => {
    answers(json(list([])))
    draw(scenarios(list([]), params, change))
    expect(screen.getByRole('link', { name: link })).toHaveAttribute('href', href)
  })

  test('who may not lay out engines is told who does', () => {
    answers(json(list([])))
    draw(scenarios(list([]), {}, { engines: [], canLayOutEngines: false }))
    expect(screen.getByText(/A designer or the owner lays out the first/)).toBeVisible()
    expect(screen.queryByRole('link', { name: /Lay out/ })).toBeNull()
  })

  test('an archived one can be restored from its row, and comes back to this list', () => {
    answers(json(list([])))
    const { container } = draw(scenarios(list([row(1, { archivedAt: '2026-12-03T11:00:00.000Z' })]), { state: 'archived' }))
    expect(screen.getByRole('button', { name: 'Restore' })).toBeVisible()
    expect(container.querySelector('input[name="next"]')).toHaveValue('/scenarios?state=archived')
    expect(container.querySelector('input[name="id"]')).toHaveValue(id(1))
  })
})

describe('other lists', () => {
  const engine = { id: id(70), name: 'Flat six', code: 'J260', spec: sampleEngine, version: 1, archivedAt: null, updatedAt: '2026-12-03T10:42:00.000Z', scenarioCount: 2 }

  test('engines: figures in the units of the person, scenarios counted, no button for who only reads', () => {
    answers(json({ rows: [engine], nextCursor: null }))
    draw(<EngineListView initial={{ rows: [engine], nextCursor: null }} params={{}} system="us" canWrite={false} />)
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('1 engine')
    expect(screen.getByRole('listitem')).toHaveTextContent('6 cylinders, 158 cu in, 67.1 hp at 2780 rpm')
    expect(screen.getByRole('link', { name: '2 scenarios' })).toHaveAttribute('href', `/scenarios?engineId=${id(70)}`)
    expect(screen.queryByRole('link', { name: 'New engine' })).toBeNull()
  })

  test('plans: code and name lead to the plan; who released it and when', () => {
    const plan = { scenarioId: id(1), number: 2, code: 'J260-01.2', title: 'Climb timing', engine: { name: 'Flat six', code: 'J260' }, counts: { outside: 0, close: 1, within: 15 }, author: person, releasedAt: '2026-12-03T10:42:00.000Z', releasedBy: person }
    answers(json({ rows: [plan], nextCursor: null }))
    draw(<PlanListView initial={{ rows: [plan], nextCursor: null }} params={{}} canRelease={false} />)
    expect(screen.getByRole('link', { name: 'J260-01.2, Climb timing' })).toHaveAttribute('href', `/plans/${id(1)}/2`)
    expect(screen.getByRole('listitem')).toHaveTextContent('Released 3 Dec 2026, 10:42 UTC by Noor Adeyemi. All 16 within the limits set, 1 close.')
  })

  test('no permission: says which roles do it', () => {
    path.now = '/engines/new'
    render(<NoPermission role="builder" />)
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('Your role does not lay out engines')
    expect(screen.getByText(/those who lay out engines are: designer and owner/)).toBeVisible()
    path.now = '/scenarios'
  })
})
