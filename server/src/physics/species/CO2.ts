import type { Species } from './species';

export const CO2: Species = {
  formula: 'CO2',
  names: ['carbon dioxide'],
  molarMass: { value: 44.009e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 0.0001 },
  viscosity: {
    value: {
      kind: 'collision-integral',
      prefactor: 1.00697e-6,
      theta: 251.196,
      coefficients: [0.235156, -0.491266, 5.211155e-2, 5.347906e-2, -1.537102e-2],
      low: 200,
      high: 1500,
    },
    source: 'Fenghour 1998',
    where: 'eqs. 3 and 4, table 1',
    uncertainty: 0.01,
  },
  conductivity: {
    value: {
      kind: 'inverse-powers',
      prefactor: 1e-3,
      theta: 304.1282,
      coefficients: [1.51874307e-2, 2.8067404e-2, 2.2856419e-2, -7.4162421e-3],
      low: 200,
      high: 1100,
    },
    source: 'Huber 2016',
    where: 'eq. 3, table 3',
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
          a: [49436.5054, -626.411601, 5.30172524, 0.002503813816, -2.127308728e-7, -7.68998878e-10, 2.849677801e-13],
        },
        {
          high: 6000,
          a: [117696.2419, -1788.791477, 8.29152319, -9.22315678e-5, 4.86367688e-9, -1.891053312e-12, 6.33003659e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, carbon dioxide, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: {
    value: { diameter: 3.941e-10, wellDepth: 195.2 },
    source: 'Svehla 1962',
    where: 'table I; the place from memory',
  },
  saturation: [
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 40,
        high: 154,
        pressure: 1e5,
        inverse: [14.76, -2571, -7.781e4, 4.325e6, -1.207e8, 1.35e9],
      },
      source: 'Fray & Schmitt 2009',
      where: 'table 5; as repeated by others',
      uncertainty: 0.05,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'solid',
        low: 154,
        high: 216.592,
        temperature: 216.592,
        pressure: 0.51795e6,
        terms: [
          { n: -14.740846, t: 1 },
          { n: 2.4327015, t: 1.9 },
          { n: -5.3061778, t: 2.9 },
        ],
      },
      source: 'Span & Wagner 1996',
      where: 'sublimation pressure; from memory',
      uncertainty: 0.005,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 216.592,
        high: 304.1282,
        temperature: 304.1282,
        pressure: 7377300.0,
        terms: [
          { n: -7.0602087, t: 1 },
          { n: 1.9391218, t: 1.5 },
          { n: -1.6463597, t: 2 },
          { n: -3.2995634, t: 4 },
        ],
      },
      source: 'Span & Wagner 1996',
      where: 'vapour pressure; from memory',
      uncertainty: 0.002,
    },
  ],
  critical: {
    value: { temperature: 304.12, pressure: 7.374e6, acentric: 0.225 },
    source: 'Poling 2001',
    where: 'appendix A',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
