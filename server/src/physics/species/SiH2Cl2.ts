import type { Species } from './species';

export const SiH2Cl2: Species = {
  formula: 'SiH2Cl2',
  names: ['dichlorosilane'],
  molarMass: { value: 101.001e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 3e-4 },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [189428.1754, -2650.960252, 15.49874174, -0.00653313075, 9.30609826e-6, -5.63969867e-9, 1.213664264e-12],
        },
        {
          high: 6000,
          a: [540020.458, -4062.33729, 15.73118788, -0.001015038389, 2.127060243e-7, -2.345079226e-11, 1.054871984e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, dichlorosilane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  dipoleMoment: { value: 3.9e-30, source: 'Nelson 1967', where: '1.17 D; from memory' },
  hazards: [
    { value: 'flammable gas', source: 'ECHA inventory', where: 'Flam. Gas 1, H220, as notified; from memory' },
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 2, H330, as notified; from memory',
    },
    { value: 'skin corrosion', source: 'ECHA inventory', where: 'Skin Corr. 1B, H314, as notified; from memory' },
  ],
};
