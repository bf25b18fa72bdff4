import type { Dimension } from '../quantities/dimension';
import { dimensionless, divideDimensions, multiplyDimensions, powerDimension } from '../quantities/dimension';
import type { Unit } from '../quantities/parseUnit';
import { parseUnit } from '../quantities/parseUnit';
import { combine, scale } from './tolerance';
import type { Quantity } from './values';

/** Arithmetic of quantities whose dimensions have been found to fit. Each result carries the leans of its operands to first order. */

export function add(a: Quantity, b: Quantity): Quantity {
  return { ...shaped(a, b), si: a.si + b.si, leans: combine(1, a.leans, 1, b.leans) };
}

/** A difference of two temperatures on a scale is no longer on it, and is shown in kelvin. */
export function subtract(a: Quantity, b: Quantity): Quantity {
  const result = { ...shaped(a, b), si: a.si - b.si, leans: combine(1, a.leans, -1, b.leans) };
  if (a.unit?.kind !== 'offset' || b.unit?.kind !== 'offset') return result;
  const { unit: _unit, ...plain } = result;
  return { ...plain, quantityKind: 'temperature_difference' };
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
  return { ...a, si: -a.si, leans: scale(-1, a.leans) };
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
