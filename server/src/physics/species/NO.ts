import { viscosityOfPotential } from '../transport/stockmayer';
import type { Species } from './species';

const potential = { diameter: 3.492e-10, wellDepth: 116.7 };

export const NO: Species = {
  formula: 'NO',
  names: ['nitric oxide', 'nitrogen monoxide'],
  molarMass: { value: 30.006e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 7e-5 },
  viscosity: {
    value: viscosityOfPotential(potential, 30.006e-3, { low: 200, high: 1500 }),
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
          a: [-11439.16503, 153.6467592, 3.43146873, -0.002668592368, 8.48139912e-6, -7.68511105e-9, 2.386797655e-12],
        },
        {
          high: 6000,
          a: [223901.8716, -1289.651623, 5.43393603, -3.6560349e-4, 9.88096645e-8, -1.416076856e-11, 9.38018462e-16],
        },
      ],
    },
    source: 'McBride 2002',
    where: 'table 1, nitric oxide, 200 to 6000 K',
    uncertainty: 0.005,
  },
  lennardJones: { value: potential, source: 'Svehla 1962', where: 'table I(a)' },
  critical: {
    value: { temperature: 180, pressure: 6.48e6, acentric: 0.582 },
    source: 'Poling 2001',
    where: 'appendix A; from memory',
  },
  hazards: [
    { value: 'oxidising gas', source: 'ECHA inventory', where: 'Ox. Gas 1, H270, as notified; from memory' },
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 1, H330, as notified; from memory',
    },
    { value: 'skin corrosion', source: 'ECHA inventory', where: 'Skin Corr. 1B, H314, as notified; from memory' },
  ],
};
