import type { Finding } from '../calc/live'
import { formatNumber, formatQuantityText, type QuantityKind, type UnitSystem } from '../units'
import { detonationSentence } from './detonation-words'
import { dataDeg as deg, dataNumber as number, dataRpm as rpm, stackWords } from './finding-data'

type Write = (finding: Finding, system: UnitSystem) => string

const sentences: Record<Finding['limitId'], Write> = {
  beyondMbtDeg: (finding, system) =>
    `At ${rpm(finding, 'rpm', system)} it fires ${deg(finding, 'deg', system)} before TDC; best torque at full throttle is ${deg(finding, 'mbtDeg', system)} (${provenanceWord(finding.data.provenance)}). Beyond it torque falls and detonation comes nearer.${stackWords(finding, system)}`,
  crankingAdvanceDeg: (finding, system) =>
    `At ${rpm(finding, 'rpm', system)}${finding.data.released ? ', the retard already released once,' : ''} between the slowest and the fastest cranking. More would kick the starter back.${stackWords(finding, system)}`,
  retardAboveCrankingRpm: (finding, system) =>
    `The retard acts below ${rpm(finding, 'belowRpm', system)}${number(finding, 'hysteresisRpm') > 0 ? `, and once released only ${rpm(finding, 'hysteresisRpm', system)} lower` : ''}; the starter reaches ${rpm(finding, 'fastestRpm', system)}. Too near, and it cranks at running advance.`,
  retardBelowIdleRpm: (finding, system) =>
    `The retard lets go at ${rpm(finding, 'belowRpm', system)}; the slowest idle is ${rpm(finding, 'slowestRpm', system)}. Too near, and it idles ${deg(finding, 'byDeg', system)} late, and a timing light there shows nothing of running timing.`,
  backupFirstDeg: (finding, system) =>
    finding.verdict === 'outside'
      ? `At ${rpm(finding, 'rpm', system)} the backup fires before the primary, so the backup alone decides the timing.${stackWords(finding, system)}`
      : `The smallest stagger comes at ${rpm(finding, 'rpm', system)}.${stackWords(finding, system)}`,
  backupPowerRatio: (finding, system) =>
    `At ${rpm(finding, 'rpm', system)} the backup makes ${formatQuantityText(number(finding, 'backupKw'), 'power', system)} of the primary’s ${formatQuantityText(number(finding, 'primaryKw'), 'power', system)}; it fires ${deg(finding, 'shortOfMbtDeg', system)} short of best torque.`,
  proofAboveIdleRpm: (finding, system) => {
    if (finding.value === null && finding.data.followsPressure) return `Its timing follows the manifold pressure, and a throttled engine shows another advance than full power. A light on the ground cannot prove it.`
    if (finding.value === null) return `At no speed from idle up does it stand within ${deg(finding, 'toleranceDeg', system)} of its timing at ${rpm(finding, 'maxRpm', system)}.`
    return finding.verdict === 'outside'
      ? `Below that it does not stand within ${deg(finding, 'toleranceDeg', system)} of its full-power timing. A check that needs a fast propeller often is not made.`
      : `From there up it stands within ${deg(finding, 'toleranceDeg', system)} of its full-power timing: a light can prove it on a slow engine.`
  },
  registerDeg: (finding, system) => registerSentence(finding, system, 'The rotor and its terminal must still face each other when the spark ends.'),
  freeDeg: (finding, system) => registerSentence(finding, system, 'Too little, and the spark jumps to the next cylinder’s lead.'),
  leadsOutOfPlace: (finding) =>
    finding.verdict === 'outside'
      ? `Round the cap, ${finding.data.rotation} with the rotor, the leads stand ${finding.data.actual}; the engine fires ${finding.data.expected}.`
      : `Round the cap, ${finding.data.rotation} with the rotor, the leads follow the firing order ${finding.data.expected}.`,
  markSpacingMm: (finding, system) =>
    `One degree on a diameter of ${formatQuantityText(number(finding, 'diameterMm'), 'length', system)}. Finer marks cannot be read under a timing light.`,
  detonationDeg: detonationSentence,
  windingK: (finding, system) => {
    const charge = `${amount(finding, 'currentA', 'current', system)} at the end of ${amount(finding, 'dwellMs', 'timeMs', system)} of dwell at ${rpm(finding, 'rpm', system)}`
    if (finding.value === null) return `${charge}: the winding finds no steady temperature. The warmer it gets, the more heat it takes; shorten the dwell or limit the current.`
    return `${charge} puts ${formatNumber(number(finding, 'powerW'), 1)}\u00a0W into the winding, in air of ${amount(finding, 'ambientK', 'temperature', system)}. Hotter, and its insulation ages fast.`
  },
  sparkVoltageRatio: (finding, system) =>
    `${finding.data.atCranking ? `While the starter turns at ${rpm(finding, 'rpm', system)}` : `At ${rpm(finding, 'rpm', system)} with the densest charge`} a gap of ${amount(finding, 'gapMm', 'arc', system)} asks for ${amount(finding, 'demandKv', 'voltageKv', system)}; the coil offers ${amount(finding, 'offeredKv', 'voltageKv', system)}. The rest is for worn plugs, damp leads and a weak battery.`,
  periodShare: (finding, system) => {
    const used = number(finding, 'dwellMs') + number(finding, 'sparkDurationMs')
    const period = finding.value === null || finding.value <= 0 ? '' : ` of the ${formatQuantityText(used / finding.value, 'timeMs', system)} from one charge to the next`
    return `At ${rpm(finding, 'rpm', system)} dwell takes ${amount(finding, 'dwellMs', 'timeMs', system)} and the spark ${amount(finding, 'sparkDurationMs', 'timeMs', system)}${period}. Beyond it the next charge starts while the spark burns.`
  },
  climbMps: (finding, system) => {
    const ceiling = typeof finding.data.ceilingM === 'number' ? `; it would hold height up to ${amount(finding, 'ceilingM', 'altitude', system)} of density altitude` : ''
    return `With ${amount(finding, 'powerKw', 'power', system)} at ${rpm(finding, 'rpm', system)}, ${amount(finding, 'massKg', 'mass', system)} and a density altitude of ${amount(finding, 'densityAltitudeM', 'altitude', system)} it ${flightWord[String(finding.data.verdict)] ?? 'flies level'}${ceiling}. A calculation: nobody shuts a cylinder off in flight to see it.`
  },
  noSparkPerH: (finding, system) => {
    const { singlePoints } = finding.data
    const points = typeof singlePoints === 'string' && singlePoints !== ''
      ? `These parts end both channels alone: ${singlePoints}.${finding.data.heatSensitive ? ' At least one of them ages by heat.' : ''}`
      : 'No part ends both channels alone.'
    return `An hour of flight; ${amount(finding, 'lowPerHour', 'failureRate', system)} to ${amount(finding, 'highPerHour', 'failureRate', system)} with each rate a tenth or ten times, for the rates are guesses. ${points} The backup’s hidden failures wait for a check each ${formatQuantityText(number(finding, 'checkIntervalHours'), 'durationHours', system, { decimals: 0 })}.`
  },
}

const flightWord: Record<string, string> = { climbs: 'still climbs', level: 'flies level at best', descends: 'descends' }

const amount = (finding: Finding, name: string, kind: QuantityKind, system: UnitSystem) => formatQuantityText(number(finding, name), kind, system)

const provenanceWord = (provenance: Finding['data'][string] | undefined) => ({ measured: 'measured', handbook: 'from a handbook', guess: 'a guess' })[String(provenance)] ?? 'a guess'

function registerSentence(finding: Finding, system: UnitSystem, why: string): string {
  const turned = formatQuantityText(number(finding, 'endOffsetDeg'), 'distributorAngle', system, { sign: true })
  const best = number(finding, 'bestPhasingDeg')
  const hint = Math.abs(best - number(finding, 'phasedAtDeg')) > 0.5 ? ` Centred at ${formatQuantityText(best, 'angle', system)} it would stand evenly.` : ''
  return `At ${rpm(finding, 'rpm', system)} the rotor stands ${turned} from centre when the spark ends. ${why}${hint}`
}

/** Why the figure matters, with the speed or setting it comes from. */
export const findingSentence: Write = (finding, system) => sentences[finding.limitId](finding, system)
