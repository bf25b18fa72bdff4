import { fromSI } from './conversion';
import type { Unit } from './parseUnit';
import { unitOf } from './parseUnit';
import type { QuantityKind } from './quantityKinds';

/** The unit for automatic display: the largest of the kind's ladder in which the value is at least 1. */
export function chooseUnit(si: number, kind: QuantityKind): Unit {
  const ladder = kind.ladder.map(unitOf);
  const fitting = ladder.filter((unit) => Math.abs(fromSI(si, unit)) >= 1).at(-1);
  if (fitting) return fitting;
  // Nothing at all is told in the coherent unit, a trifle in the smallest one.
  return (si === 0 || !Number.isFinite(si) ? undefined : ladder[0]) ?? unitOf(kind.unit);
}
