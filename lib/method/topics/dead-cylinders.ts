import { defineTopic } from '../topic'

export const deadCylinders = defineTopic({
  id: 'dead-cylinders',
  title: 'Dead cylinders and friction',
  intro: 'A cold cylinder gives nothing and is turned by the others. It costs more than its share of brake power, because the friction of the whole engine stays.',
  functions: ['deadCylinderPower', 'morseTest', 'frictionMepKpa', 'mepFromPower', 'powerFromMep'],
  equations: [
    {
      id: 'dead-cylinder-power', title: 'Power with cold cylinders', tex: String.raw`P = \left(r\, P_\mathrm{b} + P_\mathrm{f}\right)\frac{N - k}{N} - P_\mathrm{f} - k\, d, \qquad P_\mathrm{f} = P_\mathrm{b}\left(\frac{1}{\eta_\mathrm{m}} - 1\right)`,
      note: 'May come out negative, and is then shown so. At altitude power lapses first; friction is that of sea level.',
      symbols: [
        { tex: String.raw`P_\mathrm{b}`, meaning: 'brake power with all cylinders, at the reference timing', unit: 'kW', range: 'more than 0' },
        { tex: 'r', meaning: 'torque kept at this timing', unit: 'no unit', range: 'more than 0' },
        { tex: String.raw`P_\mathrm{f}`, meaning: 'friction power', unit: 'kW', range: '0 and up' },
        { tex: 'N, k', meaning: 'cylinders, cold ones', unit: 'no unit', range: 'k from 0 to N' },
        { tex: 'd', meaning: 'further drag of a cold cylinder', unit: 'kW', range: '0 and up' },
        { tex: String.raw`\eta_\mathrm{m}`, meaning: 'mechanical efficiency', unit: 'no unit', range: 'above 0, to 1' },
      ],
      sources: ['joel', 'gupta', 'rajput'],
    },
    {
      id: 'morse', title: 'Morse test', tex: String.raw`P_{\mathrm{i},j} = P_\mathrm{b} - P_{\mathrm{b},-j}, \qquad \eta_\mathrm{m} = \frac{P_\mathrm{b}}{\sum_j P_{\mathrm{i},j}}`,
      note: 'The mean loss of brake power with one cylinder cold is therefore 1/(N·ηm), not 1/N.',
      symbols: [
        { tex: String.raw`P_{\mathrm{i},j}`, meaning: 'indicated power of cylinder j', unit: 'kW', range: '0 and up' },
        { tex: String.raw`P_{\mathrm{b},-j}`, meaning: 'brake power with that cylinder cut out, at the same speed', unit: 'kW' },
        { tex: String.raw`P_\mathrm{b}`, meaning: 'brake power with all firing', unit: 'kW', range: 'more than 0' },
        { tex: String.raw`\eta_\mathrm{m}`, meaning: 'mechanical efficiency', unit: 'no unit', range: '0 to 1' },
      ],
      sources: ['joel', 'nag', 'singh', 'gupta', 'rajput'],
    },
    {
      id: 'friction-mep', title: 'Friction against speed', tex: String.raw`p_\mathrm{f} = 97 + 15\,\frac{n}{1000} + 5\left(\frac{n}{1000}\right)^2`,
      symbols: [
        { tex: String.raw`p_\mathrm{f}`, meaning: 'friction mean effective pressure, pumping at wide-open throttle included', unit: 'kPa' },
        { tex: 'n', meaning: 'engine speed', unit: 'rpm', range: '0 and up; fitted on motored car engines of 1000 to 6000' },
      ],
      sources: ['heywood-1988'],
    },
    {
      id: 'mean-effective-pressure', title: 'Mean effective pressure of a four-stroke', tex: String.raw`p_\mathrm{me} = \frac{1.2 \times 10^{8}\, P}{V_\mathrm{d}\, n}`,
      symbols: [
        { tex: String.raw`p_\mathrm{me}`, meaning: 'mean effective pressure', unit: 'kPa' },
        { tex: 'P', meaning: 'power', unit: 'kW' },
        { tex: String.raw`V_\mathrm{d}`, meaning: 'displacement', unit: 'cm³', range: 'more than 0' },
        { tex: 'n', meaning: 'engine speed', unit: 'rpm', range: 'more than 0' },
      ],
      sources: ['x-engineer'],
    },
  ],
  handbook: [
    { says: 'A cold cylinder is found by touch after a short run on the channel that fails; swapping plugs tells a plug from a lead. Ignition off and supply disconnected before hands go in.', source: 'ac-43-13-1b' },
  ],
  weaknesses: [
    'Friction is taken as unchanged when a cylinder goes cold. In truth its rings and bearings carry less, and it pumps and leaks more.',
    'The friction curve is that of car engines with water cooling and belts; an air-cooled aircraft engine differs. The engine’s own figure at rated power sets its height here, the curve its shape.',
    'A cylinder that misfires now and then is neither cold nor firing, and can shake more than a cold one.',
  ],
})
