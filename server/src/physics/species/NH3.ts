import { chapmanEnskogPrefactor } from '../transport/correlation';
import type { Species } from './species';

export const NH3: Species = {
  formula: 'NH3',
  names: ['ammonia'],
  molarMass: { value: 17.031e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 0.0001 },
  viscosity: {
    value: {
      kind: 'collision-integral',
      prefactor: chapmanEnskogPrefactor(2.1357, 17.03026, 0.2957),
      theta: 386,
      coefficients: [4.9931822, -0.61122364, 0, 0.18535124, -0.11160946],
      low: 196,
      high: 680,
    },
    source: 'Fenghour 1995',
    where: 'eqs. 2 to 4; the printed prefactor lacks a factor of 100',
    uncertainty: 0.02,
  },
  conductivity: {
    value: {
      kind: 'ratio',
      prefactor: 1e-3,
      theta: 405.56,
      numerator: [86.9294, -170.5502, 608.0287, -100.9764, 85.1986],
      denominator: [4.68994, 9.21307, -1.53637, 1],
      low: 196,
      high: 680,
    },
    source: 'Monogenidou 2018',
    where: 'dilute-gas term',
    uncertainty: 0.03,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [-76812.2615, 1270.951578, -3.89322913, 0.02145988418, -2.183766703e-5, 1.317385706e-8, -3.33232206e-12],
        },
        {
          high: 6000,
          a: [2452389.535, -8040.89424, 12.71346201, -0.000398018658, 3.55250275e-8, 2.53092357e-12, -3.32270053e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, ammonia, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: {
    value: { diameter: 2.9e-10, wellDepth: 558.3 },
    source: 'Svehla 1962',
    where: 'table I; from memory',
  },
  dipoleMoment: { value: 4.9e-30, source: 'Nelson 1967', where: '1.47 D; from memory' },
  saturation: [
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 110,
        high: 195.49,
        pressure: 1e5,
        inverse: [15.96, -3537, -3.31e4, 1.742e6, -2.995e7],
      },
      source: 'Fray & Schmitt 2009',
      where: 'table 5; from memory',
      uncertainty: 0.05,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 195.49,
        high: 405.4,
        temperature: 405.4,
        pressure: 11339000.0,
        terms: [
          { n: -7.0993, t: 1 },
          { n: -2.433, t: 1.5 },
          { n: 8.7591, t: 1.7 },
          { n: -6.4091, t: 1.95 },
          { n: -2.1185, t: 4.2 },
        ],
      },
      source: 'Tillner-Roth 1993',
      where: 'ancillary equation of the vapour pressure; from memory',
      uncertainty: 0.005,
    },
  ],
  critical: {
    value: { temperature: 405.4, pressure: 11.353e6, acentric: 0.257 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 2, H221' },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 3, H331' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1B, H314' },
    { value: 'hazardous to the aquatic environment', source: 'CLP 2008', where: 'Aquatic Acute 1, H400' },
  ],
};
