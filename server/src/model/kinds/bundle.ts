import type { Kind } from './kind';
import { ofQuantity } from './kind';

export const bundle: Kind = {
  word: 'bundle',
  title: 'a bundle',
  meaning: 'equal passages side by side',
  role: 'geometry',
  heads: [],
  keys: [
    {
      name: 'of',
      meaning: 'the passage that is repeated',
      example: 'passage',
      type: { kind: 'record', words: ['orifice', 'tube', 'duct', 'slit', 'annulus', 'cone', 'bend'] },
    },
    ofQuantity('count', 'number', 'how many there are', '7'),
  ],
  needs: [
    { count: 1, of: ['of'] },
    { count: 1, of: ['count'] },
  ],
  hint: ['area'],
  later: ['area', 'volume', 'characteristic_length', 'transmission_probability'],
  snippet: 'bundle ${1:name} { of = ${2:passage}, count = ${3:7} }',
};
