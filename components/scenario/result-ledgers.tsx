'use client'

import { memo } from 'react'
import { ChannelChip } from '@/components/ui/channel-chip'
import { Ledger } from '@/components/ui/ledger'
import { Section } from '@/components/ui/section'
import { formatQuantity, formatQuantityText, type FormatOptions, type QuantityKind } from '@/lib/units'
import { ClimbLedger } from './ledgers/climb-ledger'
import { CoilLedger, SparkLedger } from './ledgers/coil-ledgers'
import { ChargeLedger, PressureLedger } from './ledgers/cycle-ledgers'
import { DetonationLedger } from './ledgers/detonation-ledger'
import { channelHeads, equationOf, Quantity, type LedgersProps } from './ledgers/ledger-parts'
import { RedundancyLedger } from './ledgers/redundancy-ledger'
import { StackLedger } from './ledgers/stack-ledger'
import { PartView } from './stale-part'

function PowerLedger({ parts, stale, scenario, system }: LedgersProps) {
  const rpm = scenario.engine.maxRpm
  const q = (value: number, kind: QuantityKind, options: FormatOptions = {}) => <Quantity value={value} kind={kind} system={system} {...options} />
  return (
    <Section title={`Power at ${formatQuantityText(rpm, 'engineSpeed', system)}`} level={3} right={equationOf('power')}>
      <PartView name="power" part={parts.power} stale={stale.has('power')}>
        {({ atMax, backupToPrimary, shortOfMbtDeg, curveAssumed }) => (
          <>
            <Ledger
              caption={`Torque and power of both channels at ${rpm} rpm, full throttle`} columns={channelHeads}
              rows={[
                { key: 'nm', cells: ['Torque', q(atMax.primaryNm, 'torque'), q(atMax.backupNm, 'torque')] },
                { key: 'kw', cells: ['Power', q(atMax.primaryKw, 'power'), q(atMax.backupKw, 'power')] },
                { key: 'ratio', cells: ['Of the primary’s power', q(1, 'ratio', { decimals: 2 }), q(backupToPrimary, 'ratio', { decimals: 2 })] },
                { key: 'short', cells: [`Short of best torque, ${formatQuantityText(scenario.sheet.mbt.deg, 'angle', system)}`, q(shortOfMbtDeg.primary, 'angle'), q(shortOfMbtDeg.backup, 'angle')] },
              ]}
            />
            <p className="fine">Power was measured with timing at {formatQuantityText(scenario.engine.powerTimingDeg, 'angle', system)}.{curveAssumed ? ' Constant torque is assumed: the engine has no power curve.' : ''}</p>
          </>
        )}
      </PartView>
    </Section>
  )
}

function DeadCylinderLedger({ parts, stale, system }: LedgersProps) {
  const percent = (fraction: number) => <Quantity value={fraction} kind="percent" system={system} />
  return (
    <Section title="Power left with cold cylinders" level={3} right={equationOf('deadCylinders')}>
      <PartView name="deadCylinders" part={parts.deadCylinders} stale={stale.has('deadCylinders')}>
        {({ rows, rpm, frictionPowerKw }) => (
          <>
            <Ledger
              caption={`Share of the healthy power left at ${rpm} rpm for each number of cold cylinders, on either channel`}
              columns={[{ head: 'cold' }, ...channelHeads.slice(1), { head: 'power on A', right: true }]}
              rows={rows.map((row) => ({
                key: String(row.dead),
                cells: [row.dead === 0 ? 'none' : String(row.dead), percent(row.primary.fraction), percent(row.backup.fraction), <Quantity key="kw" value={row.primary.kw} kind="power" system={system} />],
              }))}
            />
            <p className="fine">At {formatQuantityText(rpm, 'engineSpeed', system)}; the cold ones are turned by the others: friction takes {formatQuantityText(frictionPowerKw, 'power', system)}. A calculation: nobody shuts a cylinder off in flight to see it.</p>
          </>
        )}
      </PartView>
    </Section>
  )
}

function RunUpLedger({ parts, stale, scenario, system }: LedgersProps) {
  const base = scenario.sheet.selection === 'both' ? 'both channels together' : 'the primary'
  const speed = (value: number) => formatQuantityText(value, 'engineSpeed', system)
  return (
    <Section title={`Expected at run-up, ${speed(scenario.sheet.runUpRpm)} on ${base}`} level={3} right={equationOf('runUp')}>
      <PartView name="runUp" part={parts.runUp} stale={stale.has('runUp')}>
        {({ rows }) => (
          <>
            <Ledger
              caption="Expected run-up speed on each channel, with its band"
              columns={[{ head: 'pitch' }, { head: <ChannelChip channel="A" />, right: true }, { head: 'band', right: true }, { head: <ChannelChip channel="B" />, right: true }, { head: 'band', right: true }]}
              rows={rows.map(({ pitch, primary, backup }) => ({
                key: pitch,
                cells: [pitch, ...[primary, backup].flatMap((channel, i) => [
                  <span key={i}><Quantity value={channel.rpm} kind="engineSpeed" system={system} /> <small>drop {formatQuantity(channel.dropRpm, 'engineSpeed', system).text}</small></span>,
                  channel.highRpm - channel.lowRpm < 0.5 ? 'exact' : `${formatQuantity(channel.lowRpm, 'engineSpeed', system).text} to ${formatQuantity(channel.highRpm, 'engineSpeed', system).text}`,
                ])],
              }))}
            />
            <p className="fine">Computed, not recorded: after three good run-ups the aircraft’s own median is the better expectation. No drop on the backup means it was not selected, the other channel stayed live, or it fires early.</p>
          </>
        )}
      </PartView>
    </Section>
  )
}

