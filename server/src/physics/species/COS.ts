import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.13e-10, wellDepth: 336 };

export const COS: Species = {
  formula: 'COS',
  names: ['carbonyl sulfide', 'carbonyl sulphide'],
  molarMass: { value: 60.07e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 4e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 60.07e-3, { low: 200, high: 1500 }),
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
          a: [85478.7643, -1319.464821, 9.73525724, -0.00687083096, 1.082331416e-5, -7.70559734e-9, 2.078570344e-12],
        },
        {
          high: 6000,
          a: [195909.8567, -1756.167688, 8.71043034, -4.13942496e-4, 1.015243648e-7, -1.159609663e-11, 5.69105386e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, carbonyl sulfide, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 2.37e-30, source: 'Nelson 1967', where: '0.712 D; from memory' },
  critical: {
    value: { temperature: 378.8, pressure: 6.349e6, acentric: 0.097 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'ECHA inventory', where: 'Flam. Gas 1, H220, as notified; from memory' },
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 3, H331, as notified; from memory',
    },
  ],
};
