import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 4.163e-10, wellDepth: 224.7 };

export const C2H4: Species = {
  formula: 'C2H4',
  names: ['ethylene', 'ethene'],
  molarMass: { value: 28.054e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 28.054e-3, { low: 200, high: 1500 }),
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
          a: [-116360.5836, 2554.85151, -16.09746428, 0.0662577932, -7.88508186e-5, 5.12522482e-8, -1.370340031e-11],
        },
        {
          high: 6000,
          a: [3408763.67, -13748.47903, 23.65898074, -0.002423804419, 4.43139566e-7, -4.35268339e-11, 1.775410633e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, ethylene, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 282.34, pressure: 5.041e6, acentric: 0.087 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 282.4, bar: 50.4, coefficients: [-6.32055, 1.16819, -1.55935, -1.83552], low: 105 }),
  ],
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    { value: 'narcotic effects', source: 'CLP 2008', where: 'STOT SE 3, H336; from memory' },
  ],
};
