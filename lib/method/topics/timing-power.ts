import { defineTopic } from '../topic'

export const timingPower = defineTopic({
  id: 'timing-power',
  title: 'Power against timing',
  intro: 'Near the spark of best torque (MBT), torque falls with the square of the distance from it. Planned timing is mostly later than MBT because of detonation; the two are kept apart everywhere.',
  functions: ['timingTorqueRatio', 'curvatureFromPoint', 'fitTimingParabola', 'brakeRatioFromIndicated'],
  equations: [
    {
      id: 'timing-torque', title: 'Torque kept at a timing', tex: String.raw`\frac{T}{T_\mathrm{MBT}} = \max\left(0,\; 1 - c\left(\alpha - \alpha_\mathrm{MBT}\right)^2\right)`,
      note: 'A ratio of brake torques, as a dynamometer gives it.',
      symbols: [
        { tex: 'T', meaning: 'brake torque', unit: 'any, the same for both' },
        { tex: 'c', meaning: 'curvature', unit: 'per °²', range: '0 and up; published engines 0.00018 to 0.0004' },
        { tex: String.raw`\alpha`, meaning: 'advance', unit: '°' },
        { tex: String.raw`\alpha_\mathrm{MBT}`, meaning: 'advance of best torque', unit: '°' },
      ],
      sources: ['crossley-cook-1991', 'heywood-1988', 'zareei-kakaee-2013'],
    },
    {
      id: 'curvature', title: 'Curvature from one point', tex: String.raw`c = \frac{1 - T/T_\mathrm{MBT}}{\left(\alpha - \alpha_\mathrm{MBT}\right)^2}`,
      symbols: [
        { tex: String.raw`T/T_\mathrm{MBT}`, meaning: 'torque kept at that advance', unit: 'no unit', range: '0 to 1' },
        { tex: String.raw`\alpha - \alpha_\mathrm{MBT}`, meaning: 'distance from best torque', unit: '°', range: 'not 0' },
        { tex: 'c', meaning: 'curvature', unit: 'per °²' },
      ],
      sources: [], basis: 'arithmetic',
    },
    {
      id: 'parabola-fit', title: 'Best torque from measured points', tex: String.raw`\min_{c_0, c_1, c_2} \sum_i \left(T_i - c_0 - c_1 x_i - c_2 x_i^2\right)^2, \qquad \alpha_\mathrm{MBT} = \bar{\alpha} - \frac{c_1}{2 c_2}`,
      note: 'Angles are centred on their mean first, which keeps the digits. A fit that does not bend downwards is refused.',
      symbols: [
        { tex: String.raw`x_i = \alpha_i - \bar{\alpha}`, meaning: 'advance of a point from the mean of all', unit: '°', range: 'three distinct at least' },
        { tex: 'T_i', meaning: 'torque measured there', unit: 'any' },
        { tex: 'c_0, c_1, c_2', meaning: 'coefficients of the parabola', unit: 'torque, per °, per °²' },
      ],
      sources: ['nist-pontius'],
    },
    {
      id: 'brake-ratio', title: 'From indicated to brake', tex: String.raw`r_\mathrm{b} = \frac{r_\mathrm{i}\, p_\mathrm{i} - p_\mathrm{f}}{p_\mathrm{i} - p_\mathrm{f}}`,
      note: 'Friction does not know the timing: the lower the load, the more of the brake torque a late spark takes.',
      symbols: [
        { tex: String.raw`r_\mathrm{b}, r_\mathrm{i}`, meaning: 'brake and indicated ratio', unit: 'no unit' },
        { tex: String.raw`p_\mathrm{i}`, meaning: 'indicated mean effective pressure', unit: 'kPa', range: 'above the friction' },
        { tex: String.raw`p_\mathrm{f}`, meaning: 'friction mean effective pressure', unit: 'kPa', range: '0 and up' },
      ],
      sources: [], basis: 'definition',
    },
  ],
  weaknesses: [
    'The parabola holds for some 20° about best torque. Far later the true curve falls less steeply than it says.',
    'Published curvatures differ by a factor of two. A single value is a guess; results that lean on it show a band.',
    'A curvature taken from 28° and 18° as if 28° were best torque comes out near 0.001, far steeper than any published engine: such a pair of timings is limited by detonation.',
    'Best torque moves with speed, charge and mixture. One angle stands for all of full throttle here.',
  ],
})
