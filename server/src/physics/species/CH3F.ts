import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 3.73e-10, wellDepth: 333 };

export const CH3F: Species = {
  formula: 'CH3F',
  names: ['fluoromethane', 'methyl fluoride'],
  molarMass: { value: 34.033e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 34.033e-3, { low: 200, high: 1500 }),
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
          a: [-202982.1878, 3447.33113, -17.68994275, 0.059452758, -6.46952825e-5, 3.85941804e-8, -9.62654153e-12],
        },
        {
          high: 6000,
          a: [2561903.188, -10860.52758, 19.2944692, -0.002070973131, 3.92912453e-7, -3.99450342e-11, 1.681447081e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, fluoromethane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 6.17e-30, source: 'Nelson 1967', where: '1.85 D; from memory' },
  critical: {
    value: { temperature: 317.28, pressure: 5.906e6, acentric: 0.198 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'ECHA inventory', where: 'Flam. Gas 1, H220, as notified; from memory' },
    { value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' },
  ],
};
