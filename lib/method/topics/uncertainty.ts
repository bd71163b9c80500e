import { defineTopic } from '../topic'

export const uncertainty = defineTopic({
  id: 'uncertainty',
  title: 'Stack of tolerances',
  intro: 'Many small tolerances add up: as a likely spread, and at worst. Both are shown, because a spread hides the rare unit in which all of them lean one way.',
  functions: ['combineUncertainty', 'studentTQuantile', 'normalQuantile'],
  equations: [
    {
      id: 'combined-uncertainty', title: 'Combined uncertainty', tex: String.raw`u = \sqrt{\sum_i c_i^2 u_i^2}, \qquad u_i = \sigma,\; \frac{a}{\sqrt{3}},\; \frac{a}{\sqrt{6}}, \qquad U = k\, u`,
      note: 'Standard deviation of a normal, half width of a rectangular and of a triangular contribution.',
      symbols: [
        { tex: 'u', meaning: 'combined standard uncertainty', unit: 'that of the result' },
        { tex: 'c_i', meaning: 'sensitivity, 1 unless set', unit: 'result over contribution' },
        { tex: 'a', meaning: 'half width', unit: 'that of the contribution', range: '0 and up' },
        { tex: 'k', meaning: 'coverage factor: Student t for 95 %, normal when nothing limits the freedom', unit: 'no unit' },
        { tex: String.raw`u_i, \sigma`, meaning: 'standard uncertainty of a contribution; of a normal one', unit: 'that of the contribution', range: '0 and up' },
        { tex: 'U', meaning: 'expanded uncertainty', unit: 'that of the result' },
      ],
      sources: ['gum-2008'],
    },
    {
      id: 'welch-satterthwaite', title: 'Effective degrees of freedom', tex: String.raw`\nu = \frac{u^4}{\sum_i \left(c_i u_i\right)^4 / \nu_i}`,
      note: 'Kept as the number it is; some tables cut it down to a whole one.',
      symbols: [
        { tex: String.raw`\nu_i`, meaning: 'degrees of freedom of a contribution', unit: 'no unit', range: 'more than 0, or none given' },
        { tex: String.raw`\nu`, meaning: 'effective degrees of freedom', unit: 'no unit' },
        { tex: 'u, c_i, u_i', meaning: 'uncertainties and sensitivities as above', unit: 'that of the result' },
      ],
      sources: ['gum-2008'],
    },
    {
      id: 'student-t', title: 'Student t', tex: String.raw`P = 1 - \tfrac{1}{2}\, I_x\left(\tfrac{\nu}{2}, \tfrac{1}{2}\right), \qquad x = \frac{\nu}{\nu + t^2}`,
      note: 'Solved for t. From 100 000 degrees of freedom an expansion about the normal value takes over; without end it is the normal value.',
      symbols: [
        { tex: 't', meaning: 'value that is not exceeded with the chance P', unit: 'no unit' },
        { tex: 'P', meaning: 'chance; one half plus half the coverage for a band to both sides', unit: 'no unit', range: 'between 0 and 1' },
        { tex: 'I_x, x', meaning: 'regularised incomplete beta function, its argument', unit: 'no unit' },
        { tex: String.raw`\nu`, meaning: 'degrees of freedom, whole or not', unit: 'no unit', range: '0.001 and up' },
      ],
      sources: ['hill-1970', 'wichura-1988'],
    },
    {
      id: 'worst-case', title: 'Worst case', tex: String.raw`w = \sum_i |c_i|\, a_i`,
      note: 'A normal contribution counts at three standard deviations.',
      symbols: [
        { tex: 'w', meaning: 'all contributions at their ends, the same way', unit: 'that of the result' },
        { tex: 'c_i, a_i', meaning: 'sensitivity; half width', unit: 'that of the contribution' },
      ],
      sources: [], basis: 'arithmetic',
    },
  ],
  weaknesses: [
    'Contributions are taken as independent. Two that share a cause, such as one mark used for both channels, add straight and not by squares.',
    'Linear only: a sensitivity that changes across the tolerance is not followed.',
  ],
})
