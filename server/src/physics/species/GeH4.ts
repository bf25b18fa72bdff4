import type { Species } from './species';

export const GeH4: Species = {
  formula: 'GeH4',
  names: ['germane'],
  molarMass: { value: 76.662e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  hazards: [
    { value: 'flammable gas', source: 'ECHA inventory', where: 'Flam. Gas 1, H220, as notified; from memory' },
    {
      value: 'acute toxicity, inhalation',
      source: 'ECHA inventory',
      where: 'Acute Tox. 1, H330, as notified; from memory',
    },
  ],
};
