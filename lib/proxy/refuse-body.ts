import { NextResponse, type NextRequest } from 'next/server'
import { wordsOfError } from '../words/errors'

/** The most that is taken in at once, bytes. */
export const bodyMax = 1_000_000

/** 413 for a body that says it is too large, 411 for one that does not say: browsers always do. Null when it may come in. */
export function refuseBody(request: NextRequest): NextResponse | null {
  if (request.method === 'GET' || request.method === 'HEAD') return null
  const length = request.headers.get('content-length')
  if (length === null) return request.headers.has('transfer-encoding') ? inWords(request, 411, 'The size of what was sent is not stated, so it was not taken in.') : null
  return Number(length) <= bodyMax ? null : inWords(request, 413, wordsOfError('tooLarge'))
}

/** JSON for the routes, plain text for an action (the framework hands a text answer to the page as the error's message), a page for a plain form. */
function inWords(request: NextRequest, status: number, sentence: string): NextResponse {
  if (request.nextUrl.pathname.startsWith('/api/')) {
    return NextResponse.json({ error: { code: 'tooLarge', message: sentence } }, { status })
  }
  if (request.headers.has('next-action')) return new NextResponse(sentence, { status, headers: { 'content-type': 'text/plain' } })
  const page = `<!doctype html><html lang="en"><meta charset="utf-8"><title>Not taken in</title><h1>Not taken in</h1><p>${sentence}</p><p>Go back to the page before: your browser keeps what was typed there.</p></html>`
  return new NextResponse(page, { status, headers: { 'content-type': 'text/html; charset=utf-8' } })
}
