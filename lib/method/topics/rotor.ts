import { defineTopic } from '../topic'

export const rotor = defineTopic({
  id: 'rotor',
  title: 'Rotor register in a shared cap',
  intro: 'A spark can cross only while the rotor faces its terminal. With two channels at different advance in one cap, one of them is always off centre. Angles here are distributor degrees but for the advances.',
  functions: ['rotorRegister', 'bestPhasingDeg'],
  equations: [
    {
      id: 'rotor-register', title: 'Register and free angle', tex: String.raw`\delta = \frac{\alpha_0 - \alpha}{2}, \qquad g = \frac{w_\mathrm{r} + w_\mathrm{t}}{2} - |\delta|, \qquad f = \frac{360}{N} - |\delta| - \frac{w_\mathrm{r} + w_\mathrm{t}}{2}`,
      note: 'The rotor goes on turning while the spark burns: 0.003·n·t distributor degrees further. Register and free angle are given at the start and at the end of the spark, and the worse counts.',
      symbols: [
        { tex: String.raw`\delta`, meaning: 'rotor past the terminal’s centre', unit: 'distributor °' },
        { tex: String.raw`\alpha, \alpha_0`, meaning: 'advance; advance at which the rotor is centred', unit: 'crank °' },
        { tex: 'g', meaning: 'register: angle left before the edges part', unit: 'distributor °', range: 'negative once they have parted' },
        { tex: 'f', meaning: 'free angle to the next terminal', unit: 'distributor °' },
        { tex: String.raw`w_\mathrm{r}, w_\mathrm{t}`, meaning: 'width of rotor tip and terminal', unit: 'distributor °', range: 'more than 0' },
        { tex: 'N', meaning: 'cylinders on the cap', unit: 'no unit', range: '1 and up' },
      ],
      sources: [], basis: 'geometry',
    },
    {
      id: 'best-phasing', title: 'Where to centre the rotor', tex: String.raw`\alpha_0^\ast = \tfrac{1}{2}\left(\min_i \alpha_i + \max_i \alpha_i\right)`,
      symbols: [
        { tex: String.raw`\alpha_i`, meaning: 'advances that occur', unit: 'crank °', range: 'one at least' },
      ],
      sources: [], basis: 'geometry',
    },
  ],
  weaknesses: [
    'A spark jumps a gap between rotor and terminal well beyond the edge if the voltage is there. Register left is a rule of layout, not the point of misfire.',
    'A mechanical advance that carries the rotor with it does not move the register; one that turns the pick-up does. The sheet has to be told which.',
    'Play of the shaft and burnt edges are not counted.',
  ],
})
