import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 5.127e-10, wellDepth: 337.7 };

export const BCl3: Species = {
  formula: 'BCl3',
  names: ['boron trichloride'],
  molarMass: { value: 117.16e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 5e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 117.16e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.1,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [23929.70339, -414.037886, 5.48803526, 0.01648395682, -2.456196216e-5, 1.74387634e-8, -4.84522214e-12],
        },
        {
          high: 6000,
          a: [-241740.8819, -292.1539509, 10.2166848, -8.6236371e-5, 1.897792088e-8, -2.168726841e-12, 1.002154013e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, boron trichloride, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1B, H314; from memory' },
  ],
};
