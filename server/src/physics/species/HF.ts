import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 3.148e-10, wellDepth: 330 };

/** The single molecule: below some 80 °C the gas associates, most at higher pressures, which is left out here. */
export const HF: Species = {
  formula: 'HF',
  names: ['hydrogen fluoride'],
  molarMass: { value: 20.006e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 6e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 20.006e-3, { low: 200, high: 1500 }),
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
          a: [-3192.09897, 59.8680772, 3.055113902, 0.001684673783, -3.28739483e-6, 3.095923617e-9, -9.76469161e-13],
        },
        {
          high: 6000,
          a: [725708.904, -1484.797741, 3.85552747, 7.13898985e-4, -2.106757333e-7, 3.050092453e-11, -1.639495583e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, hydrogen fluoride, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 6.07e-30, source: 'Nelson 1967', where: '1.82 D; from memory' },
  associates: { value: '(HF)₆ and other clusters', source: 'Chase 1998', where: 'HF and its polymers; from memory' },
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'acute toxicity, dermal', source: 'CLP 2008', where: 'Acute Tox. 1, H310; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1A, H314; from memory' },
  ],
};
