import type { ReactNode } from 'react'
import { EngineFactsPanel } from './engine-facts-panel'
import { InputSheet } from '@/components/revision/input-sheet'
import { engineSheetSections } from '@/components/revision/sheet-sections'
import { PageHead } from '@/components/shell/page-head'
import type { FormValues } from '@/lib/schemas/field'
import type { UnitSystem } from '@/lib/units'

interface EngineSheetProps {
  over: ReactNode
  title: string
  values: FormValues
  system: UnitSystem
  archived: boolean
  children?: ReactNode
}

/** The engine to read. */
export function EngineSheet({ over, title, values, system, archived, children }: EngineSheetProps) {
  return (
    <>
      <PageHead over={over} title={title} />
      <div className="body eform">
        <div>
          {archived ? <p className="oldnote">This engine is archived: restore it to change it or to save its scenarios.</p> : null}
          <InputSheet sections={engineSheetSections} values={values} system={system} level={2} />
          {children}
        </div>
        <aside aria-label="What the sheet comes to" className="eside"><EngineFactsPanel values={values} system={system} /></aside>
      </div>
    </>
  )
}
