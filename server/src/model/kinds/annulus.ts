import { annulusTransmission } from '../../physics/passages/annulus';
import { add, divide, multiply, subtract } from '../arithmetic';
import { plainNumber, show } from '../quantity';
import { accommodation, length } from './kind';
import type { Kind } from './kind';
import { given, mustBe, passageRecord } from './passageRecord';
import { accommodationOf, transmissionFigure, wallAssumptions } from './transmission';

export const annulus: Kind = {
  word: 'annulus',
  title: 'an annulus',
  meaning: 'the ring gap between coaxial tubes',
  role: 'geometry',
  heads: [],
  keys: [
    length('inner', 'the outer diameter of the inner tube', '30 mm'),
    length('outer', 'the inner diameter of the outer tube', '40 mm'),
    length('length', 'the length along the axis', '0.5 m', { symbol: 'L' }),
    accommodation,
  ],
  needs: [
    { count: 1, of: ['inner'] },
    { count: 1, of: ['outer'] },
    { count: 1, of: ['length'] },
  ],
  hint: ['area', 'volume'],
  later: [],
  snippet: 'annulus ${1:name} { inner = ${2:30 mm}, outer = ${3:40 mm}, length = ${4:0.5 m} }',
  compute: (declared, scope) => {
    const { inputs } = declared;
    const sizes = given(inputs, 'inner', 'outer', 'length');
    if (!sizes) return undefined;
    const { inner, outer, length: along } = sizes;
    const bound = `below the outer diameter, ${show(outer)}`;
    if (!mustBe(inner.si < outer.si, { key: 'inner', value: inner, bound }, declared, scope)) return undefined;
    const width = subtract(outer, inner);
    const gap = divide(width, plainNumber(2));
    const rim = multiply(plainNumber(Math.PI), add(outer, inner));
    const area = divide(multiply(rim, width), plainNumber(4));
    return passageRecord('annulus', inputs, {
      method: 'geometry of the gap between coaxial cylinders',
      geometry: {
        inner,
        outer,
        length: along,
        area,
        volume: multiply(area, along),
        wall_area: multiply(rim, along),
        hydraulic_diameter: width,
        characteristic_length: gap,
        aspect_ratio: divide(along, gap),
      },
      others: [
        transmissionFigure(
          [inner, outer, along, accommodationOf(inputs)],
          (inner, outer, length, accommodation) => annulusTransmission({ inner, outer, length, accommodation }),
          wallAssumptions(inputs),
        ),
      ],
    });
  },
};
