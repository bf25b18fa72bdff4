import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.33e-10, wellDepth: 240 };

export const CHF3: Species = {
  formula: 'CHF3',
  names: ['trifluoromethane', 'fluoroform'],
  molarMass: { value: 70.013e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 8e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 70.013e-3, { low: 200, high: 1500 }),
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
          a: [-109513.226, 2042.273879, -11.66213079, 0.0578580777, -6.85713506e-5, 4.21211838e-8, -1.053196888e-11],
        },
        {
          high: 6000,
          a: [568523.202, -4728.3617, 15.86728516, -7.38234865e-4, 1.970841706e-7, -2.062115571e-11, 8.97059964e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, trifluoromethane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 5.5e-30, source: 'Nelson 1967', where: '1.65 D; from memory' },
  critical: {
    value: { temperature: 299.3, pressure: 4.858e6, acentric: 0.264 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
