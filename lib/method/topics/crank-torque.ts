import { defineTopic } from '../topic'

export const crankTorque = defineTopic({
  id: 'crank-torque',
  title: 'Crank torque and shaking orders',
  intro: 'Pressure and moving mass of every cylinder added over two turns of the crank, and the result taken apart into orders.',
  functions: ['crankTorque'],
  equations: [
    {
      id: 'crank-torque-sum', title: 'Torque over the cycle', tex: String.raw`T(\varphi) = \sum_{j=1}^{N} \left[\left(p_j - p_\mathrm{cc}\right) A\,\frac{\mathrm{d}x}{\mathrm{d}\varphi} - m_\mathrm{r}\,\omega^2\, x''\, x'\right]`,
      note: 'Outside the closed part a cylinder stands at exhaust pressure up to 360° after firing and at intake pressure from there. A dead one is the same without a burn.',
      symbols: [
        { tex: 'T', meaning: 'torque at the crank', unit: 'Nm' },
        { tex: String.raw`p_j, p_\mathrm{cc}`, meaning: 'pressure in cylinder j and in the crankcase', unit: 'kPa' },
        { tex: 'A', meaning: 'piston area', unit: 'm²' },
        { tex: "x, x', x''", meaning: 'piston travel and its derivatives by crank angle', unit: 'm' },
        { tex: String.raw`m_\mathrm{r}`, meaning: 'mass that goes up and down, one cylinder', unit: 'kg', range: '0 and up' },
        { tex: String.raw`\omega`, meaning: 'crank speed', unit: 'rad/s' },
        { tex: String.raw`\varphi, N`, meaning: 'crank angle; cylinders', unit: 'rad, no unit' },
      ],
      sources: ['plint-martyr'], basis: 'geometry',
    },
    {
      id: 'torque-orders', title: 'Orders', tex: String.raw`a_k = \left|\frac{2}{720} \sum_{\varphi=0}^{719} T(\varphi)\, e^{-\mathrm{i} k \varphi}\right|, \qquad k = \tfrac{1}{2}, 1, \dots, 6`,
      note: 'An engine of N cylinders that fire evenly shakes at N/2 and its multiples. With one cold, the half orders between come up.',
      symbols: [
        { tex: 'a_k', meaning: 'amplitude of order k, k times a turn', unit: 'Nm', range: '0 and up' },
        { tex: String.raw`\varphi`, meaning: 'crank angle in whole degrees', unit: '°', range: '0 to 719' },
        { tex: 'T', meaning: 'torque at the crank', unit: 'Nm' },
        { tex: 'k', meaning: 'order', unit: 'no unit', range: '½ to 6' },
      ],
      sources: ['plint-martyr'],
    },
  ],
  weaknesses: [
    'The crank is stiff here. A real crank and propeller twist, and near a resonance the torque in the shaft is many times what is shown.',
    'All cylinders are alike but for those named dead, and gas exchange is two constant pressures.',
    'Torque about the crank only: forces that shake the mount are not computed.',
  ],
})
