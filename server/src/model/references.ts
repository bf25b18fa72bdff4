import { children } from '../syntax/children';
import type { Declaration, Name, Node } from '../syntax/nodes';

const known = new WeakMap<Declaration, readonly Name[]>();

/** The names that a declaration uses, wherever they come from: everything in it that is neither a key, a property nor its own name. */
export function references(declaration: Declaration): readonly Name[] {
  const before = known.get(declaration);
  if (before) return before;
  const found: Name[] = [];
  for (const child of children(declaration)) {
    if (child !== declaration.word && !('name' in declaration && child === declaration.name)) collect(child, found);
  }
  known.set(declaration, found);
  return found;
}

function collect(node: Node, found: Name[]): void {
  switch (node.kind) {
    case 'name':
      found.push(node);
      return;
    case 'member':
      collect(node.object, found);
      return;
    case 'is':
      collect(node.left, found);
      return;
    case 'head':
      collect(node.target, found);
      return;
    case 'entry':
      collect(node.value, found);
      return;
    case 'display-item':
      return;
    case 'row':
      // The rows of a table by species are names of species, not of declarations.
      if (node.at.kind !== 'name') collect(node.at, found);
      collect(node.value, found);
      return;
    default:
      for (const child of children(node)) collect(child, found);
  }
}
