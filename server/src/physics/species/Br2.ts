import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.296e-10, wellDepth: 507.9 };

export const Br2: Species = {
  formula: 'Br2',
  names: ['bromine vapour', 'bromine'],
  molarMass: { value: 159.808e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 4e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 159.808e-3, { low: 200, high: 1500 }),
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
          a: [7497.04754, -235.0884557, 5.49193432, -0.002227573303, 2.932401703e-6, -1.954889514e-9, 5.31230789e-13],
        },
        {
          high: 6000,
          a: [-4311698.57, 11112.68634, -5.55577561, 0.00363051659, -2.754164226e-7, -6.21750676e-11, 7.37534162e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, bromine vapour, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 588, pressure: 10.3e6, acentric: 0.119 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1A, H314; from memory' },
    { value: 'hazardous to the aquatic environment', source: 'CLP 2008', where: 'Aquatic Acute 1, H400; from memory' },
  ],
};
