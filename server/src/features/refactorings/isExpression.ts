import type { Expression, Node } from '../../syntax/nodes';

/** Whether a node is one that has a value. */
export function isExpression(node: Node): node is Expression {
  return expressionKinds.has(node.kind);
}

const expressionKinds: ReadonlySet<string> = new Set<Expression['kind']>([
  'number',
  'text',
  'name',
  'member',
  'call',
  'group',
  'unary',
  'arithmetic',
  'comparison',
  'logic',
  'tolerance',
  'conversion',
  'is',
  'within',
  'between',
  'table',
  'hole',
]);
