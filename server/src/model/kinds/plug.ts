import { openShare, plugTransmission } from '../../physics/passages/plug';
import { unitOf } from '../../quantities/parseUnit';
import { multiply } from '../arithmetic';
import { figures } from '../figures';
import { quantityInput } from '../inputs';
import { contradictoryInput } from '../problems/contradictoryInput';
import { plainNumber, show } from '../quantity';
import type { Figure, Quantity } from '../values';
import { length, ofQuantity } from './kind';
import type { Kind } from './kind';
import { given, passageRecord } from './passageRecord';
import { transmissionFigure } from './transmission';

export const plug: Kind = {
  word: 'plug',
  title: 'a plug',
  meaning: 'a porous plug',
  role: 'geometry',
  heads: [],
  keys: [
    ofQuantity('area', 'area', 'the area that the gas enters', '1 cm²', { symbol: 'A' }),
    length('thickness', 'the thickness along the flow', '3 mm'),
    ofQuantity('permeability', 'permeability', 'the viscous permeability (Darcy)', '1e-14 m²'),
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
  later: [],
  snippet:
    'plug ${1:name} { area = ${2:1 cm²}, thickness = ${3:3 mm}, permeability = ${4:1e-14 m²}, pore = ${5:1 µm} }',
  compute: (declared, scope) => {
    const { inputs } = declared;
    const sizes = given(inputs, 'area', 'thickness', 'pore', 'permeability');
    if (!sizes) return undefined;
    const { area, thickness, pore, permeability } = sizes;
    const porosity = quantityInput(inputs, 'porosity');
    const conducting = openShare({ pore: pore.si, permeability: permeability.si });
    if (conducting > (porosity?.si ?? 1)) {
      scope.report(contradictoryInput.at(declared.place('permeability'), { why: tooOpen(conducting, porosity) }));
      return undefined;
    }
    const bulk = multiply(area, thickness);
    return passageRecord('plug', inputs, {
      method: 'geometry of a porous body',
      geometry: { area, thickness, characteristic_length: pore },
      others: [
        ['volume', porosity ? openVolume(multiply(bulk, porosity)) : NO_VOLUME],
        transmissionFigure([thickness, pore, permeability], (thickness, pore, permeability) =>
          plugTransmission({ thickness, pore, permeability }),
        ),
      ],
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

/** B = (ε/τ) d²/32 with ε/τ no more than the porosity. */
function tooOpen(conducting: number, porosity: Quantity | undefined): string {
  const percent = { unit: unitOf('%'), digits: 3 };
  const most = porosity ? `the porosity, ${show(porosity, percent)}` : 'all of it';
  return `pores of this diameter give so large a permeability only if they make up ${show(plainNumber(conducting), percent)} of the plug, more than ${most}`;
}
