import type { Species } from './species';

export const CH4: Species = {
  formula: 'CH4',
  names: ['methane'],
  molarMass: { value: 16.043e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 0.0002 },
  viscosity: {
    value: {
      kind: 'cube-roots',
      prefactor: 10.5e-6,
      theta: 174,
      coefficients: [
        -3.0328138281, 16.918880086, -37.189364917, 41.288861858, -24.61592114, 8.9488430959, -1.8739245042,
        0.2096610139, -9.6570437074e-3,
      ],
      low: 91,
      high: 600,
    },
    source: 'Friend 1989',
    where: 'dilute-gas viscosity; the place in the paper from memory',
    uncertainty: 0.01,
  },
  conductivity: {
    value: {
      kind: 'exponential',
      prefactor: 1e-4,
      low: 200,
      high: 1000,
      pieces: [{ high: 1000, a: [1.0238177, -310.92375, 32944.309, 0.67787437] }],
    },
    source: 'Svehla 1995',
    where: 'CH4',
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
          a: [-176685.0998, 2786.18102, -12.0257785, 0.0391761929, -3.61905443e-5, 2.026853043e-8, -4.97670549e-12],
        },
        {
          high: 6000,
          a: [3730042.76, -13835.01485, 20.49107091, -0.001961974759, 4.72731304e-7, -3.72881469e-11, 1.623737207e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, methane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: {
    value: { diameter: 3.758e-10, wellDepth: 148.6 },
    source: 'Svehla 1962',
    where: 'table I; the place from memory',
  },
  saturation: [
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 30,
        high: 90.6941,
        pressure: 1e5,
        inverse: [10.51, -1110, -4341, 1.035e5, -7.91e5],
      },
      source: 'Fray & Schmitt 2009',
      where: 'table 5; as repeated by others',
      uncertainty: 0.05,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 90.6941,
        high: 190.564,
        temperature: 190.564,
        pressure: 4599200.0,
        terms: [
          { n: -6.036219, t: 1 },
          { n: 1.409353, t: 1.5 },
          { n: -0.4945199, t: 2 },
          { n: -1.443048, t: 4.5 },
        ],
      },
      source: 'Setzmann & Wagner 1991',
      where: 'ancillary equation of the vapour pressure; from memory',
      uncertainty: 0.002,
    },
  ],
  critical: {
    value: { temperature: 190.56, pressure: 4.599e6, acentric: 0.011 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220' },
    { value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' },
  ],
};
