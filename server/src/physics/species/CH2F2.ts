import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.08e-10, wellDepth: 318 };

export const CH2F2: Species = {
  formula: 'CH2F2',
  names: ['difluoromethane'],
  molarMass: { value: 52.023e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 9e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 52.023e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), estimated from other properties',
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
          a: [-181991.75, 3174.42789, -17.14256906, 0.0641135383, -7.31359212e-5, 4.42638416e-8, -1.103877216e-11],
        },
        {
          high: 6000,
          a: [1546609.496, -7876.88333, 17.68770469, -0.001581298721, 3.068917255e-7, -3.18340546e-11, 1.363827177e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, difluoromethane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 6.57e-30, source: 'Nelson 1967', where: '1.97 D; from memory' },
  critical: {
    value: { temperature: 351.26, pressure: 5.78e6, acentric: 0.277 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'flammable gas', source: 'ECHA inventory', where: 'Flam. Gas 1, H220, as notified; from memory' }],
};
