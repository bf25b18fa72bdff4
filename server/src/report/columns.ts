interface AlignOptions {
  readonly indent: number;
  /** Sets a padded cell off, without changing its width. */
  readonly style: (cell: string, column: number, row: number) => string;
}

/** Rows of cells in columns, each as wide as its widest cell. */
export function aligned(rows: readonly (readonly string[])[], { indent, style }: AlignOptions): string {
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

/** How many columns a text takes: combining marks, as in c̄, take none. */
export function columnsOf(text: string): number {
  return Array.from(text.replace(/\p{Mn}/gu, '')).length;
}
