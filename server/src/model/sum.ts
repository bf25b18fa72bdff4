import { describeDimension } from '../quantities/quantityKinds';
import type { Arithmetic, Expression, NumberLiteral } from '../syntax/nodes';
import { add, subtract } from './arithmetic';
import { evaluateQuantity } from './expression';
import { offsetLiteral, readLiteral } from './literal';
import { mismatch } from './mismatch';
import { ambiguousTemperature } from './problems/ambiguousTemperature';
import type { Fix } from './problems/problem';
import { replacement } from './problems/problem';
import type { Scope } from './scope';
import type { Quantity } from './values';

/**
 * `a + b` and `a - b`. A temperature in °C or °F that is added to something is a difference; what it is when both
 * sides are literals cannot be told, and when it is subtracted it is read as a difference with a warning.
 */
export function evaluateSum(node: Arithmetic, scope: Scope): Quantity | undefined {
  const sign = node.operator === '-' ? '-' : '+';
  const step = offsetLiteral(node.right);
  if (step && isTemperatureLiteral(node.left)) {
    reportAmbiguous(node, step, scope);
    return undefined;
  }
  if (step && sign === '-') reportAmbiguous(node, step, scope, 'warning');
  const left = evaluateQuantity(node.left, scope, 'a sum');
  const right = step ? readLiteral(step, scope, 'difference') : evaluateQuantity(node.right, scope, 'a sum');
  if (!left || !right) return undefined;
  if (left.dimension !== right.dimension) {
    const subject = sign === '+' ? 'what is added' : 'what is subtracted';
    mismatch(
      node.right,
      right,
      { subject, dimension: left.dimension, wants: describeDimension(left.dimension) },
      scope,
    );
    return undefined;
  }
  return sign === '+' ? add(left, right) : subtract(left, right);
}

function isTemperatureLiteral(node: Expression): boolean {
  if (offsetLiteral(node)) return true;
  return node.kind === 'number' && (node.unit?.text === 'K' || node.unit?.text === '°R');
}

function reportAmbiguous(
  node: Arithmetic,
  step: NumberLiteral,
  scope: Scope,
  severity: 'error' | 'warning' = 'error',
): void {
  const difference = readLiteral(step, scope, 'difference');
  const point = readLiteral(step, scope);
  if (!difference || !point) return;
  const asDifference = kelvin(step, difference, 'difference');
  const asPoint = kelvin(step, point, 'temperature');
  const readings = node.operator === '-' ? [asDifference, asPoint] : [asDifference];
  const read =
    severity === 'warning' ? 'is read as a difference here' : 'added to a temperature may be a point or a difference';
  const why =
    node.operator === '-' && severity === 'error'
      ? 'subtracted from a temperature may be a point or a difference'
      : read;
  const written = `${step.text} ${step.unit?.text ?? ''}`;
  scope.report(ambiguousTemperature.at(step.span, { written, why: `${why}; write it in K`, readings }, { severity }));
}

function kelvin(step: NumberLiteral, value: Quantity, reading: string): Fix {
  const text = `${Number(value.si.toPrecision(6))} K`;
  return replacement(step.span, text, `Write the ${reading}, ${text}`);
}
