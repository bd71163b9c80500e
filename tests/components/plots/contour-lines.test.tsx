import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { contourLines, regionOutlines, type PlotGrid } from '@/components/plots/contour-lines'
import { lies, meets, placeLabels, textBox } from '@/components/plots/label-room'
import { placeNotes, pointBox } from '@/components/plots/plot-points'
import { expectClose } from '@/tests/support/expect-close'

const gridOf = (x: readonly number[], y: readonly number[], value: (x: number, y: number) => number | null): PlotGrid => ({ x, y, values: x.map((at) => y.map((up) => value(at, up))) })
const x = [0, 1, 3, 4, 10]
const y = [10, 12, 13, 20]

describe('lines of equal value', () => {
  test('of a plane are straight, on their level, from frame to frame, on uneven axes', () => {
    const slope = fc.double({ min: 0.1, max: 3, noNaN: true })
    fc.assert(fc.property(slope, slope, fc.double({ min: 0.05, max: 0.95, noNaN: true }), (a, b, share) => {
      const plane = (at: number, up: number) => a * at + b * up
      const level = plane(0, 10) + share * (plane(10, 20) - plane(0, 10))
      const [line, ...more] = contourLines(gridOf(x, y, plane), [level])
      expect(more).toEqual([])
      if (!line) return expect.fail('no line')
      for (const point of line.points) expectClose(plane(point.x, point.y), level, { rel: 1e-9 })
      const onFrame = (point: { x: number, y: number }) => [0, 10].some((end) => Math.abs(point.x - end) < 1e-9) || [10, 20].some((end) => Math.abs(point.y - end) < 1e-9)
      const ends = [line.points[0], line.points.at(-1)]
      for (const end of ends) expect(end && onFrame(end)).toBe(true)
      // Its whole length is that of the straight way between its ends.
      const way = line.points.slice(1).reduce((sum, point, k) => sum + Math.hypot(point.x - (line.points[k]?.x ?? 0), point.y - (line.points[k]?.y ?? 0)), 0)
      expectClose(way, Math.hypot((ends[1]?.x ?? 0) - (ends[0]?.x ?? 0), (ends[1]?.y ?? 0) - (ends[0]?.y ?? 0)), { rel: 1e-9 })
    }))
  })

  test('close around a hill, cross nothing above or below it, and come one a level', () => {
    const hill = gridOf([0, 1, 2, 3, 4], [0, 1, 2, 3, 4], (at, up) => 10 - (at - 2) ** 2 - (up - 2) ** 2)
    const lines = contourLines(hill, [7.5, 9.5])
    expect(lines.map(({ level }) => level)).toEqual([7.5, 9.5])
    for (const { points } of lines) expect(points[0]).toEqual(points.at(-1))
    expect(contourLines(hill, [11, 1])).toEqual([])
  })

  test('are one run each, whichever side of the frame cuts them', () => {
    const axis = [0, 1, 2, 3, 4]
    for (const [left, low] of [[0, 2], [4, 2], [2, 0], [2, 4], [0, 0]] as const) {
      expect(contourLines(gridOf(axis, axis, (at, up) => -((at - left) ** 2) - (up - low) ** 2), [-1.5])).toHaveLength(1)
    }
  })

  test('end beside a place without a value, and are drawn on its other side', () => {
    const withHole = gridOf([0, 1, 2, 3, 4, 5], [0, 1, 2], (at, up) => (at === 2 && up === 1 ? null : up))
    const runs = contourLines(withHole, [0.5]).map(({ points }) => points.map((point) => point.x).sort((one, other) => one - other))
    expect(runs.sort((one, other) => (one[0] ?? 0) - (other[0] ?? 0))).toEqual([[0, 1], [3, 4, 5]])
    const nowhere = gridOf([0, 1], [0, 1], (at, up) => (at === 0 && up === 0 ? null : up))
    expect(contourLines(nowhere, [0.5])).toEqual([])
  })
})

describe('regions', () => {
  test('reach halfway to the next place and to the frame', () => {
    const [ring] = regionOutlines({ x, y }, (i) => i === 0)
    const xs = ring?.map((point) => point.x) ?? []
    const ys = ring?.map((point) => point.y) ?? []
    expect([Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)]).toEqual([0, 0.5, 10, 20])
    expect(regionOutlines({ x, y }, () => false)).toEqual([])
  })
})

describe('words on the drawing', () => {
  const frame = { x: 0, y: 0, width: 400, height: 300 }
  const across = (up: number) => [{ x: 0, y: up }, { x: 400, y: up }]

  test('a label stands on its line, clear of what is there and of the frame; a short line has none', () => {
    const taken = { x: 150, y: 90, width: 100, height: 20 }
    const labels = placeLabels([{ text: '20°', points: across(100) }, { text: '25°', points: across(104) }, { text: '30°', points: [{ x: 0, y: 200 }, { x: 20, y: 200 }] }, { text: '35°', points: across(2) }], [taken], frame)
    expect(labels.map(({ text, y: up }) => [text, up])).toEqual([['20°', 100], ['25°', 104]])
    const [one, two] = labels.map((label) => textBox(label.text, label))
    if (!one || !two) return expect.fail('no labels')
    expect([meets(one, taken), meets(two, taken), meets(one, two), lies(one, frame), lies(two, frame)]).toEqual([false, false, false, true, true])
  })

  test('each point’s words keep clear of the other points and stay inside', () => {
    const marks = [{ channel: 'A' as const, text: '26.0°' }, { channel: 'B' as const, text: '17.0°' }]
    const places = [{ name: 'full power', x: 390, y: 10 }, { name: 'idle', x: 10, y: 290 }, { name: 'run-up', x: 130, y: 280 }].map((place) => ({ ...place, marks }))
    const notes = placeNotes(places, frame)
    expect(notes.map(({ anchor }) => anchor)).toEqual(['end', 'start', 'start'])
    notes.forEach(({ box }, k) => {
      expect(lies(box, frame)).toBe(true)
      places.forEach((place, other) => { if (other !== k) expect(meets(box, pointBox(place))).toBe(false) })
      notes.forEach((note, other) => { if (other !== k) expect(meets(box, note.box)).toBe(false) })
    })
  })
})
