import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 5.278e-10, wellDepth: 330.1 };

export const iC4H10: Species = {
  formula: 'iC4H10',
  names: ['isobutane'],
  molarMass: { value: 58.124e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 58.124e-3, { low: 200, high: 1500 }),
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
          a: [-383446.933, 7000.03964, -44.400269, 0.1746183447, -2.078195348e-4, 1.339792433e-7, -3.55168163e-11],
        },
        {
          high: 6000,
          a: [7528018.92, -32025.1706, 57.00161, -0.00606001309, 1.143975809e-6, -1.157061835e-10, 4.84604291e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, isobutane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 407.85, pressure: 3.64e6, acentric: 0.186 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 408.2, bar: 36.5, coefficients: [-6.95579, 1.5009, -2.52717, -1.49776], low: 165 }),
  ],
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    { value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' },
  ],
};
