import { firingSchedule, msFromCrankDeg, staggerDeg } from '@/lib/calc/live'
import { formatNumber } from '@/lib/units'
import { WheelDrawing } from '@/components/wheel/wheel-drawing'

/** An invented flat six: both channels fixed. What the pages show of it is computed here. */
const rpm = 2780
const primaryDeg = 26.5
const backupDeg = 17
const firingOrder = [1, 6, 3, 2, 5, 4]

/** The wheel of the front page and of the entry pages, made on the server: no script. */
export function ExampleWheel({ words = false }: { words?: boolean }) {
  const fixed = (deg: number) => ({ schedule: { kind: 'fixed' as const, deg } })
  const stagger = staggerDeg(fixed(primaryDeg), fixed(backupDeg), { rpm })
  const figures = {
    rpm, primaryDeg, backupDeg, staggerDeg: stagger, staggerMs: msFromCrankDeg(stagger, rpm), rotation: 'clockwise' as const,
    cylindersAt: firingSchedule({ firingOrder }).map(({ cylinder, atDeg }) => ({ label: String(cylinder), atDeg })),
  }
  return (
    <>
      <div className="wheel only-w"><WheelDrawing {...figures} size="full" width={520} /></div>
      <div className="wheel only-n"><WheelDrawing {...figures} size="crop" width={328} /></div>
      {words ? <p>An example: a flat six at {formatNumber(rpm, 0)} rpm. The primary fires {formatNumber(primaryDeg, 1)}° before top dead centre, the backup {formatNumber(stagger, 1)}° later.</p> : null}
    </>
  )
}
