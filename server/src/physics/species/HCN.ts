import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 3.63e-10, wellDepth: 569.1 };

export const HCN: Species = {
  formula: 'HCN',
  names: ['hydrogen cyanide'],
  molarMass: { value: 27.026e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 27.026e-3, { low: 200, high: 1500 }),
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
          a: [90982.8693, -1238.657512, 8.72130787, -0.00652824294, 8.87270083e-6, -4.80888667e-9, 9.3178985e-13],
        },
        {
          high: 6000,
          a: [1236889.278, -4446.73241, 9.73887485, -5.85518264e-4, 1.07279144e-7, -1.013313244e-11, 3.34824798e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, hydrogen cyanide, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 9.94e-30, source: 'Nelson 1967', where: '2.98 D; from memory' },
  critical: {
    value: { temperature: 456.7, pressure: 5.39e6, acentric: 0.41 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable liquid', source: 'CLP 2008', where: 'Flam. Liq. 1, H224; from memory' },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'hazardous to the aquatic environment', source: 'CLP 2008', where: 'Aquatic Acute 1, H400; from memory' },
  ],
};
