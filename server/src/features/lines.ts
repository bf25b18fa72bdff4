export interface Position {
  readonly line: number;
  readonly character: number;
}

/** Where the lines of a text are. Lines and characters count from zero, characters in UTF-16 units. */
export interface LineIndex {
  readonly lineCount: number;
  readonly positionAt: (offset: number) => Position;
  /** The nearest offset there is; a line's end where the character lies beyond it. */
  readonly offsetAt: (position: Position) => number;
}

/** A line ends with `\n`, `\r\n` or `\r`. */
export function lineIndex(text: string): LineIndex {
  const starts = [0];
  for (const { index, 0: mark } of text.matchAll(/\r\n|\n|\r/g)) starts.push(index + mark.length);

  const lineAt = (offset: number): number => {
    let low = 0;
    let high = starts.length - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if ((starts[middle] ?? 0) <= offset) low = middle;
      else high = middle - 1;
    }
    return low;
  };

  return {
    lineCount: starts.length,
    positionAt: (offset) => {
      const within = Math.min(Math.max(0, offset), text.length);
      const line = lineAt(within);
      return { line, character: within - (starts[line] ?? 0) };
    },
    offsetAt: ({ line, character }) => {
      const start = line < 0 ? 0 : starts[line];
      if (start === undefined) return text.length;
      const end = contentEnd(text, start, starts[line + 1] ?? text.length + 1);
      return Math.min(start + Math.max(0, line < 0 ? 0 : character), end);
    },
  };
}

/** Where a line ends without the mark that ends it. */
function contentEnd(text: string, start: number, next: number): number {
  let end = Math.min(next, text.length);
  if (next > text.length) return end;
  if (end > start && text[end - 1] === '\n') end -= 1;
  if (end > start && text[end - 1] === '\r') end -= 1;
  return end;
}
