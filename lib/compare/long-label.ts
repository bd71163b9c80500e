import type { FieldDef } from '../schemas/field'

// Labels that lean on the field above them, spelled out for places where each stands alone.
const alone: Record<string, string> = {
  ratedRpm: 'Speed of the rated power',
  powerTimingDeg: 'Timing the power was measured with',
  crankRotation: 'Crank turns, seen from the damper’s end',
  damperEnd: 'Damper sits at',
  retardBelowRpm: 'Crank retard below',
  retardHysteresisRpm: 'Crank retard, hysteresis',
  mbtProvenance: 'Best-torque timing comes from',
  mbtNote: 'Best-torque timing, in words',
  'manifold.idleKpa': 'Manifold pressure at idle',
  'manifold.runUpKpa': 'Manifold pressure at run-up',
  'manifold.fullKpa': 'Manifold pressure at full throttle',
  'tolerances.timingCheckDeg': 'Tolerance of a timing check',
  'tolerances.benchDeg': 'Tolerance of a bench reading',
}

/** The label of a field that stands by itself; the channel is told beside it. */
export const longLabel = ({ name, label }: Pick<FieldDef, 'name' | 'label'>): string => alone[name.replace(/^(primary|backup|engine)\./, '')] ?? label
