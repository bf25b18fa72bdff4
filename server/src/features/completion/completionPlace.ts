import type { Analysis } from '../../model/analysis';
import type { Declared } from '../../model/declare';
import type { DeclarationScope } from '../../model/scope';
import { children } from '../../syntax/children';
import type { Declaration, Item, Junk, Node, Span } from '../../syntax/nodes';
import { parse } from '../../syntax/parse';

/**
 * Where something is about to be written. The declaration is parsed once more with a mark at the cursor, so that whatever
 * is typed so far, the tree says what the mark would be: a key, a value, a unit, a property.
 */
export interface CompletionPlace {
  readonly analysis: Analysis;
  /** The nodes around the mark, outermost first; the last one holds it. */
  readonly path: readonly Node[];
  readonly declaration: Declaration;
  /** The declaration as it stands without the mark, or the one above; nothing at the top of a file. */
  readonly declared?: Declared;
  readonly scope?: DeclarationScope;
  /** The word being typed, in the file. */
  readonly replace: Span;
  /** The word up to the cursor. */
  readonly typed: string;
  /** What follows the word on its line. */
  readonly following: string;
}

/** A word that may be a name as well as a unit, so that it fits wherever either is written. */
const MARK = 'zzz';

export function completionPlace(analysis: Analysis, offset: number): CompletionPlace | undefined {
  const { text, file } = analysis;
  if (offset < 0 || offset > text.length || isInert(text, offset)) return undefined;
  const above = file.items.filter((item) => item.offset <= offset).at(-1);
  const start = above?.offset ?? lineStart(text, offset);
  const end = Math.max(above ? above.offset + above.text.length : 0, lineEnd(text, offset));
  const marked = parse(text.slice(start, offset) + MARK + text.slice(offset, end));
  const at = offset - start;
  const item = marked.items.find((each) => each.offset <= at && at + MARK.length <= each.offset + each.text.length);
  if (!item) return undefined;
  const path = pathToMark(item, at - item.offset);
  const declared = analysis.declared.find((each) => each.item === above);
  const leaf = path.at(-1);
  const replace = leaf?.kind === 'unit' ? spanOf(leaf, start + item.offset) : wordAt(text, offset);
  return {
    analysis,
    path,
    declaration: item.declaration,
    ...(declared ? { declared, scope: analysis.scope(declared) } : {}),
    replace,
    typed: text.slice(replace.start, offset),
    following: text.slice(replace.end, lineEnd(text, replace.end)).trim(),
  };
}

/** Whether the word being typed stands first in a text that fits nowhere. */
export function isFirstWord({ text }: Junk, { typed }: CompletionPlace): boolean {
  return text.trimStart().startsWith(typed + MARK);
}

/** Inside comments and texts, and within the digits of a number, there is nothing to choose from. */
function isInert(text: string, offset: number): boolean {
  let quoted = false;
  for (const each of text.slice(lineStart(text, offset), offset)) {
    if (each === '"') quoted = !quoted;
    else if (each === '#' && !quoted) return true;
  }
  return quoted || (/\d$/.test(text.slice(0, offset)) && /^[\d.]/.test(text.slice(offset)));
}

function pathToMark({ declaration }: Item, at: number): readonly Node[] {
  const path: Node[] = [];
  const holds = ({ span }: Node) => span.start <= at && at + MARK.length <= span.end;
  for (let node: Node | undefined = declaration; node; node = children(node).find(holds)) path.push(node);
  return path;
}

function spanOf({ span }: Node, offset: number): Span {
  return { start: offset + span.start, end: offset + span.end - MARK.length };
}

/** The name around an offset; without one, nothing at the offset. */
function wordAt(text: string, offset: number): Span {
  const before = /[\p{L}_][\p{L}\p{N}_]*$/u.exec(text.slice(lineStart(text, offset), offset))?.[0] ?? '';
  const after = /^[\p{L}\p{N}_]*/u.exec(text.slice(offset, lineEnd(text, offset)))?.[0] ?? '';
  return { start: offset - before.length, end: offset + after.length };
}

function lineStart(text: string, offset: number): number {
  return text.lastIndexOf('\n', offset - 1) + 1;
}

function lineEnd(text: string, offset: number): number {
  const end = text.indexOf('\n', offset);
  return end < 0 ? text.length : end;
}
