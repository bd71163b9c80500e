import { engineFieldsBySection, engineSections } from '@/lib/schemas/engine-fields'
import { scenarioFieldsBySection, scenarioSections } from '@/lib/schemas/scenario-fields'

const channelOf = { primary: 'A', backup: 'B', primaryCoil: 'A', backupCoil: 'B' } as const

/** The scenario's inputs by section; its name stands at the head of the page. */
export const sheetSections = scenarioSections.map(({ id, title }) => ({
  title: id === 'general' ? 'Notes' : title,
  ...(id === 'primary' || id === 'backup' || id === 'primaryCoil' || id === 'backupCoil' ? { channel: channelOf[id] } : {}),
  fields: scenarioFieldsBySection[id].filter((field) => field.name !== 'title'),
}))

export const engineSheetSections = engineSections.map(({ id, title }) => ({ title, fields: engineFieldsBySection[id].filter((field) => field.name !== 'name') }))
