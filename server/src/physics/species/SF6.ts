import type { Species } from './species';

export const SF6: Species = {
  formula: 'SF6',
  names: ['sulfur hexafluoride', 'sulphur hexafluoride'],
  molarMass: {
    value: 146.05e-3,
    source: 'CIAAW 2021',
    where: 'abridged standard atomic weights; F 18.998403162',
    uncertainty: 0.0002,
  },
  viscosity: {
    value: {
      kind: 'fourth-roots',
      theta: 318.7232,
      coefficients: [1.18561e-4, -3.78103e-4, 4.16428e-4, -1.65295e-4, 2.45381e-5],
      low: 225,
      high: 1000,
    },
    source: 'Quiñones-Cisneros 2012',
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
          a: [330952.674, -4737.68505, 22.47738068, 0.01046954309, -2.560641961e-5, 2.153716967e-8, -6.51609896e-12],
        },
        {
          high: 6000,
          a: [-730672.65, -636.705655, 19.47442853, -0.0001894325671, 4.17872283e-8, -4.78374495e-12, 2.213516129e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, sulfur hexafluoride, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: {
    value: { diameter: 5.128e-10, wellDepth: 222.1 },
    source: 'Svehla 1962',
    where: 'table I; from memory',
  },
  saturation: [
    {
      value: {
        kind: 'wagner',
        phase: 'solid',
        low: 186,
        high: 223.555,
        temperature: 223.555,
        pressure: 231429,
        terms: [{ n: -12.17, t: 1 }],
      },
      source: 'CRC 2014',
      where:
        'Clausius–Clapeyron between the triple point and the sublimation point, 209.35 K at 101.325 kPa; from memory',
      uncertainty: 0.05,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 223.555,
        high: 318.7232,
        temperature: 318.7232,
        pressure: 3755000.0,
        terms: [
          { n: -7.09634642, t: 1 },
          { n: 1.676662, t: 1.5 },
          { n: -2.3921599, t: 2.5 },
          { n: 5.86078302, t: 4 },
          { n: -9.02978735, t: 4.5 },
        ],
      },
      source: 'Guder & Wagner 2009',
      where: 'ancillary equation of the vapour pressure; from memory',
      uncertainty: 0.003,
    },
  ],
  critical: {
    value: { temperature: 318.69, pressure: 3.76e6, acentric: 0.21 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
