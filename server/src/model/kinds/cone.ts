import { coneTransmission } from '../../physics/passages/cone';
import { powerDimension } from '../../quantities/dimension';
import { add, divide, map, multiply, subtract } from '../arithmetic';
import { plainNumber } from '../quantity';
import type { Quantity } from '../values';
import { accommodation, length } from './kind';
import type { Kind } from './kind';
import { given, passageRecord } from './passageRecord';
import { accommodationOf, transmissionFigure, wallAssumptions } from './transmission';

export const cone: Kind = {
  word: 'cone',
  title: 'a cone',
  meaning: 'a conical tube',
  role: 'geometry',
  heads: [],
  keys: [
    length('inlet_bore', 'the diameter where the gas enters', '40 mm'),
    length('outlet_bore', 'the diameter where it leaves', '25 mm'),
    length('length', 'the length along the axis', '80 mm', { symbol: 'L' }),
    accommodation,
  ],
  needs: [
    { count: 1, of: ['inlet_bore'] },
    { count: 1, of: ['outlet_bore'] },
    { count: 1, of: ['length'] },
  ],
  hint: ['area', 'volume'],
  later: [],
  snippet: 'cone ${1:name} { inlet_bore = ${2:40 mm}, outlet_bore = ${3:25 mm}, length = ${4:80 mm} }',
  compute: ({ inputs }) => {
    const sizes = given(inputs, 'inlet_bore', 'outlet_bore', 'length');
    if (!sizes) return undefined;
    const { inlet_bore: inlet, outlet_bore: outlet, length: along } = sizes;
    const smaller = inlet.si < outlet.si ? inlet : outlet;
    const squares = add(add(multiply(inlet, inlet), multiply(inlet, outlet)), multiply(outlet, outlet));
    return passageRecord('cone', inputs, {
      method: 'geometry of a frustum of a cone; area: that of the inlet',
      geometry: {
        inlet_bore: inlet,
        outlet_bore: outlet,
        length: along,
        area: multiply(plainNumber(Math.PI / 4), multiply(inlet, inlet)),
        outlet_area: multiply(plainNumber(Math.PI / 4), multiply(outlet, outlet)),
        volume: multiply(plainNumber(Math.PI / 12), multiply(squares, along)),
        wall_area: multiply(plainNumber(Math.PI / 2), multiply(add(inlet, outlet), slant(inlet, outlet, along))),
        characteristic_length: smaller,
        aspect_ratio: divide(along, smaller),
      },
      others: [
        transmissionFigure(
          [inlet, outlet, along, accommodationOf(inputs)],
          (inletBore, outletBore, length, accommodation) =>
            coneTransmission({ inletBore, outletBore, length, accommodation }),
          wallAssumptions(inputs),
        ),
      ],
    });
  },
};

/** The length of the wall along a straight line down it. */
function slant(inlet: Quantity, outlet: Quantity, along: Quantity): Quantity {
  const half = divide(subtract(inlet, outlet), plainNumber(2));
  const square = add(multiply(half, half), multiply(along, along));
  const si = Math.sqrt(square.si);
  return map(square, si, 1 / (2 * si), powerDimension(square.dimension, 0.5));
}
