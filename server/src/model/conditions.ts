import { kindNamed } from '../quantities/quantityKinds';
import { exact } from './tolerance';
import type { Quantity } from './values';

/** A reference condition that `assume` can set; without that its default holds and is told as an assumption. */
export interface Condition {
  readonly name: ConditionName;
  readonly quantityKind: string;
  /** SI. */
  readonly standard: number;
  readonly meaning: string;
}

export type ConditionName =
  'standard_temperature' | 'standard_pressure' | 'ambient_pressure' | 'ambient_temperature' | 'site_density';

export const conditions: readonly Condition[] = [
  {
    name: 'standard_temperature',
    quantityKind: 'temperature',
    standard: 273.15,
    meaning: 'the temperature that sccm, slm and sccs refer to',
  },
  {
    name: 'standard_pressure',
    quantityKind: 'pressure',
    standard: 101_325,
    meaning: 'the pressure that sccm, slm and sccs refer to',
  },
  {
    name: 'ambient_pressure',
    quantityKind: 'pressure',
    standard: 101_325,
    meaning: 'the pressure around the equipment: what gauge pressures count from',
  },
  {
    name: 'ambient_temperature',
    quantityKind: 'temperature',
    standard: 293.15,
    meaning: 'the temperature around the equipment',
  },
  {
    name: 'site_density',
    quantityKind: 'site_density',
    standard: 1e19,
    meaning: 'the places for molecules on a surface that make a monolayer',
  },
];

export function conditionNamed(name: string): Condition | undefined {
  return conditions.find((condition) => condition.name === name);
}

export function standardCondition({ quantityKind, standard }: Condition): Quantity {
  const kind = kindNamed(quantityKind);
  if (!kind) throw new Error(`no kind of quantity is named ${quantityKind}`);
  return { kind: 'quantity', si: standard, dimension: kind.dimension, leans: exact, quantityKind };
}
