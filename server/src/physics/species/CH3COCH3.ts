import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 4.6e-10, wellDepth: 560.2 };

export const CH3COCH3: Species = {
  formula: 'CH3COCH3',
  names: ['acetone', 'propanone'],
  molarMass: { value: 58.08e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 58.08e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.05,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [-227780.2525, 4215.28001, -24.15785316, 0.0990748332, -1.084940903e-4, 6.58335596e-8, -1.676046146e-11],
        },
        {
          high: 6000,
          a: [5001601.92, -21701.55542, 39.6449399, -0.00417994505, 7.96242953e-7, -8.12255805e-11, 3.42878096e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, acetone, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 9.61e-30, source: 'Nelson 1967', where: '2.88 D; from memory' },
  critical: {
    value: { temperature: 508.1, pressure: 4.7e6, acentric: 0.307 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 508.1, bar: 47, coefficients: [-7.45514, 1.202, -2.43926, -3.3559], low: 259 }),
  ],
  hazards: [
    { value: 'flammable liquid', source: 'CLP 2008', where: 'Flam. Liq. 2, H225; from memory' },
    { value: 'serious eye irritation', source: 'CLP 2008', where: 'Eye Irrit. 2, H319; from memory' },
    { value: 'narcotic effects', source: 'CLP 2008', where: 'STOT SE 3, H336; from memory' },
  ],
};
