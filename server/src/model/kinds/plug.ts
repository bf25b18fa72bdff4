import { multiply } from '../arithmetic';
import { figures } from '../figures';
import { quantityInput } from '../inputs';
import type { Figure, Quantity } from '../values';
import { given, passageRecord } from './passageRecord';
import type { Kind } from './kind';
import { length, ofQuantity } from './kind';

export const plug: Kind = {
  word: 'plug',
  title: 'a plug',
  meaning: 'a porous plug',
  role: 'geometry',
  heads: [],
  keys: [
    ofQuantity('area', 'area', 'the area that the gas enters', '1 cm²', { symbol: 'A' }),
    length('thickness', 'the thickness along the flow', '3 mm'),
    ofQuantity('permeability', 'permeability', 'the viscous permeability (Darcy)', '1e-13 m²'),
    length('pore', 'the diameter of the pores', '1 µm'),
    ofQuantity('porosity', 'fraction', 'the share of the volume that is open', '35 %', { bound: 'fraction' }),
  ],
  needs: [
    { count: 1, of: ['area'] },
    { count: 1, of: ['thickness'] },
    { count: 1, of: ['permeability'] },
    { count: 1, of: ['pore'] },
  ],
  hint: ['volume'],
  later: ['transmission_probability'],
  snippet:
    'plug ${1:name} { area = ${2:1 cm²}, thickness = ${3:3 mm}, permeability = ${4:1e-13 m²}, pore = ${5:1 µm} }',
  compute: ({ inputs }) => {
    const sizes = given(inputs, 'area', 'thickness', 'pore');
    if (!sizes) return undefined;
    const { area, thickness, pore } = sizes;
    const porosity = quantityInput(inputs, 'porosity');
    const bulk = multiply(area, thickness);
    return passageRecord('plug', inputs, {
      method: 'geometry of a porous body',
      geometry: { area, thickness, characteristic_length: pore },
      others: [['volume', porosity ? openVolume(multiply(bulk, porosity)) : NO_VOLUME]],
    });
  },
};

const NO_VOLUME: Figure = {
  kind: 'absent',
  why: 'the open volume of a plug needs its porosity; add porosity = … to the plug',
};

function openVolume(volume: Quantity): Figure {
  const found = figures('the open share of the body: area × thickness × porosity', { volume }).get('volume');
  return found ?? NO_VOLUME;
}
