import { children } from './children';
import { parse as parseDeclaration } from './generated/parser';
import type { Declaration, File, Item, Node } from './nodes';
import { split } from './split';

/** Parses a whole file: a tree for every text. */
export function parse(text: string): File {
  return createParser()(text);
}

/**
 * A parser that remembers the declarations of the text before, so that a keystroke parses one declaration.
 * Declarations with the same text share one tree.
 */
export function createParser(): (text: string) => File {
  let known = new Map<string, Declaration>();
  return (text) => {
    const used = new Map<string, Declaration>();
    const items: Item[] = split(text).map(({ start, end, doc }) => {
      const own = text.slice(start, end);
      const declaration = used.get(own) ?? known.get(own) ?? parseOne(own);
      used.set(own, declaration);
      return { offset: start, text: own, declaration, ...(doc === undefined ? {} : { doc }) };
    });
    known = used;
    return { text, items };
  };
}

/** The grammar takes every text; what neither it nor a reader of its tree can take is nesting deeper than the stack. */
function parseOne(text: string): Declaration {
  try {
    const declaration = parseDeclaration(text);
    return text.length > DEEPEST && isDeeper(declaration) ? tooDeep(text) : declaration;
  } catch (error) {
    if (error instanceof RangeError) return tooDeep(text);
    throw error;
  }
}

/** In levels: far more than anyone writes, far less than the stack of a worker holds. A level takes a character at least. */
const DEEPEST = 500;

/** Level by level, as the depth is what is in question. */
function isDeeper(root: Node): boolean {
  let level: readonly Node[] = [root];
  for (let depth = 0; level.length > 0; depth += 1) {
    if (depth > DEEPEST) return true;
    level = level.flatMap(children);
  }
  return false;
}

function tooDeep(text: string): Declaration {
  const span = { start: 0, end: text.length };
  const word = { kind: 'name', span: { start: 0, end: 0 }, text: '' } as const;
  return { kind: 'stray', span, word, rest: { kind: 'junk', span, text } };
}
