'use client'

import dynamic from 'next/dynamic'
import { useState } from 'react'
import { Fold } from '@/components/ui/fold'
import type { FormValues } from '@/lib/schemas/field'
import type { SparkMapPanelProps } from './spark-map-panel'

const SparkMapPanel = dynamic(() => import('./spark-map-panel').then((part) => part.SparkMapPanel), { ssr: false, loading: () => <p className="fine" role="status">The map is being fetched.</p> })

interface SparkMapSectionProps extends Omit<SparkMapPanelProps, 'typed' | 'onUse'> {
  values: FormValues
  onChange: (name: string, value: string) => void
}

/** Fetched when somebody opens it; closing it keeps what was computed. */
export function SparkMapSection({ values, onChange, ...panel }: SparkMapSectionProps) {
  const [opened, setOpened] = useState(false)
  return (
    <Fold title="Spark over speed and charge" level={2} summary="a map, computed when asked" onToggle={(open) => { if (open) setOpened(true) }}>
      {opened ? (
        <SparkMapPanel
          {...panel} typed={{ primary: values['primary.map'] ?? '', backup: values['backup.map'] ?? '' }}
          onUse={(channel, text) => {
            onChange(`${channel}.map`, text)
            onChange(`${channel}.kind`, 'map')
          }}
        />
      ) : <noscript><p className="fine">The map is computed in the browser: it needs a script.</p></noscript>}
    </Fold>
  )
}
