import { describe, expect, test } from 'vitest'
import '@/lib/calc/index'
import { defaultLimits } from '@/lib/calc/limits'
import { evaluateScenario } from '@/lib/calc/scenario/evaluate-scenario'
import type { Finding } from '@/lib/calc/scenario/result-types'
import { detonationCaution } from '@/lib/words/detonation-words'
import { findingSentence } from '@/lib/words/finding-sentences'
import { findingAmount, findingSpread, findingTitle, limitOrigin, limitWords } from '@/lib/words/findings'
import { limitLine } from '@/lib/words/limits'
import { someCases } from '@/tests/support/cases'
import { sampleCoil, sampleEngine, sampleSheet } from '@/tests/support/samples'

const reference = { sparkDeg: 26, rpm: 2780, octane: 91, marginDeg: 2 }
const results = [
  sampleSheet(), sampleSheet({ reference }), sampleSheet({ fuel: { scale: 'aki', octane: 70, worseOctane: 60 } }), sampleSheet({ fuel: { scale: 'lean', octane: 125, worseOctane: 120 } }),
  sampleSheet({ coils: { primary: sampleCoil({ limitA: null, ohm: 0.2, dwellMs: 5, thermalResistanceKPerW: 12 }), backup: sampleCoil({ dwellMs: 9 }) } }),
  sampleSheet({ airframe: { ...sampleSheet().airframe, massKg: 1100 } }), sampleSheet({ distribution: 'capEach', redundancy: { ...sampleSheet().redundancy, sharedSupply: false } }),
].map((sheet) => evaluateScenario({ engine: sampleEngine(), sheet }))
const findings = results.flatMap((result) => result.findings)
const systems = ['metric', 'us'] as const
const one = (id: string, from = 0): Finding => {
  const found = results[from]?.findings.find((finding) => finding.id === id)
  if (!found) throw new Error(`no finding ${id}`)
  return found
}
const plain = (text: string) => text.replaceAll('\u00a0', ' ')

describe('every limit', () => {
  test.each(someCases(Object.values(defaultLimits)))('$id has a title, a limit and an origin in words', (limit) => {
    const line = limitLine(limit, 'metric')
    expect(line.title).toMatch(/^[A-Z]/)
    expect(line.limit).toMatch(/^at (least|most) .*\d/)
    expect(line.origin.length).toBeGreaterThan(5)
  })
  test('is judged somewhere in these examples', () => {
    const judged = new Set(findings.map(({ limitId }) => limitId))
    expect(Object.keys(defaultLimits).filter((id) => !judged.has(id as Finding['limitId']))).toEqual([])
  })
})

describe('every sentence', () => {
  const sentences = systems.flatMap((system) => findings.map((finding) => `${findingTitle(finding, system)}. ${findingSentence(finding, system)}`))
  test('ends as one, with no gap in it', () => {
    for (const sentence of someCases(sentences)) {
      expect(sentence).toMatch(/\.$/)
      expect(sentence).not.toMatch(/undefined|NaN|null|Infinity| {2}|\.\./)
    }
  })
  test('approves nothing', () => {
    for (const sentence of someCases(sentences)) expect(sentence).not.toMatch(/\b(sound|safe|safely|approved?|airworthy|OK)\b/i)
  })
})

