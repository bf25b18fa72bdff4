import { chungPotential, chungViscosity } from './chung';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

/** The critical volume, m³/mol, is of Poling, Prausnitz & O’Connell 2001, appendix A; from memory. */
const critical = { temperature: 591.75, volume: 316e-6, acentric: 0.264 };

export const C7H8: Species = {
  formula: 'C7H8',
  names: ['toluene', 'methylbenzene'],
  molarMass: { value: 92.141e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: chungViscosity(critical, 92.141e-3, { low: 200, high: 1500 }),
    source: 'Chung 1988',
    where: 'low-pressure gas, without the terms of polarity and association',
    uncertainty: 0.06,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [-287796.222, 6133.94152, -45.7470676, 0.1936895724, -2.304305304e-4, 1.459301178e-7, -3.7907961e-11],
        },
        {
          high: 6000,
          a: [6184538.35, -29902.84056, 59.8200597, -0.00569698396, 1.080748416e-6, -1.098702235e-10, 4.62474022e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, toluene, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: chungPotential(critical), source: 'Chung 1988', where: 'σ and ε/k from the critical point' },
  critical: {
    value: { temperature: 591.75, pressure: 4.108e6, acentric: 0.264 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  // Printed for 309 K and above; at 298 K it still is within half a per cent of the Handbook, and at 273 K within two.
  saturation: [
    wagnerVapour({ temperature: 591.8, bar: 41, coefficients: [-7.28607, 1.38091, -2.83433, -2.79168], low: 273 }),
  ],
  hazards: [
    { value: 'flammable liquid', source: 'CLP 2008', where: 'Flam. Liq. 2, H225; from memory' },
    { value: 'reproductive toxicity', source: 'CLP 2008', where: 'Repr. 2, H361d; from memory' },
    { value: 'specific target organ toxicity', source: 'CLP 2008', where: 'STOT RE 2, H373; from memory' },
    { value: 'narcotic effects', source: 'CLP 2008', where: 'STOT SE 3, H336; from memory' },
  ],
};
