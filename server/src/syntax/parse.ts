import { parse as parseDeclaration } from './generated/parser';
import type { Declaration, File, Item } from './nodes';
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

/** The grammar takes every text; what it cannot take is nesting deeper than the stack. */
function parseOne(text: string): Declaration {
  try {
    return parseDeclaration(text);
  } catch (error) {
    if (error instanceof RangeError) return tooDeep(text);
    throw error;
  }
}

function tooDeep(text: string): Declaration {
  const span = { start: 0, end: text.length };
  const word = { kind: 'name', span: { start: 0, end: 0 }, text: '' } as const;
  return { kind: 'stray', span, word, rest: { kind: 'junk', span, text } };
}
