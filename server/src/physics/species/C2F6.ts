import { chungPotential, chungViscosity } from './chung';
import type { Species } from './species';

/** The critical volume, m³/mol, is of Poling, Prausnitz & O’Connell 2001, appendix A; from memory. */
const critical = { temperature: 293.03, volume: 225e-6, acentric: 0.257 };

export const C2F6: Species = {
  formula: 'C2F6',
  names: ['hexafluoroethane', 'perfluoroethane'],
  molarMass: { value: 138.01e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 8e-5 },
  viscosity: {
    value: chungViscosity(critical, 138.01e-3, { low: 200, high: 1500 }),
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
          a: [-37953.717, 799.82764, -4.67156181, 0.0750145099, -9.8121161e-5, 6.31980759e-8, -1.622597311e-11],
        },
        {
          high: 6000,
          a: [-1011551.484, -942.214071, 22.02553906, -1.31451875e-4, 1.8660453e-8, -3.46711861e-12, 2.488311205e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, hexafluoroethane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: chungPotential(critical), source: 'Chung 1988', where: 'σ and ε/k from the critical point' },
  critical: {
    value: { temperature: 293.03, pressure: 3.048e6, acentric: 0.257 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
