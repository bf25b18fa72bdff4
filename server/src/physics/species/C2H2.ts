import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 4.033e-10, wellDepth: 231.8 };

export const C2H2: Species = {
  formula: 'C2H2',
  names: ['acetylene', 'ethyne'],
  molarMass: { value: 26.038e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 26.038e-3, { low: 200, high: 1500 }),
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
          a: [159811.2089, -2216.644118, 12.65707813, -0.00797965108, 8.05499275e-6, -2.433307673e-9, -7.52923318e-14],
        },
        {
          high: 6000,
          a: [1713847.41, -5929.10666, 12.36127943, 1.314186993e-4, -1.362764431e-7, 2.712655786e-11, -1.302066204e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, acetylene, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 308.3, pressure: 6.114e6, acentric: 0.189 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 308.3, bar: 61.4, coefficients: [-6.90128, 1.26873, -2.09113, -2.75601], low: 192.4 }),
  ],
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    {
      value: 'chemically unstable gas',
      source: 'ECHA inventory',
      where: 'Chem. Unst. Gas A, H230, as notified; from memory',
    },
  ],
};
