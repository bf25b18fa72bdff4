import type { Correlation } from '../transport/correlation';
import type { Species } from './species';

const cold: Correlation = {
  kind: 'logarithmic',
  prefactor: 1e-7,
  coefficients: [-0.135311743, 1.00347841, 1.20654649, -0.149564551, 0.012520841],
  low: 20,
  high: 100,
};

const warm: Correlation = {
  kind: 'exponential',
  prefactor: 1e-7,
  low: 200,
  high: 5000,
  pieces: [
    { high: 1000, a: [0.75015944, 35.763243, -2212.1291, 0.92126352] },
    { high: 5000, a: [0.83394166, 220.82656, -52852.591, 0.20809361] },
  ],
};

export const He: Species = {
  formula: 'He',
  names: ['helium'],
  molarMass: { value: 4.002602e-3, source: 'CIAAW 2021', where: 'standard atomic weights', uncertainty: 5e-7 },
  viscosity: {
    value: { kind: 'joined', cold, warm, from: 100, to: 200, low: 20, high: 5000 },
    source: 'Svehla 1995',
    where:
      'He, fitted to Bich et al. 1990, from 200 K; below 100 K Arp et al. 1998; between them the mean weighted in ln T',
    uncertainty: 0.02,
  },
  heatCapacity: {
    value: { kind: 'monatomic' },
    source: 'Chapman & Cowling 1970',
    where: 'section 2.44: translation only, 5/2 R',
    uncertainty: 0,
  },
  lennardJones: {
    value: { diameter: 2.551e-10, wellDepth: 10.22 },
    source: 'Svehla 1962',
    where: 'table I; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
