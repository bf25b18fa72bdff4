import { nearestNames } from '../quantities/nearestNames';
import { describeDimension } from '../quantities/quantityKinds';
import type { Between, Comparison, Expression, Is, Logic, Unary, Within } from '../syntax/nodes';
import { negate, subtract } from './arithmetic';
import { describeValue, evaluate, evaluateQuantity } from './expression';
import { offsetLiteral } from './literal';
import { mismatch } from './mismatch';
import { ambiguousTemperature } from './problems/ambiguousTemperature';
import { contradictoryInput } from './problems/contradictoryInput';
import { either } from './problems/problem';
import { unknownName } from './problems/unknownName';
import { wrongType } from './problems/wrongType';
import { show } from './quantity';
import type { Scope } from './scope';
import { exact, halfWidth } from './tolerance';
import { readHalfWidth } from './toleranced';
import type { Quantity, Side, Verdict } from './values';

/**
 * Conditions. Each becomes *room*: the distance to the limit, positive when the condition holds. Since the room carries the
 * leans of both sides, an input that moves both alike does not make the condition uncertain.
 */
export function evaluateComparison(node: Comparison, scope: Scope): Verdict | undefined {
  // a < b < c compares b twice.
  if (node.left.kind === 'comparison') {
    const first = evaluateComparison(node.left, scope);
    const second = evaluateComparison({ ...node, left: node.left.right }, scope);
    return first && second && both(first, second);
  }
  const sides = evaluateAlike([node.left, node.right], scope);
  const [left, right] = sides ?? [];
  if (!left || !right || !sides) return undefined;
  const shown = [side('', left), side('', right)];
  switch (node.operator) {
    case '<':
    case '<=':
      return verdict(node, subtract(right, left), right, shown, { strict: node.operator === '<' });
    case '>':
    case '>=':
      return verdict(node, subtract(left, right), right, shown, { strict: node.operator === '>' });
    case '==':
      return equality(node, left, right, shown);
    case '!=':
      return opposite(equality(node, left, right, shown));
  }
}

export function evaluateWithin(node: Within, scope: Scope): Verdict | undefined {
  const [target, value] = evaluateAlike([node.target, node.value], scope) ?? [];
  const allowed = target && readHalfWidth(node.halfWidth, { node: node.target, value: target }, scope);
  if (!value || !allowed) return undefined;
  const distance = subtract(value, target);
  const size = distance.si < 0 ? negate(distance) : distance;
  return verdict(node, subtract(allowed, size), allowed, [side('', value), side('of ', target)], { strict: false });
}

export function evaluateBetween(node: Between, scope: Scope): Verdict | undefined {
  const [value, low, high] = evaluateAlike([node.value, node.low, node.high], scope) ?? [];
  if (!value || !low || !high) return undefined;
  if (low.si > high.si) {
    const why = `the bounds are the wrong way round: ${show(low)} is above ${show(high)}`;
    scope.report(contradictoryInput.at({ start: node.low.span.start, end: node.high.span.end }, { why }));
    return undefined;
  }
  const shown = [side('', value), side('from ', low), side('to ', high)];
  const width = subtract(high, low);
  const above = verdict(node, subtract(value, low), width, shown, { strict: false });
  return both(above, verdict(node, subtract(high, value), width, shown, { strict: false }));
}

/** `in_foreline.regime is molecular` */
export function evaluateIs(node: Is, scope: Scope): Verdict | undefined {
  const left = evaluate(node.left, scope);
  if (!left || node.right.kind === 'hole') return undefined;
  if (left.kind !== 'word') {
    scope.report(
      wrongType.at(node.left.span, { subject: '“is”', wants: 'a word such as a regime', found: describeValue(left) }),
    );
    return undefined;
  }
  if (left.of && !left.of.includes(node.right.text)) {
    const nearest = nearestNames(node.right.text, left.of);
    scope.report(unknownName.at(node.right.span, { what: 'such word', name: node.right.text, nearest }));
    return undefined;
  }
  const holds = (left.text === node.right.text) !== node.negated;
  const { reached = [] } = left;
  const sides = [{ text: reached.length > 1 ? either(reached) : left.text }];
  const open = reached.length > 1 && reached.includes(node.right.text);
  return { ...plain(node, holds, sides), ...(open ? { status: 'undecided' } : {}) };
}

export function evaluateLogic(node: Logic, scope: Scope): Verdict | undefined {
  const left = evaluateCondition(node.left, scope);
  const right = evaluateCondition(node.right, scope);
  if (!left || !right) return undefined;
  return node.operator === 'and' ? both(left, right) : not(both(not(left), not(right)));
}

