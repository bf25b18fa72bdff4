import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

export const CHCl3: Species = {
  formula: 'CHCl3',
  names: ['chloroform', 'trichloromethane'],
  molarMass: { value: 119.369e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 3e-4 },
  viscosity: {
    value: viscosityOfPotential({ diameter: 5.31e-10, wellDepth: 355 }, 119.369e-3, { low: 200, high: 1500 }, 0.07),
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
          a: [33953.3329, -304.7428785, 2.923672263, 0.02830547858, -3.71242469e-5, 2.551365915e-8, -6.98765955e-12],
        },
        {
          high: 6000,
          a: [613605.274, -3715.08717, 15.10777247, 2.362584336e-4, 1.297140438e-7, -1.267494791e-11, 5.25902231e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, chloroform, 200 to 6000 K',
    uncertainty: 0.03,
  },
  lennardJones: { value: { diameter: 5.389e-10, wellDepth: 340.2 }, source: 'Svehla 1962', where: 'table I(a)' },
  dipoleMoment: { value: 3.37e-30, source: 'Nelson 1967', where: '1.01 D; from memory' },
  critical: {
    value: { temperature: 536.4, pressure: 5.37e6, acentric: 0.218 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 3, H331; from memory' },
    { value: 'carcinogenicity', source: 'CLP 2008', where: 'Carc. 2, H351; from memory' },
    { value: 'reproductive toxicity', source: 'CLP 2008', where: 'Repr. 2, H361d; from memory' },
    { value: 'specific target organ toxicity', source: 'CLP 2008', where: 'STOT RE 1, H372; from memory' },
  ],
};
