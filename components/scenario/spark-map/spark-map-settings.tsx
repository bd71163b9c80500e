import { ChoiceStrip } from '@/components/ui/choice-strip'
import { InputField } from '@/components/ui/field'
import type { SparkMapChoice } from '@/lib/calc/live'
import type { UnitSystem } from '@/lib/units'
import { linesAllowed, type LineCounts } from '@/lib/workbench/spark-map/axes'
import { readLines } from '@/lib/workbench/spark-map/read-choice'

export interface MapSettings {
  day: SparkMapChoice['day']
  /** As typed. */
  lines: Record<keyof LineCounts, string>
}

export const firstSettings: MapSettings = { day: 'worse', lines: { speeds: String(linesAllowed.speeds.usual), pressures: String(linesAllowed.pressures.usual) } }

/** The numbers of lines, or null while one of them cannot be read. */
export function countsOf({ lines }: MapSettings, system: UnitSystem): LineCounts | null {
  const speeds = readLines('speeds', lines.speeds, system)
  const pressures = readLines('pressures', lines.pressures, system)
  return speeds.ok && pressures.ok ? { speeds: speeds.value, pressures: pressures.value } : null
}

const days = [{ value: 'worse', label: 'worse fuel and heat' }, { value: 'planned', label: 'as planned' }] as const
const fields = [{ of: 'speeds', label: 'Speeds, idle to full power' }, { of: 'pressures', label: 'Charge pressures' }] as const

interface SparkMapSettingsProps {
  settings: MapSettings
  system: UnitSystem
  onChange: (settings: MapSettings) => void
}

/** What the map is computed for. */
export function SparkMapSettings({ settings, system, onChange }: SparkMapSettingsProps) {
  return (
    <div className="map-set">
      <ChoiceStrip label="Fuel and heat" choices={days} value={settings.day} onChoose={(day) => onChange({ ...settings, day })} />
      <div>
        {fields.map(({ of, label }) => {
          const read = readLines(of, settings.lines[of], system)
          return (
            <InputField
              key={of} label={label} unit="lines" inputMode="numeric" value={settings.lines[of]} error={read.ok ? undefined : read.sentence} maxLength={6}
              title={`${linesAllowed[of].least} to ${linesAllowed[of].most}`} onChange={(event) => onChange({ ...settings, lines: { ...settings.lines, [of]: event.target.value } })}
            />
          )
        })}
      </div>
    </div>
  )
}
