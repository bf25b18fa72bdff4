import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.198e-10, wellDepth: 186.3 };

export const BF3: Species = {
  formula: 'BF3',
  names: ['boron trifluoride'],
  molarMass: { value: 67.804e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 4e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 67.804e-3, { low: 270, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.03,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [3465.584, 21.33198651, 1.641245191, 0.01993755064, -2.15011993e-5, 1.145669081e-8, -2.442285789e-12],
        },
        {
          high: 6000,
          a: [-181976.7014, -1405.347931, 11.03412258, -4.10459105e-4, 9.03127757e-8, -1.03305736e-11, 4.78055183e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, boron trifluoride, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1A, H314; from memory' },
  ],
};
