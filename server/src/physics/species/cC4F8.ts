import { chungPotential, chungViscosity } from './chung';
import type { Species } from './species';

/** The critical volume, m³/mol, is of Poling, Prausnitz & O’Connell 2001, appendix A; from memory. */
const critical = { temperature: 388.37, volume: 324e-6, acentric: 0.356 };

export const cC4F8: Species = {
  formula: 'cC4F8',
  names: ['octafluorocyclobutane', 'perfluorocyclobutane'],
  molarMass: { value: 200.028e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 8e-5 },
  viscosity: {
    value: chungViscosity(critical, 200.028e-3, { low: 200, high: 1500 }),
    source: 'Chung 1988',
    where: 'low-pressure gas, without the terms of polarity and association',
    uncertainty: 0.06,
  },
  lennardJones: { value: chungPotential(critical), source: 'Chung 1988', where: 'σ and ε/k from the critical point' },
  critical: {
    value: { temperature: 388.37, pressure: 2.778e6, acentric: 0.356 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'simple asphyxiant', source: 'OSHA HCS 2012', where: 'definition of a simple asphyxiant' }],
};
