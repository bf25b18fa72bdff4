import type { Kind } from './kind';
import { accommodation, length } from './kind';

export const cone: Kind = {
  word: 'cone',
  title: 'a cone',
  meaning: 'a conical tube',
  role: 'geometry',
  heads: [],
  keys: [
    length('inlet_bore', 'the diameter where the gas enters', '40 mm'),
    length('outlet_bore', 'the diameter where it leaves', '25 mm'),
    length('length', 'the length along the axis', '80 mm', { symbol: 'L' }),
    accommodation,
  ],
  needs: [
    { count: 1, of: ['inlet_bore'] },
    { count: 1, of: ['outlet_bore'] },
    { count: 1, of: ['length'] },
  ],
  hint: ['area', 'volume'],
  later: ['area', 'volume', 'hydraulic_diameter', 'characteristic_length', 'transmission_probability'],
  snippet: 'cone ${1:name} { inlet_bore = ${2:40 mm}, outlet_bore = ${3:25 mm}, length = ${4:80 mm} }',
};
