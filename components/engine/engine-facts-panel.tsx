import { Fragment } from 'react'
import { CapDiagram } from './cap-diagram'
import { FiringStrip } from './firing-strip'
import { LinkButton } from '@/components/ui/button'
import { Num } from '@/components/ui/num'
import { Section } from '@/components/ui/section'
import { VerdictMark } from '@/components/ui/verdict-mark'
import { engineDrawing, engineFacts } from '@/lib/engine/engine-facts'
import type { FormValues } from '@/lib/schemas/field'
import { formatNumber, formatQuantity, type UnitSystem } from '@/lib/units'

interface EngineFactsPanelProps {
  values: FormValues
  system: UnitSystem
  /** Writes the leads that the rotor would meet in firing order. */
  onFillCap?: (rotation: 'clockwise' | 'anticlockwise') => void
}

const evenStep = (degs: readonly number[]) => {
  const steps = degs.map((deg, i) => (degs[i + 1] ?? 720) - deg)
  return steps.every((step) => Math.abs(step - (steps[0] ?? 0)) < 1e-6) ? steps[0] ?? null : null
}

/** What the engine's sheet comes to, as one types. */
export function EngineFactsPanel({ values, system, onFillCap }: EngineFactsPanelProps) {
  const { firings, firingFault, cap } = engineDrawing(values, system)
  const even = firings ? evenStep(firings.map(({ atDeg }) => atDeg)) : null
  return (
    <>
      <Section title="Worked out">
        <dl className="facts efacts">
          {engineFacts(values, system).map(({ id, label, kind, value, needs }) => (
            <Fragment key={id}>
              <dt>{label}</dt>
              <dd>{value === null ? <span className="fine">{needs}</span> : <Quantity {...{ value, kind, system }} />}</dd>
            </Fragment>
          ))}
        </dl>
      </Section>
      <Section title="Firing">
        {firings ? (
          <>
            <p className="mt-2">{even === null ? 'Uneven: the intervals differ.' : <>One cylinder each <Num value={formatNumber(even, Number.isInteger(even) ? 0 : 1)} unit="°" /> of the crank.</>}</p>
            <FiringStrip firings={firings} />
          </>
        ) : <p className="fine mt-2">{firingFault ?? 'Needs the firing order.'}</p>}
      </Section>
      <Section title="Cap">
        {cap ? (
          <>
            <CapDiagram cap={cap} />
            {cap.inOrder
              ? <p className="fine">Turning {cap.rotation}, the rotor meets {cap.met.join(' ')}: the firing order.</p>
              : (
                <p>
                  <VerdictMark verdict="outside">Not in firing order</VerdictMark>: turning {cap.rotation}, the rotor meets {cap.met.join(' ')}.
                  {onFillCap ? <> <LinkButton onClick={() => onFillCap(cap.rotation)}>Set the leads in firing order</LinkButton></> : null}
                </p>
              )}
          </>
        ) : <p className="fine mt-2">Needs the firing order, and a terminal for each cylinder.</p>}
      </Section>
    </>
  )
}

function Quantity({ value, kind, system }: { value: number, kind: Parameters<typeof formatQuantity>[1], system: UnitSystem }) {
  const { text, unit } = formatQuantity(value, kind, system)
  return <Num value={text} unit={unit} />
}
