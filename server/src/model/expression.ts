import { dimensionless } from '../quantities/dimension';
import { describeDimension } from '../quantities/quantityKinds';
import { formatNumber } from '../quantities/format';
import type { Arithmetic, Conversion, Expression, Unary } from '../syntax/nodes';
import { divide, multiply, negate, power } from './arithmetic';
import { evaluateCall } from './call';
import {
  evaluateBetween,
  evaluateComparison,
  evaluateIs,
  evaluateLogic,
  evaluateNot,
  evaluateWithin,
} from './comparison';
import { gaugeLiteral, offsetLiteral, readLiteral, readUnit } from './literal';
import { evaluateMember, evaluateName } from './member';
import { ambiguousTemperature } from './problems/ambiguousTemperature';
import { noValue } from './problems/noValue';
import { replacement } from './problems/problem';
import { unitMismatch } from './problems/unitMismatch';
import { wrongType } from './problems/wrongType';
import { show } from './quantity';
import type { Scope } from './scope';
import { evaluateSum } from './sum';
import { evaluateTable } from './table';
import { evaluateTolerance } from './toleranced';
import type { Quantity, Value } from './values';

/**
 * The value of an expression, or nothing: then a problem has been reported, or a name it uses has no value.
 * An expression never throws, and a quantity it returns is finite.
 */
export function evaluate(node: Expression, scope: Scope): Value | undefined {
  switch (node.kind) {
    case 'number':
      return readLiteral(node, scope);
    case 'text':
      return { kind: 'phrase', text: node.text };
    case 'name':
      return evaluateName(node, scope);
    case 'member':
      return evaluateMember(node, scope);
    case 'call':
      return finite(node, evaluateCall(node, scope), scope);
    case 'group':
      return evaluate(node.inner, scope);
    case 'unary':
      return evaluateUnary(node, scope);
    case 'arithmetic':
      return finite(node, evaluateArithmetic(node, scope), scope);
    case 'tolerance':
      return evaluateTolerance(node, scope);
    case 'conversion':
      return evaluateConversion(node, scope);
    case 'comparison':
      return evaluateComparison(node, scope);
    case 'logic':
      return evaluateLogic(node, scope);
    case 'is':
      return evaluateIs(node, scope);
    case 'within':
      return evaluateWithin(node, scope);
    case 'between':
      return evaluateBetween(node, scope);
    case 'table':
      return evaluateTable(node, scope);
    case 'hole':
      // The hole itself is a problem of the syntax.
      return undefined;
  }
}

/** The value of an expression that must be a quantity. */
export function evaluateQuantity(node: Expression, scope: Scope, subject = 'this place'): Quantity | undefined {
  const value = evaluate(node, scope);
  if (value === undefined || value.kind === 'quantity') return value;
  scope.report(wrongType.at(node.span, { subject, wants: 'a number with its unit', found: describeValue(value) }));
  return undefined;
}

/** What a value is, with its article, for messages. */
export function describeValue(value: Value): string {
  switch (value.kind) {
    case 'quantity':
      return describeDimension(value.dimension);
    case 'word':
      return `the word “${value.text}”`;
    case 'phrase':
      return 'a text';
    case 'table':
    case 'named-table':
      return 'a table';
    case 'gas':
      return 'a gas';
    case 'verdict':
      return 'a condition';
    case 'record':
    case 'pending':
      return /^[aeiou]/.test(value.word) ? `an ${value.word}` : `a ${value.word}`;
  }
}

function evaluateUnary(node: Unary, scope: Scope): Value | undefined {
  if (node.operator === 'not') return evaluateNot(node, scope);
  // The sign of −5 °C belongs to the reading on the scale, not to the kelvins.
  if (node.operator === '-' && (offsetLiteral(node.operand) ?? gaugeLiteral(node.operand)))
    return negativeReading(node.operand, node, scope);
  const operand = evaluateQuantity(node.operand, scope, 'a sign');
  return operand && node.operator === '-' ? negate(operand) : operand;
}

function negativeReading(node: Expression, minus: Unary, scope: Scope): Value | undefined {
  switch (node.kind) {
    case 'number':
      return readLiteral(node, scope, 'value', minus);
    case 'group':
      return negativeReading(node.inner, minus, scope);
    case 'tolerance':
      return evaluateTolerance(node, scope, (value) => negativeReading(value, minus, scope));
    default:
      return evaluate(node, scope);
  }
}

function evaluateArithmetic(node: Arithmetic, scope: Scope): Quantity | undefined {
  if (node.operator === '+' || node.operator === '-') return evaluateSum(node, scope);
  const scaled = [node.left, node.right].find((side) => offsetLiteral(side));
  if (scaled) {
    reportScaled(scaled, scope);
    return undefined;
  }
  const left = evaluateQuantity(node.left, scope, 'a product');
  const right = evaluateQuantity(node.right, scope, 'a product');
  if (!left || !right) return undefined;
  switch (node.operator) {
    case '*':
      return multiply(left, right);
    case '/':
      if (right.si !== 0) return divide(left, right);
      scope.report(noValue.at(node.right.span, { why: 'a division by zero has no value' }));
      return undefined;
    case '^':
      return evaluatePower(node, left, right, scope);
  }
}

function evaluatePower(node: Arithmetic, base: Quantity, exponent: Quantity, scope: Scope): Quantity | undefined {
  if (exponent.dimension !== dimensionless) {
    const measures = describeDimension(exponent.dimension);
    scope.report(
      unitMismatch.at(node.right.span, { subject: 'an exponent', wants: 'a plain number', found: 'this', measures }),
    );
    return undefined;
  }
  if (base.si < 0 && !Number.isInteger(exponent.si)) {
    scope.report(noValue.at(node.span, { why: `${show(base)} has no power of ${formatNumber(exponent.si, 4)}` }));
    return undefined;
  }
  return power(base, exponent);
}

function evaluateConversion(node: Conversion, scope: Scope): Value | undefined {
  const value = evaluateQuantity(node.value, scope, '“in”');
  const unit = node.unit.kind === 'unit' ? readUnit(node.unit, scope) : undefined;
  if (!value || !unit) return value;
  if (unit.dimension === value.dimension) return { ...value, unit };
  scope.report(
    unitMismatch.at(node.unit.span, {
      subject: 'the value',
      wants: describeDimension(value.dimension),
      found: unit.text,
      measures: describeDimension(unit.dimension),
    }),
  );
  return undefined;
}

function reportScaled(side: Expression, scope: Scope): void {
  const literal = offsetLiteral(side);
  const value = literal && readLiteral(literal, scope);
  if (!literal || !value?.unit) return;
  const kelvin = `${Number(value.si.toPrecision(6))} K`;
  scope.report(
    ambiguousTemperature.at(literal.span, {
      written: `${literal.text} ${value.unit.text}`,
      why: 'is a point on a scale and cannot be multiplied; write it in K',
      readings: [{ ...replacement(literal.span, kelvin, `Write the temperature, ${kelvin}`), preferred: true }],
    }),
  );
}

/** No value that is not a number leaves an expression. */
function finite(node: Expression, value: Value | undefined, scope: Scope): Value | undefined {
  if (value?.kind !== 'quantity' || Number.isFinite(value.si)) return value;
  scope.report(noValue.at(node.span, { why: 'the result is too large to be represented' }));
  return undefined;
}
