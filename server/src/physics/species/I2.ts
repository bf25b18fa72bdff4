import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 5.16e-10, wellDepth: 474.2 };

export const I2: Species = {
  formula: 'I2',
  names: ['iodine vapour', 'iodine'],
  molarMass: { value: 253.8e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 8e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 253.8e-3, { low: 200, high: 1500 }),
    source: 'Svehla 1962',
    where: 'table I(a), fitted to measured viscosities',
    uncertainty: 0.04,
  },
  heatCapacity: {
    value: {
      kind: 'nasa-9',
      low: 200,
      high: 6000,
      intervals: [
        {
          high: 1000,
          a: [-5087.96877, -12.4958521, 4.50421909, 1.370962533e-4, -1.390523014e-7, 1.174813853e-10, -2.337541043e-14],
        },
        {
          high: 6000,
          a: [-5632594.16, 17939.6156, -17.23055169, 0.0124421408, -3.33276858e-6, 4.12547794e-10, -1.960461713e-14],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, iodine vapour, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  hazards: [
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 4, H332; from memory' },
    { value: 'hazardous to the aquatic environment', source: 'CLP 2008', where: 'Aquatic Acute 1, H400; from memory' },
  ],
};
