import { orificeTransmission } from '../../physics/passages/orifice';
import { powerDimension } from '../../quantities/dimension';
import { divide, map, multiply } from '../arithmetic';
import { figures } from '../figures';
import { quantityInput } from '../inputs';
import { plainNumber } from '../quantity';
import { exact } from '../tolerance';
import type { Quantity } from '../values';
import { accommodation, length, ofQuantity } from './kind';
import type { Kind } from './kind';
import { accommodationOf, transmissionFigure, wallAssumptions } from './transmission';

export const orifice: Kind = {
  word: 'orifice',
  title: 'an orifice',
  meaning: 'a round hole in a wall; thin, unless a thickness is given',
  role: 'geometry',
  heads: [],
  keys: [
    length('bore', 'the diameter of the hole', '5 mm', { symbol: 'd' }),
    ofQuantity('area', 'area', 'the area of the hole, instead of its bore', '20 mm²', { symbol: 'A' }),
    length('thickness', 'the thickness of the wall; a thin wall is assumed without it', '1 mm', {
      bound: 'not-negative',
    }),
    accommodation,
  ],
  needs: [{ count: 1, of: ['bore', 'area'] }],
  hint: ['area'],
  later: [],
  snippet: 'orifice ${1:name} { bore = ${2:5 mm} }',
  compute: ({ inputs }) => {
    const given = quantityInput(inputs, 'bore');
    const area = given ? multiply(plainNumber(Math.PI / 4), multiply(given, given)) : quantityInput(inputs, 'area');
    if (!area) return undefined;
    const bore = given ?? diameterOf(area);
    const thickness = quantityInput(inputs, 'thickness') ?? { ...bore, si: 0, leans: exact };
    return {
      kind: 'record',
      word: 'orifice',
      inputs,
      species: new Map(),
      members: new Map([
        ...figures(
          'geometry of a round hole',
          {
            bore,
            thickness,
            area,
            volume: multiply(area, thickness),
            wall_area: multiply(plainNumber(Math.PI), multiply(bore, thickness)),
            hydraulic_diameter: bore,
            characteristic_length: bore,
            aspect_ratio: divide(thickness, bore),
          },
          inputs.has('thickness') ? [] : THIN,
        ),
        transmissionFigure(
          [bore, thickness, accommodationOf(inputs)],
          (bore, thickness, accommodation) => orificeTransmission({ bore, thickness, accommodation }),
          inputs.has('thickness') ? wallAssumptions(inputs) : THIN,
        ),
      ]),
    };
  },
};

const THIN = ['a thin wall (no thickness given)'];

/** d = √(4A/π) */
function diameterOf(area: Quantity): Quantity {
  const si = Math.sqrt((4 * area.si) / Math.PI);
  return map(area, si, si / (2 * area.si), powerDimension(area.dimension, 0.5));
}
