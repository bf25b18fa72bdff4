import type { Kind } from './kind';
import { length, ofQuantity } from './kind';

export const gap: Kind = {
  word: 'gap',
  title: 'a gap',
  meaning: 'the space between parallel plates, for heat',
  role: 'geometry',
  heads: [],
  keys: [
    length('spacing', 'the distance of the plates', '1 mm', { symbol: 'h' }),
    ofQuantity('area', 'area', 'the area of one plate', '100 cm²', { symbol: 'A' }),
  ],
  needs: [
    { count: 1, of: ['spacing'] },
    { count: 1, of: ['area'] },
  ],
  hint: ['volume'],
  later: ['volume', 'characteristic_length'],
  snippet: 'gap ${1:name} { spacing = ${2:1 mm}, area = ${3:100 cm²} }',
};
