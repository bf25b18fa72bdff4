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
  later: ['volume', 'wall_area', 'characteristic_length'],
  snippet: 'jacket ${1:name} { inner = ${2:60 mm}, outer = ${3:66 mm}, length = ${4:0.5 m} }',
};
