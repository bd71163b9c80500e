import { describe, expect, test } from 'vitest'
import { foldCylinders } from '@/components/wheel/cylinders'
import { arcPath, polar, radius, wheelAngle, type Rotation } from '@/components/wheel/geometry'
import { expectClose } from '@/tests/support/expect-close'

const px = 0.1
const at = (rotation: Rotation, advanceDeg: number, atDeg = 0) => polar(wheelAngle(rotation, advanceDeg, atDeg), radius.rayA)
const expectPoint = (point: { x: number, y: number }, x: number, y: number) => {
  expectClose(point.x, x, { abs: px })
  expectClose(point.y, y, { abs: px })
}

describe('where the crank points', () => {
  test('top dead centre is on top for both hands', () => {
    expectPoint(at('clockwise', 0), 0, -176)
    expectPoint(at('anticlockwise', 0), 0, -176)
  })

  // 30° before: sin 30° and cos 30° of the ray's length, worked by hand.
  test('clockwise: a spark before top dead centre lies left of it', () => expectPoint(at('clockwise', 30), -88, -152.42))
  test('anticlockwise: it lies right of it', () => expectPoint(at('anticlockwise', 30), 88, -152.42))

  test('a spark after top dead centre lies on the other side', () => {
    expectPoint(at('clockwise', -30), 88, -152.42)
    expectPoint(at('anticlockwise', -30), -88, -152.42)
  })

  test('a cylinder that fires a quarter turn later stands a quarter turn on, in the hand of rotation', () => {
    expectPoint(at('clockwise', 0, 90), 176, 0)
    expectPoint(at('anticlockwise', 0, 90), -176, 0)
  })

  test('the two hands mirror each other for every angle', () => {
    for (let advance = -20; advance <= 60; advance += 2.5) {
      for (const atDeg of [0, 120, 240]) {
        const one = at('clockwise', advance, atDeg)
        const other = at('anticlockwise', advance, atDeg)
        expectPoint(other, -one.x, one.y)
      }
    }
  })
})

describe('arcs', () => {
  test('run the short way between two sparks, either way round', () => {
    expect(arcPath(92, -26.5, -17)).toMatch(/^M-41\.05 -82\.33A92 92 0 0 1 -26\.9 -87\.98$/)
    expect(arcPath(92, -17, -26.5)).toMatch(/A92 92 0 0 0/)
    expect(arcPath(92, 0, 200)).toMatch(/A92 92 0 1 1/)
  })
})

describe('two turns on one wheel', () => {
  test('cylinders half a cycle apart share a place', () => {
    const six = ['1', '6', '3', '2', '5', '4'].map((label, index) => ({ label, atDeg: index * 120 }))
    expect(foldCylinders(six)).toEqual([{ label: '1·2', atDeg: 0 }, { label: '6·5', atDeg: 120 }, { label: '3·4', atDeg: 240 }])
  })

  test('uneven intervals stand where they are', () => {
    expect(foldCylinders([{ label: '1', atDeg: 0 }, { label: '2', atDeg: 315 }])).toEqual([{ label: '1', atDeg: 0 }, { label: '2', atDeg: 315 }])
  })

  test('a cylinder alone in its place of the second turn stands in the first', () => {
    expect(foldCylinders([{ label: '1', atDeg: 0 }, { label: '2', atDeg: 432 }])).toEqual([{ label: '1', atDeg: 0 }, { label: '2', atDeg: 72 }])
  })

  test('dust of a sum to 720 does not part a pair', () => {
    expect(foldCylinders([{ label: '1', atDeg: 0 }, { label: '2', atDeg: 359.9999999 }])).toHaveLength(1)
  })
})
