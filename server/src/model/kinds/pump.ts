import type { Kind } from './kind';
import { ofQuantity } from './kind';

export const pump: Kind = {
  word: 'pump',
  title: 'a pump',
  meaning: 'a pump by its speed, constant or as a table over its inlet pressure',
  role: 'part',
  heads: [],
  keys: [
    {
      name: 'speed',
      symbol: 'S',
      meaning: 'the pumping speed, or a table of it over the inlet pressure',
      example: '10 L/s',
      type: {
        kind: 'quantity',
        quantity: 'pumping_speed',
        bound: 'positive',
        orTableOver: 'pressure',
        orPerSpecies: true,
      },
    },
    ofQuantity('ultimate', 'pressure', 'the lowest pressure it reaches; none is assumed', '1e-3 mbar', {
      bound: 'not-negative',
    }),
    {
      name: 'factors',
      meaning: 'the share of the speed for each species, as a table',
      example: '[He: 0.9]',
      type: { kind: 'quantity', quantity: 'number', bound: 'not-negative', orPerSpecies: true },
    },
  ],
  needs: [{ count: 1, of: ['speed'] }],
  hint: ['throughput'],
  later: ['throughput', 'pressure', 'effective_speed'],
  snippet: 'pump ${1:name} { speed = ${2:10 L/s} }',
};