function PropellerLedger({ parts, stale, system }: LedgersProps) {
  return (
    <Section title="Full throttle on the propeller" level={3} right={equationOf('propeller')}>
      <PartView name="propeller" part={parts.propeller} stale={stale.has('propeller')}>
        {({ rows }) => (
          <>
            <Ledger
              caption="Speed and power where full throttle meets the propeller" columns={[{ head: 'pitch' }, ...channelHeads.slice(1), { head: 'A, one cold', right: true }]}
              rows={rows.map(({ pitch, primary, backup, oneCold }) => ({
                key: pitch,
                cells: [pitch, ...[primary, backup, oneCold].map((point, i) => (point
                  ? <span key={i}><Quantity value={point.rpm} kind="engineSpeed" system={system} /> <small>{formatQuantityText(point.kw, 'power', system)}{point.governed ? ', governed' : ''}</small></span>
                  : <small key={i}>beyond the power curve</small>))],
              }))}
            />
            <p className="fine">Standard sea level.</p>
          </>
        )}
      </PartView>
    </Section>
  )
}

function ProofLedger({ parts, stale, scenario, system }: LedgersProps) {
  const words = (rpm: number | null) => (rpm === null ? 'at no speed' : `from ${formatQuantityText(rpm, 'engineSpeed', system)}`)
  return (
    <Section title="Where full timing can be proved" level={3} right={equationOf('proof')}>
      <PartView name="proof" part={parts.proof} stale={stale.has('proof')}>
        {({ rpm, toleranceDeg }) => (
          <>
            <Ledger caption="Lowest speed at which a timing light proves full timing" columns={channelHeads} rows={[{ key: 'proof', cells: [`Within ${formatQuantityText(toleranceDeg, 'angle', system)}`, words(rpm.primary), words(rpm.backup)] }]} />
            <p className="fine">Idle {formatQuantityText(scenario.engine.idleRpm, 'engineSpeed', system)}. Beside a turning propeller: chocks and brake, a second person at the controls, stay out of its plane, nothing loose.</p>
          </>
        )}
      </PartView>
    </Section>
  )
}

function RegisterLedger({ parts, stale, system }: LedgersProps) {
  const angle = (value: number, sign = false) => <Quantity value={value} kind="distributorAngle" system={system} sign={sign} />
  return (
    <Section title="Rotor register" level={3} right={equationOf('register')}>
      <PartView name="register" part={parts.register} stale={stale.has('register')}>
        {({ worst, bestPhasingDeg }) => (
          <>
            <Ledger
              caption="Register of rotor and terminal at the worst speed, distributor degrees" columns={channelHeads}
              rows={[
                { key: 'rpm', cells: ['Worst at', ...[worst.primary, worst.backup].map((row, i) => <Quantity key={i} value={row.rpm} kind="engineSpeed" system={system} />)] },
                { key: 'start', cells: ['From centre, spark starts', angle(worst.primary.startOffsetDeg, true), angle(worst.backup.startOffsetDeg, true)] },
                { key: 'end', cells: ['From centre, spark ends', angle(worst.primary.endOffsetDeg, true), angle(worst.backup.endOffsetDeg, true)] },
                { key: 'register', cells: ['Register left', angle(worst.primary.registerDeg), angle(worst.backup.registerDeg)] },
                { key: 'free', cells: ['Free to the next terminal', angle(worst.primary.freeDeg), angle(worst.backup.freeDeg)] },
                { key: 'best', cells: ['Stands evenly when centred at', angle(bestPhasingDeg.primary), angle(bestPhasingDeg.backup)] },
              ]}
            />
            <p className="fine">Distributor degrees, but for the last line, which is crank advance. Plus: past the terminal’s centre.</p>
          </>
        )}
      </PartView>
    </Section>
  )
}

/** Figures beside the drawings, each group with the reason where it is withheld. */
export const ResultLedgers = memo(function ResultLedgers(props: LedgersProps) {
  return (
    <>
      <div className="leds">
        <PowerLedger {...props} />
        <DeadCylinderLedger {...props} />
        <div>
          <ProofLedger {...props} />
          <RegisterLedger {...props} />
        </div>
      </div>
      <DetonationLedger {...props} />
      <div className="leds">
        <CoilLedger {...props} />
        <SparkLedger {...props} />
        <div>
          <ChargeLedger {...props} />
          <PressureLedger {...props} />
        </div>
      </div>
      <div className="leds wide-2">
        <RunUpLedger {...props} />
        <PropellerLedger {...props} />
        <ClimbLedger {...props} />
        <RedundancyLedger {...props} />
      </div>
      <div className="leds wide-2"><StackLedger {...props} /></div>
    </>
  )
})
