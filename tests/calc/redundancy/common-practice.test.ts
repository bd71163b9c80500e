import { describe, expect, it } from 'vitest'
import { ignitionTree, singlePoints, type FaultEvent } from '@/lib/calc'

const part = (id: string): FaultEvent => ({ id, ratePerH: 1e-5, exposure: { kind: 'flight', hours: 1 } })
const heated = (id: string): FaultEvent => ({ ...part(id), temperatureK: 350, referenceK: 313, activationEv: 0.4 })
const channel = (letter: string, coils: readonly FaultEvent[]) => ({ id: letter, parts: [heated(`trigger ${letter}`), heated(`module ${letter}`), ...coils] })

describe('common practice, no published source: parts that heat shortens come in twos, parts that heat leaves alone may be single', () => {
  it('cap, rotor and coil lead stand alone, and none of them minds heat', () => {
    const { noSpark } = ignitionTree({
      channels: [channel('A', [heated('coil A')]), channel('B', [heated('coil B')])],
      common: [part('cap'), part('rotor'), part('lead')], cylinders: [],
    })
    expect(singlePoints(noSpark)).toEqual([{ id: 'cap', heatSensitive: false }, { id: 'lead', heatSensitive: false }, { id: 'rotor', heatSensitive: false }])
  })

  it('a coil for both channels breaks the rule and is found', () => {
    const { noSpark } = ignitionTree({ channels: [channel('A', []), channel('B', [])], common: [part('cap'), part('rotor'), heated('coil')], cylinders: [] })
    expect(singlePoints(noSpark).filter(({ heatSensitive }) => heatSensitive)).toEqual([{ id: 'coil', heatSensitive: true }])
  })
})
