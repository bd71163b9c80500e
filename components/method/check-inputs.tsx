'use client'

import { useState } from 'react'
import { CaretGlyph } from '@/components/ui/glyphs'
import type { PublishedCall, PublishedCheck } from '@/tests/published/published-case'

const callText = ({ fn, args, path }: PublishedCall) =>
  `${fn}(${args.map((arg) => JSON.stringify(arg, null, 1).replace(/\s*\n\s*/g, ' ')).join(', ')})${path ? `.${path}` : ''}`

/** What was put in, written out only when somebody asks: data sets are long. */
export function CheckInputs({ title, checks }: { title: string, checks: readonly PublishedCheck[] }) {
  const [isOpen, setOpen] = useState(false)
  return (
    <details className="fold bare inputs" onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary><CaretGlyph /><span className="fine">inputs<span className="sr"> of {title}</span></span></summary>
      {isOpen ? (
        <dl>
          {checks.map((check, i) => (
            <div key={i}>
              <dt className="fine">{check.label}</dt>
              <dd><code>{callText(check)}{check.over ? ` ÷ ${callText(check.over)}` : ''}</code></dd>
            </div>
          ))}
        </dl>
      ) : null}
    </details>
  )
}
