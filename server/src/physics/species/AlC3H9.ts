import type { Species } from './species';

/** The single molecule Al(CH₃)₃: near room temperature the vapour is mostly the dimer, of twice the molar mass. */
export const AlC3H9: Species = {
  formula: 'AlC3H9',
  names: ['trimethylaluminium', 'trimethylaluminum', 'TMA'],
  molarMass: { value: 72.087e-3, source: 'CIAAW 2021', where: 'abridged standard atomic weights', uncertainty: 2e-4 },
  associates: { value: 'Al2(CH3)6', source: 'Laubengayer 1941', where: 'trimethylaluminium; from memory' },
  hazards: [
    { value: 'pyrophoric liquid', source: 'CLP 2008', where: 'Pyr. Liq. 1, H250; from memory' },
    { value: 'emits flammable gas with water', source: 'CLP 2008', where: 'Water-react. 1, H260; from memory' },
    { value: 'skin corrosion', source: 'CLP 2008', where: 'Skin Corr. 1B, H314; from memory' },
  ],
};
