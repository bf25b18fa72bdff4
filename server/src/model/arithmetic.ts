import type { Dimension } from '../quantities/dimension';
import { dimensionless, divideDimensions, multiplyDimensions, powerDimension } from '../quantities/dimension';
import type { Unit } from '../quantities/parseUnit';
import { parseUnit } from '../quantities/parseUnit';
import { combine, scale } from './tolerance';
import type { Quantity } from './values';

/** Arithmetic of quantities whose dimensions have been found to fit. Each result carries the leans of its operands to first order. */

export function add(a: Quantity, b: Quantity): Quantity {
  const shape = isPoint(b) && !isPoint(a) ? shaped(b, a) : shaped(a, b);
  return { ...shape, si: a.si + b.si, leans: combine(1, a.leans, 1, b.leans) };
}

/** What is left of a temperature when another is subtracted is a difference, no longer a point on a scale. */
export function subtract(a: Quantity, b: Quantity): Quantity {
  const result: Quantity = { ...shaped(a, b), si: a.si - b.si, leans: combine(1, a.leans, -1, b.leans) };
  return isPoint(b) || (isPoint(a) && result.si <= 0) ? asDifference(result) : result;
}

export function multiply(a: Quantity, b: Quantity): Quantity {
  return {
    kind: 'quantity',
    si: a.si * b.si,
    dimension: multiplyDimensions(a.dimension, b.dimension),
    leans: combine(b.si, a.leans, a.si, b.leans),
    ...productUnit(a, b, '·'),
  };
}

export function divide(a: Quantity, b: Quantity): Quantity {
  return {
    kind: 'quantity',
    si: a.si / b.si,
    dimension: divideDimensions(a.dimension, b.dimension),
    leans: combine(1 / b.si, a.leans, -a.si / (b.si * b.si), b.leans),
    ...productUnit(a, b, '/'),
  };
}

export function power(base: Quantity, exponent: Quantity): Quantity {
  const si = base.si ** exponent.si;
  return {
    kind: 'quantity',
    si,
    dimension: powerDimension(base.dimension, exponent.si),
    leans: combine(
      exponent.si === 0 ? 0 : exponent.si * base.si ** (exponent.si - 1),
      base.leans,
      base.si > 0 ? si * Math.log(base.si) : 0,
      exponent.leans,
    ),
  };
}

export function negate(a: Quantity): Quantity {
  const result: Quantity = { ...a, si: -a.si, leans: scale(-1, a.leans) };
  return isPoint(a) ? asDifference(result) : result;
}

/** Whether it is a temperature on a scale, as against a difference of two. Kelvins alone do not tell. */
function isPoint({ unit, quantityKind }: Quantity): boolean {
  return unit?.kind === 'offset' || quantityKind === 'temperature';
}

function asDifference({ unit, ...rest }: Quantity): Quantity {
  const kept = unit && unit.kind !== 'offset' ? { unit } : {};
  return { ...rest, ...kept, quantityKind: 'temperature_difference' };
}

/** A function of one quantity, with its derivative there. */
export function map(a: Quantity, si: number, derivative: number, dimension: Dimension = a.dimension): Quantity {
  const leans = scale(derivative, a.leans);
  return dimension === a.dimension && a.unit
    ? { kind: 'quantity', si, dimension, leans, unit: a.unit }
    : { kind: 'quantity', si, dimension, leans };
}

/** A sum is shown as its left side is, and of the same kind. */
function shaped(a: Quantity, b: Quantity): Pick<Quantity, 'kind' | 'dimension' | 'unit' | 'quantityKind'> {
  const unit = a.unit ?? b.unit;
  const quantityKind = a.quantityKind ?? b.quantityKind;
  return {
    kind: 'quantity',
    dimension: a.dimension,
    ...(unit ? { unit } : {}),
    ...(quantityKind === undefined ? {} : { quantityKind }),
  };
}

/**
 * `3 mbar * 2 L/s` is shown in mbar·L/s: the units of a product stay as long as no two of them measure the same,
 * so that nothing is ever shown in mm·m.
 */
function productUnit(a: Quantity, b: Quantity, sign: '·' | '/'): { unit?: Unit } {
  if (b.dimension === dimensionless && !b.unit) return a.unit && a.unit.kind !== 'offset' ? { unit: a.unit } : {};
  if (a.dimension === dimensionless && !a.unit && sign === '·')
    return b.unit && b.unit.kind !== 'offset' ? { unit: b.unit } : {};
  if (!a.unit || !b.unit || [a.unit, b.unit].some((unit) => unit.kind === 'offset' || unit.dimension === dimensionless))
    return {};
  const product = parseUnit(`${a.unit.text}${sign}${parenthesised(b.unit.text)}`);
  if (!product.ok || product.unit.dimension === dimensionless) return {};
  const dimensions = product.unit.parts.map((part) => part.row.dimension);
  return new Set(dimensions).size === dimensions.length ? { unit: product.unit } : {};
}

function parenthesised(text: string): string {
  return /[·/]/.test(text) ? `(${text})` : text;
}
