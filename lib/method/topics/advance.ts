import { defineTopic } from '../topic'

export const advance = defineTopic({
  id: 'advance',
  title: 'Advance of a channel, and stagger',
  intro: 'Each channel has a schedule, perhaps a retard for cranking, and an electronic delay. Advance is plus before top dead centre.',
  functions: ['sparkAdvanceDeg', 'advanceCurve', 'staggerDeg', 'proofSpeedRpm', 'staggerReport'],
  equations: [
    {
      id: 'spark-advance', title: 'Advance at a speed', tex: String.raw`\alpha(n) = S(n, p) - \begin{cases} r & \text{while } n < n_\mathrm{r} \\ 0 & \text{otherwise} \end{cases} - 6 \times 10^{-6}\, n\, \ell`,
      note: 'Once the retard has let go with speed rising, it comes back only below the threshold less the hysteresis.',
      symbols: [
        { tex: String.raw`\alpha`, meaning: 'advance', unit: '°' },
        { tex: 'S', meaning: 'schedule: fixed, mechanical, table, map or formula', unit: '°' },
        { tex: 'n', meaning: 'engine speed', unit: 'rpm', range: '0 and up' },
        { tex: 'p', meaning: 'manifold pressure, where the schedule uses it', unit: 'kPa', range: 'more than 0' },
        { tex: 'r', meaning: 'crank retard', unit: '°', range: '0 and up' },
        { tex: String.raw`n_\mathrm{r}`, meaning: 'threshold of the retard', unit: 'rpm', range: 'more than 0' },
        { tex: String.raw`\ell`, meaning: 'electronic delay', unit: 'µs', range: '0 and up' },
      ],
      sources: ['trade'], basis: 'definition',
    },
    {
      id: 'linear-schedule', title: 'Between two points of a schedule', tex: String.raw`S(n) = S_1 + \left(S_2 - S_1\right)\frac{n - n_1}{n_2 - n_1}`,
      note: 'A mechanical advance is flat, then this line, then flat. A table is flat outside its ends. A map does the same over speed and pressure together.',
      symbols: [
        { tex: 'S_1, S_2', meaning: 'advance at the two points', unit: '°' },
        { tex: 'n_1, n_2', meaning: 'their speeds', unit: 'rpm', range: 'ascending' },
      ],
      sources: [], basis: 'arithmetic',
    },
    {
      id: 'stagger', title: 'Stagger of the channels', tex: String.raw`\sigma = \alpha_\mathrm{A} - \alpha_\mathrm{B}, \qquad t_\sigma = \frac{\sigma}{0.006\, n}`,
      note: 'Plus: the backup fires later. Extremes are looked for at both ends, at every break of either schedule and on both sides of each jump.',
      symbols: [
        { tex: String.raw`\sigma`, meaning: 'stagger', unit: '°' },
        { tex: String.raw`\alpha_\mathrm{A}, \alpha_\mathrm{B}`, meaning: 'advance of primary and backup', unit: '°' },
        { tex: String.raw`t_\sigma`, meaning: 'stagger in time', unit: 'ms' },
        { tex: 'n', meaning: 'engine speed', unit: 'rpm', range: 'more than 0' },
      ],
      sources: ['trade'], basis: 'definition',
    },
    {
      id: 'proof-speed', title: 'Speed at which a light proves full timing', tex: String.raw`n_\mathrm{p} = \min\left\{\, n \geq n_\mathrm{i} : \left|\alpha(n) - \alpha(n_\mathrm{max})\right| \leq \tau \,\right\}`,
      note: 'Speeds inside the band of the crank retard, its hysteresis included, do not count.',
      symbols: [
        { tex: String.raw`n_\mathrm{p}`, meaning: 'lowest speed that proves it; there may be none', unit: 'rpm' },
        { tex: String.raw`n_\mathrm{i}, n_\mathrm{max}`, meaning: 'idle and full speed', unit: 'rpm', range: 'idle below full' },
        { tex: String.raw`\tau`, meaning: 'tolerance of the timing check', unit: '°', range: '0 and up' },
        { tex: String.raw`\alpha`, meaning: 'advance', unit: '°' },
      ],
      sources: ['trade'],
    },
  ],
  weaknesses: [
    'Springs, weights and pivots of a mechanical advance stick and wear; the schedule is what it is set to be, not what it does after five years.',
    'A delay is taken as constant. Real electronics drift with heat and supply, and some shorten their delay as the speed rises.',
    'A formula is sampled each 1 rpm: a peak narrower than that can be missed.',
  ],
})
