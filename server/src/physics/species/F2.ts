import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 3.357e-10, wellDepth: 112.6 };

export const F2: Species = {
  formula: 'F2',
  names: ['fluorine'],
  molarMass: { value: 37.996e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 6e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 37.996e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.04,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [10181.76308, 22.74241183, 1.97135304, 0.00815160401, -1.14896009e-5, 7.95865253e-9, -2.167079526e-12],
        },
        {
          high: 6000,
          a: [-2941167.79, 9456.5977, -7.73861615, 0.00764471299, -2.241007605e-6, 2.915845236e-10, -1.425033974e-14],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, fluorine, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 144.12, pressure: 5.172e6, acentric: 0.053 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'oxidising gas', source: 'CLP 2008', where: 'Ox. Gas 1, H270; from memory' },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1A, H314; from memory' },
  ],
};
