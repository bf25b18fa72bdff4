import { dimensionless } from '../quantities/dimension';
import { describeDimension } from '../quantities/quantityKinds';
import { formatNumber } from '../quantities/format';
import type { Expression, Tolerance } from '../syntax/nodes';
import { map, multiply } from './arithmetic';
import { evaluate, evaluateQuantity } from './expression';
import { gaugeLiteral, offsetLiteral, readLiteral } from './literal';
import { mismatch } from './mismatch';
import { ambiguousTemperature } from './problems/ambiguousTemperature';
import { missingUnit } from './problems/missingUnit';
import { outOfBounds } from './problems/outOfBounds';
import { replacement } from './problems/problem';
import { wrongType } from './problems/wrongType';
import { show } from './quantity';
import type { Scope } from './scope';
import { combine, leanOn } from './tolerance';
import type { Quantity, Value } from './values';

/**
 * `value ± halfWidth`, at 95 % coverage: one independent cause of tolerance. A half-width in percent is relative, unless
 * the value is written in percent itself: `95 % ± 1 %` is 94 to 96 %.
 */
export function evaluateTolerance(
  node: Tolerance,
  scope: Scope,
  readValue: (value: Expression) => Value | undefined = (value) => evaluate(value, scope),
): Quantity | undefined {
  const value = readValue(node.value);
  if (value === undefined) return undefined;
  if (value.kind !== 'quantity') {
    scope.report(
      wrongType.at(node.value.span, { subject: '±', wants: 'a number with its unit', found: 'something else' }),
    );
    return undefined;
  }
  const width = readHalfWidth(node.halfWidth, { node: node.value, value }, scope);
  if (!width) return undefined;
  return { ...value, leans: combine(1, value.leans, 1, leanOn(scope.causeOf(node), width.si)) };
}

/** What a half-width is taken of. */
interface Middle {
  readonly node: Expression;
  readonly value: Quantity;
}

/**
 * A half-width in the dimension of what it is taken of. One in percent is relative, unless the value is written in percent
 * itself. Readings on a scale, in °C or barg, count as differences.
 */
export function readHalfWidth(node: Expression, middle: Middle, scope: Scope): Quantity | undefined {
  const width = readWidth(node, scope);
  if (!width) return undefined;
  const { value } = middle;
  if (width.si < 0) {
    scope.report(outOfBounds.at(node.span, { subject: 'a half-width', value: show(width), bound: 'zero or more' }));
    return undefined;
  }
  const relative =
    width.dimension === dimensionless && width.unit !== undefined && value.unit?.dimension !== dimensionless;
  if (relative && value.unit?.kind === 'offset') {
    reportRelative(node, width, value, value.unit.text, scope);
    return undefined;
  }
  if (relative) return multiply(width, map(value, Math.abs(value.si), Math.sign(value.si)));
  if (width.dimension === value.dimension) return width;
  reportMismatch(node, width, middle, scope);
  return undefined;
}

function readWidth(node: Expression, scope: Scope): Quantity | undefined {
  const literal = offsetLiteral(node) ?? gaugeLiteral(node);
  if (literal) return readLiteral(literal, scope, 'difference');
  const width = evaluateQuantity(node, scope, 'a tolerance');
  if (width?.unit?.kind !== 'offset') return width;
  const why = 'is a temperature on a scale; a half-width is a difference, in K';
  scope.report(ambiguousTemperature.at(node.span, { written: show(width), why, readings: [] }));
  return undefined;
}

function reportRelative(node: Expression, width: Quantity, value: Quantity, unit: string, scope: Scope): void {
  const kelvin = `${formatNumber(Math.abs(value.si) * width.si, 2)} K`;
  const readings = [replacement(node.span, kelvin, `Write ${kelvin}`)];
  const why = `of a temperature in ${unit} may be meant of the reading or of the kelvins; write the half-width in K`;
  const written = show(width);
  scope.report(ambiguousTemperature.at(node.span, { written, why, readings }));
}

function reportMismatch(node: Expression, width: Quantity, middle: Middle, scope: Scope): void {
  const unit = width.unit?.text;
  if (middle.node.kind === 'number' && !middle.node.unit && unit !== undefined) {
    // `100 ± 4 Pa` is how data sheets write it.
    const { span, text } = middle.node;
    const wants = describeDimension(width.dimension);
    scope.report(missingUnit.at(span, { subject: 'the half-width', wants, digits: text, units: [unit] }));
    return;
  }
  const { dimension } = middle.value;
  mismatch(node, width, { subject: 'the half-width', dimension, wants: describeDimension(dimension) }, scope);
}
