import { JSDOM } from 'jsdom'

/** @typedef {{ scenario: string, number: number, token: string }} Acknowledged */

/** Longest wait for an answer of a server that may be dying, ms. */
const PATIENCE_MS = 15_000

/**
 * A person without a script: fetches pages, fills their forms, sends them, keeps the cookie.
 * @param {() => string} addressOf where the server is now
 */
export function visitor(addressOf) {
  let cookie = ''
  /**
   * @param {string} path
   * @param {RequestInit} [init]
   */
  const ask = async (path, init = {}) => {
    const response = await fetch(addressOf() + path, { ...init, redirect: 'manual', headers: { cookie, origin: addressOf() }, signal: AbortSignal.timeout(PATIENCE_MS) })
    const [set] = response.headers.getSetCookie()
    if (set) cookie = set.split(';')[0] ?? cookie
    return { status: response.status, location: response.headers.get('location'), document: new JSDOM(await response.text()).window.document }
  }
  /**
   * The form's own fields, as a browser would send them, with some changed.
   * @param {HTMLFormElement | null} form
   * @param {Record<string, string>} changes
   */
  const filled = (form, changes) => {
    if (!form) throw new Error('the page has no form')
    const body = new FormData()
    for (const field of form.querySelectorAll('input, select, textarea')) {
      const { name, value, type, checked } = /** @type {HTMLInputElement} */ (field)
      if (name && (type !== 'checkbox' || checked)) body.append(name, value)
    }
    for (const [name, value] of Object.entries(changes)) body.set(name, value)
    return body
  }
  return {
    /** @param {string} path */
    open: (path) => ask(path),
    /**
     * @param {string} path
     * @param {HTMLFormElement | null} form
     * @param {Record<string, string>} changes
     */
    send: (path, form, changes) => ask(path, { method: 'POST', body: filled(form, changes) }),
  }
}

/**
 * @param {ReturnType<typeof visitor>} person
 * @param {{ email: string, password: string }} signIn
 */
export async function enter(person, { email, password }) {
  const { document } = await person.open('/sign-in')
  const { status } = await person.send('/sign-in', document.querySelector('main form, form'), { email, password })
  if (status !== 303) throw new Error(`sign-in was answered with ${status}`)
}

/** @param {Document} document */
const revisionOf = (document) => Number(/revision (\d+)/.exec(document.querySelector('.over')?.textContent ?? '')?.[1] ?? NaN)

/**
 * Saves one scenario over and over; returns what was acknowledged. A save whose answer does not come is not.
 * @param {ReturnType<typeof visitor>} person
 * @param {string} scenario
 * @param {() => boolean} isOver
 * @param {Acknowledged[]} acknowledged
 */
export async function keepSaving(person, scenario, isOver, acknowledged) {
  const path = `/scenarios/${scenario}`
  for (let turn = 1; !isOver(); turn += 1) {
    try {
      const { document } = await person.open(path)
      const base = revisionOf(document)
      const token = `${scenario.slice(0, 8)} turn ${turn} on ${base}`
      const answer = await person.send(path, document.querySelector('#scenario-form'), { notes: token, intent: 'save' })
      const number = revisionOf(answer.document)
      if (answer.status === 200 && number === base + 1 && !answer.document.querySelector('.errors, .failed')) acknowledged.push({ scenario, number, token })
    } catch {
      await new Promise((resolve) => setTimeout(resolve, 200))
    }
  }
}
