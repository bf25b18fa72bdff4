import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

export const HCl: Species = {
  formula: 'HCl',
  names: ['hydrogen chloride'],
  molarMass: { value: 36.458e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 3e-4 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 3.36e-10, wellDepth: 328 }, 36.458e-3, { low: 200, high: 1500 }, 0.34),
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
          a: [20625.88287, -309.3368855, 5.27541885, -0.00482887422, 6.1957946e-6, -3.040023782e-9, 4.91679003e-13],
        },
        {
          high: 6000,
          a: [915774.951, -2770.550211, 5.97353979, -3.62981006e-4, 4.73552919e-8, 2.810262054e-12, -6.65610422e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, hydrogen chloride, 200 to 6000 K',
    uncertainty: 0.003,
  },
  lennardJones: { value: { diameter: 3.339e-10, wellDepth: 344.7 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 3.6e-30, source: 'Nelson 1967', where: '1.08 D; from memory' },
  critical: {
    value: { temperature: 324.7, pressure: 8.31e6, acentric: 0.131 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    {
      value: {
        kind: 'antoine',
        phase: 'liquid',
        low: 188.3,
        high: 309.4,
        pressure: 1e5,
        a: 4.57389,
        b: 868.358,
        c: 1.754,
      },
      source: 'Stull 1947',
      where:
        'Antoine equation fitted to its table; from memory, checked against the boiling point; the error is our judgement',
      uncertainty: 0.05,
    },
  ],
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 3, H331; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1A, H314; from memory' },
  ],
};
