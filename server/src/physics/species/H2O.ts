import type { Species } from './species';

export const H2O: Species = {
  formula: 'H2O',
  names: ['water vapour', 'water', 'steam'],
  molarMass: { value: 18.015e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 0.0001 },
  viscosity: {
    value: {
      kind: 'inverse-powers',
      prefactor: 1e-4,
      theta: 647.096,
      coefficients: [1.67752, 2.20462, 0.6366564, -0.241605],
      low: 273.16,
      high: 1173.15,
    },
    source: 'IAPWS R12-08',
    where: 'eq. 11 and table 1',
    uncertainty: 0.02,
  },
  conductivity: {
    value: {
      kind: 'inverse-powers',
      prefactor: 1e-3,
      theta: 647.096,
      coefficients: [2.443221e-3, 1.323095e-2, 6.770357e-3, -3.454586e-3, 4.096266e-4],
      low: 273.16,
      high: 1173.15,
    },
    source: 'IAPWS R15-11',
    where: 'eq. 16, table 1',
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
          a: [-39479.6083, 575.573102, 0.931782653, 0.00722271286, -7.34255737e-6, 4.95504349e-9, -1.336933246e-12],
        },
        {
          high: 6000,
          a: [1034972.096, -2412.698562, 4.64611078, 0.002291998307, -6.83683048e-7, 9.42646893e-11, -4.82238053e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, water vapour, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: {
    value: { diameter: 2.641e-10, wellDepth: 809.1 },
    source: 'Svehla 1962',
    where: 'table I; the place from memory',
  },
  dipoleMoment: { value: 6.17e-30, source: 'Nelson 1967', where: '1.85 D; from memory' },
  saturation: [
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 110,
        high: 273.16,
        pressure: 1,
        inverse: [9.550426, -5723.265],
        logarithm: 3.53068,
        direct: [-0.00728332],
      },
      source: 'Murphy & Koop 2005',
      where: 'eq. 7',
      uncertainty: 0.01,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 273.16,
        high: 647.096,
        temperature: 647.096,
        pressure: 22064000.0,
        terms: [
          { n: -7.85951783, t: 1 },
          { n: 1.84408259, t: 1.5 },
          { n: -11.7866497, t: 3 },
          { n: 22.6807411, t: 3.5 },
          { n: -15.9618719, t: 4 },
          { n: 1.80122502, t: 7.5 },
        ],
      },
      source: 'Wagner & Pruss 2002',
      where: 'eq. 2.5; from memory',
      uncertainty: 0.001,
    },
  ],
  critical: {
    value: { temperature: 647.14, pressure: 22.064e6, acentric: 0.344 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [],
};
