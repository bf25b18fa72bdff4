import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 4.687e-10, wellDepth: 531.4 };

export const nC4H10: Species = {
  formula: 'nC4H10',
  names: ['butane', 'n_butane'],
  molarMass: { value: 58.124e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 58.124e-3, { low: 200, high: 1500 }),
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
          a: [-317587.254, 6176.33182, -38.9156212, 0.1584654284, -1.860050159e-4, 1.199676349e-7, -3.20167055e-11],
        },
        {
          high: 6000,
          a: [7682322.45, -32560.5151, 57.3673275, -0.00619791681, 1.180186048e-6, -1.221893698e-10, 5.25063525e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, n-butane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 425.12, pressure: 3.796e6, acentric: 0.2 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 425.2, bar: 38, coefficients: [-6.88709, 1.15157, -1.99873, -3.13003], low: 170 }),
  ],
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    { value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' },
  ],
};
