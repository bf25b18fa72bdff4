import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

export const HBr: Species = {
  formula: 'HBr',
  names: ['hydrogen bromide'],
  molarMass: { value: 80.912e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 4e-5 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 3.41e-10, wellDepth: 417 }, 80.912e-3, { low: 200, high: 1500 }, 0.14),
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
          a: [25272.22498, -406.511027, 6.04311661, -0.00771788287, 1.149123213e-5, -7.29363328e-9, 1.747406491e-12],
        },
        {
          high: 6000,
          a: [1170033.949, -3786.52101, 7.50314805, -0.001284963943, 3.20625719e-7, -3.44492516e-11, 1.126758417e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, hydrogen bromide, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: { value: { diameter: 3.353e-10, wellDepth: 449 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 2.74e-30, source: 'Nelson 1967', where: '0.82 D; from memory' },
  critical: {
    value: { temperature: 363.2, pressure: 8.55e6, acentric: 0.073 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [{ value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1A, H314; from memory' }],
};
