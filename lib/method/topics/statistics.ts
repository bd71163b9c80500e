import { defineTopic } from '../topic'

export const statistics = defineTopic({
  id: 'statistics',
  title: 'Trend, capability and control',
  intro: 'How timing creeps with engine hours, and how evenly the shop makes its units.',
  functions: ['linearTrend', 'leastSquares', 'processCapability', 'cpkInterval', 'individualsChart', 'controlChartFactors'],
  equations: [
    {
      id: 'trend', title: 'Trend and its band', tex: String.raw`\hat{y}(h) = b_0 + b_1 h \;\pm\; t_\nu\, s \sqrt{1 + \frac{1}{N} + \frac{(h - \bar{h})^2}{\sum (h_i - \bar{h})^2}}`,
      note: 'Hours to the limit are counted from the last check, and given only where the slope is larger than its own uncertainty.',
      symbols: [
        { tex: 'h, y', meaning: 'engine hours, value', unit: 'h, °', range: 'three points, two distinct hours' },
        { tex: 'b_0, b_1', meaning: 'intercept and slope, least squares', unit: '°, °/h' },
        { tex: 's', meaning: 'residual standard deviation', unit: '°' },
        { tex: String.raw`t_\nu`, meaning: 'Student t, N − 2 degrees of freedom', unit: 'no unit' },
        { tex: 'N', meaning: 'number of points', unit: 'no unit', range: '3 and up' },
      ],
      sources: ['nist-norris'],
    },
    {
      id: 'least-squares', title: 'Least squares of several columns', tex: String.raw`\min_{b} \sum_i \left(y_i - \sum_j x_{ij}\, b_j\right)^2, \qquad s = \sqrt{\frac{1}{N - p} \sum_i \left(y_i - \sum_j x_{ij}\, b_j\right)^2}`,
      note: 'By reflections, never by the normal equations. Columns that follow from each other are refused.',
      symbols: [
        { tex: 'y_i', meaning: 'values', unit: 'that of the values' },
        { tex: 'x_{ij}', meaning: 'columns; a constant term is a column of ones', unit: 'that of the column' },
        { tex: 'b_j', meaning: 'coefficients', unit: 'value over column' },
        { tex: 's', meaning: 'residual standard deviation', unit: 'that of the values' },
        { tex: 'N, p', meaning: 'number of values, of columns', unit: 'no unit', range: 'more values than columns' },
      ],
      sources: ['nist-norris', 'nist-pontius', 'nist-longley', 'nist-misra1a'],
    },
    {
      id: 'capability', title: 'Process capability', tex: String.raw`C_p = \frac{U - L}{6 s}, \qquad C_{pk} = \frac{\min\left(U - \bar{x},\, \bar{x} - L\right)}{3 s}, \qquad C_{pm} = \frac{U - L}{6\sqrt{s^2 + (\bar{x} - T)^2}}`,
      symbols: [
        { tex: 'U, L', meaning: 'upper and lower limit', unit: 'that of the values', range: 'upper above lower' },
        { tex: String.raw`\bar{x}, s`, meaning: 'mean and sample standard deviation', unit: 'that of the values', range: 's not 0' },
        { tex: 'T', meaning: 'target, the middle unless given', unit: 'that of the values' },
        { tex: 'C_p, C_{pk}, C_{pm}', meaning: 'capability: of the spread, of the worse side, about the target', unit: 'no unit' },
      ],
      sources: ['nist-handbook'],
    },
    {
      id: 'capability-interval', title: 'How sure a capability is', tex: String.raw`C_{pk} \pm z \sqrt{\frac{1}{9 N} + \frac{C_{pk}^2}{2\,(N - 1)}}`,
      note: 'An approximation for values that spread normally.',
      symbols: [
        { tex: 'C_{pk}', meaning: 'capability of the worse side, as above', unit: 'no unit' },
        { tex: 'z', meaning: 'normal value of the coverage asked for', unit: 'no unit' },
        { tex: 'N', meaning: 'number of values', unit: 'no unit', range: '2 and up; good from about 25' },
      ],
      sources: ['bissell-1990'],
    },
    {
      id: 'individuals-chart', title: 'Control chart of single values', tex: String.raw`\bar{x} \pm 3\,\frac{\overline{MR}}{1.128}, \qquad MR_\mathrm{upper} = 3.267\,\overline{MR}`,
      symbols: [
        { tex: String.raw`\overline{MR}`, meaning: 'mean of the steps between neighbours', unit: 'that of the values', range: 'two values at least' },
        { tex: String.raw`\bar{x}`, meaning: 'mean of the values', unit: 'that of the values' },
      ],
      sources: ['nist-handbook'],
    },
    {
      id: 'chart-factors', title: 'Factors for charts of groups', tex: String.raw`d_2 = \int \left(1 - \Phi^N - (1 - \Phi)^N\right) \mathrm{d}x, \qquad c_4 = \sqrt{\frac{2}{N - 1}}\,\frac{\Gamma\left(\tfrac{N}{2}\right)}{\Gamma\left(\tfrac{N - 1}{2}\right)}, \qquad D = 1 \pm \frac{3\, d_3}{d_2}, \qquad B = 1 \pm \frac{3 \sqrt{1 - c_4^2}}{c_4}`,
      symbols: [
        { tex: 'N', meaning: 'values in a group', unit: 'no unit', range: '2 to 100' },
        { tex: 'd_2, d_3', meaning: 'mean and standard deviation of a range over the standard deviation of the values', unit: 'no unit' },
        { tex: 'c_4', meaning: 'mean of a sample standard deviation over that of the values', unit: 'no unit' },
        { tex: String.raw`\Phi, x`, meaning: 'share of the normal distribution below x; place in it', unit: 'no unit' },
        { tex: String.raw`\Gamma`, meaning: 'gamma function', unit: 'no unit' },
        { tex: 'D, B', meaning: 'limits of a range and of a standard deviation over their means, not below 0', unit: 'no unit' },
      ],
      sources: ['chart-constants'],
    },
  ],
  weaknesses: [
    'A straight line is the simplest creep there is. A part that lets go at once gives no warning in any trend.',
    'Capability figures from a few dozen units are loose: a Cpk of 1.0 from 25 units may as well be 0.7 or 1.3.',
  ],
})
