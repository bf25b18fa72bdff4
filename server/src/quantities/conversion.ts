import type { StandardReference } from './standardReference';
import { standardAmountPerVolume, standardReference } from './standardReference';
import type { Unit } from './unit';

export type { StandardReference } from './standardReference';
export { standardReference } from './standardReference';

/** The number of coherent SI units in one unit. Standard flows depend on the reference. */
export function unitFactor(unit: Unit, reference: StandardReference = standardReference): number {
  return (unit.scale.times / unit.scale.over) * standardFactor(unit, reference);
}

/** The value in coherent SI units. Offset temperatures become absolute; a gauge pressure stays one, ambient is the caller's to add. */
export function toSI(value: number, unit: Unit, reference: StandardReference = standardReference): number {
  const { times, plus, over } = unit.scale;
  return ((value * times + plus) / over) * standardFactor(unit, reference);
}

export function fromSI(si: number, unit: Unit, reference: StandardReference = standardReference): number {
  const { times, plus, over } = unit.scale;
  return ((si / standardFactor(unit, reference)) * over - plus) / times;
}

/** A difference or a tolerance in coherent SI units: the zero of an offset unit does not enter. */
export function toSIDifference(
  difference: number,
  unit: Unit,
  reference: StandardReference = standardReference,
): number {
  return ((difference * unit.scale.times) / unit.scale.over) * standardFactor(unit, reference);
}

export function fromSIDifference(si: number, unit: Unit, reference: StandardReference = standardReference): number {
  return ((si / standardFactor(unit, reference)) * unit.scale.over) / unit.scale.times;
}

function standardFactor(unit: Unit, reference: StandardReference): number {
  return unit.standardPower === 0 ? 1 : standardAmountPerVolume(reference) ** unit.standardPower;
}
