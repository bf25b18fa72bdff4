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
  saturation: [
    {
      value: {
        kind: 'wagner',
        phase: 'liquid',
        low: 234.3,
        high: 1764,
        temperature: 1764,
        pressure: 167e6,
        terms: [
          { n: -4.57618368, t: 1 },
          { n: -1.40726277, t: 1.89 },
          { n: 2.36263541, t: 2 },
          { n: -31.0889985, t: 8 },
          { n: 58.0183959, t: 8.5 },
          { n: -27.6304546, t: 9 },
        ],
      },
      source: 'Huber 2006',
      where: 'eq. 1; from memory, checked against the boiling point',
      uncertainty: 0.03,
    },
  ],
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
