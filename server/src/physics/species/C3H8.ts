import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 5.118e-10, wellDepth: 237.1 };

export const C3H8: Species = {
  formula: 'C3H8',
  names: ['propane'],
  molarMass: { value: 44.097e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 44.097e-3, { low: 200, high: 1500 }),
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
          a: [-243314.4337, 4656.27081, -29.39466091, 0.1188952745, -1.376308269e-4, 8.81482391e-8, -2.342987994e-11],
        },
        {
          high: 6000,
          a: [6420731.68, -26597.91134, 45.3435684, -0.00502066392, 9.47121694e-7, -9.57540523e-11, 4.00967288e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, propane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 369.83, pressure: 4.248e6, acentric: 0.152 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 369.8, bar: 42.5, coefficients: [-6.72219, 1.33236, -2.13868, -1.38551], low: 145 }),
  ],
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    { value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' },
  ],
};
