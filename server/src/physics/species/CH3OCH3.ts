import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

export const CH3OCH3: Species = {
  formula: 'CH3OCH3',
  names: ['dimethyl ether', 'methoxymethane'],
  molarMass: { value: 46.069e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 4.21e-10, wellDepth: 432 }, 46.069e-3, { low: 200, high: 1500 }, 0.19),
    source: 'Monchick & Mason 1961',
    where: 'table of parameters; from memory',
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
          a: [-269310.3242, 4300.70971, -21.52788028, 0.0813183339, -8.29567132e-5, 4.80191151e-8, -1.188699808e-11],
        },
        {
          high: 6000,
          a: [4933577.19, -20830.94065, 36.2905061, -0.00410835164, 7.90322031e-7, -8.13143563e-11, 3.45816611e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, dimethyl ether, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: { diameter: 4.307e-10, wellDepth: 395 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 4.34e-30, source: 'Nelson 1967', where: '1.3 D; from memory' },
  critical: {
    value: { temperature: 400.1, pressure: 5.37e6, acentric: 0.2 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' }],
};
