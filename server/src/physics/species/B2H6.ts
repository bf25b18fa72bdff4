import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.821e-10, wellDepth: 213.2 };

export const B2H6: Species = {
  formula: 'B2H6',
  names: ['diborane'],
  molarMass: { value: 27.668e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 0.002 },
  viscosity: {
    value: viscosityOfPotential(potential, 27.668e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), estimated from other properties',
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
          a: [-10528.44558, 1041.795556, -8.96051886, 0.0549248088, -5.30519705e-5, 3.011904756e-8, -7.6887683e-12],
        },
        {
          high: 6000,
          a: [2835765.414, -15676.00163, 32.2612233, -0.00373860973, 7.71880646e-7, -8.41445454e-11, 3.75222338e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, diborane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  hazards: [
    { value: 'flammable gas', source: 'ECHA inventory', where: 'Flam. Gas 1, H220, as notified; from memory' },
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 1, H330, as notified; from memory',
    },
  ],
};
