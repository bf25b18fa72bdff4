import type { Analysis } from '../../model/analysis';
import type { Declared } from '../../model/declare';
import { children } from '../../syntax/children';
import { itemAt, pathAt } from '../../syntax/locate';
import type { Node, Span } from '../../syntax/nodes';

/** What is selected: the nodes around it, outermost first. A cursor alone selects what it touches. */
export interface Selection {
  readonly declared: Declared;
  readonly path: readonly Node[];
}

export function selectionAt({ file, text, declared: all }: Analysis, range: Span): Selection | undefined {
  const { start, end } = trimmed(text, range);
  const item = itemAt(file, start);
  const declared = item && all.find((each) => each.item === item);
  if (!declared || end > item.offset + item.text.length) return undefined;
  const own = { start: start - item.offset, end: end - item.offset };
  const path = own.start === own.end ? pathAt(item.declaration, own.start) : pathAround(item.declaration, own);
  return { declared, path };
}

/** Down to the smallest node that holds the whole range. */
function pathAround(root: Node, { start, end }: Span): readonly Node[] {
  const path: Node[] = [];
  const holds = ({ span }: Node) => span.start <= start && end <= span.end;
  for (let node: Node | undefined = root; node; node = children(node).find(holds)) path.push(node);
  return path;
}

function trimmed(text: string, { start, end }: Span): Span {
  const selected = text.slice(start, end);
  const from = start + (selected.length - selected.trimStart().length);
  return selected.trim() === '' ? { start, end: start } : { start: from, end: from + selected.trim().length };
}
