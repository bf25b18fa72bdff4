import { children } from '../../syntax/children';
import type { Node } from '../../syntax/nodes';

/** Whether a node or anything below it is of a certain sort. */
export function contains(node: Node, test: (node: Node) => boolean): boolean {
  return test(node) || children(node).some((child) => contains(child, test));
}
