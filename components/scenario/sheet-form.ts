import type { FieldErrors, FormValues } from '@/lib/schemas/field'
import type { UnitSystem } from '@/lib/units'

/** What every group of inputs needs of the sheet. */
export interface SheetForm {
  values: FormValues
  errors: FieldErrors
  faultAt: Record<string, number>
  /** Names of fields that drive a finding outside its limit. */
  flagged: ReadonlySet<string>
  system: UnitSystem
  onChange: (name: string, value: string) => void
}
