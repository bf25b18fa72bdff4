import { chapmanEnskogPrefactor } from '../transport/correlation';
import type { Species } from './species';

/** Normal hydrogen: three quarters ortho, one quarter para. */
export const H2: Species = {
  formula: 'H2',
  names: ['hydrogen'],
  molarMass: { value: 2.016e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 5e-5 },
  viscosity: {
    value: {
      kind: 'collision-integral',
      prefactor: chapmanEnskogPrefactor(0.021357, 2.01588, 0.297),
      theta: 30.41,
      coefficients: [0.20963, -0.455274, 0.143602, -0.0335325, 0.00276981],
      low: 20,
      high: 2000,
    },
    source: 'Muzny 2013',
    where: 'eqs. 3 and 4, table 2',
    uncertainty: 0.01,
  },
  conductivity: {
    value: {
      kind: 'ratio',
      prefactor: 1,
      theta: 33.145,
      numerator: [-0.340976, 4.5882, -1.4508, 0.326394, 3.16939e-3, 1.90592e-4, -1.139e-6],
      denominator: [138.497, -22.1878, 4.57151, 1],
      low: 20,
      high: 1000,
    },
    source: 'Assael 2011',
    where: 'normal hydrogen, dilute-gas term',
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
          a: [40783.2321, -800.918604, 8.21470201, -0.01269714457, 1.753605076e-5, -1.20286027e-8, 3.36809349e-12],
        },
        {
          high: 6000,
          a: [560812.801, -837.150474, 2.975364532, 0.001252249124, -3.74071619e-7, 5.9366252e-11, -3.6069941e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, hydrogen, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: {
    value: { diameter: 2.827e-10, wellDepth: 59.7 },
    source: 'Svehla 1962',
    where: 'table I; the place from memory',
  },
  saturation: [
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 13.957,
        high: 33.145,
        temperature: 33.145,
        pressure: 1296400.0,
        terms: [
          { n: -4.89789, t: 1 },
          { n: 0.988558, t: 1.5 },
          { n: 0.349689, t: 2 },
          { n: 0.499356, t: 2.85 },
        ],
      },
      source: 'Leachman 2009',
      where: 'normal hydrogen, ancillary equation of the vapour pressure; from memory',
      uncertainty: 0.005,
    },
  ],
  critical: {
    value: { temperature: 33.19, pressure: 1.313e6, acentric: -0.216 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220' },
    { value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' },
  ],
};
