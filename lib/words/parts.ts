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
}

/** What stands in place of a figure that is withheld, and why. */
export function withheldWords(name: PartName, error: PartError): { title: string; reason: string } {
  const title = `${partTitle[name]}: withheld`
  const reasons: Partial<Record<PartError['code'], string>> = {
    twoPlugs: 'With two plugs in a cylinder both channels burn the charge together. Power, run-up drop and cold cylinders are worked out for one plug only; angles hold.',
    noRotor: 'Direct coils have no rotor and no cap.',
    formulaParserNotLoaded: 'The formula reader is being fetched.',
  }
  return { title, reason: reasons[error.code] ?? error.message }
}

export function noticeWords({ code, value, limit }: Notice): string {
  const words: Record<string, string> = {
    curvatureOutsidePublished: `A loss of ${value} per degree² lies outside the published engines, ${limit}. A curvature fitted as if planned timing were best torque is far too steep.`,
    powerCurveAssumed: 'No power curve was given: constant torque through the rated power is assumed.',
    ratedPowerOffCurve: `The power curve does not pass through the rated power: it gives ${Number(limit).toFixed(1)} kW at the rated speed.`,
  }
  return words[code] ?? code
}
