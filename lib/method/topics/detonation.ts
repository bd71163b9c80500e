import { defineTopic } from '../topic'

export const detonation = defineTopic({
  id: 'detonation',
  title: 'Detonation',
  intro: 'Unburned gas ahead of the flame lights itself if pressure and heat last long enough. The integral says how far that has come by the end of the burn; 1 or more means detonation is to be expected.',
  functions: ['knockLimitedSpark', 'sparkMap', 'sparkMapOf', 'manifoldKpaFromCharge', 'chargeKpaFromManifold', 'autoignitionDelayMs'],
  equations: [
    {
      id: 'knock-delay', title: 'Time to self-ignition', tex: String.raw`\tau = 17.68 \left(\frac{O}{100}\right)^{3.402} p^{-1.7}\, \exp\left(\frac{3800}{T_\mathrm{u}}\right)`,
      symbols: [
        { tex: String.raw`\tau`, meaning: 'time to self-ignition at this state', unit: 'ms' },
        { tex: 'O', meaning: 'octane number of the fuel', unit: 'no unit', range: 'more than 0; fitted on primary reference fuels of 80 to 100' },
        { tex: 'p', meaning: 'pressure', unit: 'atm' },
        { tex: String.raw`T_\mathrm{u}`, meaning: 'temperature of the unburned gas', unit: 'K' },
      ],
      sources: ['douaud-eyzat-1978'],
    },
    {
      id: 'unburned-temperature', title: 'Unburned gas', tex: String.raw`T_\mathrm{u} = T_1 \left(\frac{p}{p_1}\right)^{(\gamma_\mathrm{u} - 1)/\gamma_\mathrm{u}}, \qquad \gamma_\mathrm{u} = 1.33`,
      symbols: [
        { tex: 'T_1, p_1', meaning: 'state at inlet-valve closing', unit: 'K, kPa', range: 'more than 0' },
        { tex: String.raw`T_\mathrm{u}, p`, meaning: 'unburned gas; pressure', unit: 'K, kPa' },
        { tex: String.raw`\gamma_\mathrm{u}`, meaning: 'ratio of specific heats of the unburned gas', unit: 'no unit' },
      ],
      sources: [], basis: 'definition',
    },
    {
      id: 'knock-integral', title: 'Knock integral, octane required', tex: String.raw`I = \int_{\mathrm{ivc}}^{\theta_{90}} \frac{\mathrm{d}t}{\tau}, \qquad O_\mathrm{req} = O\, I^{1/3.402}`,
      symbols: [
        { tex: 'I', meaning: 'knock integral', unit: 'no unit', range: '1 and more: detonation expected' },
        { tex: String.raw`\theta_{90}`, meaning: 'angle at which nine tenths are burned, or exhaust opening', unit: '°' },
        { tex: String.raw`O_\mathrm{req}`, meaning: 'octane at which the integral is 1', unit: 'no unit' },
        { tex: String.raw`t, \tau`, meaning: 'time; time to self-ignition', unit: 'ms' },
        { tex: 'O', meaning: 'octane number of the fuel', unit: 'no unit' },
      ],
      sources: ['livengood-wu-1955', 'douaud-eyzat-1978', 'gasoline-faq'],
    },
    {
      id: 'knock-limit', title: 'Margin to detonation', tex: String.raw`\alpha_\mathrm{K} = \min\left\{\alpha \geq -20 : I(\alpha) \geq 1\right\}, \qquad \text{margin} = \alpha_\mathrm{K} - \alpha`,
      note: 'The first crossing from the late side. The integral turns down again beyond about 45°, so the most advanced spark that passes would sit behind a band that detonates.',
      symbols: [
        { tex: String.raw`\alpha_\mathrm{K}`, meaning: 'limit', unit: '°', range: '−20 to 60 to 0.01; or never, or always' },
        { tex: String.raw`\alpha`, meaning: 'advance planned', unit: '°' },
        { tex: 'I', meaning: 'knock integral with the spark there', unit: 'no unit' },
      ],
      sources: ['douaud-eyzat-1978'],
    },
    {
      id: 'octane-uncertainty', title: 'What the margin is worth', tex: String.raw`\text{margin}\left(O \pm 5\right), \qquad \text{after a clean reference: margin}\left(O \pm 1\right)`,
      note: 'A margin carries ±5 octane numbers, turned into degrees: outside when the value itself is short of its limit, close when only the worse end is. A setting of this engine known to run clean shifts the scale so that the model agrees with it, and ±1 is left. Differences between settings carry none of it.',
      symbols: [{ tex: 'O', meaning: 'octane, on the one scale that was typed for every fuel: no conversion is made', unit: 'no unit' }],
      sources: [], basis: 'choice of this program',
    },
    {
      id: 'spark-map', title: 'Spark over speed and charge', tex: String.raw`\alpha(n, p) = \min\left(\alpha_\mathrm{MBT}(n, p),\, \alpha_\mathrm{K}(n, p)\right), \qquad p_\mathrm{man} = p\,\frac{p_\mathrm{man,full}}{p_\mathrm{full}}`,
      note: 'At each place the burn is scaled from full power. The charge pressure at inlet closing is not the manifold pressure a unit measures: the two are taken to be in proportion, which is right at full throttle only.',
      symbols: [
        { tex: String.raw`\alpha`, meaning: 'spark of the map; of best torque; limit', unit: '°', range: '−20 to 60; none where every spark detonates' },
        { tex: 'n', meaning: 'speed', unit: 'rpm', range: 'more than 0' },
        { tex: String.raw`p, p_\mathrm{man}`, meaning: 'charge pressure at inlet closing; manifold pressure', unit: 'kPa', range: 'more than 0' },
      ],
      sources: [], basis: 'choice of this program',
    },
  ],
  weaknesses: [
    'The constants belong to one engine and to mixtures of two pure fuels. On another engine the octane asked for is right to ±5 at best: trust differences between settings, not the figure.',
    'A hot spot, a glowing plug or a lean cylinder detonates or preignites long before the mean cylinder does. None of it is here.',
    'The mean cycle is judged. The quickest cycles of a running engine come closer to detonation than it does.',
    'A charge guessed too thin hides detonation, which is why the charge is solved from the power the engine makes.',
  ],
})
