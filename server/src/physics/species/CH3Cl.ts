import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

export const CH3Cl: Species = {
  formula: 'CH3Cl',
  names: ['chloromethane', 'methyl chloride'],
  molarMass: { value: 50.485e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 3e-4 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 3.94e-10, wellDepth: 414 }, 50.485e-3, { low: 200, high: 1500 }, 0.5),
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
          a: [-98419.711, 1983.700841, -10.84512305, 0.0477798005, -5.51551626e-5, 3.50617614e-8, -9.23610396e-12],
        },
        {
          high: 6000,
          a: [2522463.305, -10301.15447, 18.82725852, -0.001872291294, 3.47337286e-7, -3.45888722e-11, 1.428941079e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, chloromethane, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: { diameter: 4.182e-10, wellDepth: 350 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 6.24e-30, source: 'Nelson 1967', where: '1.87 D; from memory' },
  critical: {
    value: { temperature: 416.25, pressure: 6.679e6, acentric: 0.151 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    { value: 'carcinogenicity', source: 'CLP 2008', where: 'Carc. 2, H351; from memory' },
    { value: 'specific target organ toxicity', source: 'CLP 2008', where: 'STOT RE 2, H373; from memory' },
  ],
};
