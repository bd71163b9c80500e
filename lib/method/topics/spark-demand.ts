import { defineTopic } from '../topic'

export const sparkDemand = defineTopic({
  id: 'spark-demand',
  title: 'Voltage a spark needs',
  intro: 'Denser gas insulates better. A later spark meets higher pressure and asks for more voltage; the coil’s energy and the capacitance of leads and plug say what there is.',
  functions: ['breakdownKv', 'sparkDemandKv', 'sparkMargin'],
  equations: [
    {
      id: 'breakdown', title: 'Breakdown of a gap', tex: String.raw`U = 24.22\,\delta d + 6.08 \sqrt{\delta d}, \qquad \delta = \frac{p}{101.325}\cdot\frac{293.15}{T}`,
      symbols: [
        { tex: 'U', meaning: 'breakdown voltage in a uniform field', unit: 'kV' },
        { tex: 'd', meaning: 'gap', unit: 'cm', range: 'more than 0' },
        { tex: String.raw`\delta`, meaning: 'density of the gas over that at 20 °C and one atmosphere', unit: 'no unit', range: 'more than 0' },
        { tex: 'p, T', meaning: 'pressure and temperature in the gap', unit: 'kPa, K', range: 'more than 0' },
      ],
      sources: ['wadhwa', 'plug-gap-band'],
    },
    {
      id: 'spark-pressure', title: 'Cylinder at the spark', tex: String.raw`p = p_1 \left(\frac{V_1}{V(\alpha)}\right)^{n}, \qquad T = T_1 \left(\frac{V_1}{V(\alpha)}\right)^{n - 1}`,
      symbols: [
        { tex: 'p_1, T_1, V_1', meaning: 'state at inlet-valve closing', unit: 'kPa, K, m³', range: 'more than 0' },
        { tex: String.raw`V(\alpha)`, meaning: 'volume at the spark', unit: 'm³', range: 'spark between inlet closing and exhaust opening' },
        { tex: 'n', meaning: 'polytropic exponent', unit: 'no unit', range: '1.3 unless set' },
      ],
      sources: [], basis: 'definition',
    },
    {
      id: 'spark-offered', title: 'Voltage on offer', tex: String.raw`U_\mathrm{o} = \min\left(U_\mathrm{clamp},\; \sqrt{\frac{2\,\eta\, E}{C}}\right)`,
      symbols: [
        { tex: 'E', meaning: 'energy stored in the coil', unit: 'mJ', range: 'more than 0' },
        { tex: String.raw`\eta`, meaning: 'share of it that reaches the secondary', unit: 'no unit', range: 'above 0, to 1' },
        { tex: 'C', meaning: 'capacitance of secondary, lead and plug', unit: 'pF', range: 'more than 0' },
        { tex: String.raw`U_\mathrm{clamp}`, meaning: 'limit of the driver or of the insulation', unit: 'kV', range: 'more than 0' },
      ],
      sources: [], basis: 'definition',
    },
  ],
  weaknesses: [
    'The formula is for polished spheres, cold and clean. Sharp new edges need less; worn, fouled or wet plugs need more, or leak the charge away.',
    'Motion of the gas, fuel in it and the polarity of the spark are left out.',
    'A spark that has jumped has not yet lit the mixture: energy and duration matter too, most of all in lean or cold mixture.',
  ],
})
