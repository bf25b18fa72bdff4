import { printable } from './printable';

interface AlignOptions {
  readonly indent: number;
  /** Sets a padded cell off, without changing its width. */
  readonly style: (cell: string, column: number, row: number) => string;
}

/** Rows of cells in columns, each as wide as its widest cell. */
export function aligned(given: readonly (readonly string[])[], { indent, style }: AlignOptions): string {
  const rows = given.map((row) => row.map((cell) => printable(cell).trimEnd()));
  const widths: number[] = [];
  for (const row of rows)
    row.forEach((cell, column) => (widths[column] = Math.max(widths[column] ?? 0, columnsOf(cell))));
  return rows
    .map((row, index) => {
      const filled = row.filter((_, column) => row.slice(column).some((rest) => rest !== ''));
      const last = filled.length - 1;
      const cells = filled.map((cell, column) => {
        const padding = column === last ? '' : ' '.repeat((widths[column] ?? 0) - columnsOf(cell));
        return style(cell, column, index) + padding;
      });
      return ' '.repeat(indent) + cells.join('  ');
    })
    .join('\n');
}

/** How many columns a text takes in a terminal: combining marks, as in c̄, take none; Chinese, Japanese and Korean signs two. */
export function columnsOf(text: string): number {
  const letters = text.replace(WITHOUT_WIDTH, '');
  return Array.from(letters).length + (letters.match(WIDE)?.length ?? 0);
}

const WITHOUT_WIDTH = /[\p{Mn}\p{Me}\p{Cf}]/gu;
const WIDE =
  /[\p{Script=Han}\p{Script=Hiragana}\p{Script=Katakana}\p{Script=Hangul}\u3000-\u303E\uFF01-\uFF60\p{Emoji_Presentation}]/gu;
