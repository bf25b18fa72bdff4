import { powerDimension } from '../../quantities/dimension';
import { divide, map, multiply } from '../arithmetic';
import { figures } from '../figures';
import { quantityInput } from '../inputs';
import { plainNumber } from '../quantity';
import type { Members, Quantity } from '../values';
import { ofQuantity } from './kind';
import type { Kind } from './kind';

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
  later: [],
  snippet: 'chamber ${1:name} { volume = ${2:50 L}, wall_area = ${3:1 m²} }',
  compute: ({ inputs }) => {
    const volume = quantityInput(inputs, 'volume');
    if (!volume) return undefined;
    const wall = quantityInput(inputs, 'wall_area');
    return {
      kind: 'record',
      word: 'chamber',
      inputs,
      species: new Map(),
      members: new Map([
        ...figures('as given', { volume, ...(wall ? { wall_area: wall } : {}) }),
        ...(wall ? meanChord(volume, wall) : edge(volume)),
      ]),
    };
  },
};

/** ℓ = 4V/S */
function meanChord(volume: Quantity, wall: Quantity): Members {
  return figures('4 V/S, the mean length of the chords through the chamber', {
    characteristic_length: divide(multiply(plainNumber(4), volume), wall),
  });
}

/** ℓ = V^(1/3) */
function edge(volume: Quantity): Members {
  const si = Math.cbrt(volume.si);
  const length = map(volume, si, si / (3 * volume.si), powerDimension(volume.dimension, 1 / 3));
  return figures('V^(1/3), the edge of a cube of this volume', { characteristic_length: length }, [
    'a chamber about as long as wide (no wall area given)',
  ]);
}
