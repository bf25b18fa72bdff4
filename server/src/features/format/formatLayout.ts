import type { File, Item } from '../../syntax/nodes';
import { columnsOfComments } from './formatComments';
import type { Piece } from './formatPieces';
import { byteOrderMark, piecesOf } from './formatPieces';
import type { TextEdit } from '../textEdit';

/** The changes that lay a file out, but for the items that are to be kept as they are. */
export function layOut(file: File, kept: ReadonlySet<Item>): readonly TextEdit[] {
  const pieces = piecesOf(file, kept);
  for (const [piece, space] of columnsOfComments(pieces)) piece.wanted = space;
  const edits = pieces.flatMap((piece) => [
    ...changeSpace(piece.start - piece.gap.length, piece.gap, piece.wanted),
    ...change(piece.start, file.text.slice(piece.start, piece.end), piece.text),
  ]);
  return [...edits, ...ending(file.text, pieces)];
}

/** One line break ends a file that has any text. */
function ending(text: string, pieces: readonly Piece[]): readonly TextEdit[] {
  const last = pieces.at(-1);
  const from = last?.end ?? byteOrderMark(text);
  const gap = text.slice(from);
  if (last?.kept || gap.includes('\uFEFF')) return [];
  const lineBreak = /\r?\n/.exec(gap)?.[0] ?? /\r?\n/.exec(text)?.[0] ?? '\n';
  return changeSpace(from, gap, last ? lineBreak : '');
}

/** Line by line, so that the lines of a range can be told. */
function changeSpace(start: number, before: string, after: string): readonly TextEdit[] {
  const [first, second] = [before, after].map((text) => /^(?<line>[^\r\n]*)(?<end>\r?\n)/.exec(text)?.groups);
  const { line = '', end = '' } = first ?? {};
  if (end === '' || end !== second?.['end']) return change(start, before, after);
  const next = line.length + end.length;
  return [
    ...change(start, line, second['line'] ?? ''),
    ...changeSpace(start + next, before.slice(next), after.slice((second['line'] ?? '').length + end.length)),
  ];
}

/** What differs between two texts, without what they begin and end with alike. */
function change(start: number, before: string, after: string): readonly TextEdit[] {
  if (before === after) return [];
  let head = 0;
  while (head < before.length && before[head] === after[head]) head += 1;
  let tail = 0;
  const most = Math.min(before.length, after.length) - head;
  while (tail < most && before.at(-1 - tail) === after.at(-1 - tail)) tail += 1;
  // A line break of two characters is never taken apart.
  if (tail > 0 && before.at(-tail) === '\n' && before.at(-tail - 1) === '\r') tail -= 1;
  return [{ start: start + head, end: start + before.length - tail, text: after.slice(head, after.length - tail) }];
}
