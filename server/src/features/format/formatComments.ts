import type { Piece } from './formatPieces';

/**
 * The space before each comment at the end of a line: two, or what keeps comments of neighbouring lines in the column
 * that they share.
 */
export function columnsOfComments(pieces: readonly Piece[]): ReadonlyMap<Piece, string> {
  const spaces = new Map<Piece, string>();
  for (const run of runs(trailing(pieces))) {
    const widest = Math.max(...run.map(({ width }) => width)) + 2;
    const [first] = run;
    for (const { piece, width } of run) {
      const column = run.length > 1 && first ? Math.max(first.column, widest) : width + 2;
      spaces.set(piece, ' '.repeat(column - width));
    }
  }
  return spaces;
}

interface Trailing {
  readonly piece: Piece;
  readonly line: number;
  /** Where it stands. */
  readonly column: number;
  /** Where the text before it will end. */
  readonly width: number;
}

function trailing(pieces: readonly Piece[]): readonly Trailing[] {
  const found: Trailing[] = [];
  let line = 0;
  let column = 0;
  let width = 0;
  pieces.forEach((piece, index) => {
    const { gap, wanted, comment, text, kept } = piece;
    line += lineBreaks(gap);
    column = columnAfter(column, gap);
    if (comment && index > 0 && !kept && lineBreaks(gap) === 0) found.push({ piece, line, column, width });
    width = columnAfter(columnAfter(width, wanted), text);
    line += lineBreaks(text);
    // A piece of several lines is kept as it is.
    column = text.includes('\n') ? columnAfter(column, text) : column + piece.end - piece.start;
  });
  return found;
}

/** Comments of lines that follow each other, all in one column. */
function runs(comments: readonly Trailing[]): readonly (readonly Trailing[])[] {
  const found: Trailing[][] = [];
  for (const comment of comments) {
    const run = found.at(-1);
    const last = run?.at(-1);
    if (run && last && last.line + 1 === comment.line && last.column === comment.column) run.push(comment);
    else found.push([comment]);
  }
  return found;
}

function lineBreaks(text: string): number {
  return text.split('\n').length - 1;
}

function columnAfter(column: number, text: string): number {
  const start = text.lastIndexOf('\n');
  return start < 0 ? column + text.length : text.length - start - 1;
}
