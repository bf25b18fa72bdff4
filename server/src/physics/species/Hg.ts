import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 2.969e-10, wellDepth: 750 };

export const Hg: Species = {
  formula: 'Hg',
  names: ['mercury vapour', 'mercury'],
  molarMass: { value: 200.592e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 200.592e-3, { low: 300, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.06,
  },
  heatCapacity: {
    value: { kind: 'monatomic' },
    source: 'Chapman & Cowling 1970',
    where: 'section 2.44: translation only, 5/2 R',
    uncertainty: 0,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'reproductive toxicity', source: 'CLP 2008', where: 'Repr. 1B, H360D; from memory' },
    { value: 'specific target organ toxicity', source: 'CLP 2008', where: 'STOT RE 1, H372; from memory' },
    {
      value: 'hazardous to the aquatic environment',
      source: 'CLP 2008',
      where: 'Aquatic Chronic 1, H410; from memory',
    },
  ],
};
