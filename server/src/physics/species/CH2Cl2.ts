import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

export const CH2Cl2: Species = {
  formula: 'CH2Cl2',
  names: ['dichloromethane', 'methylene chloride'],
  molarMass: { value: 84.927e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 3e-4 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 4.52e-10, wellDepth: 483 }, 84.927e-3, { low: 200, high: 1500 }, 0.2),
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
          a: [-25098.41179, 868.766738, -5.09466921, 0.0415004999, -5.19977215e-5, 3.44594426e-8, -9.27029252e-12],
        },
        {
          high: 6000,
          a: [1529279.337, -6976.95476, 16.94154931, -0.001265053995, 2.344766734e-7, -2.333227421e-11, 9.63283473e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, dichloromethane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: { diameter: 4.898e-10, wellDepth: 356.3 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 5.34e-30, source: 'Nelson 1967', where: '1.6 D; from memory' },
  critical: {
    value: { temperature: 510, pressure: 6.08e6, acentric: 0.199 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'carcinogenicity', source: 'CLP 2008', where: 'Carc. 2, H351; from memory' }],
};
