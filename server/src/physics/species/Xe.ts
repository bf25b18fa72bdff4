import { chapmanEnskogPrefactor } from '../transport/correlation';
import type { Species } from './species';

export const Xe: Species = {
  formula: 'Xe',
  names: ['xenon'],
  molarMass: { value: 131.293e-3, source: 'CIAAW 2021', where: 'standard atomic weights', uncertainty: 5e-5 },
  viscosity: {
    value: {
      kind: 'collision-integral',
      prefactor: chapmanEnskogPrefactor(0.0266958, 131.293, 0.3885),
      theta: 274,
      coefficients: [0.46649, -0.57015, 0.19164, -0.03708, 0.00241],
      low: 274,
      high: 2740,
    },
    source: 'Kestin 1984',
    where: 'collision integral for 1 ≤ T* ≤ 10 and the parameters of xenon; from memory',
    uncertainty: 0.015,
  },
  heatCapacity: {
    value: { kind: 'monatomic' },
    source: 'Chapman & Cowling 1970',
    where: 'section 2.44: translation only, 5/2 R',
    uncertainty: 0,
  },
  lennardJones: {
    value: { diameter: 4.047e-10, wellDepth: 231.0 },
    source: 'Svehla 1962',
    where: 'table I; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
