import { slitTransmission } from '../../physics/passages/slit';
import { divide, multiply } from '../arithmetic';
import { plainNumber } from '../quantity';
import { accommodation, length } from './kind';
import type { Kind } from './kind';
import { given, passageRecord } from './passageRecord';
import { accommodationOf, transmissionFigure, wallAssumptions } from './transmission';

export const slit: Kind = {
  word: 'slit',
  title: 'a slit',
  meaning: 'a long slit between parallel plates; its end walls are neglected',
  role: 'geometry',
  heads: [],
  keys: [
    length('height', 'the distance of the plates', '0.1 mm', { symbol: 'h' }),
    length('width', 'the width across the flow', '100 mm', { symbol: 'b' }),
    length('length', 'the length along the flow', '10 mm', { symbol: 'L' }),
    accommodation,
  ],
  needs: [
    { count: 1, of: ['height'] },
    { count: 1, of: ['width'] },
    { count: 1, of: ['length'] },
  ],
  hint: ['area', 'volume'],
  later: [],
  snippet: 'slit ${1:name} { height = ${2:0.1 mm}, width = ${3:100 mm}, length = ${4:10 mm} }',
  compute: ({ inputs }) => {
    const sides = given(inputs, 'height', 'width', 'length');
    if (!sides) return undefined;
    const { height, width, length: along } = sides;
    const area = multiply(width, height);
    return passageRecord('slit', inputs, {
      method: 'geometry of a gap between two plates, without its end walls',
      geometry: {
        height,
        width,
        length: along,
        area,
        volume: multiply(area, along),
        wall_area: multiply(plainNumber(2), multiply(width, along)),
        hydraulic_diameter: multiply(plainNumber(2), height),
        characteristic_length: height,
        aspect_ratio: divide(along, height),
      },
      others: [
        transmissionFigure(
          [height, along, accommodationOf(inputs)],
          (height, length, accommodation) => slitTransmission({ height, length, accommodation }),
          wallAssumptions(inputs),
        ),
      ],
    });
  },
};
