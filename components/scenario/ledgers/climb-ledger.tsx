import { Ledger } from '@/components/ui/ledger'
import type { ClimbRow } from '@/lib/calc/live'
import { formatQuantityText } from '@/lib/units'
import { PartSection, quantityIn, type LedgersProps } from './ledger-parts'

const stateWords: Record<ClimbRow['state'], string> = { primary: 'On the primary', backup: 'On the backup', oneCold: 'One cylinder cold' }
const verdictWords: Record<ClimbRow['verdict'], string> = { climbs: 'climbs', level: 'level at best', descends: 'descends' }

/** What each state of the engine leaves of the climb at the planned place. */
export function ClimbLedger(props: LedgersProps) {
  const { parts, scenario: { sheet }, system } = props
  const q = quantityIn(system)
  const place = parts.climb?.ok ? ` at a density altitude of ${formatQuantityText(parts.climb.densityAltitudeM, 'altitude', system)}` : ''
  return (
    <PartSection name="climb" part={parts.climb} title={`Climb${place}`} ledgers={props}>
      {({ rows }) => (
        <>
          <Ledger
            caption="Power at the propeller, best climb or least descent, and ceiling" columns={[{ head: 'full throttle' }, { head: 'propeller', right: true }, { head: 'climb', right: true }, { head: 'ceiling', right: true }]}
            rows={rows.map(({ state, rpm, powerKw, verdict, climbMps, speedMps, ceilingM }) => ({
              key: state,
              cells: [
                stateWords[state],
                <span key="prop">{q(powerKw, 'power')} <small>{formatQuantityText(rpm, 'engineSpeed', system)}</small></span>,
                <span key="climb">{q(climbMps, 'climb', { sign: true })} <small>{verdictWords[verdict]}, {formatQuantityText(speedMps, 'airspeed', system)}</small></span>,
                ceilingM === null ? <small key="none">none found</small> : q(ceilingM, 'altitude'),
              ],
            }))}
          />
          <p className="fine">At {formatQuantityText(sheet.airframe.massKg, 'mass', system)}, full throttle, in still air; the ceiling is a density altitude. A calculation: nobody shuts a channel or a cylinder off in flight to see what is left.</p>
        </>
      )}
    </PartSection>
  )
}
