import type { Species } from './species';

export const Kr: Species = {
  formula: 'Kr',
  names: ['krypton'],
  molarMass: { value: 83.798e-3, source: 'CIAAW 2021', where: 'standard atomic weights', uncertainty: 3e-5 },
  viscosity: {
    value: {
      kind: 'exponential',
      prefactor: 1e-7,
      low: 200,
      high: 5000,
      pieces: [
        { high: 1000, a: [0.58597795, -129.24832, 4749.5759, 2.579365] },
        { high: 5000, a: [0.68985845, 56.296306, -36082.6, 1.7170715] },
      ],
    },
    source: 'Svehla 1995',
    where: 'Kr, fitted to Bich et al. 1990',
    uncertainty: 0.01,
  },
  heatCapacity: {
    value: { kind: 'monatomic' },
    source: 'Chapman & Cowling 1970',
    where: 'section 2.44: translation only, 5/2 R',
    uncertainty: 0,
  },
  lennardJones: {
    value: { diameter: 3.655e-10, wellDepth: 178.9 },
    source: 'Svehla 1962',
    where: 'table I; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
