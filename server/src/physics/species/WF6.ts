import type { Species } from './species';

export const WF6: Species = {
  formula: 'WF6',
  names: ['tungsten hexafluoride'],
  molarMass: { value: 297.828e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 6e-5 },
  hazards: [
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 1, H330 (so a safety data sheet of BOC, 2021), as notified; from memory',
    },
    {
      value: 'skin corrosion',
      source: 'ECHA inventory',
      where: 'Skin Corr. 1A, H314 (likewise), as notified; from memory',
    },
  ],
};
