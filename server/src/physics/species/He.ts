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
  saturation: [
    {
      value: {
        kind: 'scale',
        phase: 'liquid',
        low: 1.25,
        high: 2.1768,
        centre: 5.6,
        width: 2.9,
        coefficients: [1.392408, 0.527153, 0.166756, 0.050988, 0.026514, 0.001975, -0.017976, 0.005409, 0.013259],
      },
      source: 'Preston-Thomas 1990',
      where: 'eq. 3, table 3; from memory',
      uncertainty: 0.003,
    },
    {
      value: {
        kind: 'scale',
        phase: 'liquid',
        low: 2.1768,
        high: 5,
        centre: 10.3,
        width: 1.9,
        coefficients: [3.146631, 1.357655, 0.413923, 0.091159, 0.016349, 0.001826, -0.004325, -0.004973],
      },
      source: 'Preston-Thomas 1990',
      where: 'eq. 3, table 3; from memory',
      uncertainty: 0.003,
    },
  ],
  critical: {
    value: { temperature: 5.19, pressure: 0.227e6, acentric: -0.39 },
    source: 'Poling 2001',
    where: 'appendix A',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
