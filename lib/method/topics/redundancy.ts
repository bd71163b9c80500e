import { defineTopic } from '../topic'

export const redundancy = defineTopic({
  id: 'redundancy',
  title: 'Redundancy',
  intro: 'Which parts failing together stop the sparks, and how likely that is in an hour. The structure is certain; the rates are guesses, and the page says how much rests on each.',
  functions: ['eventProbability', 'faultTreeProbability', 'timeAveragedProbability', 'minimalCutSets', 'importance', 'singlePoints', 'ignitionTree', 'rateSensitivity'],
  equations: [
    {
      id: 'event-probability', title: 'Chance of one failure', tex: String.raw`q = 1 - e^{-\lambda t} \;\text{(in flight)}, \qquad \bar{q} = 1 - \frac{1 - e^{-\lambda T}}{\lambda T} \;\text{(hidden, mean over the interval)}`,
      symbols: [
        { tex: String.raw`\lambda`, meaning: 'failure rate', unit: '1/h', range: '0 and up' },
        { tex: 't', meaning: 'time of the flight', unit: 'h', range: '0 and up' },
        { tex: 'T', meaning: 'interval between checks that would find it', unit: 'h', range: 'more than 0' },
        { tex: String.raw`q, \bar{q}`, meaning: 'chance of the failure; its mean over the interval', unit: 'no unit', range: '0 to 1' },
      ],
      sources: ['iec-61508-6'],
    },
    {
      id: 'arrhenius', title: 'Heat and failure rate', tex: String.raw`\lambda(T) = \lambda_\mathrm{ref} \exp\left(-\frac{E_\mathrm{a}}{k}\left(\frac{1}{T} - \frac{1}{T_\mathrm{ref}}\right)\right)`,
      symbols: [
        { tex: String.raw`E_\mathrm{a}`, meaning: 'activation energy', unit: 'eV', range: '0 and up' },
        { tex: String.raw`T, T_\mathrm{ref}`, meaning: 'temperature of the part, and of the known rate', unit: 'K', range: 'more than 0' },
        { tex: 'k', meaning: 'Boltzmann constant, 8.617e-5', unit: 'eV/K' },
        { tex: String.raw`\lambda, \lambda_\mathrm{ref}`, meaning: 'failure rate; the known one', unit: '1/h', range: '0 and up' },
      ],
      sources: ['mil-hdbk-217f'],
    },
    {
      id: 'common-cause', title: 'Failing together for one reason', tex: String.raw`\lambda_\mathrm{alone} = (1 - \beta)\,\lambda, \qquad \lambda_\mathrm{common} = \beta\,\lambda`,
      symbols: [
        { tex: String.raw`\beta`, meaning: 'share of failures that take all listed parts at once', unit: 'no unit', range: '0 to 1' },
        { tex: String.raw`\lambda, \lambda_\mathrm{alone}, \lambda_\mathrm{common}`, meaning: 'rate of one part; what stays its own; of the shared event', unit: '1/h', range: '0 and up' },
      ],
      sources: ['iec-61508-6'],
    },
    {
      id: 'fault-tree', title: 'Chance of the top event', tex: String.raw`Q = \Pr\left(\bigcup_{c} \bigcap_{e \in c} e\right) = q_e\, Q\big|_{e = 1} + \left(1 - q_e\right) Q\big|_{e = 0}`,
      note: 'Exact, by a binary decision diagram: an event that stands in several places is counted once. A cut set is a smallest group of failures that is enough; a single point is one of size 1.',
      symbols: [
        { tex: 'Q', meaning: 'chance of the top event', unit: 'no unit', range: '0 to 1' },
        { tex: 'e, q_e', meaning: 'an event, and its chance', unit: 'no unit', range: '0 to 1' },
        { tex: 'c', meaning: 'minimal cut sets', unit: 'no unit' },
      ],
      sources: ['bryant-1986', 'rauzy-1993', 'nasa-fault-tree-2002', 'fault-tree-examples'],
    },
    {
      id: 'latent-together', title: 'Hidden failures share their interval', tex: String.raw`\bar{Q} = \frac{1}{T}\int_0^{T} Q\big(q_1(t), \dots\big)\,\mathrm{d}t, \qquad \text{for two: } \approx \frac{(\lambda T)^2}{3}`,
      note: 'The product of two means would be (λT)²/4: a quarter too kind, and for three half too kind. This mean is what the screens show.',
      symbols: [
        { tex: 'q_i(t)', meaning: 'chance at time t since the last check', unit: 'no unit' },
        { tex: String.raw`Q, \bar{Q}`, meaning: 'chance of the top event; its mean', unit: 'no unit', range: '0 to 1' },
        { tex: 't, T', meaning: 'time since the check; interval', unit: 'h' },
        { tex: String.raw`\lambda`, meaning: 'failure rate', unit: '1/h' },
      ],
      sources: ['iec-61508-6'],
    },
    {
      id: 'importance', title: 'How much hangs on a part', tex: String.raw`\mathrm{B}_e = Q\big|_{e=1} - Q\big|_{e=0}, \qquad \mathrm{FV}_e = 1 - \frac{Q|_{e=0}}{Q}, \qquad \mathrm{RAW}_e = \frac{Q|_{e=1}}{Q}, \qquad \mathrm{RRW}_e = \frac{Q}{Q|_{e=0}}`,
      note: 'Two definitions of Fussell–Vesely are in use. This one is 1 − 1/RRW.',
      symbols: [
        { tex: String.raw`\mathrm{B}`, meaning: 'Birnbaum importance', unit: 'no unit' },
        { tex: String.raw`\mathrm{FV}`, meaning: 'Fussell–Vesely importance', unit: 'no unit' },
        { tex: String.raw`\mathrm{RAW}, \mathrm{RRW}`, meaning: 'worth of risk achieved and reduced', unit: 'no unit', range: 'none where it would be infinite' },
        { tex: 'Q', meaning: 'chance of the top event', unit: 'no unit', range: '0 to 1' },
        { tex: 'e', meaning: 'the event: 1 failed for certain, 0 cannot fail', unit: 'no unit' },
      ],
      sources: ['birnbaum-1969', 'fault-tree-examples'],
    },
  ],
  handbook: [
    { says: 'Certificated spark-ignition engines have two ignitions: two plugs in a cylinder on two circuits with supplies of their own, or something as reliable in flight.', source: 'far-33-37' },
    { says: 'For orientation, a small single-engine aeroplane, per flight hour: minor 1e-3, major 1e-4, hazardous 1e-5, catastrophic 1e-6. Homebuilts are not certificated to it.', source: 'ac-23-1309-1e' },
    { says: 'An experimental aircraft stays in an area assigned to it until it is shown to be controllable.', source: 'far-91-319' },
  ],
  weaknesses: [
    'No failure rates of these parts are published for this use. A result is good to a factor of ten; the table of sensitivities shows which guesses carry it.',
    'Only what was drawn can fail: a wrong lead, a forgotten switch, water and people are in no tree unless somebody puts them there.',
    'Rates are constant in time. Wear and early failures are not; a part past its life is worse than its mean.',
  ],
})