describe('detonation', () => {
  const all = findings.filter(({ limitId }) => limitId === 'detonationDeg')
  test('no margin stands without its caution, scale, spread and what may change it', () => {
    for (const finding of someCases(all)) {
      const sentence = findingSentence(finding, 'metric')
      expect(sentence).toContain(detonationCaution)
      expect(sentence).toMatch(/RON|\(R\+M\)\/2|lean rating/)
      expect(sentence).toMatch(/±(5|1)/)
      expect(findingSpread(finding, 'metric')).toMatch(/octane less$/)
      expect(findingAmount(finding, 'metric')).toMatch(/^.+\(.+\)$/)
    }
  })
  test('says whether the model is anchored, and how far its octane number may be off', () => {
    expect(findingSentence(one('detonationDeg.primary'), 'metric')).toContain('good to ±5 at best')
    expect(findingSentence(one('detonationDeg.primary', 1), 'metric')).toMatch(/anchored to a setting known to run clean.*±1/)
  })
  test('says what going to the backup gains, on the backup alone', () => {
    expect(findingSentence(one('detonationDeg.backup'), 'metric')).toMatch(/Going to the backup gains [\d.]+° and [\d.]+ octane numbers\./)
    expect(findingSentence(one('detonationDeg.primary'), 'metric')).not.toContain('gains')
  })
  test('names the worse fuel and charge in the person’s units', () => {
    expect(plain(findingSentence(one('detonationDeg.primary'), 'metric'))).toContain('with 91 RON and a charge 15 K hotter and 3 kPa denser')
    expect(plain(findingSentence(one('detonationDeg.primary'), 'us'))).toContain('with 91 RON and a charge 27 °F hotter and 0.9 inHg denser')
  })
  test('where every spark detonates or none does, it says so', () => {
    const always = { ...one('detonationDeg.primary'), value: null, data: { ...one('detonationDeg.primary').data, state: 'always', limitDeg: null, lowDeg: null, plannedDeg: null } }
    expect(findingSentence(always, 'metric')).toMatch(/it detonates at every spark searched.*no margin at all.*there is no margin either/)
    expect(findingAmount(always, 'metric')).toBe('none (none for 5 octane less)')
    const never = { ...always, value: 40, data: { ...always.data, state: 'never' } }
    expect(findingSentence(never, 'metric')).toContain('at least this')
  })
})

describe('chances, coils, climb', () => {
  test('a chance never stands without its spread', () => {
    const finding = one('noSparkPerH')
    const spread = /\d\.\d·10⁻\S+ to \d\.\d·10⁻\S+/
    expect(plain(findingSpread(finding, 'metric') ?? '')).toMatch(spread)
    expect(plain(findingAmount(finding, 'metric'))).toMatch(/^\d\.\d·10⁻\S+ \/h \(/)
    expect(plain(findingSentence(finding, 'metric'))).toMatch(/tenth or ten times/)
    expect(plain(limitWords(finding, 'metric'))).toBe('at most 1.0·10⁻⁵ /h')
  })
  test('single points are named, or that there are none', () => {
    expect(findingSentence(one('noSparkPerH'), 'metric')).toMatch(/alone: .*supply/)
    expect(findingSentence(one('noSparkPerH', 6), 'metric')).toContain('No part ends both channels alone.')
  })
  test('a limit from a publication says which, and what it is not', () => {
    expect(limitOrigin.insulationClass).toMatch(/class F, IEC 60085, from memory/)
    expect(limitOrigin.hazardous).toMatch(/orientation; homebuilts are not certificated/)
  })
  test('a winding without a steady temperature is said, not left blank', () => {
    const backup = one('windingK.backup', 4)
    expect(backup.value).toBeNull()
    expect(findingSentence(backup, 'metric')).toContain('no steady temperature')
    expect(findingAmount(backup, 'metric')).toBe('no end')
  })
  test('a climb is signed, and its words follow the verdict', () => {
    expect(findingAmount(one('climbMps'), 'metric')).toMatch(/^[+−]/)
    expect(findingSentence(one('climbMps', 5), 'metric')).toContain('descends')
  })
  test('the tolerance stack is said beside an angle, plainly where it would carry it past the limit', () => {
    const cranking = one('crankingAdvanceDeg.backup')
    expect(findingSentence(cranking, 'metric')).toMatch(/tolerances stack up to ±[\d.]+°, and leave it inside\./)
    expect(findingSentence({ ...cranking, limit: (cranking.value ?? 0) + 0.1 }, 'metric')).toContain('that would carry it past the limit.')
    expect(findingSentence({ ...cranking, limit: (cranking.value ?? 0) - 1 }, 'metric')).not.toContain('inside')
  })
})
