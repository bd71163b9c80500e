'use client'

import { useRef, useState } from 'react'
import type { EngineDto } from '@/lib/schemas/engine-dto'
import type { FormValues } from '@/lib/schemas/field'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import type { SheetState } from '@/lib/schemas/sheet-answer'

/** What stands in the records. */
export interface SavedAs {
  number: number
  at: string
  by: string
  /** Texts as they were saved, to tell whether anything was typed since. */
  values: FormValues
  /** Revision the form was filled from where it is not the newest. */
  filledFrom?: number
}

interface SaveOptions {
  save: (before: SheetState, form: FormData) => Promise<SheetState>
  first: SheetState
  saved: SavedAs
  engineVersion: number
  onSaved: (revision: RevisionDto) => void
  onEngineChanged: (engine: EngineDto) => void
}

/** Longest form that is sent; the server takes 1 MB. */
const mostCharacters = 500_000

const isEngine = (conflict: unknown): conflict is EngineDto => typeof conflict === 'object' && conflict !== null && 'spec' in conflict && 'version' in conflict

const offline = (): SheetState => ({ ok: false, code: 'unavailable', formError: 'No connection: nothing was saved. Everything you typed is still here; save again when the connection is back.' })

/** Saving with a script: nothing typed is lost when the connection, the session or the engine is gone. */
export function useSave({ save, first, saved: opened, engineVersion: openedVersion, onSaved, onEngineChanged }: SaveOptions) {
  const [answer, setAnswer] = useState<SheetState>(first)
  const [saved, setSaved] = useState<SavedAs>(opened)
  const [engineVersion, setEngineVersion] = useState(openedVersion)
  const [saving, setSaving] = useState(false)
  const lastForm = useRef<FormData | null>(null)

  async function submit(form: FormData | null, values: FormValues, onTopOf?: number) {
    const data = form ?? lastForm.current ?? new FormData()
    for (const [name, value] of Object.entries(values)) data.set(name, value)
    if (onTopOf !== undefined) data.set('baseRevision', String(onTopOf))
    lastForm.current = data
    if (Object.values(values).reduce((sum, value) => sum + value.length, 0) > mostCharacters) {
      setAnswer({ ok: false, code: 'tooLarge', formError: 'The sheet holds more than half a million characters, the most that is taken in at once. Shorten its notes or tables; nothing was saved.' })
      return
    }
    setSaving(true)
    try {
      const next = await save(answer, data)
      setAnswer(next)
      if (next.ok && next.data.kind === 'saved') {
        const { revision } = next.data
        setSaved({ number: revision.number, at: revision.createdAt, by: revision.author.name, values })
        setEngineVersion(revision.engineVersion)
        onSaved(revision)
      } else if (!next.ok && next.code === 'engineChanged' && isEngine(next.conflict)) {
        setEngineVersion(next.conflict.version)
        onEngineChanged(next.conflict)
      }
    } catch {
      setAnswer(offline())
    } finally {
      setSaving(false)
    }
  }
  return { answer, saved, saving, engineVersion, submit, setSaved }
}
