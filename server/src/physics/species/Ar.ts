import { lemmonJacobsen } from './lemmonJacobsen';
import type { Species } from './species';

export const Ar: Species = {
  formula: 'Ar',
  names: ['argon'],
  molarMass: { value: 39.95e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 0.0004 },
  viscosity: {
    value: lemmonJacobsen(39.948, 0.335, 143.2, { low: 80, high: 2000 }),
    source: 'Lemmon & Jacobsen 2004',
    where: 'eqs. 2 and 3, tables I and II; the places from memory',
    uncertainty: 0.01,
  },
  heatCapacity: {
    value: { kind: 'monatomic' },
    source: 'Chapman & Cowling 1970',
    where: 'section 2.44: translation only, 5/2 R',
    uncertainty: 0,
  },
  lennardJones: {
    value: { diameter: 3.542e-10, wellDepth: 93.3 },
    source: 'Svehla 1962',
    where: 'table I; from memory',
  },
  saturation: [
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 20,
        high: 83.8058,
        pressure: 1e5,
        inverse: [10.69, -893.2, -3567, 6.574e4, -4.28e5],
      },
      source: 'Fray & Schmitt 2009',
      where: 'table 5; from memory',
      uncertainty: 0.05,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 83.8058,
        high: 150.687,
        temperature: 150.687,
        pressure: 4863000.0,
        terms: [
          { n: -5.9409785, t: 1 },
          { n: 1.3553888, t: 1.5 },
          { n: -0.46497607, t: 2 },
          { n: -1.5399043, t: 4.5 },
        ],
      },
      source: 'Tegeler 1999',
      where: 'ancillary equation of the vapour pressure; from memory',
      uncertainty: 0.002,
    },
  ],
  critical: {
    value: { temperature: 150.86, pressure: 4.898e6, acentric: -0.002 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
