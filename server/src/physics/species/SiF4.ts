import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.88e-10, wellDepth: 171.9 };

export const SiF4: Species = {
  formula: 'SiF4',
  names: ['silicon tetrafluoride', 'tetrafluorosilane'],
  molarMass: { value: 104.077e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 5e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 104.077e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.05,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [10696.70784, -95.6963864, 2.513988593, 0.0330978103, -4.57304408e-5, 3.091834452e-8, -8.26930405e-12],
        },
        {
          high: 6000,
          a: [-384589.232, -656.997991, 13.4892572, -5.10047136e-5, 5.34632958e-8, -4.95959811e-12, 2.299314375e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, silicon tetrafluoride, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  hazards: [
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 2, H330, as notified; from memory',
    },
    { value: 'skin corrosion', source: 'ECHA inventory', where: 'Skin Corr. 1B, H314, as notified; from memory' },
  ],
};
