import { defineTopic } from '../topic'

export const coil = defineTopic({
  id: 'coil',
  title: 'Coil: charge, energy, heat',
  intro: 'An ignition coil is a resistance and an inductance on a supply. What it stores depends on how long it is charged; what it suffers depends on how often.',
  functions: ['coilCurrentA', 'stalledCurrentA', 'dwellForCurrentMs', 'sparkEnergyMj', 'sparksPerSecond', 'dwellAvailableMs', 'sparkPeriodShare', 'coilHeat'],
  equations: [
    {
      id: 'coil-current', title: 'Current after a dwell', tex: String.raw`i(t) = \min\left(\frac{V}{R}\left(1 - e^{-Rt/L}\right),\; i_\mathrm{lim}\right)`,
      note: 'An engine that stops with its trigger closed draws what a long dwell would: V/R, or the limit.',
      symbols: [
        { tex: 'i', meaning: 'primary current', unit: 'A' },
        { tex: 'V', meaning: 'voltage at the coil', unit: 'V', range: 'more than 0' },
        { tex: 'R', meaning: 'resistance of the primary circuit', unit: 'Ω', range: 'more than 0' },
        { tex: 'L', meaning: 'primary inductance', unit: 'mH', range: 'more than 0' },
        { tex: 't', meaning: 'dwell', unit: 'ms', range: '0 and up' },
        { tex: String.raw`i_\mathrm{lim}`, meaning: 'limit of the driver, if any', unit: 'A', range: 'more than 0' },
      ],
      sources: ['bird', 'alexander-sadiku'],
    },
    {
      id: 'dwell', title: 'Dwell for a current', tex: String.raw`t = -\frac{L}{R} \ln\left(1 - \frac{i R}{V}\right)`,
      symbols: [
        { tex: 'i', meaning: 'current wanted', unit: 'A', range: 'below V/R, and within the limit' },
        { tex: 't', meaning: 'dwell it takes', unit: 'ms' },
        { tex: 'V', meaning: 'voltage at the coil', unit: 'V', range: 'more than 0' },
        { tex: 'R', meaning: 'resistance of the primary circuit', unit: 'Ω', range: 'more than 0' },
        { tex: 'L', meaning: 'primary inductance', unit: 'mH', range: 'more than 0' },
      ],
      sources: ['bird'],
    },
    {
      id: 'spark-energy', title: 'Energy stored', tex: String.raw`E = \tfrac{1}{2}\, L\, i^2`,
      note: 'Stored in the primary. About half of it arrives at the plug.',
      symbols: [
        { tex: 'E', meaning: 'energy', unit: 'mJ' },
        { tex: 'L', meaning: 'primary inductance', unit: 'mH', range: 'more than 0' },
        { tex: 'i', meaning: 'current when the spark is called for', unit: 'A' },
      ],
      sources: ['bird', 'alexander-sadiku'],
    },
    {
      id: 'sparks-per-second', title: 'Sparks a second, and the time between', tex: String.raw`f = \frac{N n}{120}, \qquad t_\mathrm{max} = \frac{1000\, d}{f}, \qquad s = \frac{f\left(t + t_\mathrm{s}\right)}{1000}`,
      note: 'Twice as many with a wasted spark. A coil with two ends whose cylinders fire together counts as one cylinder with a wasted spark.',
      symbols: [
        { tex: 'f', meaning: 'sparks a second of this coil', unit: '1/s' },
        { tex: 'N', meaning: 'cylinders it serves', unit: 'no unit', range: '1 and up' },
        { tex: 'n', meaning: 'engine speed', unit: 'rpm', range: 'more than 0' },
        { tex: 'd', meaning: 'share of the period that may be dwell', unit: 'no unit', range: 'above 0, to 1' },
        { tex: String.raw`t_\mathrm{max}`, meaning: 'longest dwell', unit: 'ms' },
        { tex: 's', meaning: 'share of the period that dwell and spark take', unit: 'no unit', range: 'beyond 1 they do not fit' },
        { tex: String.raw`t, t_\mathrm{s}`, meaning: 'dwell; time the spark burns', unit: 'ms', range: '0 and up' },
      ],
      sources: ['timing-arithmetic'],
    },
    {
      id: 'coil-heat', title: 'Winding temperature', tex: String.raw`T = T_\mathrm{a} + R_\mathrm{th}\, f \int_0^{t} R(T)\, i^2 \,\mathrm{d}t, \qquad R(T) = R_\mathrm{ref}\,\frac{1 + 0.00393\,(T - 293.15)}{1 + 0.00393\,(T_\mathrm{ref} - 293.15)}`,
      note: 'The lowest temperature that satisfies it. Hot copper has more resistance, and beyond a point there is no such temperature: the coil runs away, and the program says so.',
      symbols: [
        { tex: 'T', meaning: 'winding temperature', unit: 'K', range: 'up to the highest allowed, 453.15 unless set' },
        { tex: String.raw`T_\mathrm{a}`, meaning: 'air around the coil', unit: 'K', range: 'more than 0' },
        { tex: String.raw`R_\mathrm{th}`, meaning: 'thermal resistance from winding to air', unit: 'K/W', range: 'more than 0' },
        { tex: String.raw`R_\mathrm{ref}, T_\mathrm{ref}`, meaning: 'resistance measured, and at which temperature', unit: 'Ω, K' },
        { tex: 'R(T)', meaning: 'resistance at that temperature', unit: 'Ω' },
        { tex: 'f', meaning: 'sparks a second', unit: '1/s' },
        { tex: 't, i', meaning: 'dwell; current during it', unit: 'ms, A' },
      ],
      sources: ['copper-resistance'], basis: 'definition',
    },
  ],
  weaknesses: [
    'Inductance is taken as constant. An iron core saturates: near its limit the current rises faster and the stored energy grows less than ½LI² says.',
    'Only the primary’s copper is heated. Losses of the core, the secondary and the driver come on top.',
    'One thermal resistance stands for a whole installation; it changes with airflow, and after shutdown there is none.',
  ],
})
