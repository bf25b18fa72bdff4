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
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
