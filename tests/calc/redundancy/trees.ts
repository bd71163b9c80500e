import type { FaultEvent, FaultGate, FaultTree } from '@/lib/calc/live'

export const chance = (id: string, p: number): FaultEvent => ({ id, exposure: { kind: 'probability', p } })
export const flown = (id: string, ratePerH: number, hours = 2): FaultEvent => ({ id, ratePerH, exposure: { kind: 'flight', hours } })
export const latent = (id: string, ratePerH: number, checkIntervalHours = 100): FaultEvent => ({ id, ratePerH, exposure: { kind: 'latent', checkIntervalHours } })
export const heat = { temperatureK: 360, referenceK: 300, activationEv: 0.4 }

const gateOf = (line: string): FaultGate => {
  const [id = '', kind = '', ...inputs] = line.trim().split(/\s+/)
  const k = Number(kind)
  if (k > 0) return { id, kind: 'atLeast', k, inputs }
  return { id, kind: kind === 'and' ? 'and' : 'or', inputs }
}

/** A tree from lines such as `top and a b` or `top 2 a b c`, the first the top. */
export const treeOf = (lines: string, events: readonly FaultEvent[], more: Partial<FaultTree> = {}): FaultTree => {
  const gates = lines.trim().split('\n').map(gateOf)
  return { top: gates[0]?.id ?? '', events, gates, ...more }
}

export const tank = treeOf(`
T or TANK OP
OP or MOT K2
MOT and S TC
TC or S1 K1B
K1B or K1 R`, [chance('TANK', 5e-6), chance('K2', 3e-5), chance('S', 1e-4), chance('S1', 3e-5), chance('K1', 5e-6), chance('R', 1e-4)])

export const trains = treeOf(`
T and A B
A or V1 P1
B or V2 P2`, [chance('V1', 0.5), chance('V2', 0.5), chance('P1', 0.7), chance('P2', 0.7)])

export const repeated = treeOf(`
T and A1 A2
A1 or A B C
A or F G
A2 or C D E
E and H I`, [chance('B', 0.1), chance('C', 0.3), chance('D', 0.5), chance('F', 0.7), chance('G', 0.2), chance('H', 0.4), chance('I', 0.8)])

export const twoOfThree = treeOf('T 2 A B C', [chance('A', 0.1), chance('B', 0.2), chance('C', 0.3)])

export const large = treeOf(`
r1 and g1 g2
g1 or e1 e2 e3 g3
g2 and g4 g5
g3 and g6 g7
g4 or e4 e5 e6 e7 g8
g5 or e8 g9
g6 or e9 e10 e11 g10
g7 or e12 e13
g8 and g11 g12
g9 and g13 g14
g10 and g15 g16
g11 or e14 e15 e16 g17
g12 and g18 g19
g13 or e1 e2 e3 g20
g14 or e4 e5 e6 e7 g21
g15 or e17 e18
g16 or e19 e20 e21
g17 and g22 g23
g18 or e22 e23
g19 or e24 e25
g20 and g24 g25
g21 and g26 g27
g22 or e17 e18 e21
g23 or e19 e20
g24 or e14 e15 e16 g28
g25 and g29 g30
g26 or e9 e10 e11 g31
g27 or e12 e13
g28 and g32 g33
g29 or e22 e23
g30 or e24 e25
g31 and g34 g35
g32 or e17 e18 e21
g33 or e19 e20
g34 or e19 e20 e21
g35 or e17 e18`, Array.from({ length: 25 }, (_, i) => chance(`e${i + 1}`, 0.02)))
