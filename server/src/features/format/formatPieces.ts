import type { File, Item } from '../../syntax/nodes';
import { indentsOf } from './formatIndent';
import { alignedEquals, spaceBetween, tokenText } from './formatSpacing';
import type { Token } from '../tokens';
import { tokensOf } from '../tokens';

/** A piece of the file that is not white space, with the white space before it. Places count from the file's start. */
export interface Piece {
  readonly start: number;
  readonly end: number;
  /** As it is to be written. */
  readonly text: string;
  readonly comment: boolean;
  /** The white space before it, as it is and as it is to be. */
  readonly gap: string;
  wanted: string;
  /** Neither the piece nor the space around it may change. */
  readonly kept: boolean;
}

/** The pieces of a file in order; of an item that is to be kept, all at once. */
export function piecesOf({ text, items }: File, kept: ReadonlySet<Item>): readonly Piece[] {
  const pieces: Piece[] = [];
  let before: Token | undefined;
  // What follows a declaration with an error may belong to it, as long as the error is there.
  let keeping = false;
  const put = (token: Token, start: number, place: { indent: string; equals?: string | undefined; kept: boolean }) => {
    const gap = text.slice(pieces.at(-1)?.end ?? byteOrderMark(text), start);
    const still = keeping || place.kept || gap.includes('\uFEFF');
    const wanted = still
      ? gap
      : (newGap(gap, { indent: place.indent, first: pieces.length === 0 }) ??
        (before ? (place.equals ?? spaceBetween(before, token)) : ''));
    const comment = token.kind === 'comment';
    const end = start + token.text.length;
    pieces.push({ start, end, text: place.kept ? token.text : tokenText(token), comment, gap, wanted, kept: still });
    before = token;
  };
  const comments = (from: number, to: number, parent: Token['parent']) => {
    for (const { index, 0: found } of text.slice(from, to).matchAll(/#[^\r\n]*/g)) {
      const start = from + index;
      put({ kind: 'comment', text: found, start, end: start + found.length, parent }, start, {
        indent: '',
        kept: keeping,
      });
    }
  };

  let end = 0;
  for (const item of items) {
    const { offset, declaration } = item;
    comments(end, offset, declaration);
    if (kept.has(item)) {
      put({ kind: 'word', text: item.text, start: 0, end: item.text.length, parent: declaration }, offset, {
        indent: '',
        kept: true,
      });
      keeping = true;
    } else {
      const tokens = tokensOf(declaration, item.text);
      const equals = alignedEquals(declaration, item.text, tokens);
      const indents = indentsOf(declaration, item.text, tokens);
      tokens.forEach((token, index) => {
        const indent = indents[index] ?? '';
        put(token, offset + token.start, { indent, equals: equals.get(token.start), kept: false });
        keeping = false;
      });
    }
    end = offset + item.text.length;
  }
  const last = items.at(-1)?.declaration ?? { kind: 'stray', span: { start: 0, end: 0 }, word: NO_WORD };
  comments(end, text.length, last);
  return pieces;
}

const NO_WORD = { kind: 'name', span: { start: 0, end: 0 }, text: '' } as const;

/** Where the text starts behind the mark that some editors put before it. */
export function byteOrderMark(text: string): number {
  return text.startsWith('\uFEFF') ? 1 : 0;
}

/** Line breaks stay, of blank lines one; nothing where the gap has no line break. */
function newGap(gap: string, { indent, first }: { indent: string; first: boolean }): string | undefined {
  if (first) return '';
  const breaks = gap.match(/\r?\n/g);
  return breaks ? breaks.slice(0, 2).join('') + indent : undefined;
}
