import { defineTopic } from '../topic'

export const climb = defineTopic({
  id: 'climb',
  title: 'Climb, level or descend',
  intro: 'Power left over after drag lifts the aircraft. With a parabolic drag polar the answer is one subtraction at each speed.',
  functions: ['powerRequiredKw', 'climbRateMps', 'bestClimb', 'outcome'],
  equations: [
    {
      id: 'power-required', title: 'Power for level flight', tex: String.raw`P_\mathrm{r} = \tfrac{1}{2}\,\rho\, V^3 S\, C_{D0} + \frac{2 K W^2}{\rho\, V S}, \qquad W = m g_0`,
      symbols: [
        { tex: String.raw`\rho`, meaning: 'air density', unit: 'kg/m³', range: 'more than 0' },
        { tex: 'V', meaning: 'true airspeed', unit: 'm/s', range: 'more than 0' },
        { tex: 'S', meaning: 'wing area', unit: 'm²', range: 'more than 0' },
        { tex: 'C_{D0}', meaning: 'drag coefficient without lift', unit: 'no unit', range: 'more than 0' },
        { tex: 'K', meaning: 'induced drag over lift coefficient squared', unit: 'no unit', range: 'more than 0' },
        { tex: 'm', meaning: 'mass', unit: 'kg', range: 'more than 0' },
        { tex: String.raw`P_\mathrm{r}`, meaning: 'power for level flight at the propeller', unit: 'W' },
        { tex: 'W, g_0', meaning: 'weight; 9.80665', unit: 'N, m/s²' },
      ],
      sources: ['lowry'],
    },
    {
      id: 'climb-rate', title: 'Rate of climb', tex: String.raw`v_\mathrm{c} = \frac{\eta\, P - P_\mathrm{r}(V)}{W}, \qquad \text{best over } V \geq V_\mathrm{min}`,
      note: 'With a constant propeller efficiency the best speed is that of least power, often too slow to fly: the lowest speed allowed bounds it.',
      symbols: [
        { tex: String.raw`v_\mathrm{c}`, meaning: 'rate of climb, minus is descent', unit: 'm/s' },
        { tex: String.raw`\eta`, meaning: 'propeller efficiency', unit: 'no unit', range: '0 to 1, a number or one for each speed' },
        { tex: 'P', meaning: 'brake power', unit: 'W', range: '0 and up' },
        { tex: String.raw`V_\mathrm{min}`, meaning: 'lowest speed allowed, 1.3 times the stall', unit: 'm/s', range: 'more than 0' },
        { tex: 'W', meaning: 'weight', unit: 'N' },
        { tex: String.raw`P_\mathrm{r}(V)`, meaning: 'power for level flight at airspeed V', unit: 'W, m/s' },
      ],
      sources: ['lowry', 'excess-power'],
    },
    {
      id: 'ceiling', title: 'Ceiling', tex: String.raw`v_\mathrm{c}\left(h^\ast\right) = 0`,
      note: 'The whole chain is solved: power lapses with density, cold cylinders take theirs, the propeller absorbs what is left. Within 0.25 m/s of zero the verdict is “level”.',
      symbols: [
        { tex: String.raw`h^\ast`, meaning: 'density altitude without climb', unit: 'm', range: '−1000 to 11 000, or none' },
        { tex: String.raw`v_\mathrm{c}`, meaning: 'best rate of climb at that height', unit: 'm/s' },
      ],
      sources: ['gagg-ferrar-1934', 'lowry'],
    },
  ],
  weaknesses: [
    'Small angles only: thrust and drag are taken along a level path, good to about 15° of climb.',
    'The drag polar is that of the clean aircraft in straight flight. A windmilling or fouled propeller, gear, flaps, a turn or rough air cost more.',
    'Propeller efficiency at climb speed is the weakest figure of all: a tenth of it decides between climbing and not.',
  ],
})
