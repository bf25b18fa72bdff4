import { ductTransmission } from '../../physics/passages/duct';
import { add, divide, multiply } from '../arithmetic';
import { plainNumber } from '../quantity';
import { accommodation, length } from './kind';
import type { Kind } from './kind';
import { given, passageRecord } from './passageRecord';
import { accommodationOf, transmissionFigure, wallAssumptions } from './transmission';

export const duct: Kind = {
  word: 'duct',
  title: 'a duct',
  meaning: 'a straight duct of rectangular section',
  role: 'geometry',
  heads: [],
  keys: [
    length('width', 'the longer side of the section', '60 mm', { symbol: 'b' }),
    length('height', 'the shorter side of the section', '20 mm', { symbol: 'h' }),
    length('length', 'the length along the axis', '1 m', { symbol: 'L' }),
    accommodation,
  ],
  needs: [
    { count: 1, of: ['width'] },
    { count: 1, of: ['height'] },
    { count: 1, of: ['length'] },
  ],
  hint: ['area', 'volume'],
  later: [],
  snippet: 'duct ${1:name} { width = ${2:60 mm}, height = ${3:20 mm}, length = ${4:1 m} }',
  compute: ({ inputs }) => {
    const sides = given(inputs, 'width', 'height', 'length');
    if (!sides) return undefined;
    const { width, height, length: along } = sides;
    const area = multiply(width, height);
    const rim = multiply(plainNumber(2), add(width, height));
    const smaller = width.si < height.si ? width : height;
    return passageRecord('duct', inputs, {
      method: 'geometry of a rectangular duct',
      geometry: {
        width,
        height,
        length: along,
        area,
        volume: multiply(area, along),
        wall_area: multiply(rim, along),
        hydraulic_diameter: divide(multiply(plainNumber(4), area), rim),
        characteristic_length: smaller,
        aspect_ratio: divide(along, smaller),
      },
      others: [
        transmissionFigure(
          [width, height, along, accommodationOf(inputs)],
          (width, height, length, accommodation) => ductTransmission({ width, height, length, accommodation }),
          wallAssumptions(inputs),
        ),
      ],
    });
  },
};
