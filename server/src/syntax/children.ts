import type { Node } from './nodes';

/** The parts of a node in the order of the text. */
export function children(node: Node): readonly Node[] {
  return parts(node).filter((part) => part !== undefined);
}

function parts(node: Node): readonly (Node | undefined)[] {
  switch (node.kind) {
    case 'let':
    case 'assume':
      return [node.word, node.name, node.value, node.rest];
    case 'use':
      return [node.word, node.path, node.rest];
    case 'display':
      return [node.word, ...node.items, node.rest];
    case 'gas':
      return [node.word, node.name, node.mixture, node.rest];
    case 'require':
      return [node.word, node.condition, node.because, node.rest];
    case 'line':
      return [node.word, node.name, node.route, node.rest];
    case 'site':
      return [node.word, node.name, node.state, node.relation, node.geometry, node.rest];
    case 'thing':
      return [node.word, node.name, node.head, node.block, node.rest];
    case 'stray':
      return [node.word, node.rest];
    case 'display-item':
      return [node.quantity, node.unit];
    case 'head':
      return [node.relation, node.target];
    case 'block':
      return node.items;
    case 'entry':
      return [node.key, node.value, node.rest];
    case 'connection':
      return [node.route, node.rest];
    case 'vary':
      return [node.target, node.from, node.to, node.count, node.rest];
    case 'show':
      return [...node.figures, node.rest];
    case 'mixture':
      return node.parts;
    case 'part':
      return [node.name, node.amount];
    case 'series':
      return node.stages;
    case 'parallel':
      return node.branches;
    case 'number':
      return [node.unit];
    case 'member':
      return [node.object, node.property];
    case 'call':
      return [node.callee, ...node.arguments];
    case 'group':
      return [node.inner];
    case 'unary':
      return [node.operand];
    case 'arithmetic':
    case 'comparison':
    case 'logic':
      return [node.left, node.right];
    case 'is':
      return [node.left, node.right];
    case 'tolerance':
      return [node.value, node.halfWidth];
    case 'conversion':
      return [node.value, node.unit];
    case 'within':
      return [node.value, node.halfWidth, node.target];
    case 'between':
      return [node.value, node.low, node.high];
    case 'table':
      return node.rows;
    case 'row':
      return [node.at, node.value];
    case 'name':
    case 'text':
    case 'unit':
    case 'hole':
    case 'junk':
    case 'balance':
      return [];
  }
}

/** Visits a node and all below it, outermost first. */
export function walk(node: Node, visit: (node: Node) => void): void {
  visit(node);
  for (const child of children(node)) walk(child, visit);
}
