import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 3.828e-10, wellDepth: 232.4 };

export const N2O: Species = {
  formula: 'N2O',
  names: ['nitrous oxide', 'dinitrogen monoxide'],
  molarMass: { value: 44.013e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 7e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 44.013e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.03,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [42882.2597, -644.011844, 6.03435143, 2.265394436e-4, 3.47278285e-6, -3.62774864e-9, 1.137969552e-12],
        },
        {
          high: 6000,
          a: [343844.804, -2404.557558, 9.12563622, -5.40166793e-4, 1.315124031e-7, -1.4142151e-11, 6.38106687e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, nitrous oxide, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 309.52, pressure: 7.245e6, acentric: 0.162 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'oxidising gas', source: 'ECHA inventory', where: 'Ox. Gas 1, H270, as notified; from memory' },
    { value: 'narcotic effects', source: 'ECHA inventory', where: 'STOT SE 3, H336, as notified; from memory' },
  ],
};
