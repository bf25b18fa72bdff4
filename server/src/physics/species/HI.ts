import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

export const HI: Species = {
  formula: 'HI',
  names: ['hydrogen iodide'],
  molarMass: { value: 127.908e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 8e-5 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 4.13e-10, wellDepth: 313 }, 127.908e-3, { low: 200, high: 1500 }, 0.029),
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
          a: [18728.8173, -343.178884, 5.95671243, -0.0085434396, 1.454780274e-5, -1.049104164e-8, 2.839734003e-12],
        },
        {
          high: 6000,
          a: [472492.145, -1923.465741, 5.75804897, -4.06626638e-4, 9.47433205e-8, -1.033534431e-11, 4.61161479e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, hydrogen iodide, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: { value: { diameter: 4.211e-10, wellDepth: 288.7 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 1.47e-30, source: 'Nelson 1967', where: '0.44 D; from memory' },
  critical: {
    value: { temperature: 424, pressure: 8.31e6, acentric: 0.05 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1A, H314; from memory' }],
};
