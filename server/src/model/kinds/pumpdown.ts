import type { Kind } from './kind';
import { ofQuantity } from './kind';

export const pumpdown: Kind = {
  word: 'pumpdown',
  title: 'a pump-down',
  meaning: 'a system in time, from one pressure to another',
  role: 'study',
  heads: [{ relation: 'of', wants: 'record', words: ['system'] }],
  keys: [
    {
      name: 'chamber',
      meaning: 'the chamber whose pressure is followed',
      example: 'chamber',
      type: { kind: 'record', words: ['chamber'] },
    },
    ofQuantity('from', 'pressure', 'the pressure at the start', '1 atm'),
    ofQuantity('to', 'pressure', 'the pressure at the end', '1e-2 mbar'),
  ],
  needs: [
    { count: 1, of: ['chamber'] },
    { count: 1, of: ['from'] },
    { count: 1, of: ['to'] },
  ],
  hint: ['time'],
  later: ['time', 'final_pressure'],
  snippet: 'pumpdown ${1:name} of ${2:system} { chamber = ${3:chamber}, from = ${4:1 atm}, to = ${5:1e-2 mbar} }',
};
