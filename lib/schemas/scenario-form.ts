import type { ScenarioSheet } from '../calc/live'
import { formatInput, type UnitSystem } from '../units'
import { channelToForm, isScheduleKind, numbersOfChannel, readChannel } from './channel-form'
import { fieldIndex, type FieldErrors, type FormValues } from './field'
import { modelFieldOf } from './model-fields'
import { modelToForm, numbersOfModel, readModel } from './model-form'
import { fieldReader, placeIssues } from './read-fields'
import { scenarioSheet, scenarioTitle, type CheckedSheet } from './scenario'
import { maxPitches, scenarioFields, type ChannelPrefix } from './scenario-fields'

const index = fieldIndex(scenarioFields)

export interface ScenarioInput {
  title: string
  sheet: CheckedSheet
}

export type ScenarioFormResult = { ok: true; input: ScenarioInput } | { ok: false; errors: FieldErrors }

/** Numbers the form is filled from, by field name. */
function numbersOfSheet(sheet: ScenarioSheet): Record<string, number | null> {
  const { mbt, propeller, rotor, manifold, tolerances } = sheet
  const pitches = propeller.pitches.flatMap((pitch, i): [string, number][] => [[`pitch.${i}.rpm`, pitch.rpm], [`pitch.${i}.kw`, pitch.kw]])
  return {
    ...numbersOfChannel('primary', sheet.primary),
    ...numbersOfChannel('backup', sheet.backup),
    mbtDeg: mbt.deg,
    curvaturePerDeg2: mbt.curvaturePerDeg2,
    governedRpm: propeller.governedRpm,
    ...Object.fromEntries(pitches),
    runUpRpm: sheet.runUpRpm,
    'manifold.idleKpa': manifold.idleKpa,
    'manifold.runUpKpa': manifold.runUpKpa,
    'manifold.fullKpa': manifold.fullKpa,
    'rotor.terminalWidthDeg': rotor.terminalWidthDeg,
    'rotor.rotorWidthDeg': rotor.rotorWidthDeg,
    'rotor.phasedAtDeg': rotor.phasedAtDeg,
    'rotor.backupPhasedAtDeg': rotor.backupPhasedAtDeg,
    'rotor.sparkDurationMs': rotor.sparkDurationMs,
    'rotor.plateRadiusMm': rotor.plateRadiusMm,
    'tolerances.timingCheckDeg': tolerances.timingCheckDeg,
    'tolerances.benchDeg': tolerances.benchDeg,
    'tolerances.markDeg': tolerances.markDeg,
    'tolerances.scatterDeg': tolerances.scatterDeg,
    ...numbersOfModel(sheet),
  }
}

/** Texts of the scenario form in the person's units. */
export function scenarioToForm(title: string, sheet: ScenarioSheet, system: UnitSystem): FormValues {
  const form: FormValues = { ...channelToForm('primary', sheet.primary, system), ...channelToForm('backup', sheet.backup, system) }
  for (const [name, value] of Object.entries(numbersOfSheet(sheet))) {
    if (name.startsWith('primary.') || name.startsWith('backup.')) continue
    form[name] = value === null ? '' : formatInput(value, index.get(name)?.quantity ?? 'plain', system)
  }
  for (let i = 0; i < maxPitches; i += 1) {
    form[`pitch.${i}.name`] = sheet.propeller.pitches[i]?.name ?? ''
    form[`pitch.${i}.rpm`] ??= ''
    form[`pitch.${i}.kw`] ??= ''
  }
  return {
    ...form,
    ...modelToForm(sheet, system),
    title,
    notes: sheet.notes,
    distribution: sheet.distribution,
    plugsPerCylinder: String(sheet.plugsPerCylinder),
    selection: sheet.selection,
    mbtProvenance: sheet.mbt.provenance,
    mbtNote: sheet.mbt.note,
    propellerKind: sheet.propeller.kind,
    'rotor.mechanicalCarriesRotor': sheet.rotor.mechanicalCarriesRotor ? 'on' : '',
  }
}

