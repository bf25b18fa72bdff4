import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

export const SO2: Species = {
  formula: 'SO2',
  names: ['sulfur dioxide', 'sulphur dioxide'],
  molarMass: { value: 64.058e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 4e-4 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 4.04e-10, wellDepth: 347 }, 64.058e-3, { low: 200, high: 1500 }, 0.42),
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
          a: [-53108.4214, 909.031167, -2.356891244, 0.02204449885, -2.510781471e-5, 1.446300484e-8, -3.36907094e-12],
        },
        {
          high: 6000,
          a: [-112764.0116, -825.226138, 7.61617863, -1.99932761e-4, 5.65563143e-8, -5.45431661e-12, 2.918294102e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, sulfur dioxide, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: { diameter: 4.112e-10, wellDepth: 335.4 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 5.44e-30, source: 'Nelson 1967', where: '1.63 D; from memory' },
  critical: {
    value: { temperature: 430.8, pressure: 7.884e6, acentric: 0.245 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    {
      value: {
        kind: 'antoine',
        phase: 'liquid',
        low: 263,
        high: 414.9,
        pressure: 1e5,
        a: 4.37798,
        b: 966.575,
        c: -42.071,
      },
      source: 'Stull 1947',
      where:
        'Antoine equation fitted to its table; from memory, checked against the boiling point; the error is our judgement',
      uncertainty: 0.05,
    },
  ],
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 3, H331; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1B, H314; from memory' },
  ],
};
