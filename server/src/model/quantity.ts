import type { Dimension } from '../quantities/dimension';
import { dimensionless } from '../quantities/dimension';
import type { FormatOptions } from '../quantities/format';
import { formatQuantity, formatWithTolerance } from '../quantities/format';
import { chooseUnit } from '../quantities/chooseUnit';
import { coherentUnitText } from '../quantities/dimension';
import type { Unit } from '../quantities/parseUnit';
import { unitOf } from '../quantities/parseUnit';
import type { QuantityKind } from '../quantities/quantityKinds';
import { kindNamed, kindsOf } from '../quantities/quantityKinds';
import type { Leans } from './tolerance';
import { exact, halfWidth } from './tolerance';
import type { Quantity } from './values';

export function quantity(si: number, dimension: Dimension, leans: Leans = exact): Quantity {
  return { kind: 'quantity', si, dimension, leans };
}

export function plainNumber(value: number): Quantity {
  return quantity(value, dimensionless);
}

/** What the quantity measures: as known, else the most general kind of its dimension. */
export function kindOf({ quantityKind, dimension }: Quantity): QuantityKind | undefined {
  return (quantityKind === undefined ? undefined : kindNamed(quantityKind)) ?? kindsOf(dimension)[0];
}

/** How a file wants its results written: the unit for each kind of quantity that it names. */
export type DisplayUnits = ReadonlyMap<string, Unit>;
export const noDisplayUnits: DisplayUnits = new Map();

/** The unit to show a quantity in: the author's own, else the file's for its kind, else one that suits its size. */
export function unitFor(value: Quantity, display: DisplayUnits = noDisplayUnits): Unit {
  if (value.unit) return value.unit;
  const kind = kindOf(value);
  if (!kind) return unitOf(coherentUnitText(value.dimension));
  return display.get(kind.name) ?? chooseUnit(value.si, kind);
}

export interface ShowOptions extends FormatOptions {
  readonly display?: DisplayUnits;
  /** The unit to show it in, whatever the file says. */
  readonly unit?: Unit;
}

/** The best value alone. */
export function show(value: Quantity, options: ShowOptions = {}): string {
  return formatQuantity(value.si, options.unit ?? unitFor(value, options.display), options);
}

/** The value with its tolerance at 95 % coverage, if it has one. */
export function showWithTolerance(value: Quantity, options: ShowOptions = {}): string {
  const width = halfWidth(value.leans);
  const unit = options.unit ?? unitFor(value, options.display);
  return formatWithTolerance(value.si, width, unit, options);
}
