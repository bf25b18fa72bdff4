import type { Item } from '../../syntax/nodes';

/** Where a declaration begins with the lines that document it; within a line where it shares that with another one. */
export function declarationStart(text: string, { offset, doc }: Item): number {
  const line = text.lastIndexOf('\n', offset - 1) + 1;
  if (text.slice(line, offset).trim() !== '') return offset;
  return doc === undefined ? line : firstDocLine(text, line);
}

function firstDocLine(text: string, line: number): number {
  if (line === 0) return line;
  const above = text.lastIndexOf('\n', line - 2) + 1;
  return /^\s*##/.test(text.slice(above, line)) ? firstDocLine(text, above) : line;
}
