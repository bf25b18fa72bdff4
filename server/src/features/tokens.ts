import { children } from '../syntax/children';
import type { Declaration, Node } from '../syntax/nodes';

/** A piece of a declaration's text that is not white space. Its place counts from the declaration's start. */
export interface Token {
  /** A node of its own, of a number the digits; or, between the nodes, a word of the grammar, a mark or a comment. */
  readonly kind: 'name' | 'number' | 'unit' | 'text' | 'junk' | 'balance' | 'word' | 'mark' | 'comment';
  readonly start: number;
  readonly end: number;
  readonly text: string;
  /** The innermost node around it. */
  readonly parent: Node;
}

/** The whole text of a declaration but for its white space, in order. */
export function tokensOf(declaration: Declaration, text: string): readonly Token[] {
  const tokens: Token[] = [];
  collect(declaration, { start: 0, end: text.length }, declaration, { text, tokens });
  return tokens;
}

interface Collection {
  readonly text: string;
  readonly tokens: Token[];
}

/** Takes in a stretch of the text that belongs to a node: its parts, and what stands between them. */
function collect(node: Node, stretch: { start: number; end: number }, parent: Node, to: Collection): void {
  let at = stretch.start;
  const put = (start: number, end: number, take: () => void) => {
    if (end <= start) return;
    fill(node, at, start, to);
    take();
    at = end;
  };
  switch (node.kind) {
    case 'hole':
      return;
    case 'name':
    case 'unit':
    case 'text':
    case 'junk':
    case 'balance':
      to.tokens.push({ kind: node.kind, start: at, end: stretch.end, text: to.text.slice(at, stretch.end), parent });
      return;
    case 'number': {
      const { start, end } = node.digits;
      put(start, end, () => to.tokens.push({ kind: 'number', start, end, text: node.text, parent }));
      break;
    }
    default:
  }
  for (const child of children(node)) {
    const { start, end } = child.span;
    put(start, end, () => {
      collect(child, child.span, node, to);
    });
  }
  fill(node, at, stretch.end, to);
}

const FILLING = /(?<comment>#[^\r\n]*)|(?<word>[\p{L}_][\p{L}\p{N}_]*)|(?<mark>->|\+-|\.\.|==|!=|<=|>=|[^\s\uFEFF])/gu;

function fill(parent: Node, from: number, to: number, { text, tokens }: Collection): void {
  for (const { index, groups, 0: found } of text.slice(from, to).matchAll(FILLING)) {
    const kind = groups?.['comment'] ? 'comment' : groups?.['word'] ? 'word' : 'mark';
    const start = from + index;
    tokens.push({ kind, start, end: start + found.length, text: found, parent });
  }
}
