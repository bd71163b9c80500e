import { useEffect, useState } from 'react'

/** A hand still typing is not corrected: a fault is said after this pause, or when the field is left. */
const pauseMs = 700

/** The fault to show now: none while it is being typed, the newest after a pause. */
export function useSettledError(error: string | undefined, value: string): [string | undefined, () => void] {
  const [settledValue, setSettledValue] = useState<string | null>(value)
  useEffect(() => {
    const timer = setTimeout(() => setSettledValue(value), pauseMs)
    return () => clearTimeout(timer)
  }, [value])
  return [settledValue === value ? error : undefined, () => setSettledValue(value)]
}
