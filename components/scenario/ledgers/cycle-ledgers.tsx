import { Ledger } from '@/components/ui/ledger'
import { formatQuantityText } from '@/lib/units'
import { channelHeads, PartSection, quantityIn, type LedgersProps } from './ledger-parts'

/** The charge that makes the power, and the burn fitted to the best torque stated. */
export function ChargeLedger(props: LedgersProps) {
  const { parts, system } = props
  const q = quantityIn(system)
  return (
    <PartSection name="charge" part={parts.charge} title="Charge at full power" ledgers={props}>
      {({ rpm, powerKw, pressureKpa, volumetricEfficiency, from, mismatch, delayDeg, durationDeg, mbtDeg }) => (
        <>
          <Ledger
            caption="Charge at inlet closing and burn, full throttle" columns={[{ head: `at ${formatQuantityText(rpm, 'engineSpeed', system)}` }, { head: 'full throttle', right: true }]}
            rows={[
              { key: 'kpa', cells: ['Charge at inlet closing', q(pressureKpa, 'pressure')] },
              { key: 've', cells: ['Volumetric efficiency', q(volumetricEfficiency, 'ratio')] },
              { key: 'delay', cells: ['Spark to start of burning', q(delayDeg, 'angle')] },
              { key: 'burn', cells: ['Burning', q(durationDeg, 'angle')] },
              { key: 'mbt', cells: ['Best torque of this burn', q(mbtDeg, 'angle')] },
            ]}
          />
          <p className="fine">
            {from === 'power'
              ? `Solved: with this charge the cycle makes the ${formatQuantityText(powerKw, 'power', system)} of the power curve.`
              : `Typed as volumetric efficiency; the charge makes ${formatQuantityText(Math.abs(mismatch), 'percent', system, { decimals: 1 })} ${mismatch < 0 ? 'less' : 'more'} than the ${formatQuantityText(powerKw, 'power', system)} of the power curve.`}
            {' '}The burn is fitted to the best-torque timing stated.
          </p>
        </>
      )}
    </PartSection>
  )
}

/** Pressures of the simulated cycle on either channel’s spark. */
export function PressureLedger(props: LedgersProps) {
  const { parts, system } = props
  const q = quantityIn(system)
  return (
    <PartSection name="pressure" part={parts.pressure} title="Cylinder pressure" ledgers={props}>
      {({ rpm, primary, backup }) => (
        <>
          <Ledger
            caption="Pressure of the simulated cycle on each channel" columns={[{ head: `at ${formatQuantityText(rpm, 'engineSpeed', system)}` }, ...channelHeads.slice(1)]}
            rows={[
              { key: 'peak', cells: ['Peak', q(primary.peakKpa, 'meanPressure'), q(backup.peakKpa, 'meanPressure')] },
              { key: 'at', cells: ['Peak after TDC', q(primary.peakDeg, 'angle'), q(backup.peakDeg, 'angle')] },
              { key: 'imep', cells: ['Mean effective, indicated', q(primary.imepKpa, 'meanPressure'), q(backup.imepKpa, 'meanPressure')] },
              { key: 'torque', cells: ['Of the torque at best spark', q(primary.torqueRatio, 'ratio'), q(backup.torqueRatio, 'ratio')] },
            ]}
          />
          <p className="fine">From inlet closing to exhaust opening, at full throttle. The simulated torque stands beside the measured curve, not in its place.</p>
        </>
      )}
    </PartSection>
  )
}
