import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { takeCycleEngine } from '@/lib/calc/geometry/cycle-engine'
import { clearanceM3, displacementM3, travelM, volumeM3 } from '@/lib/calc/geometry/slider-crank'
import { cylinderVolumeCc, pistonTravelMm } from '@/lib/calc/live'
import { deepFreeze } from '@/tests/support/deep-freeze'
import { expectCalcError } from '@/tests/support/expect-calc-error'
import { expectClose } from '@/tests/support/expect-close'

const crank = { strokeMm: 76, rodMm: 128 }
const engine = { boreMm: 94, ...crank, compressionRatio: 8.6 }
const angle = fc.double({ min: -1e6, max: 1e6, noNaN: true })

describe('pistonTravelMm', () => {
  it('is 0 at the top, the stroke at the bottom, and Pythagoras at a right angle', () => {
    for (const turns of [-720, 0, 360, 7200]) expect(pistonTravelMm({ ...crank, thetaDeg: turns })).toBe(0)
    for (const bottom of [-180, 180, 540]) expectClose(pistonTravelMm({ ...crank, thetaDeg: bottom }), 76, { rel: 1e-15 })
    expectClose(pistonTravelMm({ ...crank, thetaDeg: 90 }), 38 + 128 - Math.sqrt(128 ** 2 - 38 ** 2), { rel: 1e-13 })
  })

  it('agrees with the textbook form, is even, and repeats each turn', () => {
    fc.assert(fc.property(angle, fc.double({ min: 38.001, max: 1e4, noNaN: true }), (thetaDeg, rodMm) => {
      const at = (deg: number) => pistonTravelMm({ strokeMm: 76, rodMm, thetaDeg: deg })
      const theta = ((thetaDeg % 360) * Math.PI) / 180
      expectClose(at(thetaDeg), 38 * (1 - Math.cos(theta)) + rodMm - Math.sqrt(rodMm ** 2 - (38 * Math.sin(theta)) ** 2), { abs: 1e-9 })
      expect(at(-thetaDeg)).toBe(at(thetaDeg))
    }))
  })

  it('keeps its digits a hair after the top, where the textbook form loses all of them', () => {
    const theta = (1e-6 * Math.PI) / 180
    expectClose(pistonTravelMm({ ...crank, thetaDeg: 1e-6 }), (38 * (1 + 38 / 128) * theta ** 2) / 2, { rel: 1e-12 })
  })

  it('an endless rod leaves the cosine', () => {
    for (const thetaDeg of [10, 75, 130]) expectClose(pistonTravelMm({ strokeMm: 76, rodMm: 1e300, thetaDeg }), 38 * (1 - Math.cos((thetaDeg * Math.PI) / 180)), { rel: 1e-14 })
  })
})

describe('cylinderVolumeCc', () => {
  it('runs from the clearance to the compression ratio times it', () => {
    const top = cylinderVolumeCc({ engine, thetaDeg: 0 })
    expectClose(top, (Math.PI * 9.4 ** 2 * 7.6) / 4 / 7.6, { rel: 1e-14 })
    expectClose(cylinderVolumeCc({ engine, thetaDeg: 180 }) / top, 8.6, { rel: 1e-14 })
  })

  it('adds piston area times travel', () => {
    fc.assert(fc.property(angle, (thetaDeg) => {
      const above = cylinderVolumeCc({ engine, thetaDeg }) - cylinderVolumeCc({ engine, thetaDeg: 0 })
      expectClose(above, (Math.PI * 9.4 ** 2 * pistonTravelMm({ ...crank, thetaDeg })) / 40, { abs: 1e-10 })
    }))
  })

  it('is what the cycle works with, in SI', () => {
    expectClose(volumeM3(engine, 33), clearanceM3(engine) + (Math.PI / 4) * 0.094 ** 2 * travelM(engine, 33), { rel: 1e-14 })
    expectClose(clearanceM3(engine), displacementM3(engine) / 7.6, { rel: 1e-15 })
  })
})

describe('wrong engines', () => {
  const cycle = { ...engine, ivcDeg: -120, evoDeg: 130 }
  const of = (change: object) => () => takeCycleEngine(deepFreeze({ ...cycle, ...change }), 'engine')

  it('takes the ends of the closed cycle', () => {
    expect(of({})()).toEqual(cycle)
    expect(of({ ivcDeg: -180, evoDeg: 180 })()).toEqual({ ...cycle, ivcDeg: -180, evoDeg: 180 })
  })

  it('names the member that cannot be used', () => {
    for (const bad of [undefined, null, Number.NaN, Infinity, '76', 0, -1]) {
      for (const name of ['boreMm', 'strokeMm', 'rodMm', 'compressionRatio', 'evoDeg']) expectCalcError(of({ [name]: bad }), `engine.${name}`)
    }
    expectCalcError(of({ rodMm: 38 }), 'engine.rodMm')
    expectCalcError(of({ compressionRatio: 1 }), 'engine.compressionRatio')
    for (const ivcDeg of [0, 1, -180.1, null, undefined]) expectCalcError(of({ ivcDeg }), 'engine.ivcDeg')
    expectCalcError(of({ evoDeg: 180.1 }), 'engine.evoDeg')
    for (const boreMm of [1e200, 1e-200]) expectCalcError(of({ boreMm }), 'engine.boreMm')
    expectCalcError(of({ strokeMm: 5e-324 }), 'engine.boreMm')
    expectCalcError(of({ compressionRatio: 1e308 }), 'engine.compressionRatio')
    for (const none of [undefined, null, 3, [], 'x']) expectCalcError(() => cylinderVolumeCc({ engine: none as never, thetaDeg: 0 }), 'engine')
    for (const thetaDeg of [undefined, null, Number.NaN, Infinity, '1']) {
      expectCalcError(() => cylinderVolumeCc({ engine, thetaDeg: thetaDeg as never }), 'thetaDeg')
      expectCalcError(() => pistonTravelMm({ ...crank, thetaDeg: thetaDeg as never }), 'thetaDeg')
    }
    expectCalcError(() => pistonTravelMm({ strokeMm: 76, rodMm: 38, thetaDeg: 0 }), 'rodMm')
    expectCalcError(() => pistonTravelMm(undefined as never), 'strokeMm')
    expectCalcError(() => cylinderVolumeCc(null as never), 'engine')
  })
})
