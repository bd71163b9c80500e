import type { ReactNode } from 'react'
import { Ledger } from '@/components/ui/ledger'
import { formatNumber, formatQuantityText } from '@/lib/units'
import { channelHeads, PartSection, quantityIn, type LedgersProps } from './ledger-parts'

const channels = ['primary', 'backup'] as const

/** Charge, heat and time of each channel’s coil. */
export function CoilLedger(props: LedgersProps) {
  const { parts, scenario: { engine, sheet }, system } = props
  const q = quantityIn(system)
  return (
    <PartSection name="coils" part={parts.coils} title="Coils" ledgers={props}>
      {(rows) => {
        const each = (show: (row: typeof rows.primary) => ReactNode) => channels.map((channel) => show(rows[channel]))
        const cranking = [...new Set(channels.map((channel) => formatQuantityText(sheet.coils[channel].crankingV, 'voltage', system)))].join(' and ')
        return (
          <>
            <Ledger
              caption="Current, energy, heat and time of each coil" columns={[{ head: `at ${formatQuantityText(engine.maxRpm, 'engineSpeed', system)}` }, ...channelHeads.slice(1)]}
              rows={[
                { key: 'current', cells: ['Current at the end of dwell', ...each((row) => q(row.currentA, 'current'))] },
                { key: 'energy', cells: ['Energy stored', ...each((row) => q(row.energyMj, 'energyMj'))] },
                { key: 'winding', cells: ['Winding', ...each((row) => (row.windingK === null ? <b className="bad">no steady temperature</b> : q(row.windingK, 'temperature')))] },
                { key: 'heat', cells: ['Heat in the winding', ...each((row) => (row.powerW === null ? <b className="bad">runs away</b> : <span className="n">{formatNumber(row.powerW, 1)}{'\u00a0'}<i className="sp">W</i></span>))] },
                { key: 'share', cells: ['Dwell and spark, of the period', ...each((row) => q(row.periodShare, 'percent'))] },
                { key: 'crank', breakAbove: true, cells: [`Starter turning, ${cranking}: current`, ...each((row) => q(row.crankingCurrentA, 'current'))] },
                { key: 'crankEnergy', cells: ['Starter turning: energy stored', ...each((row) => q(row.crankingEnergyMj, 'energyMj'))] },
                { key: 'stalled', cells: ['Engine stopped, trigger closed', ...each((row) => q(row.stalledA, 'current'))] },
              ]}
            />
            <p className="fine">Energy is what the coil stores; about half of it arrives at the plug. With the ignition on and the engine stopped, a closed trigger heats coil and driver with the last line’s current.</p>
          </>
        )
      }}
    </PartSection>
  )
}

/** Voltage a plug asks for against what the coil offers. */
export function SparkLedger(props: LedgersProps) {
  const { parts, scenario: { engine, sheet }, system } = props
  const q = quantityIn(system)
  return (
    <PartSection name="spark" part={parts.spark} title="Spark voltage" ledgers={props}>
      {({ primary, backup }) => {
        const share = [...new Set(channels.map((channel) => formatQuantityText(sheet.coils[channel].transferEfficiency, 'percent', system)))].join(' and ')
        return (
          <>
            <Ledger
              caption="Spark voltage asked for and offered on each channel" columns={[{ head: `across ${formatQuantityText(sheet.plugGapMm, 'arc', system)}` }, ...channelHeads.slice(1)]}
              rows={[
                { key: 'demand', cells: [`Asked for at ${formatQuantityText(engine.maxRpm, 'engineSpeed', system)}`, q(primary.demandKv, 'voltageKv'), q(backup.demandKv, 'voltageKv')] },
                { key: 'offer', cells: ['Offered', q(primary.offeredKv, 'voltageKv'), q(backup.offeredKv, 'voltageKv')] },
                { key: 'ratio', cells: ['Offered over asked for', q(primary.ratio, 'ratio'), q(backup.ratio, 'ratio')] },
                { key: 'crankDemand', breakAbove: true, cells: [`Asked for while cranking at ${formatQuantityText(engine.crankingRpm, 'engineSpeed', system)}`, q(primary.crankingDemandKv, 'voltageKv'), q(backup.crankingDemandKv, 'voltageKv')] },
                { key: 'crankOffer', cells: ['Offered', q(primary.crankingOfferedKv, 'voltageKv'), q(backup.crankingOfferedKv, 'voltageKv')] },
                { key: 'crankRatio', cells: ['Offered over asked for', q(primary.crankingRatio, 'ratio'), q(backup.crankingRatio, 'ratio')] },
              ]}
            />
            <p className="fine">In the densest charge allowed for; of the energy stored {share} is counted as arriving. Secondary voltage can injure or kill: ignition off and supply disconnected before hands go in.</p>
          </>
        )
      }}
    </PartSection>
  )
}
