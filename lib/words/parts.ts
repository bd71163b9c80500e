import type { Notice, PartError, PartName } from '../calc/live'

export const partTitle: Record<PartName, string> = {
  speeds: 'Marked speeds',
  curves: 'Advance against speed',
  stagger: 'Stagger against speed',
  power: 'Power against speed',
  deadCylinders: 'Power left with cold cylinders',
  runUp: 'Expected at run-up',
  propeller: 'Full throttle on the propeller',
  register: 'Rotor register',
  leads: 'Leads on the cap',
  proof: 'Where full timing can be proved',
  marks: 'Timing marks',
  coils: 'Coils',
  climb: 'Climb',
  redundancy: 'Chances of losing the spark',
  stack: 'Tolerance stack',
  charge: 'Charge at full power',
  detonation: 'Detonation',
  pressure: 'Cylinder pressure',
  spark: 'Spark voltage',
}

const reasons: Partial<Record<PartError['code'], string>> = {
  twoPlugs: 'With two plugs in a cylinder both channels burn the charge together. Power, run-up drop, cold cylinders, climb and the simulated cycle are worked out for one plug only; angles hold.',
  noRotor: 'Direct coils have no rotor and no cap.',
  formulaParserNotLoaded: 'The formula reader is being fetched.',
  notComputed: 'The simulated cycle is being computed.',
}

/** A reason that ends with what to do about it. */
const remedies: Partial<Record<PartError['code'], string>> = {
  chargeMismatch: 'A charge guessed too thin would hide detonation, so no margin is shown. Correct the volumetric efficiency, or leave it empty: then the charge is solved from the power.',
  chargeUnsolved: 'Look at the power, the friction and the valve timing: they do not belong to one engine.',
  burnUncalibrated: 'No burn of sensible length has its best torque at the angle stated; the figures of the simulated cycle would belong to another engine.',
}

/** What stands in place of a figure that is withheld, and why; `isSaved`: in a revision that nobody computes again. */
export function withheldWords(name: PartName, error: PartError, isSaved = false): { title: string; reason: string } {
  const { code, message } = error
  // What could not be computed says so itself.
  if (code === 'notComputed' && error.value === 'failed') return { title: `${partTitle[name]}: not computed`, reason: message }
  if (code === 'notComputed')
    return isSaved
      ? { title: `${partTitle[name]}: not computed`, reason: 'The version of the program that saved this revision did not compute it. Opened as a sheet and saved again, it is.' }
      : { title: `${partTitle[name]}: being computed`, reason: reasons.notComputed ?? message }
  if (code === 'chargeMismatch') return { title: `${partTitle[name]}: the charge does not match the power curve`, reason: `${message} ${remedies.chargeMismatch}` }
  const remedy = remedies[code]
  return { title: `${partTitle[name]}: withheld`, reason: reasons[code] ?? (remedy ? `${message} ${remedy}` : message) }
}

export function noticeWords({ code, value, limit }: Notice): string {
  const words: Record<string, string> = {
    curvatureOutsidePublished: `A loss of ${value} per degree² lies outside the published engines, ${limit}. A curvature fitted as if planned timing were best torque is far too steep.`,
    powerCurveAssumed: 'No power curve was given: constant torque through the rated power is assumed.',
    chargeTyped: `The charge follows the volumetric efficiency that was typed, ${value}, and makes ${Number.parseFloat(limit) >= 0 ? `${Number.parseFloat(limit)} % more` : `${-Number.parseFloat(limit)} % less`} power than the power curve; left empty, the charge is solved from the power.`,
    gammaOutsideFit: `The burning charge reaches ${Math.round(value)} K, hotter than the fit of its specific heats, ${limit}.`,
    burnCoarse: `The burn is so short that steps of ${value}° are coarse for it.`,
    ratedPowerOffCurve: `The power curve does not pass through the rated power: it gives ${Number(limit).toFixed(1)} kW at the rated speed.`,
  }
  return words[code] ?? code
}