export function evaluateNot(node: Unary, scope: Scope): Verdict | undefined {
  const operand = evaluateCondition(node.operand, scope);
  return operand && not(operand);
}

/** The value of an expression that must be a condition. */
export function evaluateCondition(node: Expression, scope: Scope): Verdict | undefined {
  const value = evaluate(node, scope);
  if (value === undefined || value.kind === 'verdict') return value;
  scope.report(
    wrongType.at(node.span, {
      subject: 'this place',
      wants: 'a condition such as a >= b',
      found: describeValue(value),
    }),
  );
  return undefined;
}

function evaluateAlike(nodes: readonly Expression[], scope: Scope): readonly Quantity[] | undefined {
  const values = nodes.map((node) => evaluateQuantity(node, scope, 'a comparison'));
  const [first] = values;
  const known: Quantity[] = [];
  for (const [index, value] of values.entries()) {
    const node = nodes[index];
    if (!first || !value || !node) continue;
    if (value.dimension === first.dimension) {
      if (isMistaken(node, values)) reportPoint(node, value, scope);
      else known.push(value);
    } else
      mismatch(
        node,
        value,
        { subject: 'the other side', dimension: first.dimension, wants: describeDimension(first.dimension) },
        scope,
      );
  }
  return known.length === nodes.length ? known : undefined;
}

/** A difference of temperatures is compared with a difference: 50 °C would be 323 K. */
function isMistaken(node: Expression, values: readonly (Quantity | undefined)[]): boolean {
  return offsetLiteral(node) !== undefined && values.some((value) => value?.quantityKind === 'temperature_difference');
}

function reportPoint(node: Expression, value: Quantity, scope: Scope): void {
  const why = 'is a temperature on a scale, but the other side is a difference of temperatures; write it in K';
  scope.report(ambiguousTemperature.at(node.span, { written: show(value), why, readings: [] }));
}

/** Equal within rounding. Where the difference is uncertain and reaches zero, nobody can tell. */
function equality(node: Expression, left: Quantity, right: Quantity, sides: readonly Side[]): Verdict {
  const difference = settled(subtract(left, right), [left, right]);
  const equal = difference.si === 0;
  const width = halfWidth(difference.leans);
  const open = width > 0 && width >= Math.abs(difference.si);
  return { ...plain(node, equal, sides), ...(open ? { status: 'undecided' } : {}), leans: difference.leans };
}

/** What is left between two sides by rounding alone is no difference. */
function settled(room: Quantity, sides: readonly Quantity[]): Quantity {
  const scale = Math.max(...sides.map(({ si }) => Math.abs(si)));
  return Math.abs(room.si) <= 1e-12 * scale ? { ...room, si: 0 } : room;
}

function verdict(
  node: Expression,
  distance: Quantity,
  limit: Quantity,
  sides: readonly Side[],
  { strict }: { strict: boolean },
): Verdict {
  const room = settled(
    distance,
    sides.flatMap(({ value }) => value ?? []),
  );
  const holds = strict ? room.si > 0 : room.si >= 0;
  const uncertain = halfWidth(room.leans) > Math.abs(room.si);
  const status = uncertain ? 'undecided' : holds ? 'holds' : 'fails';
  const margin = room.si / Math.abs(limit.si);
  return {
    kind: 'verdict',
    status,
    ...(Number.isFinite(margin) ? { margin } : {}),
    sides,
    holds,
    leans: room.leans,
    relation: node.span,
  };
}

/** A condition in which nothing is measured. */
function plain(node: Expression, holds: boolean, sides: readonly Side[]): Verdict {
  return { kind: 'verdict', status: holds ? 'holds' : 'fails', holds, sides, leans: exact, relation: node.span };
}

/** Both conditions: the worse one tells. */
function both(a: Verdict, b: Verdict): Verdict {
  const worse =
    RANK[a.status] < RANK[b.status] || (a.status === b.status && (a.margin ?? Infinity) <= (b.margin ?? Infinity))
      ? a
      : b;
  return { ...worse, holds: a.holds && b.holds };
}

const RANK = { fails: 0, undecided: 1, holds: 2 } as const;

/** The opposite, said as “not”. */
function not(a: Verdict): Verdict {
  return { ...opposite(a), negated: !a.negated };
}

/** The opposite, where the condition itself says so, as `!=` does. */
function opposite(a: Verdict): Verdict {
  const status = a.status === 'undecided' ? 'undecided' : a.status === 'holds' ? 'fails' : 'holds';
  return { ...a, status, holds: !a.holds, ...(a.margin === undefined ? {} : { margin: -a.margin }) };
}

function side(text: string, value: Quantity): Side {
  return { text, value };
}
