import type { Analysis } from '../model/analysis';
import { tokensOf } from './tokens';

/** Text that can be folded away. The line on which it starts stays, the one on which it ends does not. */
export interface FoldingRange {
  readonly start: number;
  readonly end: number;
  readonly kind: 'block' | 'comment' | 'imports' | 'region';
}

/** Blocks and tables, comments of several lines, several `use`, and what stands between `# region` and `# endregion`. */
export function folding(analysis: Analysis): readonly FoldingRange[] {
  const { text } = analysis;
  const comments = lineComments(analysis);
  return [
    ...brackets(analysis),
    ...runs(
      comments.filter(({ text: own }) => !REGION.test(own)),
      text,
      'comment',
    ),
    ...runs(uses(analysis), text, 'imports'),
    ...regions(comments),
  ]
    .filter(({ start, end }) => text.slice(start, end).includes('\n'))
    .sort((a, b) => a.start - b.start || b.end - a.end);
}

interface Stretch {
  readonly start: number;
  readonly end: number;
}

/** The closing bracket of a block stays in sight. */
function brackets({ file, text }: Analysis): readonly FoldingRange[] {
  return file.items.flatMap(({ offset, declaration, text: own }) => {
    if (!own.includes('\n')) return [];
    const open: number[] = [];
    const found: FoldingRange[] = [];
    for (const token of tokensOf(declaration, own)) {
      if (token.kind !== 'mark') continue;
      if ('{[('.includes(token.text)) open.push(offset + token.start);
      if (!'}])'.includes(token.text)) continue;
      const start = open.pop();
      const end = text.lastIndexOf('\n', offset + token.start - 1);
      if (start !== undefined && end > start)
        found.push({ start, end: end - (text[end - 1] === '\r' ? 1 : 0), kind: 'block' });
    }
    return found;
  });
}

function uses({ file }: Analysis): readonly Stretch[] {
  return file.items
    .filter(({ declaration }) => declaration.kind === 'use')
    .map(({ offset, text }) => ({ start: offset, end: offset + text.length }));
}

/** Stretches with nothing but white space and one line break between them are one. */
function runs(stretches: readonly Stretch[], text: string, kind: FoldingRange['kind']): readonly FoldingRange[] {
  const found: FoldingRange[] = [];
  for (const { start, end } of stretches) {
    const last = found.at(-1);
    if (last && /^[ \t]*\r?\n[ \t]*$/.test(text.slice(last.end, start))) found[found.length - 1] = { ...last, end };
    else found.push({ start, end, kind });
  }
  return found;
}

interface LineComment extends Stretch {
  readonly text: string;
}

/** The comments that have a line to themselves. */
function lineComments({ text, file }: Analysis): readonly LineComment[] {
  const found: LineComment[] = [];
  const put = (start: number, own: string) => {
    const line = text.slice(text.lastIndexOf('\n', start - 1) + 1, start);
    if (line.trim() === '') found.push({ start, end: start + own.trimEnd().length, text: own });
  };
  const between = (from: number, to: number) => {
    for (const { index, 0: own } of text.slice(from, to).matchAll(/#[^\r\n]*/g)) put(from + index, own);
  };
  let at = 0;
  for (const { offset, declaration, text: own } of file.items) {
    between(at, offset);
    for (const token of tokensOf(declaration, own)) if (token.kind === 'comment') put(offset + token.start, token.text);
    at = offset + own.length;
  }
  between(at, text.length);
  return found;
}

const REGION = /^#\s*(?<mark>region|endregion)\b/;

function regions(comments: readonly LineComment[]): readonly FoldingRange[] {
  const open: number[] = [];
  return comments.flatMap(({ start, end, text }) => {
    const mark = REGION.exec(text)?.groups?.['mark'];
    if (mark === 'region') open.push(start);
    const from = mark === 'endregion' ? open.pop() : undefined;
    return from === undefined ? [] : [{ start: from, end, kind: 'region' as const }];
  });
}
