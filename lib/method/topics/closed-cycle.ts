import { defineTopic } from '../topic'

export const closedCycle = defineTopic({
  id: 'closed-cycle',
  title: 'Pressure in the cylinder',
  intro: 'One zone of gas from inlet-valve closing to exhaust-valve opening: compressed, burned along a fixed curve, cooled by the walls. It tells settings of one engine apart; it clears nothing for flight.',
  functions: ['simulateCycle', 'chargePressureFromVolumetricEfficiency', 'combustionEfficiency', 'findMbt', 'scaleBurn', 'calibrateBurn', 'cylinderVolumeCc', 'pistonTravelMm', 'burnedFraction', 'wallHeatTransfer'],
  equations: [
    {
      id: 'cylinder-volume', title: 'Volume against crank angle', tex: String.raw`V(\theta) = \frac{V_\mathrm{d}}{\epsilon - 1} + \frac{\pi B^2}{4}\left(r + l - r\cos\theta - \sqrt{l^2 - r^2 \sin^2\theta}\right)`,
      symbols: [
        { tex: 'B', meaning: 'bore', unit: 'mm', range: 'more than 0' },
        { tex: 'r', meaning: 'half the stroke', unit: 'mm', range: 'more than 0' },
        { tex: 'l', meaning: 'length of the rod between centres', unit: 'mm', range: 'more than r' },
        { tex: String.raw`\epsilon`, meaning: 'compression ratio', unit: 'no unit', range: 'more than 1' },
        { tex: String.raw`V_\mathrm{d}`, meaning: 'displacement of one cylinder', unit: 'cm³' },
        { tex: String.raw`\theta`, meaning: 'crank angle, 0 at firing top dead centre', unit: '°', range: 'inlet closing to exhaust opening' },
      ],
      sources: ['gupta'], basis: 'geometry',
    },
    {
      id: 'charge', title: 'Charge in the cylinder', tex: String.raw`m = \frac{p_1 V_1}{R T_1}, \qquad m_\mathrm{f} = \frac{m\,(1 - x_\mathrm{r})}{1 + \lambda}, \qquad p_1 = \eta_\mathrm{v}\, \rho_\mathrm{a} V_\mathrm{d}\, \frac{R\, T_1}{V_1\,(1 - x_\mathrm{r})\,\lambda/(1 + \lambda)}`,
      note: 'Pressure at inlet-valve closing, not in the manifold: the piston is already rising. In a scenario it is solved so that the cycle makes the power the engine is said to make; a charge guessed too thin would hide detonation.',
      symbols: [
        { tex: 'p_1, T_1, V_1', meaning: 'state at inlet-valve closing', unit: 'kPa, K, m³', range: 'more than 0' },
        { tex: String.raw`x_\mathrm{r}`, meaning: 'share of burned gas left from before', unit: 'no unit', range: '0 to below 1' },
        { tex: String.raw`\lambda`, meaning: 'air to fuel by mass', unit: 'no unit', range: 'more than 0' },
        { tex: String.raw`\eta_\mathrm{v}`, meaning: 'volumetric efficiency', unit: 'no unit', range: 'more than 0' },
        { tex: String.raw`\rho_\mathrm{a}`, meaning: 'density of the air outside', unit: 'kg/m³', range: 'more than 0' },
        { tex: 'R', meaning: 'gas constant, 287', unit: 'J/(kg·K)' },
        { tex: String.raw`m, m_\mathrm{f}`, meaning: 'mass of the charge; of the fuel in it', unit: 'kg' },
        { tex: String.raw`V_\mathrm{d}`, meaning: 'displacement of one cylinder', unit: 'm³' },
      ],
      sources: [], basis: 'definition',
    },
    {
      id: 'wiebe', title: 'Share burned', tex: String.raw`x(\theta) = 1 - \exp\left(-a\left(\frac{\theta - \theta_0}{\Delta\theta}\right)^{m+1}\right), \qquad \theta_0 = -\alpha + \theta_\mathrm{d}`,
      note: 'What is left at the end, e to the minus a, is never released.',
      symbols: [
        { tex: 'x', meaning: 'share of the fuel burned', unit: 'no unit', range: '0 to 1' },
        { tex: String.raw`\alpha`, meaning: 'advance of the spark', unit: '°' },
        { tex: String.raw`\theta_\mathrm{d}`, meaning: 'delay until burning shows', unit: '°', range: '0 and up' },
        { tex: String.raw`\Delta\theta`, meaning: 'duration of the burn', unit: '°', range: 'more than 0' },
        { tex: 'a, m', meaning: 'shape of the curve, 5 and 2 unless set', unit: 'no unit', range: 'more than 0; 0 and up' },
        { tex: String.raw`\theta, \theta_0`, meaning: 'crank angle; where burning begins', unit: '°', range: 'inlet closing to exhaust opening' },
      ],
      sources: ['trade', 'ferguson-kirkpatrick'],
    },
    {
      id: 'cycle-pressure', title: 'Pressure step by step', tex: String.raw`\frac{\mathrm{d}p}{\mathrm{d}\theta} = -\gamma\,\frac{p}{V}\,\frac{\mathrm{d}V}{\mathrm{d}\theta} + \frac{\gamma - 1}{V}\,\left(\eta_\mathrm{c}\, m_\mathrm{f} H\,\frac{\mathrm{d}x}{\mathrm{d}\theta} - \frac{\mathrm{d}Q_\mathrm{w}}{\mathrm{d}\theta}\right)`,
      note: 'Fourth-order Runge–Kutta in equal steps, cut at the start of the burn, at nine tenths of it and at its end, so that no step straddles a change of the equations.',
      symbols: [
        { tex: 'p', meaning: 'pressure', unit: 'kPa' },
        { tex: String.raw`\gamma`, meaning: 'ratio of specific heats', unit: 'no unit', range: 'above 1, to 1.67; or with temperature' },
        { tex: String.raw`\eta_\mathrm{c}`, meaning: 'combustion efficiency', unit: 'no unit', range: 'above 0, to 1' },
        { tex: 'H', meaning: 'heating value of the fuel', unit: 'kJ/kg', range: '44 000 unless set' },
        { tex: String.raw`Q_\mathrm{w}`, meaning: 'heat to the walls', unit: 'J' },
        { tex: String.raw`V, \theta`, meaning: 'volume; crank angle', unit: 'm³, °' },
        { tex: String.raw`m_\mathrm{f}, x`, meaning: 'mass of fuel; share burned', unit: 'kg, no unit' },
      ],
      sources: ['ferguson-kirkpatrick'],
    },
    {
      id: 'gamma-temperature', title: 'Specific heats with temperature', tex: String.raw`\gamma = 1.338 - 6.0 \times 10^{-5}\, T + 1.0 \times 10^{-8}\, T^2, \qquad T = \frac{pV}{mR}`,
      symbols: [
        { tex: 'T', meaning: 'mean gas temperature', unit: 'K', range: 'fitted up to 3000, where it turns; beyond that a notice is given' },
        { tex: String.raw`\gamma`, meaning: 'ratio of specific heats', unit: 'no unit' },
        { tex: 'p, V, m, R', meaning: 'pressure, volume, mass, gas constant 287', unit: 'Pa, m³, kg, J/(kg·K)' },
      ],
      sources: ['gamma-fit'],
    },
    {
      id: 'wall-heat', title: 'Heat to the walls', tex: String.raw`h = 3.26\, B^{-0.2} p^{0.8}\, T^{-0.55} w^{0.8}, \qquad w = 2.28\, \bar{S}_\mathrm{p} + c_2\,\frac{V_\mathrm{d} T_1}{p_1 V_1}\,\max\left(0,\, p - p_\mathrm{m}\right), \qquad \frac{\mathrm{d}Q_\mathrm{w}}{\mathrm{d}\theta} = \frac{h A\,(T - T_\mathrm{w})}{6\, n}`,
      symbols: [
        { tex: 'h', meaning: 'heat-transfer coefficient', unit: 'W/(m²·K)' },
        { tex: 'B', meaning: 'bore', unit: 'm' },
        { tex: 'p', meaning: 'pressure', unit: 'kPa' },
        { tex: 'w', meaning: 'mean gas speed', unit: 'm/s' },
        { tex: String.raw`\bar{S}_\mathrm{p}`, meaning: 'mean piston speed', unit: 'm/s' },
        { tex: 'c_2', meaning: '0.00324 once burning has begun, 0 before', unit: 'm/(s·K)' },
        { tex: String.raw`p_\mathrm{m}`, meaning: 'pressure without burning, exponent 1.3', unit: 'kPa' },
        { tex: 'A', meaning: 'surface of head, piston and liner exposed', unit: 'm²' },
        { tex: String.raw`T_\mathrm{w}`, meaning: 'wall temperature', unit: 'K', range: 'more than 0' },
        { tex: 'T', meaning: 'gas temperature', unit: 'K' },
        { tex: String.raw`V_\mathrm{d}, V_1, T_1, p_1`, meaning: 'displacement; state at inlet-valve closing', unit: 'm³, K, kPa' },
        { tex: String.raw`Q_\mathrm{w}, \theta, n`, meaning: 'heat to the walls; crank angle; speed', unit: 'J, °, rpm' },
      ],
      sources: ['woschni-1967'],
    },
    {
      id: 'combustion-efficiency', title: 'Fuel that can burn', tex: String.raw`\eta_\mathrm{c} = 0.97\,\min\left(1,\, \frac{\lambda}{14.6}\right)`,
      note: 'Offered, not imposed: rich mixture lacks the air for all of its fuel.',
      symbols: [
        { tex: String.raw`\lambda`, meaning: 'air to fuel by mass', unit: 'no unit', range: 'more than 0' },
        { tex: String.raw`\eta_\mathrm{c}`, meaning: 'share of the heat of the fuel that can be released', unit: 'no unit' },
      ],
      sources: [], basis: 'choice of this program',
    },
    {
      id: 'mbt', title: 'Spark of best torque', tex: String.raw`\alpha_\mathrm{MBT} = \arg\max_{-20 \leq \alpha \leq 60} \int p\,\mathrm{d}V`,
      note: 'A scenario has one best-torque timing, with where it came from. Delay and duration of the burn are scaled together until the cycle agrees with it to 0.01°; where no burn of 30° to 140° does, the results of the cycle are withheld.',
      symbols: [
        { tex: String.raw`\alpha_\mathrm{MBT}`, meaning: 'advance of greatest work', unit: '°', range: '−20 to 60, to 0.01' },
        { tex: 'p, V', meaning: 'pressure and volume through the closed part', unit: 'Pa, m³' },
      ],
      sources: [], basis: 'definition',
    },
    {
      id: 'burn-scaling', title: 'Burn with speed and charge', tex: String.raw`\Delta\theta = \Delta\theta_0 \left(\frac{n}{n_0}\right)^{1/3} \left(\frac{p}{p_0}\right)^{-1/4}`,
      note: 'The delay is scaled alike. Used for maps; without it best torque would hardly move with speed.',
      symbols: [
        { tex: String.raw`\Delta\theta_0, n_0, p_0`, meaning: 'burn, speed and charge pressure of the reference', unit: '°, rpm, kPa', range: 'more than 0' },
        { tex: 'n, p', meaning: 'speed and charge pressure wanted', unit: 'rpm, kPa', range: 'more than 0' },
      ],
      sources: ['hires-1978'],
    },
  ],
  weaknesses: [
    'One zone has no hot and cold gas: the peak temperature it gives is a mean, and heat lost to the walls is right only on the whole.',
    'The burn is prescribed. It does not know plugs, swirl, a second flame or a cold day; it is made to agree with one measured best-torque angle and is trusted only near it.',
    'Mean effective pressure here is that of the closed part. Pumping is in the friction figure, so the two must not be mixed to two digits.',
    'No two cycles burn alike. The faster ones in a hundred stand several degrees ahead of this mean cycle.',
  ],
})
