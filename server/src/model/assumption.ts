import { nearestNames } from '../quantities/nearestNames';
import { describeDimension, kindNamed } from '../quantities/quantityKinds';
import { dimensionless } from '../quantities/dimension';
import type { AssumeDeclaration } from '../syntax/nodes';
import { conditionNamed, conditions } from './conditions';
import { describeValue, evaluate } from './expression';
import { literalOf, mismatch } from './mismatch';
import { contradictoryInput } from './problems/contradictoryInput';
import { outOfBounds } from './problems/outOfBounds';
import { unknownName } from './problems/unknownName';
import { wrongType } from './problems/wrongType';
import { show } from './quantity';
import type { RegimeLimits } from './regime';
import { standardRegimeLimits } from './regime';
import type { Scope } from './scope';
import type { Value } from './values';

/** `assume ambient_pressure = 950 mbar`: the value, when it is of the condition's kind. */
export function evaluateAssumption(node: AssumeDeclaration, scope: Scope): Value | undefined {
  const value = evaluate(node.value, scope);
  if (node.name.kind === 'hole') return undefined;
  const name = node.name.text;
  if (name === REGIME_LIMITS) return value && checkLimits(node, value, scope);
  const condition = conditionNamed(name);
  if (!condition) {
    const nearest = nearestNames(name, [REGIME_LIMITS, ...conditions.map((each) => each.name)]);
    scope.report(unknownName.at(node.name.span, { what: 'reference condition', name, nearest }));
    return undefined;
  }
  const kind = kindNamed(condition.quantityKind);
  if (!value || !kind) return undefined;
  if (value.kind !== 'quantity') {
    scope.report(
      wrongType.at(node.value.span, {
        subject: name,
        wants: describeDimension(kind.dimension),
        found: describeValue(value),
      }),
    );
    return undefined;
  }
  if (value.dimension !== kind.dimension) {
    mismatch(
      node.value,
      value,
      { subject: name, dimension: kind.dimension, wants: describeDimension(kind.dimension), kind },
      scope,
    );
    return undefined;
  }
  if (!(value.si > 0)) {
    const place = literalOf(node.value)?.span ?? node.value.span;
    scope.report(outOfBounds.at(place, { subject: name, value: show(value), bound: 'above zero' }));
    return undefined;
  }
  return { ...value, quantityKind: kind.name };
}

export const REGIME_LIMITS = 'regime_limits';

/** The limits that a value of `regime_limits` sets; those it leaves out stay as they are. */
export function limitsOf(value: Value | undefined): RegimeLimits {
  if (value?.kind !== 'named-table') return standardRegimeLimits;
  const limit = (name: keyof RegimeLimits) => value.rows.get(name)?.si ?? standardRegimeLimits[name];
  return { slip: limit('slip'), transitional: limit('transitional'), molecular: limit('molecular') };
}

function checkLimits(node: AssumeDeclaration, value: Value, scope: Scope): Value | undefined {
  const names = Object.keys(standardRegimeLimits);
  if (value.kind !== 'named-table') {
    const wants = 'a table such as [slip: 0.01, transitional: 0.1, molecular: 10]';
    scope.report(wrongType.at(node.value.span, { subject: REGIME_LIMITS, wants, found: describeValue(value) }));
    return undefined;
  }
  for (const [name, limit] of value.rows) {
    if (!names.includes(name)) {
      scope.report(
        unknownName.at(node.value.span, {
          what: 'regime with a lower limit',
          name,
          nearest: nearestNames(name, names),
        }),
      );
      return undefined;
    }
    if (limit.dimension !== dimensionless) {
      scope.report(
        wrongType.at(node.value.span, {
          subject: REGIME_LIMITS,
          wants: 'Knudsen numbers, which have no unit',
          found: describeValue(limit),
        }),
      );
      return undefined;
    }
  }
  const { slip, transitional, molecular } = limitsOf(value);
  if (0 < slip && slip < transitional && transitional < molecular) return value;
  scope.report(
    contradictoryInput.at(node.value.span, {
      why: 'the limits of the regimes rise from slip over transitional to molecular',
    }),
  );
  return undefined;
}
