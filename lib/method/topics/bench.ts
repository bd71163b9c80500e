import { defineTopic } from '../topic'

export const bench = defineTopic({
  id: 'bench',
  title: 'A run on the bench',
  intro: 'A unit is turned on a bench and read against a wheel. The readings are turned into advance, held against the plan, and looked through for stagger, scatter between cylinders and the retard step.',
  functions: ['evaluateBenchRun', 'benchReadingsToAdvance'],
  equations: [
    {
      id: 'bench-advance', title: 'From wheel to advance', tex: String.raw`\alpha = s\,k\left(\theta_0 - \theta\right), \qquad \text{or relative: } \alpha = \alpha_\mathrm{plan} + s\,k\left(\bar{\theta}_\mathrm{A} - \theta\right)`,
      note: 'A unit on a bench has no top dead centre. Without an index only shape, stagger, step and scatter are judged; absolute timing is set on the engine.',
      symbols: [
        { tex: String.raw`\theta, \theta_0`, meaning: 'reading; reading at the index', unit: '° of the wheel' },
        { tex: String.raw`\bar{\theta}_\mathrm{A}`, meaning: 'mean primary reading at the chosen speed', unit: '° of the wheel' },
        { tex: 'k', meaning: '2 on a distributor wheel, 1 on a crank wheel', unit: 'no unit' },
        { tex: 's', meaning: 'way round of the wheel', unit: 'no unit', range: '1 or −1' },
        { tex: String.raw`\alpha, \alpha_\mathrm{plan}`, meaning: 'advance read; planned at the chosen speed', unit: 'crank °' },
      ],
      sources: [], basis: 'geometry',
    },
    {
      id: 'bench-deviation', title: 'Deviation, stagger, scatter', tex: String.raw`e = \alpha_\mathrm{read} - \alpha_\mathrm{plan}, \qquad |e| \leq \tau, \qquad \sigma = \bar{\alpha}_\mathrm{A} - \bar{\alpha}_\mathrm{B}`,
      note: 'Plus is early. Scatter is range and sample standard deviation over the cylinders of one channel at one speed.',
      symbols: [
        { tex: 'e', meaning: 'deviation', unit: '°' },
        { tex: String.raw`\tau`, meaning: 'tolerance', unit: '°', range: '0 and up' },
        { tex: String.raw`\sigma`, meaning: 'stagger of the channel means', unit: '°' },
        { tex: String.raw`\alpha_\mathrm{read}, \alpha_\mathrm{plan}`, meaning: 'advance read and planned', unit: '°' },
      ],
      sources: [], basis: 'definition',
    },
    {
      id: 'bench-retard', title: 'Finding the retard step', tex: String.raw`e' = \alpha_\mathrm{read} - \alpha_\mathrm{plan, no\,retard}, \qquad \text{retarded where } e' < -\tfrac{1}{2}\, r`,
      note: 'Found when every retarded speed lies below every other, readings with speed rising.',
      symbols: [
        { tex: 'r', meaning: 'retard of the plan', unit: '°', range: 'more than 0' },
        { tex: "e'", meaning: 'deviation from the plan without its retard', unit: '°' },
        { tex: String.raw`\alpha_\mathrm{read}`, meaning: 'advance read', unit: '°' },
      ],
      sources: [], basis: 'choice of this program',
    },
  ],
  weaknesses: [
    'A bench is cool, even and unloaded. Heat, vibration and supply voltage of the aircraft are not on it.',
    'The tolerance judges the reading; how well the wheel can be read is part of the tolerance stack, not of this verdict.',
  ],
})
