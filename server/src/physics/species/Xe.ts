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
  saturation: [
    {
      value: {
        kind: 'wagner',
        phase: 'solid',
        low: 110,
        high: 161.405,
        temperature: 161.405,
        pressure: 81891,
        terms: [{ n: -11.33, t: 1 }],
      },
      source: 'Clusius & Riccoboni 1937',
      where:
        'Clausius–Clapeyron from the triple point with 15.2 kJ/mol, their heats of fusion and of vaporisation carried halfway to 110 K; from memory',
      uncertainty: 0.1,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 161.405,
        high: 289.733,
        temperature: 289.733,
        pressure: 5842000.0,
        terms: [
          { n: -6.00586, t: 1 },
          { n: 1.30532, t: 1.5 },
          { n: -0.63587, t: 2.5 },
          { n: -1.11246, t: 5 },
        ],
      },
      source: 'Ambrose & Walton 1989',
      where:
        'corresponding states with the acentric factor 0.0059 that gives the normal boiling point, 165.051 K; from memory',
      uncertainty: 0.01,
    },
  ],
  critical: {
    value: { temperature: 289.74, pressure: 5.84e6, acentric: 0.004 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
