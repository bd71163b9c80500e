import { CalcError } from '../calc-error'
import type { ChannelName, Part, PartError } from './result-types'

/** Members of an engine, as the library's functions name them in an error. */
const engineMembers = new Set([
  'cylinders', 'firingOrder', 'intervalsDeg', 'boreMm', 'strokeMm', 'powerCurve', 'mechanicalEfficiency', 'frictionPowerKw',
  'crankingRpm', 'idleRpm', 'maxRpm', 'brakePowerKw',
])

const sheetMembers: Record<string, string> = {
  mbtDeg: 'sheet.mbt.deg',
  curvaturePerDeg2: 'sheet.mbt.curvaturePerDeg2',
  toleranceDeg: 'sheet.tolerances.timingCheckDeg',
  plateRadiusMm: 'sheet.rotor.plateRadiusMm',
  terminalWidthDeg: 'sheet.rotor.terminalWidthDeg',
  rotorWidthDeg: 'sheet.rotor.rotorWidthDeg',
  phasedAtDeg: 'sheet.rotor.phasedAtDeg',
  mapKpa: 'sheet.manifold.fullKpa',
  diameterMm: 'engine.damperDiameterMm',
  'engine.ivcDeg': 'sheet.cycle.ivcDeg',
  'engine.evoDeg': 'sheet.cycle.evoDeg',
  'charge.temperatureK': 'sheet.cycle.chargeK',
  'charge.residualFraction': 'sheet.cycle.residualFraction',
  'charge.airFuelRatio': 'sheet.cycle.airFuelRatio',
  airFuelRatio: 'sheet.cycle.airFuelRatio',
  'heatLoss.wallK': 'sheet.cycle.wallK',
  'heatLoss.headAreaFactor': 'sheet.cycle.headAreaFactor',
  delayShare: 'sheet.cycle.delayShare',
  burn: 'sheet.mbt.deg',
  octane: 'sheet.fuel.octane',
  gapMm: 'sheet.plugGapMm',
  temperatureK: 'sheet.conditions.temperatureK',
  pressureAltitudeM: 'sheet.conditions.pressureAltitudeM',
  minSpeedMps: 'sheet.airframe.minSpeedMps',
}

/** Members of the coil's functions that stand on a channel's coil. */
const coilMembers = new Set(['coil', 'dwellMs', 'ms', 'ambientK', 'thermalResistanceKPerW', 'secondaryPf', 'transferEfficiency', 'clampKv', 'energyMj'])

/** Where in a scenario the argument of a library function came from. */
function scenarioField(field: string, channel: ChannelName | null): string {
  const [head = '', ...rest] = field.split('.')
  const tail = rest.length > 0 ? `.${rest.join('.')}` : ''
  if (head === 'channel') return `sheet.${channel ?? 'primary'}${tail}`
  if (head === 'primary' || head === 'backup') return `sheet.${head}${tail}`
  if (coilMembers.has(head)) return `sheet.coils.${channel ?? 'primary'}.${head === 'coil' && tail ? tail.slice(1) : head === 'ms' || head === 'energyMj' ? 'dwellMs' : head}`
  if (engineMembers.has(head)) return `engine.${field}`
  return sheetMembers[field] ?? sheetMembers[head] ?? field
}

/** A reason to withhold a part that is no fault of what was typed. */
export class Withheld extends Error {
  constructor(readonly error: PartError) {
    super(error.message)
  }
}

export const withheld = (code: PartError['code'], field: string, message: string, value: unknown = null, limit: string | null = null): Withheld =>
  new Withheld({ code, field, value, limit, unit: null, message })

/** Runs the library for one channel, so that its error names that channel. */
export function forChannel<T>(channel: ChannelName, compute: () => T): T {
  try {
    return compute()
  } catch (error) {
    if (!(error instanceof CalcError)) throw error
    throw new Withheld(partErrorOf(error, channel))
  }
}

function partErrorOf(error: CalcError, channel: ChannelName | null): PartError {
  return {
    code: error.code ?? 'input',
    field: scenarioField(error.field, channel),
    value: error.value, limit: error.limit, unit: error.unit, message: error.message,
    ...(error.at === undefined ? {} : { at: error.at }),
  }
}

/** One part of the evaluation: what fails stays in it, the others go on. */
export function part<T extends object>(compute: () => T): Part<T> {
  try {
    return { ok: true, ...compute() }
  } catch (error) {
    if (error instanceof Withheld) return { ok: false, error: error.error }
    if (error instanceof CalcError) return { ok: false, error: partErrorOf(error, null) }
    throw error
  }
}
