import type { Species } from './species';

export const CO: Species = {
  formula: 'CO',
  names: ['carbon monoxide'],
  molarMass: { value: 28.01e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 0.0001 },
  viscosity: {
    value: {
      kind: 'exponential',
      prefactor: 1e-7,
      low: 200,
      high: 5000,
      pieces: [
        { high: 1000, a: [0.60443938, -43.632704, -884.41949, 1.897215] },
        { high: 5000, a: [0.65060585, 28.517449, -16690.236, 1.5223271] },
      ],
    },
    source: 'Svehla 1995',
    where: 'CO, fitted to Boushehri et al. 1987 below 1000 K',
    uncertainty: 0.015,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [14890.45326, -292.2285939, 5.72452717, -0.00817623503, 1.456903469e-5, -1.087746302e-8, 3.027941827e-12],
        },
        {
          high: 6000,
          a: [461919.725, -1944.704863, 5.91671418, -0.000566428283, 1.39881454e-7, -1.787680361e-11, 9.62093557e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, carbon monoxide, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: {
    value: { diameter: 3.69e-10, wellDepth: 91.7 },
    source: 'Svehla 1962',
    where: 'table I; the place from memory',
  },
  saturation: [
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 14,
        high: 61.55,
        pressure: 1e5,
        inverse: [10.43, -721.3, -1.074e4, 2.341e5, -2.392e6, 9.478e6],
      },
      source: 'Fray & Schmitt 2009',
      where: 'table 5; as repeated by others',
      uncertainty: 0.05,
    },
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 61.55,
        high: 68.16,
        pressure: 1e5,
        inverse: [10.25, -748.2, -5843, 3.939e4],
      },
      source: 'Fray & Schmitt 2009',
      where: 'table 5; as repeated by others',
      uncertainty: 0.03,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 68.16,
        high: 132.86,
        temperature: 132.86,
        pressure: 3494000.0,
        terms: [
          { n: -6.1192, t: 1 },
          { n: 1.0411, t: 1.5 },
          { n: -6.2162, t: 3.9 },
          { n: 10.437, t: 4.6 },
          { n: -7.6813, t: 5.4 },
        ],
      },
      source: 'Lemmon & Span 2006',
      where: 'vapour pressure of the equation of state; from memory',
      uncertainty: 0.005,
    },
  ],
  critical: {
    value: { temperature: 132.85, pressure: 3.494e6, acentric: 0.045 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220' },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 3, H331' },
    { value: 'reproductive toxicity', source: 'CLP 2008', where: 'Repr. 1A, H360D' },
    { value: 'specific target organ toxicity', source: 'CLP 2008', where: 'STOT RE 1, H372' },
  ],
};
