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
  saturation: [
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 30,
        high: 115.775,
        pressure: 1e5,
        inverse: [10.77, -1223, -8903, 2.635e5, -4.26e6, 2.575e7],
      },
      source: 'Fray & Schmitt 2009',
      where: 'table 5; from memory',
      uncertainty: 0.05,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 115.775,
        high: 209.48,
        temperature: 209.48,
        pressure: 5525000.0,
        terms: [
          { n: -5.9697, t: 1 },
          { n: 1.2673, t: 1.5 },
          { n: -0.95609, t: 2.95 },
          { n: -35.63, t: 9.3 },
          { n: 56.884, t: 10.4 },
        ],
      },
      source: 'Lemmon & Span 2006',
      where: 'vapour pressure of the equation of state; from memory',
      uncertainty: 0.005,
    },
  ],
  critical: {
    value: { temperature: 209.4, pressure: 5.5e6, acentric: 0.001 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
