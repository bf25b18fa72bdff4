import type { Species } from './species';

export const Ne: Species = {
  formula: 'Ne',
  names: ['neon'],
  molarMass: { value: 20.1797e-3, source: 'CIAAW 2021', where: 'standard atomic weights', uncertainty: 3e-5 },
  viscosity: {
    value: {
      kind: 'exponential',
      prefactor: 1e-7,
      low: 200,
      high: 5000,
      pieces: [
        { high: 1000, a: [0.68398511, 18.732366, -2366.3189, 1.8284755] },
        { high: 5000, a: [0.72333495, 104.20872, -25429.545, 1.4942434] },
      ],
    },
    source: 'Svehla 1995',
    where: 'Ne, fitted to Bich et al. 1990',
    uncertainty: 0.01,
  },
  heatCapacity: {
    value: { kind: 'monatomic' },
    source: 'Chapman & Cowling 1970',
    where: 'section 2.44: translation only, 5/2 R',
    uncertainty: 0,
  },
  lennardJones: {
    value: { diameter: 2.82e-10, wellDepth: 32.8 },
    source: 'Svehla 1962',
    where: 'table I',
  },
  saturation: [
    {
      value: {
        kind: 'powers',
        phase: 'liquid',
        low: 24.556,
        high: 40,
        pressure: 101325,
        inverse: [10.6184172, -244.9607],
        direct: [-0.08481115, 9.783496e-4],
      },
      source: 'IPTS 1968',
      where: 'secondary reference points, vapour pressure of neon, T₆₈ within 10 mK; from memory',
      uncertainty: 0.005,
    },
  ],
  critical: {
    value: { temperature: 44.4, pressure: 2.76e6, acentric: -0.016 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
