import { kindOf } from '../../model/quantity';
import type { Quantity } from '../../model/values';
import { fromSI } from '../../quantities/conversion';
import { coherentUnitText } from '../../quantities/dimension';
import type { Unit } from '../../quantities/parseUnit';
import { unitOf } from '../../quantities/parseUnit';
import type { QuantityKind } from '../../quantities/quantityKinds';
import { kindsOf } from '../../quantities/quantityKinds';

/** The coherent SI unit of a value or else the most usual other one, before all in which it needs no power of ten. */
export function alternativeUnit(value: Quantity, shown: Unit): Unit | undefined {
  const others = otherUnits(value, shown, kindOf(value));
  return others.find((unit) => isPlain(fromSI(value.si, unit))) ?? others[0];
}

/** Whether a number is written without a power of ten. */
function isPlain(value: number): boolean {
  return value === 0 || (Math.abs(value) >= 1e-3 && Math.abs(value) < 1e5);
}

/** The other units that a value may be told in: the coherent SI unit, then those of the trade, the most usual first. */
export function otherUnits({ dimension }: Quantity, shown: Unit, kind = kindMeant(shown)): readonly Unit[] {
  const scales = kind?.name === 'temperature' ? ['°R'] : [];
  const texts = kind ? [kind.unit, ...kind.usual, ...scales] : [coherentUnitText(dimension)];
  return [...new Set(texts)].map(unitOf).filter((unit) => unit.text !== shown.text);
}

/** What a unit is for: of the kinds that share its dimension the one that the trade measures in it. */
export function kindMeant({ text, dimension }: Unit): QuantityKind | undefined {
  const kinds = kindsOf(dimension);
  return kinds.find(({ usual, ladder }) => usual.includes(text) || ladder.includes(text)) ?? kinds[0];
}
