import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.084e-10, wellDepth: 207.6 };

export const SiH4: Species = {
  formula: 'SiH4',
  names: ['silane', 'monosilane'],
  molarMass: { value: 32.117e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 6e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 32.117e-3, { low: 200, high: 1500 }),
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
          a: [78729.9329, -552.608705, 2.498944303, 0.01442118274, -8.46710731e-6, 2.726164641e-9, -5.43675437e-13],
        },
        {
          high: 6000,
          a: [1290378.74, -7813.39978, 18.28851664, -0.001975620946, 4.15650215e-7, -4.59674561e-11, 2.072777131e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, silane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 269.7, pressure: 4.84e6, acentric: 0.068 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'ECHA inventory', where: 'Flam. Gas 1, H220, as notified; from memory' },
    {
      value: 'pyrophoric gas',
      source: 'ECHA inventory',
      where: 'H232: may ignite by itself in air, as notified; from memory',
    },
  ],
};
