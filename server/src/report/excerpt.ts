import { columnsOf } from './columns';
import { printable } from './printable';

/** A line, or a stretch of a long one, with a mark below it, as a terminal can show it. */
export interface Excerpt {
  readonly line: string;
  /** The columns in front of the mark. */
  readonly indent: number;
  /** The columns of the mark, at least one. */
  readonly width: number;
}

/** In UTF-16 units, which are columns in all but rare texts. */
const LONGEST = 120;
const IN_FRONT = 40;

/** Marks a line from `start` to `end`. Of a line that no terminal holds, only what is around the start of the mark is shown. */
export function excerpt(whole: string, start: number, end: number): Excerpt {
  const from = whole.length > LONGEST ? Math.max(0, start - IN_FRONT) : 0;
  const to = whole.length > LONGEST ? Math.min(whole.length, from + LONGEST) : whole.length;
  const cut = { before: from > 0 ? '…' : '', after: to < whole.length ? '…' : '' };
  const shown = (a: number, b: number) => printable(whole.slice(a, b));
  return {
    line: cut.before + shown(from, to) + cut.after,
    indent: columnsOf(cut.before + shown(from, start)),
    width: Math.max(1, columnsOf(shown(start, Math.min(end, to)))),
  };
}
