import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

export const C2H5OH: Species = {
  formula: 'C2H5OH',
  names: ['ethanol', 'ethyl alcohol'],
  molarMass: { value: 46.069e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 4.31e-10, wellDepth: 431 }, 46.069e-3, { low: 200, high: 1500 }, 0.3),
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
          a: [-234279.1392, 4479.18055, -27.44817302, 0.1088679162, -1.305309334e-4, 8.4373464e-8, -2.234559017e-11],
        },
        {
          high: 6000,
          a: [4694817.65, -19297.98213, 34.4758404, -0.00323616598, 5.78494772e-7, -5.56460027e-11, 2.2262264e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, ethanol, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: { diameter: 4.53e-10, wellDepth: 362.6 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 5.64e-30, source: 'Nelson 1967', where: '1.69 D; from memory' },
  critical: {
    value: { temperature: 513.92, pressure: 6.148e6, acentric: 0.649 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 513.9, bar: 61.4, coefficients: [-8.51838, 0.34163, -5.73683, 8.32581], low: 293 }),
  ],
  hazards: [{ value: 'flammable liquid', source: 'CLP 2008', where: 'Flam. Liq. 2, H225; from memory' }],
};
