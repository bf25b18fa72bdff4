import type { Kind } from './kind';
import { accommodation, length } from './kind';

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
  later: ['area', 'volume', 'hydraulic_diameter', 'characteristic_length', 'transmission_probability'],
  snippet: 'duct ${1:name} { width = ${2:60 mm}, height = ${3:20 mm}, length = ${4:1 m} }',
};
