import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 4.678e-10, wellDepth: 298.9 };

export const C3H6: Species = {
  formula: 'C3H6',
  names: ['propylene', 'propene'],
  molarMass: { value: 42.081e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 42.081e-3, { low: 200, high: 1500 }),
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
          a: [-191246.2174, 3542.07424, -21.14878626, 0.0890148479, -1.001429154e-4, 6.26795939e-8, -1.637870781e-11],
        },
        {
          high: 6000,
          a: [5017620.34, -20860.84035, 36.4415634, -0.00388119117, 7.27867719e-7, -7.3212045e-11, 3.052176369e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, propylene, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 1.22e-30, source: 'Nelson 1967', where: '0.366 D; from memory' },
  critical: {
    value: { temperature: 364.9, pressure: 4.6e6, acentric: 0.142 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 364.9, bar: 46, coefficients: [-6.64231, 1.21857, -1.81005, -2.48212], low: 140 }),
  ],
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    { value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' },
  ],
};
