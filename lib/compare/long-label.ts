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
  'tolerances.markDeg': 'Tolerance of reading a mark',
  'fuel.scale': 'Octane scale of the fuel',
  'fuel.octane': 'Planned fuel, octane',
  'fuel.worseOctane': 'Worse fuel, octane',
  'worse.hotterK': 'Worse case, charge hotter by',
  'worse.denserKpa': 'Worse case, charge denser by',
  'reference.sparkDeg': 'Known to run clean at',
  'reference.rpm': 'Clean setting, speed',
  'reference.octane': 'Clean setting, octane',
  'reference.marginDeg': 'Clean setting, short of detonation by',
  'cycle.wallK': 'Walls of the cylinder',
  'coil.limitA': 'Coil current limited to',
  'coil.supplyV': 'Voltage at the coil, running',
  'coil.crankingV': 'Voltage at the coil, cranking',
  'coil.ambientK': 'Air around the coil',
  'coil.thermalResistanceKPerW': 'Coil warms by',
  'coil.transferEfficiency': 'Energy that arrives at the plug',
  'coil.wastedSpark': 'Coil fires two cylinders at a time',
  'redundancy.referenceK': 'Failure rates are given for',
  'redundancy.activationEv': 'Activation energy of heat failures',
}

/** The label of a field that stands by itself; the channel is told beside it. */
export const longLabel = ({ name, label }: Pick<FieldDef, 'name' | 'label'>): string => alone[name.replace(/^coils\.(primary|backup)\./, 'coil.').replace(/^(primary|backup|engine)\./, '')] ?? label
