import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

export const H2S: Species = {
  formula: 'H2S',
  names: ['hydrogen sulfide', 'hydrogen sulphide'],
  molarMass: { value: 34.076e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 6e-4 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 3.49e-10, wellDepth: 343 }, 34.076e-3, { low: 200, high: 1500 }, 0.21),
    source: 'Monchick & Mason 1961',
    where: 'table of parameters; from memory. They rest on measurements of 1921, some 5 % above the later ones',
    uncertainty: 0.07,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [9543.80881, -68.7517508, 4.05492196, -3.014557336e-4, 3.76849775e-6, -2.239358925e-9, 3.086859108e-13],
        },
        {
          high: 6000,
          a: [1430040.22, -5284.02865, 10.16182124, -9.70384996e-4, 2.154003405e-7, -2.1696957e-11, 9.31816307e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, hydrogen sulfide, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: { diameter: 3.623e-10, wellDepth: 301.1 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 3.24e-30, source: 'Nelson 1967', where: '0.97 D; from memory' },
  critical: {
    value: { temperature: 373.4, pressure: 8.963e6, acentric: 0.09 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    {
      value: {
        kind: 'antoine',
        phase: 'liquid',
        low: 212,
        high: 349.5,
        pressure: 1e5,
        a: 4.52887,
        b: 958.587,
        c: -0.539,
      },
      source: 'Stull 1947',
      where:
        'Antoine equation fitted to its table from 212.8 K, here from 212 K; from memory, checked against the boiling point; the error is our judgement',
      uncertainty: 0.05,
    },
  ],
  hazards: [
    { value: 'flammable gas', source: 'CLP 2008', where: 'Flam. Gas 1, H220; from memory' },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 2, H330; from memory' },
    { value: 'hazardous to the aquatic environment', source: 'CLP 2008', where: 'Aquatic Acute 1, H400; from memory' },
  ],
};
