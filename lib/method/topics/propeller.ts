import { defineTopic } from '../topic'

export const propeller = defineTopic({
  id: 'propeller',
  title: 'Propeller and run-up',
  intro: 'What an engine loses in torque shows as speed only through the propeller that holds it. One plug a cylinder and two channels, one in use, are assumed.',
  functions: ['fixedPitchOperatingPoint', 'constantSpeedOperatingPoint', 'runUpDrop', 'torqueRatioFromDrop'],
  equations: [
    {
      id: 'propeller-load', title: 'Load of a propeller', tex: String.raw`P_\mathrm{L}(n) = P_0 \left(\frac{n}{n_0}\right)^3 \frac{\rho}{\rho_0}`,
      symbols: [
        { tex: 'P_0, n_0', meaning: 'power absorbed at one known speed', unit: 'kW, rpm', range: 'more than 0' },
        { tex: String.raw`\rho/\rho_0`, meaning: 'density of the air over that of the known point', unit: 'no unit', range: 'more than 0' },
      ],
      sources: ['propeller-cube-law'],
    },
    {
      id: 'operating-point', title: 'Where engine and propeller meet', tex: String.raw`f(n)\, P(n) = P_\mathrm{L}(n)`,
      note: 'Of several crossings, the fastest at which the load outgrows the engine. A governor holds its speed as long as the power lies between the loads of low and high pitch; below that the speed falls along the low-pitch load, above it overspeeds along the high.',
      symbols: [
        { tex: 'P(n)', meaning: 'power curve, straight between its points', unit: 'kW', range: 'speeds ascending' },
        { tex: 'f(n)', meaning: 'share of it that is left', unit: 'no unit', range: 'a number, or one for each speed' },
        { tex: 'n', meaning: 'speed of the meeting', unit: 'rpm', range: 'within the power curve' },
      ],
      sources: ['propeller-cube-law'],
    },
    {
      id: 'run-up-drop', title: 'Drop at run-up', tex: String.raw`\frac{n_2}{n_1} = r^{\,1/(2 - m)}`,
      note: 'The sheet uses m = −0.5 and shows the band from 0 to −1: behind a nearly choked throttle the air per minute stays the same, which is −1.',
      symbols: [
        { tex: 'n_1, n_2', meaning: 'speed before and after', unit: 'rpm', range: 'more than 0' },
        { tex: 'r', meaning: 'torque left, at one speed', unit: 'no unit', range: 'more than 0' },
        { tex: 'm', meaning: 'engine torque at fixed throttle goes with this power of speed', unit: 'no unit', range: 'below 2' },
      ],
      sources: ['trade'],
    },
    {
      id: 'run-up-ratio', title: 'Torque left at part throttle', tex: String.raw`r_\mathrm{i} = 1 - \left(1 - r_\mathrm{b}\right)\eta_\mathrm{m}, \qquad r = \frac{r_\mathrm{i}\left(p_\mathrm{L} + p_\mathrm{f}\right) - p_\mathrm{f}}{p_\mathrm{L}}`,
      note: 'The loss of full load is carried over as an indicated one; at the light load of a run-up friction weighs more. The band also holds best torque 0° to 10° earlier, because thin charge burns slower.',
      symbols: [
        { tex: String.raw`r_\mathrm{b}`, meaning: 'brake torque left at full load', unit: 'no unit' },
        { tex: String.raw`p_\mathrm{L}, p_\mathrm{f}`, meaning: 'mean effective pressure of the propeller’s load and of friction at that speed', unit: 'kPa', range: 'more than 0' },
        { tex: String.raw`\eta_\mathrm{m}`, meaning: 'mechanical efficiency at full load', unit: 'no unit', range: 'above 0, to 1' },
      ],
      sources: [], basis: 'choice of this program',
    },
  ],
  weaknesses: [
    'The cube law is for a propeller standing in still air, or flying at one ratio of airspeed to tip speed. Wind at run-up alone moves the speed by tens of rpm.',
    'How torque follows speed at a fixed throttle is a guess within a band. After three good run-ups the aircraft’s own median is a better expectation than any of this.',
    'The 25 to 175 rpm of handbooks belong to engines with two plugs in each cylinder and say nothing of these.',
  ],
})
