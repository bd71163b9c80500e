import { defineTopic } from '../topic'

export const angleAndTime = defineTopic({
  id: 'angle-and-time',
  title: 'Angle, time and arc',
  intro: 'Angles are crank degrees unless a name says distributor. Everything that takes time, a delay or a spark, becomes an angle that grows with speed.',
  functions: ['crankDegFromMs', 'msFromCrankDeg', 'distributorDegFromCrank', 'crankDegFromDistributor', 'arcMm', 'degFromArcMm', 'firingSchedule'],
  equations: [
    {
      id: 'crank-time', title: 'Crank angle turned in a time', tex: String.raw`\theta = 0.006\, n\, t`,
      symbols: [
        { tex: String.raw`\theta`, meaning: 'crank angle', unit: '°' },
        { tex: 'n', meaning: 'engine speed', unit: 'rpm', range: 'more than 0 where time is asked for' },
        { tex: 't', meaning: 'time', unit: 'ms' },
      ],
      sources: ['timing-arithmetic'],
    },
    {
      id: 'half-speed', title: 'Distributor and crank', tex: String.raw`\theta_\mathrm{d} = \tfrac{1}{2}\,\theta`,
      note: 'The distributor of a four-stroke engine turns once for two turns of the crank.',
      symbols: [
        { tex: String.raw`\theta_\mathrm{d}`, meaning: 'distributor angle', unit: '°' },
        { tex: String.raw`\theta`, meaning: 'crank angle', unit: '°' },
      ],
      sources: [], basis: 'geometry',
    },
    {
      id: 'arc', title: 'Arc on a damper or a plate', tex: String.raw`s = \frac{\pi\, D\, \theta}{360}`,
      symbols: [
        { tex: 's', meaning: 'arc', unit: 'mm' },
        { tex: 'D', meaning: 'diameter on which the marks stand', unit: 'mm', range: 'more than 0' },
        { tex: String.raw`\theta`, meaning: 'angle', unit: '°' },
      ],
      sources: ['timing-arithmetic'],
    },
    {
      id: 'firing-schedule', title: 'When each cylinder fires', tex: String.raw`\varphi_1 = 0, \qquad \varphi_{i+1} = \varphi_i + \Delta_i, \qquad \sum_{i=1}^{N} \Delta_i = 720`,
      note: 'Without intervals of its own an engine fires evenly, each interval 720/N.',
      symbols: [
        { tex: String.raw`\varphi_i`, meaning: 'crank angle of the i-th firing, the first at 0', unit: '°', range: '0 to below 720' },
        { tex: String.raw`\Delta_i`, meaning: 'interval from this firing to the next', unit: '°', range: 'more than 0; together 720 to 0.000001' },
        { tex: 'N', meaning: 'number of cylinders', unit: 'no unit', range: '1 and up' },
      ],
      sources: [], basis: 'geometry',
    },
  ],
  weaknesses: [
    'A crank does not turn evenly: while cranking it slows before each top dead centre, and a delay there takes a smaller angle than the mean speed says.',
    'Backlash in the drive of a distributor is not in these angles.',
  ],
})
