import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

export const CH3OH: Species = {
  formula: 'CH3OH',
  names: ['methanol', 'methyl alcohol'],
  molarMass: { value: 32.042e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 3.69e-10, wellDepth: 417 }, 32.042e-3, { low: 200, high: 1500 }, 0.5),
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
          a: [-241664.2886, 4032.14719, -20.46415436, 0.0690369807, -7.59893269e-5, 4.59820836e-8, -1.158706744e-11],
        },
        {
          high: 6000,
          a: [3411570.76, -13455.00201, 22.61407623, -0.002141029179, 3.73005054e-7, -3.49884639e-11, 1.366073444e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, methanol, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: { diameter: 3.626e-10, wellDepth: 481.8 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 5.67e-30, source: 'Nelson 1967', where: '1.7 D; from memory' },
  critical: {
    value: { temperature: 512.64, pressure: 8.097e6, acentric: 0.565 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 512.6, bar: 80.9, coefficients: [-8.54796, 0.76982, -3.1085, 1.54481], low: 288 }),
  ],
  hazards: [
    { value: 'flammable liquid', source: 'CLP 2008', where: 'Flam. Liq. 2, H225; from memory' },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 3, H331; from memory' },
    { value: 'specific target organ toxicity', source: 'CLP 2008', where: 'STOT SE 1, H370; from memory' },
  ],
};
