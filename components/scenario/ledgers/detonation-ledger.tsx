import { ChannelChip } from '@/components/ui/channel-chip'
import { DetonationCaution } from '@/components/ui/detonation-caution'
import { Ledger } from '@/components/ui/ledger'
import { ScrollBox } from '@/components/ui/scroll-box'
import type { DetonationCases, DetonationPoint, ScenarioSheet } from '@/lib/calc/live'
import { formatQuantityText, type UnitSystem } from '@/lib/units'
import { gainWords, octaneScale, octaneUncertaintyWords, octaneWords } from '@/lib/words/detonation-words'
import { channelHeads, PartSection, Quantity, quantityIn, type LedgersProps } from './ledger-parts'

const channels = ['primary', 'backup'] as const
const letters = { primary: 'A', backup: 'B' } as const
const cases = ['planned', 'worse', 'altitude'] as const satisfies readonly (keyof DetonationCases)[]

/** What each case assumes, once under the table. */
function caseWords({ fuel, worse }: ScenarioSheet, densityAltitudeM: number | null, system: UnitSystem): Record<keyof DetonationCases, string> {
  const hotter = formatQuantityText(worse.hotterK, 'temperatureDifference', system)
  const denser = formatQuantityText(worse.denserKpa, 'pressure', system)
  return {
    planned: `As planned: ${octaneWords(fuel.octane, fuel.scale)}`,
    worse: `Worse: ${octaneWords(fuel.worseOctane, fuel.scale)}, charge ${hotter} hotter, ${denser} denser`,
    altitude: `As planned at ${densityAltitudeM === null ? 'its density altitude' : `a density altitude of ${formatQuantityText(densityAltitudeM, 'altitude', system)}`}`,
  }
}

function LimitCell({ point, system }: { point: DetonationPoint, system: UnitSystem }) {
  if (point.state === 'always') return <b className="bad">at every spark</b>
  return point.limitDeg === null ? <>not reached</> : <Quantity value={point.limitDeg} kind="angle" system={system} />
}

function MarginCell({ point: { marginDeg, state }, system }: { point: DetonationPoint, system: UnitSystem }) {
  if (marginDeg === null) return <b className="bad">none</b>
  return <>{state === 'never' ? 'at least ' : null}<Quantity value={marginDeg} kind="angle" system={system} /></>
}

/** With more octane a limit that was not reached is not reached either: then there is no upper end to give. */
function reach({ lowDeg, highDeg, state }: DetonationPoint, system: UnitSystem): string {
  const [low, high] = [lowDeg, highDeg].map((value) => (value === null ? 'none' : formatQuantityText(value, 'angle', system)))
  return state === 'never' ? `${low} or more` : `${low} to ${high}`
}

/** Margin to detonation of each channel, with what it is worth; never without its caution. */
export function DetonationLedger(props: LedgersProps) {
  const { parts, scenario: { sheet }, system } = props
  const q = quantityIn(system)
  const { scale } = sheet.fuel
  return (
    <PartSection name="detonation" part={parts.detonation} title="Detonation" ledgers={props}>
      {({ primary, backup, octaneUncertainty, anchored, octaneShift, gainDeg, gainOctane }) => {
        const rows = { primary, backup }
        const words = caseWords(sheet, parts.climb?.ok ? parts.climb.densityAltitudeM : null, system)
        const cost = (value: number | null) => (value === null ? 'none found' : q(value, 'angle'))
        return (
          <>
            <DetonationCaution />
            <ScrollBox label="Detonation margins">
              <Ledger
                className="wide" caption="Spark, detonation limit and margin of each channel as planned, worse than planned and at altitude"
                columns={[
                  { head: 'case' }, { head: '' }, { head: 'at', right: true }, { head: 'fires at', right: true }, { head: 'detonation from', right: true }, { head: 'margin', right: true },
                  { head: `margin, octane ±${octaneUncertainty}`, right: true }, { head: 'octane asked for', right: true },
                ]}
                rows={cases.flatMap((name) => channels.map((channel, i) => {
                  const point = rows[channel][name]
                  return {
                    key: `${name}.${channel}`, breakAbove: name !== 'planned' && i === 0,
                    cells: [
                      words[name], <ChannelChip key="chip" channel={letters[channel]} spoken />, q(point.rpm, 'engineSpeed'), q(point.sparkDeg, 'angle'),
                      <LimitCell key="limit" point={point} system={system} />, <MarginCell key="margin" point={point} system={system} />,
                      reach(point, system), octaneWords(point.octaneRequired, scale, 1),
                    ],
                  }
                }))}
              />
            </ScrollBox>
            <div className="leds wide-2">
              <div>
                <Ledger
                  caption="Degrees of margin lost in the worse case" columns={[{ head: 'margin lost, worse case' }, ...channelHeads.slice(1)]}
                  rows={[
                    { key: 'octane', cells: ['One octane number less', ...channels.map((channel) => cost(rows[channel].perOctaneDeg))] },
                    { key: 'hotter', cells: [`Charge ${formatQuantityText(10, 'temperatureDifference', system)} hotter`, ...channels.map((channel) => cost(rows[channel].per10KDeg))] },
                    { key: 'denser', cells: [`Charge ${formatQuantityText(10, 'pressure', system)} denser`, ...channels.map((channel) => cost(rows[channel].per10KpaDeg))] },
                  ]}
                />
              </div>
              <p className="fine">
                {gainWords(gainDeg, gainOctane, system)} Octane numbers are on the scale typed, {octaneScale[scale]}; none is converted.
                {' '}Of absolute figures {octaneUncertaintyWords(octaneUncertainty, anchored)}{anchored ? `, its scale shifted by ${octaneShift.toFixed(1)}` : ''}; differences between settings carry none of that. Each case stands at the speed where its channel is worst.
              </p>
            </div>
          </>
        )
      }}
    </PartSection>
  )
}
