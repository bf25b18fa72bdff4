import type { Kind } from './kind';
import { accommodation, length } from './kind';

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
  later: ['area', 'volume', 'hydraulic_diameter', 'characteristic_length', 'transmission_probability'],
  snippet: 'annulus ${1:name} { inner = ${2:30 mm}, outer = ${3:40 mm}, length = ${4:0.5 m} }',
};
