import type { Kind } from './kind';
import { ofQuantity } from './kind';

export const chamber: Kind = {
  word: 'chamber',
  title: 'a chamber',
  meaning: 'a volume with walls that may give off gas',
  role: 'geometry',
  heads: [],
  keys: [
    ofQuantity('volume', 'volume', 'the volume inside', '50 L', { symbol: 'V' }),
    ofQuantity('wall_area', 'area', 'the area of the walls', '1 m²', { symbol: 'S' }),
    ofQuantity('temperature', 'temperature', 'the temperature of the walls; the ambient one is assumed', '20 °C', {
      symbol: 'T',
    }),
    {
      name: 'outgassing',
      meaning: 'the throughput that the walls give off per area, or a table with a row for each species',
      example: '1e-8 mbar·L/(s·cm²)',
      type: { kind: 'quantity', quantity: 'outgassing_rate', bound: 'not-negative', orPerSpecies: true },
    },
    ofQuantity('outgassing_exponent', 'number', 'the exponent n of a decay as 1/tⁿ; none is assumed', '1', {
      bound: 'not-negative',
    }),
    ofQuantity('outgassing_age', 'time', 'the time after which the stated outgassing holds', '1 h'),
  ],
  needs: [{ count: 1, of: ['volume'] }],
  hint: ['volume'],
  later: ['volume', 'wall_area', 'characteristic_length'],
  snippet: 'chamber ${1:name} { volume = ${2:50 L}, wall_area = ${3:1 m²} }',
};
