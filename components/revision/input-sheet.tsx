import { ChannelChip } from '@/components/ui/channel-chip'
import { Num } from '@/components/ui/num'
import { Section } from '@/components/ui/section'
import { inputRows, type InputRow } from '@/lib/compare/input-rows'
import type { FieldDef, FormValues } from '@/lib/schemas/field'
import type { UnitSystem } from '@/lib/units'

interface InputSheetProps {
  sections: readonly { title: string, channel?: 'A' | 'B', fields: readonly FieldDef[] }[]
  values: FormValues
  system: UnitSystem
  level?: 2 | 3
}

function Value({ row }: { row: InputRow }) {
  if (row.layout !== 'line') return <pre className={`block ${row.layout}`}>{row.left}</pre>
  return row.unit ? <Num value={row.left} unit={row.unit.joined ? '°' : row.unit.symbol} /> : <b>{row.left}</b>
}

/** Inputs as they were saved, section by section; fields that were left empty are left out. */
export function InputSheet({ sections, values, system, level = 3 }: InputSheetProps) {
  return (
    <div className="isheet">
      {sections.map(({ title, channel, fields }) => {
        const rows = inputRows(fields, values, values, system)
        if (rows.length === 0) return null
        return (
          <Section key={title} title={channel ? <><ChannelChip channel={channel} /> {title}</> : title} level={level}>
            <dl className="facts ifacts">
              {rows.map((row) => <div key={row.key} className={row.layout !== 'line' ? 'tall' : undefined}><dt>{row.label}</dt><dd><Value row={row} /></dd></div>)}
            </dl>
          </Section>
        )
      })}
    </div>
  )
}
