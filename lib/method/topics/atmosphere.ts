import { defineTopic } from '../topic'

export const atmosphere = defineTopic({
  id: 'atmosphere',
  title: 'Atmosphere and power with height',
  intro: 'The standard atmosphere up to 11 000 m, with temperatures other than standard, and what thin air leaves of an unsupercharged engine.',
  functions: ['standardAtmosphere', 'densityAltitudeM', 'powerAtDensityRatio'],
  equations: [
    {
      id: 'standard-atmosphere', title: 'Temperature, pressure, density', tex: String.raw`T = 288.15 - 0.0065\, h, \qquad p = 101.325 \left(\frac{T}{288.15}\right)^{g_0/(0.0065\, R)}, \qquad \sigma = \frac{p}{101.325}\cdot\frac{288.15}{T + \Delta T}`,
      note: 'An offset of temperature leaves the pressure as it is.',
      symbols: [
        { tex: 'h', meaning: 'geopotential height', unit: 'm', range: '−1000 to 11 000' },
        { tex: 'T', meaning: 'standard temperature there', unit: 'K' },
        { tex: String.raw`\Delta T`, meaning: 'offset from it', unit: 'K' },
        { tex: 'p', meaning: 'pressure', unit: 'kPa' },
        { tex: String.raw`\sigma`, meaning: 'density over 1.225 kg/m³', unit: 'no unit' },
        { tex: 'g_0, R', meaning: '9.80665 and 8314.32/28.9644', unit: 'm/s², J/(kg·K)' },
      ],
      sources: ['us-standard-atmosphere-1976'],
    },
    {
      id: 'density-altitude', title: 'Density altitude', tex: String.raw`\sigma\!\left(h_\rho\right) = \frac{p(h_\mathrm{p})}{101.325}\cdot\frac{288.15}{T}`,
      symbols: [
        { tex: String.raw`h_\rho`, meaning: 'height at which standard air is as dense', unit: 'm', range: '−5000 to 11 000' },
        { tex: String.raw`h_\mathrm{p}`, meaning: 'pressure altitude', unit: 'm', range: '−1000 to 11 000' },
        { tex: 'T', meaning: 'air temperature', unit: 'K', range: 'more than 0' },
        { tex: String.raw`\sigma(h)`, meaning: 'density ratio of the standard atmosphere', unit: 'no unit' },
        { tex: 'p(h)', meaning: 'its pressure', unit: 'kPa' },
      ],
      sources: ['us-standard-atmosphere-1976'],
    },
    {
      id: 'power-lapse', title: 'Power in thin air', tex: String.raw`\frac{P}{P_0} = 1.132\,\sigma - 0.132`,
      symbols: [
        { tex: 'P, P_0', meaning: 'full-throttle power here and at sea level, at one speed', unit: 'kW' },
        { tex: String.raw`\sigma`, meaning: 'density ratio', unit: 'no unit', range: 'more than 0' },
      ],
      sources: ['gagg-ferrar-1934'],
    },
  ],
  weaknesses: [
    'Humid air makes less power than dry air of the same density; moisture is left out.',
    'The lapse was fitted on aircraft engines of the early 1930s at constant speed. How closely another engine, intake or mixture follows it is not known.',
  ],
})
