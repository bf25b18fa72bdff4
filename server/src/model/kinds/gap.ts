import { multiply } from '../arithmetic';
import { plainNumber } from '../quantity';
import { given, passageRecord } from './passageRecord';
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
  later: [],
  snippet: 'gap ${1:name} { spacing = ${2:1 mm}, area = ${3:100 cm²} }',
  compute: ({ inputs }) => {
    const sizes = given(inputs, 'spacing', 'area');
    if (!sizes) return undefined;
    const { spacing, area } = sizes;
    return passageRecord('gap', inputs, {
      method: 'geometry of parallel plates, without their edges',
      geometry: {
        spacing,
        area,
        volume: multiply(spacing, area),
        wall_area: multiply(plainNumber(2), area),
        characteristic_length: spacing,
      },
    });
  },
};
