import { children } from './children';
import type { File, Item, Node } from './nodes';

/** The declaration that holds an offset of the file; at a seam the one that ends there. */
export function itemAt(file: File, offset: number): Item | undefined {
  let low = 0;
  let high = file.items.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    const item = file.items[middle];
    if (item && item.offset + item.text.length < offset) low = middle + 1;
    else high = middle;
  }
  const item = file.items[low];
  return item && item.offset <= offset ? item : undefined;
}

/** The nodes around an offset of a declaration, outermost first; the last touches the offset most closely. */
export function pathAt(root: Node, offset: number): readonly Node[] {
  const path: Node[] = [];
  for (let node: Node | undefined = root; node; node = closest(children(node), offset)) path.push(node);
  return path;
}

/** Where two parts meet, a name or a number is what is meant, not the mark beside it. */
function closest(nodes: readonly Node[], offset: number): Node | undefined {
  const touching = nodes.filter((node) => node.span.start <= offset && offset <= node.span.end);
  return touching.find((node) => node.kind !== 'hole' && offset < node.span.end) ?? touching[0];
}
