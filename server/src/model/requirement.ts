import { children, walk } from '../syntax/children';
import type { Expression, RequireDeclaration } from '../syntax/nodes';
import { evaluateCondition } from './comparison';
import { requirementFails } from './problems/requirementFails';
import { requirementUndecided } from './problems/requirementUndecided';
import { showWithTolerance } from './quantity';
import type { DisplayUnits } from './quantity';
import type { DeclarationScope } from './scope';
import type { Verdict } from './values';

/** Whether a requirement holds; when it does not, a problem says what was found and what was wanted. */
export function evaluateRequirement(
  node: RequireDeclaration,
  text: string,
  scope: DeclarationScope,
): Verdict | undefined {
  const verdict = evaluateCondition(node.condition, scope);
  if (!verdict || verdict.status === 'holds') return verdict;
  const found = describeVerdict(verdict, node.condition, text, scope.display());
  if (verdict.status === 'undecided') {
    const severity = node.strength === 'require' ? 'warning' : 'information';
    scope.report(requirementUndecided.at(node.condition.span, { found, holds: verdict.holds }, { severity }));
    return verdict;
  }
  const because = node.because?.kind === 'text' ? node.because.text : undefined;
  const severity = node.strength === 'require' ? 'error' : 'warning';
  scope.report(
    requirementFails.at(
      node.condition.span,
      { strength: node.strength, found, ...(because ? { because } : {}) },
      { severity },
    ),
  );
  return verdict;
}

/** `bleed.conductance is 12.3 L/s; wanted >= 20 L/s`. Of a compound condition the part that decides is told. */
export function describeVerdict(verdict: Verdict, condition: Expression, text: string, display: DisplayUnits): string {
  const relation = relationAt(condition, verdict);
  const values = verdict.sides.map((side) => (side.value ? showWithTolerance(side.value, { display }) : side.text));
  // The condition stands in another declaration.
  if (!relation) return `${text.slice(condition.span.start, condition.span.end)} does not hold (${values.join(', ')})`;
  const [left, ...rest] = verdict.sides;
  const first = leftOf(relation);
  const subject = text.slice(first.span.start, first.span.end);
  const wanted = text
    .slice(first.span.end, relation.span.end)
    .trim()
    .replace(/^is\s+/, '');
  const value = left?.value ? showWithTolerance(left.value, { display }) : (left?.text ?? '');
  const limits = rest.flatMap((side) => (side.value ? [showWithTolerance(side.value, { display })] : []));
  const explained = limits.length > 0 && namesSomething(relation, first) ? ` (${limits.join(', ')})` : '';
  const not = verdict.negated ? 'not ' : '';
  if (first.kind === 'number' && relation.kind === 'comparison' && relation.right.kind !== 'number') {
    // `12 mm < bore` is about the bore.
    const about = text.slice(relation.right.span.start, relation.right.span.end);
    return `${about} is ${values[1] ?? ''}; wanted ${not}${text.slice(first.span.start, relation.span.end)}`;
  }
  const is = first.kind === 'number' ? '' : `${subject} is `;
  return `${is}${value}; wanted ${not}${wanted}${explained}`;
}

/** Whether the limits are names, whose values a reader does not see. */
function namesSomething(relation: Expression, left: Expression): boolean {
  let found = false;
  for (const part of children(relation)) {
    if (part !== left) walk(part, ({ kind }) => (found ||= kind === 'name'));
  }
  return found;
}

function relationAt(condition: Expression, { relation }: Verdict): Expression | undefined {
  let found: Expression | undefined;
  walk(condition, (node) => {
    if (relation && node.span.start === relation.start && node.span.end === relation.end && isRelation(node))
      found = node;
  });
  return found;
}

function isRelation(node: { kind: string }): node is Expression {
  return ['comparison', 'is', 'within', 'between'].includes(node.kind);
}

function leftOf(node: Expression): Expression {
  switch (node.kind) {
    case 'comparison':
      return node.left.kind === 'comparison' ? node.left.right : node.left;
    case 'is':
      return node.left;
    case 'within':
    case 'between':
      return node.value;
    default:
      return node;
  }
}
