import type { ScenarioSheet } from '@/lib/calc/scenario/scenario-types'
import { clubSix, largeEight, smallFour } from './demo-models'

/** Sheets of the demo scenarios, on the engines of demo-engines. Figures as a shop might have them, invented all the same. */

const retard = { byDeg: 8, belowRpm: 450, hysteresisRpm: 40 }

const common = {
  ...clubSix,
  distribution: 'sharedCap', plugsPerCylinder: 1, selection: 'oneAtATime',
  mbt: { deg: 31.5, curvaturePerDeg2: 3.2e-4, provenance: 'measured', note: 'Spring balance on the club propeller, five angles, two afternoons.' },
  propeller: { kind: 'fixedPitch', governedRpm: null, pitches: [{ name: 'climb', rpm: 2780, kw: 50 }, { name: 'ground-set, half a degree coarser', rpm: 2690, kw: 48.2 }] },
  runUpRpm: 1700,
  manifold: { idleKpa: 38, runUpKpa: 64, fullKpa: 98 },
  rotor: {
    terminalWidthDeg: 7, rotorWidthDeg: 16, phasedAtDeg: 13, backupPhasedAtDeg: 9, sparkDurationMs: 1.2, mechanicalCarriesRotor: true, plateRadiusMm: 36,
  },
} as const satisfies Partial<ScenarioSheet>

const pitches = (list: ScenarioSheet['propeller']['pitches']): ScenarioSheet['propeller'] => ({ kind: 'fixedPitch', governedRpm: null, pitches: list })

export const fixedPair: ScenarioSheet = {
  ...common,
  propeller: pitches([...common.propeller.pitches]),
  primary: { schedule: { kind: 'fixed', deg: 25.5 }, crankRetard: retard, latencyUs: 55 },
  backup: { schedule: { kind: 'fixed', deg: 17 }, latencyUs: 0 },
  notes: 'The plain pair: nothing moves once the engine runs, so an idle check proves both.',
}

export const mechanical: ScenarioSheet = {
  ...common,
  propeller: pitches([...common.propeller.pitches]),
  primary: { schedule: { kind: 'mechanical', initialDeg: 9, startRpm: 900, fullRpm: 2200, fullDeg: 26 }, latencyUs: 0 },
  backup: { schedule: { kind: 'fixed', deg: 14 }, latencyUs: 0 },
  rotor: { ...common.rotor, phasedAtDeg: -4 },
  notes: 'Weights from the donor engine, plate at 14. To see how far the backup leads while the weights rest.',
}

export const pressureMap: ScenarioSheet = {
  ...common,
  propeller: pitches([...common.propeller.pitches]),
  primary: {
    schedule: {
      kind: 'map', rpm: [400, 900, 1500, 2100, 2700, 3200], mapKpa: [35, 55, 75, 90, 100],
      deg: [
        [24, 24, 24, 24, 24],
        [27, 26.5, 25.5, 24.5, 24],
        [30, 29, 27, 25.5, 24.5],
        [31, 30, 28, 26.5, 25.5],
        [31, 30.5, 28.5, 27, 26],
        [31, 30.5, 28.5, 27, 26],
      ],
    },
    crankRetard: { byDeg: 7, belowRpm: 480, hysteresisRpm: 60 },
    latencyUs: 80,
  },
  backup: { schedule: { kind: 'fixed', deg: 16.5 }, latencyUs: 0 },
  notes: 'More advance at part throttle for cruise. Nothing gained in climb.',
}

export const twoStep: ScenarioSheet = {
  ...common,
  propeller: pitches([...common.propeller.pitches]),
  primary: { schedule: { kind: 'formula', expression: 'rpm < 650 ? 16 : min(25.5, 16 + (rpm - 650) / 18)' }, latencyUs: 55 },
  backup: { schedule: { kind: 'fixed', deg: 15 }, latencyUs: 0 },
  mbt: { ...common.mbt, provenance: 'guess', note: 'Taken over from the shop’s other sheet.' },
  notes: 'My own aircraft: starts at 16, all in well below idle check speed.',
}

