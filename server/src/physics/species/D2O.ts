import type { Species } from './species';

export const D2O: Species = {
  formula: 'D2O',
  names: ['heavy water vapour', 'heavy water', 'deuterium oxide'],
  molarMass: {
    value: 20.027e-3,
    source: 'CIAAW 2021',
    where: 'abridged standard atomic weight of oxygen; the atomic mass of ²H from Wang 2021',
    uncertainty: 5e-5,
  },
  viscosity: {
    value: {
      kind: 'root-ratio',
      prefactor: 1e-6,
      theta: 643.847,
      numerator: [0.889754, 61.22217, -44.8866, 111.5812, 3.547412],
      denominator: [0.79637, 2.38127, -0.33463, 2.669, 0.000211366],
      low: 276.97,
      high: 775,
    },
    source: 'IAPWS R17-20',
    where: 'dilute-gas term; from memory',
    uncertainty: 0.02,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [6958.27847, -12.80889437, 3.59587887, 0.001502093683, 3.59467505e-7, 5.3404172e-10, -5.18194127e-13],
        },
        {
          high: 6000,
          a: [1544193.253, -5474.2389, 10.17542424, -9.61941554e-4, 2.036545675e-7, -2.050566442e-11, 8.51077069e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, heavy water vapour, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: {
    value: { diameter: 2.641e-10, wellDepth: 809.1 },
    source: 'Svehla 1962',
    where: 'table I(a), water: isotopes share their potential',
  },
  dipoleMoment: { value: 6.17e-30, source: 'Nelson 1967', where: '1.85 D; from memory' },
  critical: {
    value: { temperature: 643.847, pressure: 21.671e6, acentric: 0.364 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 276.97,
        high: 643.847,
        temperature: 643.847,
        pressure: 21.671e6,
        terms: [
          { n: -7.896657, t: 1 },
          { n: 24.73308, t: 1.89 },
          { n: -27.81128, t: 2 },
          { n: 9.355913, t: 3 },
          { n: -9.220083, t: 3.6 },
        ],
      },
      source: 'Harvey & Lemmon 2002',
      where: 'eq. 4; from memory, checked against the boiling point',
      uncertainty: 0.002,
    },
  ],
  hazards: [],
};
