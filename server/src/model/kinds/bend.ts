import { bendTransmission } from '../../physics/passages/bend';
import { add, divide, map, multiply } from '../arithmetic';
import { quantityInput } from '../inputs';
import { plainNumber, show } from '../quantity';
import type { Scope } from '../scope';
import { exact } from '../tolerance';
import type { Quantity } from '../values';
import { accommodation, length, ofQuantity } from './kind';
import type { Given, Kind } from './kind';
import { given, mustBe, passageRecord } from './passageRecord';
import { accommodationOf, transmissionFigure, wallAssumptions } from './transmission';

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
    length('inlet_length', 'the straight length before the turn begins; none is assumed', '40 mm', {
      bound: 'not-negative',
    }),
    length('outlet_length', 'the straight length after the turn ends; none is assumed', '40 mm', {
      bound: 'not-negative',
    }),
    accommodation,
  ],
  needs: [
    { count: 1, of: ['bore'] },
    { count: 1, of: ['angle'] },
    { count: 1, of: ['radius'] },
  ],
  hint: ['volume'],
  later: [],
  snippet: 'bend ${1:name} { bore = ${2:40 mm}, angle = ${3:90°}, radius = ${4:60 mm} }',
  compute: (declared, scope) => {
    const { inputs } = declared;
    const sizes = given(inputs, 'bore', 'angle', 'radius');
    if (!sizes || !isBend(sizes, declared, scope)) return undefined;
    const { bore, angle, radius } = sizes;
    const none = { ...bore, si: 0, leans: exact };
    const inlet = quantityInput(inputs, 'inlet_length') ?? none;
    const outlet = quantityInput(inputs, 'outlet_length') ?? none;
    const turn = radius.si === 0 ? mitreLength(bore, angle) : multiply(radius, angle);
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
      others: [
        transmissionFigure(
          [bore, angle, radius, inlet, outlet, accommodationOf(inputs)],
          (bore, angle, radius, inletLength, outletLength, accommodation) =>
            bendTransmission({ bore, angle, radius, inletLength, outletLength, accommodation }),
          wallAssumptions(inputs),
        ),
      ],
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
  const mitre = radius.si === 0;
  const most = mitre ? 'below 180° for a mitre' : 'no more than 180°';
  const turns = mustBe(
    angle.si < Math.PI || (!mitre && angle.si === Math.PI),
    { key: 'angle', value: angle, bound: most },
    declared,
    scope,
  );
  const bound = `0 for a mitre, or at least half the bore, ${show({ ...bore, si: bore.si / 2 })}`;
  const round = mitre || radius.si >= bore.si / 2;
  return mustBe(round, { key: 'radius', value: radius, bound }, declared, scope) && turns;
}

/** d tan(angle/2): the centre line between the sections at the inner corner of a mitre. */
function mitreLength(bore: Quantity, { unit: _unit, ...angle }: Quantity): Quantity {
  const tangent = Math.tan(angle.si / 2);
  return multiply(bore, map(angle, tangent, (1 + tangent * tangent) / 2));
}
