import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 5.947e-10, wellDepth: 322.7 };

export const CCl4: Species = {
  formula: 'CCl4',
  names: ['carbon tetrachloride', 'tetrachloromethane'],
  molarMass: { value: 153.811e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 3e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 153.811e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.03,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [109338.5626, -1861.731846, 14.49632467, 0.00394948516, -1.010805379e-5, 8.64551417e-9, -2.642368852e-12],
        },
        {
          high: 6000,
          a: [-304307.8255, -216.8170491, 13.16132386, -6.43112489e-5, 1.416482497e-8, -1.61934332e-12, 7.48397435e-17],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, carbon tetrachloride, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 556.4, pressure: 4.56e6, acentric: 0.193 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 556.4, bar: 45.6, coefficients: [-7.07139, 1.71497, -2.8993, -2.49466], low: 250.5 }),
  ],
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 3, H331; from memory' },
    { value: 'carcinogenicity', source: 'CLP 2008', where: 'Carc. 2, H351; from memory' },
    { value: 'specific target organ toxicity', source: 'CLP 2008', where: 'STOT RE 1, H372; from memory' },
    { value: 'hazardous to the ozone layer', source: 'CLP 2008', where: 'Ozone 1, H420; from memory' },
  ],
};
