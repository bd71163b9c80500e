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
  { id: 'gupta', author: 'H. N. Gupta', title: 'Fundamentals of Internal Combustion Engines', year: null, provenance: 'read', use: 'Morse test and mean effective pressures, Ex. 16.4; travel and volume of a slider-crank, Ex. 16.1' },
  { id: 'rajput', author: 'R. K. Rajput', title: 'Internal Combustion Engines', year: null, provenance: 'read', use: 'Morse test and mean effective pressures, Ex. 17.46' },
  { id: 'x-engineer', author: 'x-engineer.org', title: 'Mean effective pressure', year: null, provenance: 'read', use: 'Indicated, brake and friction mean effective pressure of a worked four-cylinder engine' },
  { id: 'nist-pontius', author: 'National Institute of Standards and Technology', title: 'Statistical Reference Datasets, Pontius', year: null, provenance: 'read', use: 'Certified values of a least-squares parabola' },
  { id: 'propeller-cube-law', author: 'engine handbooks', title: 'Propeller load: power with the cube of speed', year: null, provenance: 'read', use: 'Speed at 75 % of rated power' },
  { id: 'timing-arithmetic', author: 'ignition primers', title: 'Angle, time and dwell at a speed', year: null, provenance: 'read', use: 'Angle turned in a second, sparks a second, dwell angle against time, arc on a damper' },
  { id: 'us-standard-atmosphere-1976', author: 'NOAA, NASA and US Air Force', title: 'U.S. Standard Atmosphere, 1976', year: 1976, provenance: 'read', use: 'Temperature, pressure and density of the lowest layer, its constants and its tables' },
  { id: 'gagg-ferrar-1934', author: 'R. F. Gagg and E. V. Farrar', title: 'Altitude performance of aircraft engines equipped with gear-driven superchargers', year: 1934, provenance: 'read', use: 'Full-throttle power of a naturally aspirated engine against density; read as a formula in later works' },
  { id: 'lowry', author: 'J. T. Lowry', title: 'Performance of Light Aircraft', year: 1999, provenance: 'read', use: 'Thrust, drag, climb and lowest sink of the example aeroplane' },
  { id: 'excess-power', author: 'flying handbooks', title: 'Rate of climb from the power to spare', year: null, provenance: 'read', use: 'Climb of 3000 lb with 120 hp to spare' },
  { id: 'bird', author: 'J. Bird', title: 'Electrical Circuit Theory and Technology', year: null, provenance: 'read', use: 'Current in a coil with resistance after switching on, ch. 17' },
  { id: 'alexander-sadiku', author: 'C. K. Alexander and M. N. O. Sadiku', title: 'Fundamentals of Electric Circuits', year: null, provenance: 'read', use: 'Current and stored energy of an ignition coil, the worked example of an automobile; read in a re-typing' },
  { id: 'copper-resistance', author: 'International Electrotechnical Commission', title: 'IEC 60028, resistance of copper', year: null, provenance: 'memory', use: 'Temperature coefficient 0.00393 per kelvin at 20 °C' },
  { id: 'wadhwa', author: 'C. L. Wadhwa', title: 'High Voltage Engineering', year: null, provenance: 'read', use: 'Breakdown voltage of a uniform field in air and the density factor of air, Ex. 4.1' },
  { id: 'plug-gap-band', author: 'ignition primers', title: 'Voltage of a plug gap', year: null, provenance: 'read', use: 'Bands for a gap in the open and in an engine' },
  { id: 'nasa-fault-tree-2002', author: 'W. Vesely and others', title: 'Fault Tree Handbook with Aerospace Applications', year: 2002, provenance: 'read', use: 'Pressure tank example: probability and cut sets' },
  { id: 'fault-tree-examples', author: 'fault tree literature', title: 'Solved fault trees: two trains, a repeated event, two of three, 25 events and 36 gates', year: null, provenance: 'read', use: 'Probabilities, cut sets by order, importance measures' },
  { id: 'bryant-1986', author: 'R. E. Bryant', title: 'Graph-based algorithms for Boolean function manipulation', year: 1986, provenance: 'memory', use: 'Ordered binary decision diagrams' },
  { id: 'rauzy-1993', author: 'A. Rauzy', title: 'New algorithms for fault trees analysis', year: 1993, provenance: 'memory', use: 'Minimal cut sets from a decision diagram' },
  { id: 'birnbaum-1969', author: 'Z. W. Birnbaum', title: 'On the importance of different components in a multicomponent system', year: 1969, provenance: 'memory', use: 'Importance of an event; the worths of risk are common practice beside it' },
  { id: 'iec-61508-6', author: 'International Electrotechnical Commission', title: 'IEC 61508-6, functional safety, guidelines', year: 2010, provenance: 'memory', use: 'Mean probability of faults that share a test interval; the beta factor' },
  { id: 'mil-hdbk-217f', author: 'US Department of Defense', title: 'MIL-HDBK-217F, Reliability prediction of electronic equipment', year: 1991, provenance: 'memory', use: 'Form of the temperature factor of a failure rate' },
  { id: 'woschni-1967', author: 'G. Woschni', title: 'A universally applicable equation for the instantaneous heat transfer coefficient in the internal combustion engine, SAE 670931', year: 1967, provenance: 'read', use: 'Heat transfer from the gas to the walls; its constants were read' },
  { id: 'douaud-eyzat-1978', author: 'A. M. Douaud and P. Eyzat', title: 'Four-octane-number method for predicting the anti-knock behavior of fuels and engines, SAE 780080', year: 1978, provenance: 'memory', use: 'Delay to autoignition against octane number, pressure and temperature' },
  { id: 'livengood-wu-1955', author: 'J. C. Livengood and P. C. Wu', title: 'Correlation of autoignition phenomena in internal combustion engines and rapid compression machines', year: 1955, provenance: 'memory', use: 'The integral of the reciprocal delay that reaches 1 at autoignition' },
  { id: 'hires-1978', author: 'S. D. Hires, R. J. Tabaczynski and J. M. Novak', title: 'The prediction of ignition delay and combustion intervals for a homogeneous charge, spark ignition engine, SAE 780232', year: 1978, provenance: 'memory', use: 'How the angles of a burn grow with speed and thin charge' },
  { id: 'gamma-fit', author: 'the trade', title: 'Ratio of specific heats of a burning charge against temperature, a fit', year: null, provenance: 'common practice', use: 'γ = 1.338 − 6·10⁻⁵·T + 10⁻⁸·T²' },
  { id: 'ferguson-kirkpatrick', author: 'C. R. Ferguson and A. T. Kirkpatrick', title: 'Internal Combustion Engines: Applied Thermosciences', year: null, provenance: 'memory', use: 'Finite heat release in closed form' },
  { id: 'plint-martyr', author: 'M. Plint and A. Martyr', title: 'Engine Testing: Theory and Practice', year: null, provenance: 'read', use: 'First major order of an even-firing engine' },
  { id: 'gasoline-faq', author: 'B. Hamilton', title: 'Gasoline FAQ', year: null, provenance: 'read', use: 'Octane asked for against compression ratio: a band for sanity' },
  { id: 'gum-2008', author: 'Joint Committee for Guides in Metrology', title: 'JCGM 100, Guide to the expression of uncertainty in measurement', year: 2008, provenance: 'read', use: 'Combination of uncertainties, effective degrees of freedom, Student’s t (table G.2); examples H.1 to H.3' },
  { id: 'hill-1970', author: 'G. W. Hill', title: 'Algorithm 395: Student’s t-distribution, Communications of the ACM 13', year: 1970, provenance: 'memory', use: 'Expansion of Student’s t about the normal value for many degrees of freedom' },
  { id: 'wichura-1988', author: 'M. J. Wichura', title: 'Algorithm AS 241: The percentage points of the normal distribution, Applied Statistics 37', year: 1988, provenance: 'memory', use: 'Normal quantiles' },
  { id: 'normal-table', author: 'statistics tables', title: 'Table of the normal distribution', year: null, provenance: 'memory', use: 'Normal values at the usual coverages' },
  { id: 'bissell-1990', author: 'A. F. Bissell', title: 'How reliable is your capability index?, Applied Statistics 39', year: 1990, provenance: 'memory', use: 'Interval of a capability index' },
  { id: 'capability-example', author: 'SAS Institute', title: 'QC user’s guide, example 5.3', year: null, provenance: 'read', use: 'Capability interval of 75 measured amplifications' },
  { id: 'chart-constants', author: 'quality control handbooks', title: 'Factors of control charts', year: null, provenance: 'read', use: 'Factors for groups of 2 to 20 values; d2 and D4 of two for a chart of single values' },
  { id: 'nist-handbook', author: 'National Institute of Standards and Technology', title: 'e-Handbook of Statistical Methods, 6.1.6 and 6.3.2.2', year: null, provenance: 'memory', use: 'Chart of ten flow rates; capability of a worked process' },
  { id: 'nist-norris', author: 'National Institute of Standards and Technology', title: 'Statistical Reference Datasets, Norris', year: null, provenance: 'read', use: 'Certified values of a least-squares line' },
  { id: 'nist-longley', author: 'National Institute of Standards and Technology', title: 'Statistical Reference Datasets, Longley', year: null, provenance: 'read', use: 'Certified values of least squares with seven columns that nearly depend on each other' },
  { id: 'nist-misra1a', author: 'National Institute of Standards and Technology', title: 'Statistical Reference Datasets, Misra1a', year: null, provenance: 'read', use: 'Certified values of a curve of the form of a coil’s current' },
  { id: 'iec-60085', author: 'International Electrotechnical Commission', title: 'IEC 60085, Electrical insulation: thermal evaluation and designation', year: null, provenance: 'memory', use: 'Temperature of insulation class F, 155 °C' },
  { id: 'ac-23-1309-1e', author: 'Federal Aviation Administration', title: 'AC 23.1309-1E, System safety analysis and assessment for Part 23 airplanes', year: null, provenance: 'memory', use: 'Orders of magnitude for failure conditions of small single-engine aeroplanes, for orientation; read second-hand' },
  { id: 'far-33-37', author: 'Code of Federal Regulations', title: '14 CFR 33.37, Ignition system', year: null, provenance: 'read', use: 'What a certificated engine has for redundancy: shown, not computed' },
  { id: 'far-91-319', author: 'Code of Federal Regulations', title: '14 CFR 91.319 and Part 43 Appendix D', year: null, provenance: 'read', use: 'Flight area and condition inspection of experimental aircraft: shown, not computed' },
  { id: 'ac-43-13-1b', author: 'Federal Aviation Administration', title: 'AC 43.13-1B, Acceptable methods, techniques, and practices, 8-2a', year: null, provenance: 'read', use: 'How a cold cylinder is found: shown, not computed' },
  { id: 'faa-powerplant', author: 'Federal Aviation Administration', title: 'Aviation Maintenance Technician Handbook, Powerplant', year: null, provenance: 'read', use: 'Usual drop of a magneto: shown, not computed' },
  { id: 'trade', author: 'the trade', title: 'Common practice', year: null, provenance: 'common practice', use: 'Facts of the trade without a published source' },
]

/** Every publication that a figure of the library or a published check rests on, by id. */
export const sources: Readonly<Record<string, Source>> = Object.freeze(Object.fromEntries(list.map((source) => [source.id, Object.freeze(source)])))
