import { defineTopic } from '../topic'

export const checks = defineTopic({
  id: 'checks',
  title: 'Checks in the hangar',
  intro: 'A timing light at idle and the drop at run-up, judged against the plan. A reading that says nothing about running timing is not judged at all.',
  functions: ['evaluateTimingCheck', 'evaluateRunUp'],
  equations: [
    {
      id: 'timing-check', title: 'Timing check', tex: String.raw`e = \alpha_\mathrm{read} - \alpha_\mathrm{plan}(n), \qquad \text{within: } |e| \leq \tau`,
      note: 'Below the threshold of the crank retard, and in its hysteresis, nothing can be passed or signed: a unit set there would run early by the whole retard.',
      symbols: [
        { tex: 'e', meaning: 'deviation, plus is early', unit: '°' },
        { tex: 'n', meaning: 'speed of the check', unit: 'rpm', range: '0 and up' },
        { tex: String.raw`\tau`, meaning: 'tolerance', unit: '°', range: '0 and up' },
        { tex: String.raw`\alpha_\mathrm{read}, \alpha_\mathrm{plan}`, meaning: 'advance read and planned', unit: '°' },
      ],
      sources: ['trade'],
    },
    {
      id: 'run-up-check', title: 'Run-up check', tex: String.raw`d = n_\mathrm{both} - n_\mathrm{channel}, \qquad \text{within: } |d - d_\mathrm{exp}| \leq \tau_n`,
      note: 'Without a reading on both channels the primary is the reference. Each channel has an expected drop of its own: none at all on the backup means it was not selected, the other stayed live, or it fires early.',
      symbols: [
        { tex: 'd', meaning: 'drop', unit: 'rpm' },
        { tex: String.raw`d_\mathrm{exp}`, meaning: 'drop expected', unit: 'rpm' },
        { tex: String.raw`\tau_n`, meaning: 'tolerance', unit: 'rpm', range: '0 and up' },
        { tex: String.raw`n_\mathrm{both}, n_\mathrm{channel}`, meaning: 'speed on both channels and on one', unit: 'rpm', range: 'more than 0' },
      ],
      sources: ['trade'],
    },
  ],
  handbook: [
    { says: 'With two plugs in a cylinder a drop of 25 to 75 rpm, even on both sides, is usual; aeroplane handbooks allow up to 125 to 175 and 50 between the sides. With one plug in a cylinder these figures do not hold, and the aircraft’s own govern.', source: 'faa-powerplant' },
    { says: 'No drop at all points to a channel that is still live when it is switched off, or to one timed early.', source: 'faa-powerplant' },
    { says: 'A condition inspection within 12 calendar months comes from the aircraft’s operating limitations, to the scope of Part 43 Appendix D; the entry carries date, total time, name, signature and certificate. The rules where the aircraft flies govern.', source: 'far-91-319' },
  ],
  weaknesses: [
    'A light shows the spark it is clipped to. Crossfire and a swapped lead look like good timing.',
    'Wind, oil temperature and a tachometer’s own error move a run-up by as much as a degree of timing does.',
  ],
})
