import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 4.64e-10, wellDepth: 518 };

export const iC3H7OH: Species = {
  formula: 'iC3H7OH',
  names: ['isopropanol', 'isopropyl alcohol'],
  molarMass: { value: 60.096e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  viscosity: {
    value: viscosityOfPotential(potential, 60.096e-3, { low: 200, high: 1500 }, 0.2),
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
          a: [-338651.024, 6106.048, -37.9141804, 0.1530494531, -1.864354461e-4, 1.213257738e-7, -3.22043349e-11],
        },
        {
          high: 6000,
          a: [6001074.75, -25058.7683, 46.2209612, -0.00427246631, 7.69367877e-7, -7.45058484e-11, 2.998959935e-15],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, 2-propanol, 200 to 6000 K',
    uncertainty: 0.01,
  },
  lennardJones: {
    value: potential,
    source: 'Monchick & Mason 1961',
    where: 'σ and ε/k of the Stockmayer potential, the dipole left out; from memory',
  },
  dipoleMoment: { value: 5.54e-30, source: 'Nelson 1967', where: '1.66 D; from memory' },
  critical: {
    value: { temperature: 508.3, pressure: 4.762e6, acentric: 0.665 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  saturation: [
    {
      // log₁₀(p/mmHg) = 8.11778 − 1580.92/(t/°C + 219.61).
      value: {
        kind: 'antoine',
        phase: 'liquid',
        low: 273.15,
        high: 374.15,
        pressure: 133.322,
        a: 8.11778,
        b: 1580.92,
        c: -53.54,
      },
      source: 'Dean 1999',
      where: 'table 5.9; from memory, checked against the boiling point; the error is our judgement',
      uncertainty: 0.03,
    },
  ],
  hazards: [
    { value: 'flammable liquid', source: 'CLP 2008', where: 'Flam. Liq. 2, H225; from memory' },
    { value: 'serious eye irritation', source: 'CLP 2008', where: 'Eye Irrit. 2, H319; from memory' },
    { value: 'narcotic effects', source: 'CLP 2008', where: 'STOT SE 3, H336; from memory' },
  ],
};
