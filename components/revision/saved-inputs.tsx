import { InputSheet } from './input-sheet'
import { engineSheetSections, sheetSections } from './sheet-sections'
import { Section } from '@/components/ui/section'
import { engineToForm } from '@/lib/schemas/engine-form'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import type { UnitSystem } from '@/lib/units'

/** Everything that was typed, with the engine as it was then. */
export function SavedInputs({ revision: { title, sheet, engine }, system }: { revision: Pick<RevisionDto, 'title' | 'sheet' | 'engine'>, system: UnitSystem }) {
  return (
    <>
      <Section title="Inputs"><InputSheet sections={sheetSections} values={scenarioToForm(title, sheet, system)} system={system} /></Section>
      <Section title={`Engine: ${engine.name}`} right="as it was when this was saved"><InputSheet sections={engineSheetSections} values={engineToForm(engine.name, engine.code, engine.spec, system)} system={system} /></Section>
    </>
  )
}
