import { z } from 'zod'
import type { Airframe, CoilSetup, CycleSetup, Fuel, RedundancySetup, ReferenceSetting, WorseCase } from '../calc/live'
import { modelFields } from './model-fields'
import { numbersOf } from './number-schema'
import type { ChannelPrefix } from './scenario-fields'

const num = numbersOf(modelFields)

const coilOf = (channel: ChannelPrefix) => {
  const at = (name: string) => num(`coils.${channel}.${name}`)
  return z.object({
    ohm: at('ohm'), mh: at('mh'), limitA: at('limitA').nullable(), dwellMs: at('dwellMs'), supplyV: at('supplyV'), crankingV: at('crankingV'), wastedSpark: z.boolean(),
    ambientK: at('ambientK'), thermalResistanceKPerW: at('thermalResistanceKPerW'),
    secondaryPf: at('secondaryPf'), transferEfficiency: at('transferEfficiency'), clampKv: at('clampKv').nullable(),
  }) satisfies z.ZodType<CoilSetup>
}

const rate = (part: string) => num(`redundancy.ratesPerH.${part}`)

/** Members of the sheet that the models of detonation, coil, climb and failure stand on. */
export const modelMembers = {
  cycle: z.object({
    ivcDeg: num('cycle.ivcDeg'), evoDeg: num('cycle.evoDeg'), chargeK: num('cycle.chargeK'), residualFraction: num('cycle.residualFraction'),
    airFuelRatio: num('cycle.airFuelRatio'), volumetricEfficiency: num('cycle.volumetricEfficiency').nullable(),
    delayShare: num('cycle.delayShare'), wallK: num('cycle.wallK'), headAreaFactor: num('cycle.headAreaFactor'),
  }) satisfies z.ZodType<CycleSetup>,
  fuel: z.object({ scale: z.enum(['ron', 'mon', 'aki', 'lean']), octane: num('fuel.octane'), worseOctane: num('fuel.worseOctane') })
    .refine((fuel) => fuel.worseOctane <= fuel.octane, { path: ['worseOctane'], message: 'The worse fuel must not have more octane than the planned one.' }) satisfies z.ZodType<Fuel>,
  worse: z.object({ hotterK: num('worse.hotterK'), denserKpa: num('worse.denserKpa') }) satisfies z.ZodType<WorseCase>,
  reference: z.object({
    sparkDeg: num('reference.sparkDeg'), rpm: num('reference.rpm'), octane: num('reference.octane'), marginDeg: num('reference.marginDeg'),
  }).nullable() satisfies z.ZodType<ReferenceSetting | null>,
  coils: z.object({ primary: coilOf('primary'), backup: coilOf('backup') }),
  plugGapMm: num('plugGapMm'),
  airframe: z.object({
    massKg: num('airframe.massKg'), wingAreaM2: num('airframe.wingAreaM2'), cd0: num('airframe.cd0'), inducedK: num('airframe.inducedK'),
    propEfficiency: num('airframe.propEfficiency'), minSpeedMps: num('airframe.minSpeedMps'),
  }) satisfies z.ZodType<Airframe>,
  conditions: z.object({ pressureAltitudeM: num('conditions.pressureAltitudeM'), temperatureK: num('conditions.temperatureK') }),
  redundancy: z.object({
    ratesPerH: z.object({
      supply: rate('supply'), switch: rate('switch'), trigger: rate('trigger'), module: rate('module'), coil: rate('coil'), cap: rate('cap'), plug: rate('plug'),
    }),
    hotK: num('redundancy.hotK'), referenceK: num('redundancy.referenceK'), activationEv: num('redundancy.activationEv'),
    sharedSupply: z.boolean(), sharedCoil: z.boolean(), flightHours: num('redundancy.flightHours'), checkIntervalHours: num('redundancy.checkIntervalHours'),
  }) satisfies z.ZodType<RedundancySetup>,
}
