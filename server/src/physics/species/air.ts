import { lemmonJacobsen, lemmonJacobsenConductivity } from './lemmonJacobsen';
import type { Species } from './species';

const viscosity = lemmonJacobsen(28.9586, 0.36, 103.3, { low: 70, high: 2000 });

/** Dry air as if it were one gas, after the composition for which its viscosity was correlated. */
export const air: Species = {
  formula: 'air',
  names: ['air', 'dry air'],
  molarMass: {
    value: 28.9586e-3,
    source: 'Lemmon 2000',
    where: 'table 3, the composition below; from memory',
    uncertainty: 0.0001,
  },
  viscosity: {
    value: viscosity,
    source: 'Lemmon & Jacobsen 2004',
    where: 'eqs. 2 and 3, tables I and II; the places from memory',
    uncertainty: 0.01,
  },
  conductivity: {
    value: lemmonJacobsenConductivity(viscosity, 132.6312, 1.308, [
      { n: 1.405, t: -1.1 },
      { n: -1.036, t: -0.3 },
    ]),
    source: 'Lemmon & Jacobsen 2004',
    where: 'eq. 5, table III; the places from memory',
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
          a: [10099.5016, -196.827561, 5.00915511, -0.00576101373, 1.06685993e-5, -7.94029797e-9, 2.18523191e-12],
        },
        {
          high: 6000,
          a: [241521.443, -1257.8746, 5.14455867, -0.000213854179, 7.06522784e-8, -1.07148349e-11, 6.57780015e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, Air, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: {
    value: { diameter: 3.711e-10, wellDepth: 78.6 },
    source: 'Svehla 1962',
    where: 'table I; from memory',
  },
  blend: { value: { N2: 0.7812, Ar: 0.0092, O2: 0.2096 }, source: 'Lemmon 2000', where: 'table 3; from memory' },
  saturation: [
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 59.75,
        high: 132.6312,
        temperature: 132.6312,
        pressure: 3785020.0,
        terms: [
          { n: -0.1567266, t: 0.5 },
          { n: -5.539635, t: 1 },
          { n: 0.7567212, t: 2.5 },
          { n: -3.514322, t: 4 },
        ],
      },
      source: 'Lemmon 2000',
      where: 'ancillary equation of the dew point; from memory',
      uncertainty: 0.005,
    },
  ],
  hazards: [],
};
