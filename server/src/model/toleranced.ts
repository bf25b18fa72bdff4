import { dimensionless } from '../quantities/dimension';
import { describeDimension } from '../quantities/quantityKinds';
import { formatNumber } from '../quantities/format';
import type { Expression, Tolerance } from '../syntax/nodes';
import { evaluate, evaluateQuantity } from './expression';
import { offsetLiteral, readLiteral } from './literal';
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
  const width = readWidth(node.halfWidth, scope);
  if (value === undefined) return undefined;
  if (value.kind !== 'quantity') {
    scope.report(
      wrongType.at(node.value.span, { subject: '±', wants: 'a number with its unit', found: 'something else' }),
    );
    return undefined;
  }
  const amount = width && halfWidthOf(node, value, width, scope);
  if (amount === undefined) return undefined;
  return { ...value, leans: combine(1, value.leans, 1, leanOn(scope.causeOf(node), amount)) };
}

function readWidth(node: Expression, scope: Scope): Quantity | undefined {
  const literal = offsetLiteral(node);
  return literal ? readLiteral(literal, scope, 'difference') : evaluateQuantity(node, scope, 'a tolerance');
}

function halfWidthOf(node: Tolerance, value: Quantity, width: Quantity, scope: Scope): number | undefined {
  if (width.si < 0) {
    scope.report(
      outOfBounds.at(node.halfWidth.span, { subject: 'a half-width', value: show(width), bound: 'zero or more' }),
    );
    return undefined;
  }
  const relative =
    width.dimension === dimensionless && width.unit !== undefined && value.unit?.dimension !== dimensionless;
  if (relative && value.unit?.kind === 'offset') {
    const kelvin = `${formatNumber(Math.abs(value.si) * width.si, 2)} K`;
    const readings = [replacement(node.halfWidth.span, kelvin, `Write ± ${kelvin}`)];
    const why = `of a temperature in ${value.unit.text} may be meant of the reading or of the kelvins; write the half-width in K`;
    scope.report(
      ambiguousTemperature.at(node.halfWidth.span, {
        written: `± ${String(Number((100 * width.si).toPrecision(4)))} %`,
        why,
        readings,
      }),
    );
    return undefined;
  }
  if (relative) return Math.abs(value.si) * width.si;
  if (width.dimension === value.dimension) return width.si;
  const { dimension } = value;
  const unit = width.unit?.text;
  if (node.value.kind === 'number' && !node.value.unit && unit !== undefined) {
    // `100 ± 4 Pa` is how data sheets write it.
    const { span, text } = node.value;
    const wants = describeDimension(width.dimension);
    scope.report(missingUnit.at(span, { subject: 'the half-width', wants, digits: text, units: [unit] }));
    return undefined;
  }
  mismatch(node.halfWidth, width, { subject: 'the half-width', dimension, wants: describeDimension(dimension) }, scope);
  return undefined;
}
