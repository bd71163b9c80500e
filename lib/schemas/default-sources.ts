import { sources } from '../calc/live'
import { sourceWords } from '../words/sources'

/** Nobody measured it and nobody published it: to be replaced by the builder’s own figure. */
export const guess = 'guess'

/** 'trade' is common practice; otherwise the id of a publication. */
type Origin = typeof guess | 'trade' | 'us-standard-atmosphere-1976'

const coil: Record<string, Origin> = {
  ohm: guess, mh: guess, limitA: guess, dwellMs: guess, supplyV: 'trade', crankingV: 'trade', ambientK: guess, thermalResistanceKPerW: guess,
  secondaryPf: guess, transferEfficiency: 'trade', clampKv: guess, wastedSpark: guess,
}

const under = (path: string, origins: Record<string, Origin>) => Object.entries(origins).map(([name, origin]): [string, Origin] => [`${path}.${name}`, origin])

/** Field → where its default comes from, for each field that starts with a figure nobody typed. */
export const defaultOrigins: Readonly<Record<string, Origin>> = Object.freeze(Object.fromEntries([
  ...under('cycle', {
    ivcDeg: guess, evoDeg: guess, chargeK: 'trade', residualFraction: 'trade', airFuelRatio: 'trade', volumetricEfficiency: guess,
    delayShare: 'trade', wallK: 'trade', headAreaFactor: 'trade',
  }),
  ...under('fuel', { scale: guess, octane: guess, worseOctane: guess }),
  ...under('worse', { hotterK: guess, denserKpa: guess }),
  ...under('reference', { sparkDeg: guess, rpm: guess, octane: guess, marginDeg: guess }),
  ...under('coils.primary', coil), ...under('coils.backup', coil),
  ['plugGapMm', 'trade'] as const,
  ...under('airframe', { massKg: guess, wingAreaM2: guess, cd0: guess, inducedK: guess, propEfficiency: guess, minSpeedMps: guess }),
  ...under('conditions', { pressureAltitudeM: 'us-standard-atmosphere-1976', temperatureK: 'us-standard-atmosphere-1976' }),
  ...under('redundancy.ratesPerH', { supply: guess, switch: guess, trigger: guess, module: guess, coil: guess, cap: guess, plug: guess }),
  ...under('redundancy', { hotK: guess, referenceK: guess, activationEv: guess, sharedSupply: guess, sharedCoil: guess, flightHours: guess, checkIntervalHours: guess }),
  ...under('tolerances', { markDeg: guess, scatterDeg: guess }),
]))

/** "Default: a guess." */
export function defaultWords(name: string): string | null {
  const origin = defaultOrigins[name]
  if (origin === undefined) return null
  const source = sources[origin]
  return `Default: ${source ? sourceWords(source) : 'a guess'}.`
}
