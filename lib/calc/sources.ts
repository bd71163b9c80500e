/** How far a figure can be traced: seen in the source, recalled from it, or known in the trade without any. */
export type Provenance = 'read' | 'memory' | 'common practice'

export interface Source {
  readonly id: string
  readonly author: string
  readonly title: string
  /** `null` where the edition that was seen is not known. */
  readonly year: number | null
  readonly provenance: Provenance
  /** What is taken from it. */
  readonly use: string
}

const list: readonly Source[] = [
  {
    id: 'heywood-1988', author: 'J. B. Heywood', title: 'Internal Combustion Engine Fundamentals', year: 1988, provenance: 'memory',
    use: 'Friction mean effective pressure against speed; the class of curve of torque against spark timing (fig. 15-3)',
  },
  {
    id: 'crossley-cook-1991', author: 'P. R. Crossley and J. A. Cook', title: 'A nonlinear engine model for drivetrain system development', year: 1991, provenance: 'read',
    use: 'Torque surface; its coefficients were read in the Modelica Standard Library',
  },
  {
    id: 'zareei-kakaee-2013', author: 'J. Zareei and A. H. Kakaee', title: 'Study and the effects of ignition timing on gasoline engine performance and emissions, European Transport Research Review 5', year: 2013, provenance: 'read',
    use: 'Spark of best torque at full load and 3400 rpm (abstract)',
  },
  { id: 'joel', author: 'R. Joel', title: 'Basic Engineering Thermodynamics', year: null, provenance: 'read', use: 'Morse tests, Ex. 17.4 and 17.5' },
  { id: 'nag', author: 'P. K. Nag', title: 'Basic and Applied Thermodynamics', year: null, provenance: 'read', use: 'Morse test, Ex. 20.8' },
  { id: 'singh', author: 'O. Singh', title: 'Engineering Thermodynamics', year: null, provenance: 'read', use: 'Morse test, Ex. 10.11' },
  { id: 'gupta', author: 'H. N. Gupta', title: 'Fundamentals of Internal Combustion Engines', year: null, provenance: 'read', use: 'Morse test and mean effective pressures, Ex. 16.4' },
  { id: 'rajput', author: 'R. K. Rajput', title: 'Internal Combustion Engines', year: null, provenance: 'read', use: 'Morse test and mean effective pressures, Ex. 17.46' },
  { id: 'x-engineer', author: 'x-engineer.org', title: 'Mean effective pressure', year: null, provenance: 'read', use: 'Indicated, brake and friction mean effective pressure of a worked four-cylinder engine' },
  { id: 'nist-pontius', author: 'National Institute of Standards and Technology', title: 'Statistical Reference Datasets, Pontius', year: null, provenance: 'read', use: 'Certified values of a least-squares parabola' },
  { id: 'propeller-cube-law', author: 'engine handbooks', title: 'Propeller load: power with the cube of speed', year: null, provenance: 'read', use: 'Speed at 75 % of rated power' },
  { id: 'timing-arithmetic', author: 'ignition primers', title: 'Angle, time and dwell at a speed', year: null, provenance: 'read', use: 'Angle turned in a second, sparks a second, dwell angle against time, arc on a damper' },
  { id: 'trade', author: 'the trade', title: 'Common practice', year: null, provenance: 'common practice', use: 'Facts of the trade without a published source' },
]

/** Every publication that a figure of the library or a published check rests on, by id. */
export const sources: Readonly<Record<string, Source>> = Object.freeze(Object.fromEntries(list.map((source) => [source.id, Object.freeze(source)])))
