import { add, divide, multiply } from '../arithmetic';
import { quantityInput } from '../inputs';
import { plainNumber, show } from '../quantity';
import type { Scope } from '../scope';
import { exact } from '../tolerance';
import type { Quantity } from '../values';
import { given, mustBe, passageRecord } from './passageRecord';
import type { Given, Kind } from './kind';
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
  later: ['transmission_probability'],
  snippet: 'bend ${1:name} { bore = ${2:40 mm}, angle = ${3:90°}, radius = ${4:60 mm} }',
  compute: (declared, scope) => {
    const { inputs } = declared;
    const sizes = given(inputs, 'bore', 'angle', 'radius');
    if (!sizes || !isBend(sizes, declared, scope)) return undefined;
    const { bore, angle, radius } = sizes;
    const none = { ...bore, si: 0, leans: exact };
    const inlet = quantityInput(inputs, 'inlet_length') ?? none;
    const outlet = quantityInput(inputs, 'outlet_length') ?? none;
    const turn = multiply(radius, angle);
    const along = add(add(inlet, turn), outlet);
    const area = multiply(plainNumber(Math.PI / 4), multiply(bore, bore));
    return passageRecord('bend', inputs, {
      method: 'geometry of a bent round tube along its centre line (Pappus)',
      assumptions: NO_LENGTH.filter(([key]) => !inputs.has(key)).map(([, text]) => text),
      geometry: {
        bore,
        length: along,
        area,
        volume: multiply(area, along),
        wall_area: multiply(plainNumber(Math.PI), multiply(bore, along)),
        hydraulic_diameter: bore,
        characteristic_length: bore,
        aspect_ratio: divide(along, bore),
      },
    });
  },
};

const NO_LENGTH = [
  ['inlet_length', 'no straight length before the turn'],
  ['outlet_length', 'no straight length after the turn'],
] as const;

interface Sizes {
  readonly bore: Quantity;
  readonly angle: Quantity;
  readonly radius: Quantity;
}

/** Whether there is a bend of these sizes: it turns by no more than 180°, and its inner side does not fold over. */
function isBend({ bore, angle, radius }: Sizes, declared: Given, scope: Scope): boolean {
  const turns = mustBe(
    angle.si <= Math.PI,
    { key: 'angle', value: angle, bound: 'no more than 180°' },
    declared,
    scope,
  );
  const bound = `0 for a mitre, or at least half the bore, ${show({ ...bore, si: bore.si / 2 })}`;
  const round = radius.si === 0 || radius.si >= bore.si / 2;
  return mustBe(round, { key: 'radius', value: radius, bound }, declared, scope) && turns;
}
