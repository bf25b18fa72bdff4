import { dimensionless } from '../quantities/dimension';
import { describeDimension, kindNamed } from '../quantities/quantityKinds';
import { nearestNames } from '../quantities/nearestNames';
import type { Call, Expression } from '../syntax/nodes';
import { describeValue, evaluate, evaluateQuantity } from './expression';
import type { GasFunction, QuantityFunction } from './functions';
import { functionNamed, functions } from './functions';
import { mismatch } from './mismatch';
import { gasNamed } from './mixture';
import { decimalComma } from './problems/decimalComma';
import { noValue } from './problems/noValue';
import { unknownName } from './problems/unknownName';
import { wrongArguments } from './problems/wrongArguments';
import { wrongType } from './problems/wrongType';
import { show } from './quantity';
import type { Scope } from './scope';
import { interpolate } from './table';
import type { Gas, Quantity } from './values';

/** A function of quantities, or a table read at a place: `speed(1 mbar)`. */
export function evaluateCall(node: Call, scope: Scope): Quantity | undefined {
  const definition = functionNamed(node.callee.text);
  if (!definition) return readTable(node, scope);
  return definition.takes === 'gas'
    ? evaluateOfGas(node, definition, scope)
    : evaluateFunction(node, definition, scope);
}

function evaluateFunction(node: Call, definition: QuantityFunction, scope: Scope): Quantity | undefined {
  const values = evaluateArguments(node, scope);
  if (!values) return undefined;
  const [least, most] = definition.arity;
  const [first, ...rest] = values;
  if (!first || values.length < least || values.length > most) {
    scope.report(wrongArguments.at(node.span, { usage: definition.usage, given: values.length }));
    return undefined;
  }
  if (!argumentsFit(node, definition, values, scope)) return undefined;
  const result = definition.compute(first, ...rest);
  if (!result) scope.report(noValue.at(node.span, { why: `${definition.name} has no value at ${show(first)}` }));
  return result;
}

function evaluateOfGas(node: Call, definition: GasFunction, scope: Scope): Quantity | undefined {
  const { name, usage } = definition;
  const [first, second, ...more] = node.arguments;
  if (!first || !second || more.length > 0) {
    scope.report(wrongArguments.at(node.span, { usage, given: node.arguments.length }));
    return undefined;
  }
  const gas = gasArgument(first, name, scope);
  const temperature = evaluateQuantity(second, scope, name);
  const kind = kindNamed('temperature');
  if (!temperature || !kind) return undefined;
  const { dimension } = kind;
  if (temperature.dimension !== dimension) {
    mismatch(
      second,
      temperature,
      { subject: `an argument of ${name}`, dimension, wants: 'a temperature', kind },
      scope,
    );
    return undefined;
  }
  const found = gas && definition.compute(gas, temperature);
  if (typeof found !== 'string') return found;
  scope.report(noValue.at(node.span, { why: found }));
  return undefined;
}

function gasArgument(node: Expression, name: string, scope: Scope): Gas | undefined {
  if (node.kind === 'name') return gasNamed(node, scope);
  const value = evaluate(node, scope);
  if (!value || value.kind === 'gas') return value;
  const found = describeValue(value);
  scope.report(wrongType.at(node.span, { subject: `the first argument of ${name}`, wants: 'a gas', found }));
  return undefined;
}

function evaluateArguments(node: Call, scope: Scope): readonly Quantity[] | undefined {
  const values = node.arguments.map((argument) => {
    if (argument.kind !== 'number' || !argument.comma) return evaluateQuantity(argument, scope, node.callee.text);
    scope.report(decimalComma.at(argument.digits, { digits: argument.text, inList: true }));
    return undefined;
  });
  const known = values.filter((value) => value !== undefined);
  return known.length === values.length ? known : undefined;
}

function argumentsFit(
  node: Call,
  { name, takes }: QuantityFunction,
  values: readonly Quantity[],
  scope: Scope,
): boolean {
  if (takes === 'any') return true;
  const dimension = takes === 'number' ? dimensionless : (values[0]?.dimension ?? dimensionless);
  const wants = takes === 'number' ? 'a plain number' : describeDimension(dimension);
  const wrong = values.findIndex((value) => value.dimension !== dimension);
  const [argument, value] = [node.arguments[wrong], values[wrong]];
  if (!argument || !value) return true;
  mismatch(argument, value, { subject: `an argument of ${name}`, dimension, wants }, scope);
  return false;
}

function readTable(node: Call, scope: Scope): Quantity | undefined {
  const { callee } = node;
  const found = scope.lookUp(callee.text);
  if (found.kind === 'blocked') return undefined;
  if (found.kind === 'unknown') {
    const nearest = nearestNames(callee.text, [...functions.map(({ name }) => name), ...scope.names()]);
    scope.report(unknownName.at(callee.span, { what: 'function or table', name: callee.text, nearest }));
    return undefined;
  }
  if (found.value.kind !== 'table') {
    scope.report(
      wrongType.at(callee.span, {
        subject: 'a call',
        wants: 'a function or a table',
        found: describeValue(found.value),
      }),
    );
    return undefined;
  }
  const [at, ...more] = evaluateArguments(node, scope) ?? [];
  const [argument] = node.arguments;
  const dimension = found.value.rows[0]?.at.dimension ?? dimensionless;
  if (!argument || !at || more.length > 0) {
    if (node.arguments.length !== 1)
      scope.report(wrongArguments.at(node.span, { usage: `${callee.text}(x)`, given: node.arguments.length }));
    return undefined;
  }
  if (at.dimension !== dimension) {
    mismatch(
      argument,
      at,
      { subject: `the place in ${callee.text}`, dimension, wants: describeDimension(dimension) },
      scope,
    );
    return undefined;
  }
  return interpolate(found.value, at, argument, scope);
}
