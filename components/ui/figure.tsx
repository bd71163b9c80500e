'use client'

import clsx from 'clsx'
import { useDeferredValue, useState, type KeyboardEvent, type ReactNode } from 'react'
import { figureCsv, type FigureData } from './figure-data'
import { FigureTable } from './figure-table'

interface FigureProps {
  /** Head in sight; the table keeps it when it takes the drawing's place. */
  title?: ReactNode
  level?: 2 | 3
  /** What the drawing shows, in one sentence, for those who do not see it. */
  sentence: string
  data: FigureData
  /** File name of the numbers, without its ending. */
  csvName: string
  /** Keys of the drawing itself, at the foot. */
  keys?: ReactNode
  className?: string
  /** The drawing. What can be operated (a scrubber) goes into `controls`: an image hides what is in it. */
  children: ReactNode
  controls?: ReactNode
}

function saveCsv(data: FigureData, name: string) {
  const url = URL.createObjectURL(new Blob([figureCsv(data)], { type: 'text/csv;charset=utf-8' }))
  const link = document.createElement('a')
  link.href = url
  link.download = `${name}.csv`
  link.click()
  // Some browsers read the address after the click has returned.
  setTimeout(() => URL.revokeObjectURL(url), 10_000)
}

const typing = (target: EventTarget) => target instanceof HTMLElement && (target.isContentEditable || target.matches('textarea, select, input:not([type="range"])'))

/** A drawing with its numbers one key away: T, while the focus is in the figure, swaps it for its table. */
export function Figure({ title, level = 3, sentence, data, csvName, keys, className, children, controls }: FigureProps) {
  const [asTable, setAsTable] = useState(false)
  // Numbers in a table may come a frame after the drawing that a hand is moving.
  const settled = useDeferredValue(data)
  const Heading = level === 2 ? 'h2' : 'h3'
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key.toLowerCase() !== 't' || event.ctrlKey || event.metaKey || event.altKey || typing(event.target)) return
    event.preventDefault()
    setAsTable((now) => !now)
  }
  return (
    <figure className={clsx('figure', className)} onKeyDown={onKeyDown}>
      {title ? <div className="fighead"><Heading>{title}</Heading></div> : null}
      {asTable ? null : <div role="img" aria-label={sentence}>{children}</div>}
      <div className={asTable ? 'figtable' : 'sr'} tabIndex={asTable ? 0 : undefined} role={asTable ? 'region' : undefined} aria-label={asTable ? data.caption : undefined}>
        <FigureTable data={settled} />
      </div>
      {controls}
      <div className="figfoot">
        {keys}
        <span className="right">
          <button type="button" aria-keyshortcuts="t" aria-pressed={asTable} onClick={() => setAsTable((now) => !now)}><kbd aria-hidden="true">T</kbd> {asTable ? 'drawing' : 'numbers as a table'}</button>
          <button type="button" onClick={() => saveCsv(data, csvName)}>save as CSV</button>
        </span>
      </div>
    </figure>
  )
}
