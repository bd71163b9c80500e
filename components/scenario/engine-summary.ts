import { displacementCc, type Engine } from '@/lib/calc/live'
import { formatQuantityText, type UnitSystem } from '@/lib/units'

/** "6 cylinders, 2596 cc, 90.0 mm × 68.0 mm" */
export function engineSummary(engine: Engine, system: UnitSystem): string {
  const bore = formatQuantityText(engine.boreMm, 'boreLength', system)
  const stroke = formatQuantityText(engine.strokeMm, 'boreLength', system)
  return `${engine.cylinders} cylinders, ${formatQuantityText(displacementCc(engine), 'displacement', system)}, ${bore} × ${stroke}`
}
