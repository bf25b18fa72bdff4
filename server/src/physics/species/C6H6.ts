import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 5.349e-10, wellDepth: 412.3 };

export const C6H6: Species = {
  formula: 'C6H6',
  names: ['benzene'],
  molarMass: { value: 78.114e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 78.114e-3, { low: 200, high: 1500 }),
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
          a: [-167734.0902, 4404.50004, -37.1737791, 0.1640509559, -2.020812374e-4, 1.307915264e-7, -3.4442841e-11],
        },
        {
          high: 6000,
          a: [4538575.72, -22605.02547, 46.940073, -0.00420667683, 7.90799433e-7, -7.9683021e-11, 3.32821208e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, benzene, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 562.05, pressure: 4.895e6, acentric: 0.21 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 562.2, bar: 48.9, coefficients: [-6.98273, 1.33213, -2.62863, -3.33399], low: 288 }),
  ],
  hazards: [
    { value: 'flammable liquid', source: 'CLP 2008', where: 'Flam. Liq. 2, H225; from memory' },
    { value: 'carcinogenicity', source: 'CLP 2008', where: 'Carc. 1A, H350; from memory' },
    { value: 'germ cell mutagenicity', source: 'CLP 2008', where: 'Muta. 1B, H340; from memory' },
    { value: 'specific target organ toxicity', source: 'CLP 2008', where: 'STOT RE 1, H372; from memory' },
  ],
};
