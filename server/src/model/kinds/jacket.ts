import { add, divide, multiply, subtract } from '../arithmetic';
import { plainNumber, show } from '../quantity';
import { given, mustBe, passageRecord } from './passageRecord';
import type { Kind } from './kind';
import { length } from './kind';

export const jacket: Kind = {
  word: 'jacket',
  title: 'a jacket',
  meaning: 'the space between coaxial cylinders, for heat',
  role: 'geometry',
  heads: [],
  keys: [
    length('inner', 'the diameter of the inner cylinder', '60 mm'),
    length('outer', 'the diameter of the outer cylinder', '66 mm'),
    length('length', 'the length along the axis', '0.5 m', { symbol: 'L' }),
  ],
  needs: [
    { count: 1, of: ['inner'] },
    { count: 1, of: ['outer'] },
    { count: 1, of: ['length'] },
  ],
  hint: ['volume'],
  later: [],
  snippet: 'jacket ${1:name} { inner = ${2:60 mm}, outer = ${3:66 mm}, length = ${4:0.5 m} }',
  compute: (declared, scope) => {
    const { inputs } = declared;
    const sizes = given(inputs, 'inner', 'outer', 'length');
    if (!sizes) return undefined;
    const { inner, outer, length: along } = sizes;
    const bound = `below the outer diameter, ${show(outer)}`;
    if (!mustBe(inner.si < outer.si, { key: 'inner', value: inner, bound }, declared, scope)) return undefined;
    const perDiameter = multiply(plainNumber(Math.PI), along);
    const walls = multiply(perDiameter, add(inner, outer));
    const half = divide(subtract(outer, inner), plainNumber(2));
    return passageRecord('jacket', inputs, {
      method: 'geometry of coaxial cylinders, without their ends',
      geometry: {
        inner,
        outer,
        length: along,
        volume: divide(multiply(walls, half), plainNumber(2)),
        wall_area: walls,
        inner_area: multiply(perDiameter, inner),
        outer_area: multiply(perDiameter, outer),
        characteristic_length: half,
      },
    });
  },
};
