import { lemmonJacobsen, lemmonJacobsenConductivity } from './lemmonJacobsen';
import type { Species } from './species';

const viscosity = lemmonJacobsen(28.01348, 0.3656, 98.94, { low: 70, high: 2000 });

export const N2: Species = {
  formula: 'N2',
  names: ['nitrogen'],
  molarMass: { value: 28.014e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 0.0001 },
  viscosity: {
    value: viscosity,
    source: 'Lemmon & Jacobsen 2004',
    where: 'eqs. 2 and 3, tables I and II; the places from memory',
    uncertainty: 0.01,
  },
  conductivity: {
    value: lemmonJacobsenConductivity(viscosity, 126.192, 1.511, [
      { n: 2.117, t: -1 },
      { n: -3.332, t: -0.7 },
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
          a: [22103.71497, -381.846182, 6.08273836, -0.00853091441, 1.384646189e-5, -9.62579362e-9, 2.519705809e-12],
        },
        {
          high: 6000,
          a: [587712.406, -2239.249073, 6.06694922, -0.00061396855, 1.491806679e-7, -1.923105485e-11, 1.061954386e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, nitrogen, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: {
    value: { diameter: 3.798e-10, wellDepth: 71.4 },
    source: 'Svehla 1962',
    where: 'table I; the place from memory',
  },
  saturation: [
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 21.2,
        high: 35.61,
        pressure: 1e5,
        inverse: [12.4, -807.4, -3926, 6.297e4, -4.633e5, 1.325e6],
      },
      source: 'Fray & Schmitt 2009',
      where: 'table 5; from memory',
      uncertainty: 0.06,
    },
    {
      value: {
        kind: 'powers',
        phase: 'solid',
        low: 35.61,
        high: 63.151,
        pressure: 1e5,
        inverse: [8.514, -458.4, -1.987e4, 4.8e5, -4.524e6],
      },
      source: 'Fray & Schmitt 2009',
      where: 'table 5; from memory',
      uncertainty: 0.06,
    },
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 63.151,
        high: 126.192,
        temperature: 126.192,
        pressure: 3395800.0,
        terms: [
          { n: -6.12445284, t: 1 },
          { n: 1.2632722, t: 1.5 },
          { n: -0.765910082, t: 2.5 },
          { n: -1.77570564, t: 5 },
        ],
      },
      source: 'Span 2000',
      where: 'ancillary equation of the vapour pressure; from memory',
      uncertainty: 0.002,
    },
  ],
  critical: {
    value: { temperature: 126.2, pressure: 3.398e6, acentric: 0.037 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
