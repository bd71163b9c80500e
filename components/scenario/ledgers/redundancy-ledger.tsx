import { Ledger } from '@/components/ui/ledger'
import { VerdictMark } from '@/components/ui/verdict-mark'
import type { LossRow } from '@/lib/calc/live'
import { formatQuantity, formatQuantityText } from '@/lib/units'
import { PartSection, quantityIn, type LedgersProps } from './ledger-parts'

const lossWords: Record<LossRow['loss'], string> = { noSpark: 'No spark at all', channelLost: 'One channel lost', cylinderLost: 'One cylinder lost' }

/** Chances of each loss an hour of flight; none stands without its spread. */
export function RedundancyLedger(props: LedgersProps) {
  const { parts, system } = props
  const q = quantityIn(system)
  const chance = (value: number) => formatQuantity(value, 'failureRate', system).text
  return (
    <PartSection name="redundancy" part={parts.redundancy} title="Chances of losing the spark" ledgers={props}>
      {({ losses, cutSets, singlePoints, checkIntervalHours }) => (
        <>
          <Ledger
            caption="Chance of each loss in an hour of flight, with each rate a tenth and ten times" columns={[{ head: 'an hour of flight' }, { head: 'chance', right: true }, { head: 'rates a tenth to ten times', right: true }]}
            rows={losses.map(({ loss, perHour, lowPerHour, highPerHour }) => ({
              key: loss, cells: [lossWords[loss], q(perHour, 'failureRate'), <span key="spread" className="nowrap">{chance(lowPerHour)} to {chance(highPerHour)}</span>],
            }))}
          />
          {singlePoints.length > 0 ? (
            <ul className="points" aria-label="Parts that end both channels alone">
              {singlePoints.map(({ id, heatSensitive }) => <li key={id}><VerdictMark verdict={heatSensitive ? 'singleHeat' : 'single'} />: {id}</li>)}
            </ul>
          ) : <p>No part ends both channels alone.</p>}
          <p className="fine">
            The rates are guesses: what they are guessed at decides more than the arithmetic. {cutSets} {cutSets === 1 ? 'set' : 'sets'} of failures {cutSets === 1 ? 'ends' : 'end'} all spark.
            {' '}Failures of the backup that nobody sees count over the {formatQuantityText(checkIntervalHours, 'durationHours', system, { decimals: 0 })} between its checks.
          </p>
        </>
      )}
    </PartSection>
  )
}