/** Reads the scenario form; `base` is the sheet it was filled from, so that untouched fields keep their exact values. */
export function formToScenario(values: FormValues, system: UnitSystem, base?: ScenarioSheet): ScenarioFormResult {
  const read = fieldReader(index, values, system, base ? numbersOfSheet(base) : {})
  const { number, text } = read
  const pitches = Array.from({ length: maxPitches }, (_, i) => i)
    .filter((i) => ['name', 'rpm', 'kw'].some((part) => text(`pitch.${i}.${part}`) !== ''))
  const missing = (name: string, sentence: string) => {
    if (text(name) === '') read.errors[name] = sentence
  }
  for (const i of pitches) {
    missing(`pitch.${i}.name`, 'Give this pitch a name, for example “climb”.')
    missing(`pitch.${i}.kw`, 'Type the power this pitch takes.')
    missing(`pitch.${i}.rpm`, 'Type the speed at which it takes that power.')
  }
  const raw = {
    distribution: text('distribution'),
    plugsPerCylinder: Number(text('plugsPerCylinder')),
    selection: text('selection'),
    primary: readChannel('primary', values, read, system, base?.primary),
    backup: readChannel('backup', values, read, system, base?.backup),
    mbt: { deg: number('mbtDeg'), curvaturePerDeg2: number('curvaturePerDeg2'), provenance: text('mbtProvenance'), note: text('mbtNote') },
    propeller: {
      kind: text('propellerKind'),
      governedRpm: number('governedRpm'),
      pitches: pitches.map((i) => ({ name: text(`pitch.${i}.name`), rpm: number(`pitch.${i}.rpm`), kw: number(`pitch.${i}.kw`) })),
    },
    runUpRpm: number('runUpRpm'),
    manifold: { idleKpa: number('manifold.idleKpa'), runUpKpa: number('manifold.runUpKpa'), fullKpa: number('manifold.fullKpa') },
    rotor: {
      terminalWidthDeg: number('rotor.terminalWidthDeg'),
      rotorWidthDeg: number('rotor.rotorWidthDeg'),
      phasedAtDeg: number('rotor.phasedAtDeg'),
      backupPhasedAtDeg: number('rotor.backupPhasedAtDeg'),
      sparkDurationMs: number('rotor.sparkDurationMs'),
      mechanicalCarriesRotor: read.check('rotor.mechanicalCarriesRotor'),
      plateRadiusMm: number('rotor.plateRadiusMm'),
    },
    tolerances: {
      timingCheckDeg: number('tolerances.timingCheckDeg'), benchDeg: number('tolerances.benchDeg'),
      markDeg: number('tolerances.markDeg'), scatterDeg: number('tolerances.scatterDeg'),
    },
    ...readModel(read),
    notes: values.notes ?? '',
  }
  const sheet = scenarioSheet.safeParse(raw)
  const title = scenarioTitle.safeParse(values.title ?? '')
  if (sheet.success && title.success && Object.keys(read.errors).length === 0) return { ok: true, input: { title: title.data, sheet: sheet.data } }
  const errors = title.success ? read.errors : { ...read.errors, title: title.error.issues[0]?.message ?? 'Give the scenario a name.' }
  const nameOf = (path: readonly PropertyKey[]) => fieldOfSheetPath(path.map(String), values, pitches)
  return { ok: false, errors: placeIssues(sheet.success ? [] : sheet.error.issues, errors, index, nameOf, system) }
}

/** Form field of a path in the sheet (`primary.schedule.points.1.rpm` → `primary.table`); `pitchRows`: form row of each pitch in the sheet. */
export function fieldOfSheetPath(path: readonly string[], values: FormValues, pitchRows: readonly number[] = []): string {
  const [head = '', second = '', third = '', fourth = ''] = path
  if (head === 'primary' || head === 'backup') return fieldOfChannelPath(head, second, third, values)
  if (head === 'mbt') return { deg: 'mbtDeg', curvaturePerDeg2: 'curvaturePerDeg2', provenance: 'mbtProvenance', note: 'mbtNote' }[second] ?? 'mbtDeg'
  if (head === 'propeller') {
    if (second === 'kind') return 'propellerKind'
    if (second === 'governedRpm') return 'governedRpm'
    const row = pitchRows[Number(third)] ?? (Number(third) || 0)
    return `pitch.${row}.${fourth || 'name'}`
  }
  if (head === 'manifold' || head === 'rotor' || head === 'tolerances') return `${head}.${second}`
  return modelFieldOf(path) ?? head
}

function fieldOfChannelPath(channel: ChannelPrefix, second: string, third: string, values: FormValues): string {
  if (second === 'crankRetard') return `${channel}.${{ belowRpm: 'retardBelowRpm', hysteresisRpm: 'retardHysteresisRpm' }[third] ?? 'retardDeg'}`
  if (second === 'latencyUs') return `${channel}.latencyUs`
  const typed = values[`${channel}.kind`] ?? ''
  const kind = isScheduleKind(typed) ? typed : 'fixed'
  if (third === 'kind' || third === '') return kind === 'fixed' || kind === 'mechanical' ? `${channel}.kind` : `${channel}.${kind}`
  return kind === 'fixed' || kind === 'mechanical' ? `${channel}.${kind}.${third}` : `${channel}.${kind}`
}

/** Form field that a scenario path of the library (`sheet.primary.schedule.expression`, `engine.maxRpm`) belongs to. */
export function fieldOfScenarioPath(path: string, values: FormValues): string {
  const parts = path.split('.')
  return parts[0] === 'sheet' ? fieldOfSheetPath(parts.slice(1), values) : path
}
