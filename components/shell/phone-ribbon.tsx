'use client'

import type { ReactNode } from 'react'

interface PhoneRibbonProps<T extends string> {
  label: string
  tabs: readonly { value: T, label: ReactNode }[]
  value: T
  onChoose: (value: T) => void
}

/** The parts of one page on a phone, at the foot of the screen; in wider windows all parts stand beside each other. */
export function PhoneRibbon<T extends string>({ label, tabs, value, onChoose }: PhoneRibbonProps<T>) {
  return (
    <div className="ribbon" role="group" aria-label={label}>
      {tabs.map((tab) => <button key={tab.value} type="button" aria-pressed={tab.value === value} onClick={() => onChoose(tab.value)}>{tab.label}</button>)}
    </div>
  )
}
