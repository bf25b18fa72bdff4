import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';
import { wagnerVapour } from './wagnerVapour';

const potential = { diameter: 4.217e-10, wellDepth: 316 };

export const Cl2: Species = {
  formula: 'Cl2',
  names: ['chlorine'],
  molarMass: { value: 70.9e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 3e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 70.9e-3, { low: 200, high: 1500 }),
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
          a: [34628.1517, -554.712652, 6.20758937, -0.002989632078, 3.17302729e-6, -1.793629562e-9, 4.26004359e-13],
        },
        {
          high: 6000,
          a: [6092569.42, -19496.27662, 28.54535795, -0.01449968764, 4.46389077e-6, -6.35852586e-10, 3.32736029e-14],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, chlorine, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 417, pressure: 7.7e6, acentric: 0.069 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    wagnerVapour({ temperature: 416.9, bar: 79.8, coefficients: [-6.34074, 1.15037, -1.40416, -2.2322], low: 206 }),
  ],
  hazards: [
    { value: 'oxidising gas', source: 'CLP 2008', where: 'Ox. Gas 1, H270; from memory' },
    { value: 'acute toxicity, inhalation', source: 'CLP 2008', where: 'Acute Tox. 3, H331; from memory' },
    { value: 'skin irritation', source: 'CLP 2008', where: 'Skin Irrit. 2, H315; from memory' },
    { value: 'serious eye irritation', source: 'CLP 2008', where: 'Eye Irrit. 2, H319; from memory' },
    { value: 'hazardous to the aquatic environment', source: 'CLP 2008', where: 'Aquatic Acute 1, H400; from memory' },
  ],
};
