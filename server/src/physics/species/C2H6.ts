import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 4.443e-10, wellDepth: 215.7 };

export const C2H6: Species = {
  formula: 'C2H6',
  names: ['ethane'],
  molarMass: { value: 30.07e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 30.07e-3, { low: 200, high: 1500 }),
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
          a: [-186204.4161, 3406.19186, -19.51705092, 0.0756583559, -8.20417322e-5, 5.0611358e-8, -1.319281992e-11],
        },
        {
          high: 6000,
          a: [5025782.13, -20330.22397, 33.2255293, -0.00383670341, 7.23840586e-7, -7.3191825e-11, 3.065468699e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, ethane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 305.32, pressure: 4.872e6, acentric: 0.099 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 305.4, bar: 48.8, coefficients: [-6.34307, 1.0163, -1.19116, -2.03539], low: 133 }),
  ],
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    { value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' },
  ],
};
