'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { InputField } from '@/components/ui/field'
import { channelToForm } from '@/lib/schemas/channel-form'
import type { ChannelPrefix } from '@/lib/schemas/scenario-fields'
import { formatQuantityText, type UnitSystem } from '@/lib/units'
import { readMargin } from '@/lib/workbench/spark-map/read-choice'
import { mapScheduleOf } from '@/lib/workbench/spark-map/schedule'
import { refusalWords } from '@/lib/words/spark-map-words'
import type { DrawnMap } from './use-spark-map'

interface SparkMapCopyProps {
  drawn: DrawnMap
  /** Why this map may not be copied now. */
  off: string | null
  system: UnitSystem
  /** The shop's limit of the margin to detonation, crank degrees. */
  marginDeg: number
  /** What stands in each channel's map field. */
  typed: Record<ChannelPrefix, string>
  onUse: (channel: ChannelPrefix, text: string) => void
}

const channels = ['primary', 'backup'] as const

/** Puts the map into a channel's form as if it had been typed there. */
export function SparkMapCopy({ drawn, off, system, marginDeg, typed, onUse }: SparkMapCopyProps) {
  const [margin, setMargin] = useState(String(marginDeg))
  const [asked, setAsked] = useState<{ channel: ChannelPrefix, text: string } | null>(null)
  const [said, setSaid] = useState('')
  const read = readMargin(margin, system)

  const put = (channel: ChannelPrefix, text: string) => {
    onUse(channel, text)
    setAsked(null)
    setSaid(`The ${channel} advances by this map now, ${drawn.map.rpm.length} speeds by ${drawn.map.pressureKpa.length} pressures. It is typed in, not saved.`)
  }
  const choose = (channel: ChannelPrefix) => {
    setAsked(null)
    if (!read.ok) return setSaid(read.sentence)
    const made = mapScheduleOf(drawn.map, drawn.pressures, read.value)
    if (!made.ok) return setSaid(refusalWords(made.refused, read.value, system))
    const text = channelToForm(channel, { schedule: made.schedule }, system)[`${channel}.map`] ?? ''
    if (typed[channel].trim() === '' || typed[channel].trim() === text) return put(channel, text)
    setSaid('')
    setAsked({ channel, text })
  }
  return (
    <div className="map-copy">
      <InputField
        label="Keep short of the detonation limit by" unit="degrees" inputMode="decimal" value={margin} error={read.ok ? undefined : read.sentence}
        note={`Best torque, or this much later than detonation begins; down to the next 0.1°. The shop’s limit is ${formatQuantityText(marginDeg, 'angle', system)}.`}
        onChange={(event) => setMargin(event.target.value)}
      />
      <div className="acts">
        {channels.map((channel) => <Button key={channel} off={off ?? undefined} onClick={() => choose(channel)}>Use as the {channel}’s map</Button>)}
      </div>
      {asked && !off ? (
        <div className="acts" role="group" aria-label="Replace the map that is typed there">
          <p>The {asked.channel}’s map field holds a map already.</p>
          <Button autoFocus onClick={() => put(asked.channel, asked.text)}>Replace it</Button>
          <Button onClick={() => setAsked(null)}>Keep it</Button>
        </div>
      ) : null}
      <p role="status">{said}</p>
      <p className="fine">Below the lowest speed the map holds its first line, cranking too: look at the findings after copying. The model compares settings of one engine; it clears none for flight.</p>
    </div>
  )
}
