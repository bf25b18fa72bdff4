import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.154e-10, wellDepth: 175 };

export const NF3: Species = {
  formula: 'NF3',
  names: ['nitrogen trifluoride'],
  molarMass: { value: 71.001e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 6e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 71.001e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), estimated from other properties',
    uncertainty: 0.08,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [87571.4928, -903.183289, 4.02741727, 0.02314439555, -3.41510647e-5, 2.409483651e-8, -6.63346419e-12],
        },
        {
          high: 6000,
          a: [-349626.876, -497.372867, 10.36866128, 8.90068765e-5, 5.88265436e-8, -3.157737664e-12, 1.714329953e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, nitrogen trifluoride, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 234, pressure: 4.461e6, acentric: 0.126 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'oxidising gas', source: 'ECHA inventory', where: 'Ox. Gas 1, H270, as notified; from memory' },
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 4, H332, as notified; from memory',
    },
    {
      value: 'specific target organ toxicity',
      source: 'ECHA inventory',
      where: 'STOT RE 2, H373, as notified; from memory',
    },
  ],
};
