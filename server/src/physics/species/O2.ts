import { lemmonJacobsen, lemmonJacobsenConductivity } from './lemmonJacobsen';
import type { Species } from './species';

const viscosity = lemmonJacobsen(31.9988, 0.3428, 118.5, { low: 70, high: 2000 });

export const O2: Species = {
  formula: 'O2',
  names: ['oxygen'],
  molarMass: { value: 31.998e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 0.0001 },
  viscosity: {
    value: viscosity,
    source: 'Lemmon & Jacobsen 2004',
    where: 'eqs. 2 and 3, tables I and II; the places from memory',
    uncertainty: 0.015,
  },
  conductivity: {
    value: lemmonJacobsenConductivity(viscosity, 154.581, 1.036, [
      { n: 6.283, t: -0.9 },
      { n: -4.262, t: -0.6 },
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
          a: [-34255.6342, 484.700097, 1.119010961, 0.00429388924, -6.83630052e-7, -2.0233727e-9, 1.039040018e-12],
        },
        {
          high: 6000,
          a: [
            -1037939.022, 2344.830282, 1.819732036, 0.001267847582, -2.188067988e-7, 2.053719572e-11, -8.19346705e-16,
          ],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, oxygen, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: {
    value: { diameter: 3.467e-10, wellDepth: 106.7 },
    source: 'Svehla 1962',
    where: 'table I; from memory',
  },
  saturation: [
    {
      value: {
        kind: 'wagner',
        phase: 'solid',
        low: 43.8,
        high: 54.361,
        temperature: 54.361,
        pressure: 146.33,
        terms: [{ n: -18.14, t: 1 }],
      },
      source: 'Giauque & Johnston 1929',
      where:
        'Clausius–Clapeyron from the triple point with 8.20 kJ/mol, their heats of fusion and of vaporisation; from memory',
      uncertainty: 0.05,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 54.361,
        high: 154.581,
        temperature: 154.581,
        pressure: 5043000.0,
        terms: [
          { n: -6.043938, t: 1 },
          { n: 1.175627, t: 1.5 },
          { n: -0.994086, t: 3 },
          { n: -3.449148, t: 7 },
          { n: 3.343141, t: 9 },
        ],
      },
      source: 'Stewart 1991',
      where: 'ancillary equation of the vapour pressure; from memory',
      uncertainty: 0.003,
    },
  ],
  critical: {
    value: { temperature: 154.58, pressure: 5.043e6, acentric: 0.022 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'oxidising gas', source: 'CLP 2008', where: 'Ox. Gas 1, H270' }],
};