/** The climb timing as it was first laid out, then with the top taken down, then with a later backup tried. */
export const climbFirst: ScenarioSheet = {
  ...common,
  propeller: pitches([...common.propeller.pitches]),
  primary: {
    schedule: { kind: 'table', points: [{ rpm: 450, deg: 25.2 }, { rpm: 1200, deg: 26 }, { rpm: 2100, deg: 29.5 }, { rpm: 2800, deg: 32.6 }] },
    crankRetard: retard, latencyUs: 55,
  },
  backup: { schedule: { kind: 'fixed', deg: 17 }, latencyUs: 0 },
  notes: 'First lay-out, from the plate of the bench unit.',
}

export const climbReleased: ScenarioSheet = {
  ...climbFirst,
  primary: {
    schedule: { kind: 'table', points: [{ rpm: 450, deg: 25.2 }, { rpm: 1200, deg: 25.6 }, { rpm: 2100, deg: 27.2 }, { rpm: 2800, deg: 27.6 }] },
    crankRetard: retard, latencyUs: 55,
  },
  notes: 'Top taken down by 5 after the warm-day runs on 97 RON.',
}

export const climbTrial: ScenarioSheet = {
  ...climbReleased,
  backup: { schedule: { kind: 'fixed', deg: 14.5 }, latencyUs: 0 },
  notes: 'Later backup for 95 RON: what it costs in power.',
}

export const reasonForProof = 'Full timing is read on the bench at 2780 rpm for each unit and again on the test stand; the idle check proves the start of the table only.'

export const fourCapEach: ScenarioSheet = {
  ...common,
  ...smallFour,
  distribution: 'capEach',
  primary: { schedule: { kind: 'fixed', deg: 24 }, crankRetard: { byDeg: 7, belowRpm: 500, hysteresisRpm: 50 }, latencyUs: 60 },
  backup: { schedule: { kind: 'fixed', deg: 15 }, latencyUs: 0 },
  mbt: { deg: 30, curvaturePerDeg2: 3e-4, provenance: 'handbook', note: 'Range for this bore and ratio.' },
  propeller: pitches([{ name: 'as fitted', rpm: 2950, kw: 41 }]),
  runUpRpm: 1750,
  rotor: { ...common.rotor, phasedAtDeg: 17, backupPhasedAtDeg: 9, plateRadiusMm: 34 },
  notes: 'A cap for each channel, so that a cracked one takes only its own.',
}

export const eightDirect: ScenarioSheet = {
  ...common,
  ...largeEight,
  distribution: 'directCoils',
  primary: {
    schedule: { kind: 'table', points: [{ rpm: 400, deg: 20 }, { rpm: 640, deg: 24 }, { rpm: 3200, deg: 24.5 }] },
    crankRetard: { byDeg: 4, belowRpm: 400, hysteresisRpm: 30 }, latencyUs: 40,
  },
  backup: { schedule: { kind: 'fixed', deg: 15 }, latencyUs: 20 },
  mbt: { deg: 29.5, curvaturePerDeg2: 2.9e-4, provenance: 'guess', note: '' },
  propeller: { kind: 'constantSpeed', governedRpm: 2750, pitches: [{ name: 'low stop', rpm: 2800, kw: 52 }, { name: 'high stop', rpm: 2400, kw: 74 }] },
  runUpRpm: 1800,
  notes: 'Eight coils a side.',
}

export const neighboursSheet: ScenarioSheet = {
  ...fixedPair,
  primary: { schedule: { kind: 'fixed', deg: 25.5 }, crankRetard: retard, latencyUs: 0 },
  propeller: pitches([{ name: 'as fitted', rpm: 2700, kw: 44 }]),
  notes: '',
}
