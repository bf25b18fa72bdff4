import type { Kind } from './kind';
import { accommodation, length, ofQuantity } from './kind';

export const bend: Kind = {
  word: 'bend',
  title: 'a bend',
  meaning: 'an elbow of round section',
  role: 'geometry',
  heads: [],
  keys: [
    length('bore', 'the inner diameter', '40 mm', { symbol: 'd' }),
    ofQuantity('angle', 'angle', 'how far it turns', '90°'),
    length('radius', 'the radius of the centre line; 0 for a mitre', '60 mm', { bound: 'not-negative' }),
    length('inlet_length', 'the straight length before the turn; none is assumed', '40 mm', { bound: 'not-negative' }),
    length('outlet_length', 'the straight length after the turn; none is assumed', '40 mm', { bound: 'not-negative' }),
    accommodation,
  ],
  needs: [
    { count: 1, of: ['bore'] },
    { count: 1, of: ['angle'] },
    { count: 1, of: ['radius'] },
  ],
  hint: ['volume'],
  later: ['area', 'volume', 'characteristic_length', 'transmission_probability'],
  snippet: 'bend ${1:name} { bore = ${2:40 mm}, angle = ${3:90°}, radius = ${4:60 mm} }',
};
