import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 5.977e-10, wellDepth: 390.2 };

export const SiCl4: Species = {
  formula: 'SiCl4',
  names: ['silicon tetrachloride', 'tetrachlorosilane'],
  molarMass: { value: 169.885e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 3e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 169.885e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), estimated from other properties',
    uncertainty: 0.12,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [117164.6285, -2185.821461, 19.08250496, -0.00963633572, 8.83684769e-6, -4.3600424e-9, 8.94023243e-13],
        },
        {
          high: 6000,
          a: [-210033.0761, -84.7610771, 13.06364027, -2.55402042e-5, 5.65381847e-9, -6.48875267e-13, 3.008025543e-17],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, silicon tetrachloride, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  hazards: [
    { value: 'skin corrosion', source: 'ECHA inventory', where: 'Skin Corr. 1A, H314, as notified; from memory' },
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 3, H331, as notified; from memory',
    },
  ],
};
