import { multiply } from '../arithmetic';
import { figure } from '../figures';
import { quantityInput } from '../inputs';
import type { Figure, Quantity } from '../values';
import { ofQuantity } from './kind';
import type { Kind } from './kind';
import { mustBe, passageRecord } from './passageRecord';

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
  later: [],
  snippet: 'bundle ${1:name} { of = ${2:passage}, count = ${3:7} }',
  compute: (declared, scope) => {
    const { inputs } = declared;
    const one = inputs.get('of');
    const count = quantityInput(inputs, 'count');
    if (one?.kind !== 'record' || !count) return undefined;
    const whole = Number.isInteger(count.si);
    if (!mustBe(whole, { key: 'count', value: count, bound: 'a whole number' }, declared, scope)) return undefined;
    const others = [...one.members].filter(([name]) => SUMS.includes(name) || KEPT.includes(name));
    return passageRecord('bundle', inputs, {
      method: 'equal passages side by side',
      geometry: {},
      others: others.map(([name, each]) => [name, SUMS.includes(name) ? times(each, count) : each]),
    });
  },
};

/** What all the passages have together. */
const SUMS: readonly string[] = ['area', 'outlet_area', 'volume', 'wall_area'];

/** What is the same of one passage as of all. */
const KEPT: readonly string[] = [
  'length',
  'hydraulic_diameter',
  'characteristic_length',
  'aspect_ratio',
  'transmission_probability',
];

function times(one: Figure, count: Quantity): Figure {
  if (one.kind !== 'figure' || one.value.kind !== 'quantity') return one;
  const { quantityKind } = one.value;
  const value = { ...multiply(one.value, count), ...(quantityKind === undefined ? {} : { quantityKind }) };
  return figure(value, { ...one.provenance, method: `the count times that of one: ${one.provenance.method}` });
}
