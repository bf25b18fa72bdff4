import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 3.981e-10, wellDepth: 251.5 };

export const PH3: Species = {
  formula: 'PH3',
  names: ['phosphine'],
  molarMass: { value: 33.998e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 5e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 33.998e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.04,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [-6384.32534, 405.756741, -0.1565680086, 0.01338380613, -8.27539143e-6, 3.024360831e-9, -6.42176463e-13],
        },
        {
          high: 6000,
          a: [1334801.106, -6725.46352, 14.45857073, -0.001639736883, 3.40921857e-7, -3.73627208e-11, 1.672947506e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, phosphine, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 1.93e-30, source: 'Nelson 1967', where: '0.58 D; from memory' },
  critical: {
    value: { temperature: 324.5, pressure: 6.54e6, acentric: 0.038 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    {
      value: 'pyrophoric gas',
      source: 'ECHA inventory',
      where: 'H232: may ignite by itself in air, as notified; from memory',
    },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 1, H330; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1B, H314; from memory' },
    { value: 'hazardous to the aquatic environment', source: 'CLP 2008', where: 'Aquatic Acute 1, H400; from memory' },
  ],
};
