import type { Species } from './species';

export const O3: Species = {
  formula: 'O3',
  names: ['ozone'],
  molarMass: { value: 47.997e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 7e-5 },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [-12823.14507, 589.821664, -2.547496763, 0.02690121526, -3.52825834e-5, 2.312290922e-8, -6.04489327e-12],
        },
        {
          high: 6000,
          a: [-38696624.8, 102334.4994, -89.615516, 0.0370614497, -4.13763874e-6, -2.725018591e-10, 5.24818811e-14],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, ozone, 200 to 6000 K',
    uncertainty: 0.005,
  },
  dipoleMoment: { value: 1.77e-30, source: 'Nelson 1967', where: '0.53 D; from memory' },
  hazards: [
    { value: 'oxidising gas', source: 'ECHA inventory', where: 'Ox. Gas 1, H270, as notified; from memory' },
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 1, H330, as notified; from memory',
    },
  ],
};
