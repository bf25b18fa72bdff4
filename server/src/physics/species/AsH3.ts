import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.145e-10, wellDepth: 259.8 };

export const AsH3: Species = {
  formula: 'AsH3',
  names: ['arsine'],
  molarMass: { value: 77.946e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 3e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 77.946e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.04,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'specific target organ toxicity', source: 'CLP 2008', where: 'STOT RE 2, H373; from memory' },
    { value: 'hazardous to the aquatic environment', source: 'CLP 2008', where: 'Aquatic Acute 1, H400; from memory' },
  ],
};
