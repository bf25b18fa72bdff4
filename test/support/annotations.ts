import type { LocatedProblem } from '../../server/src/model/analysis';
import type { Severity } from '../../server/src/model/problems/problem';

/** A problem as a comment line with carets states it. */
export interface Annotation {
  readonly line: number;
  readonly column: number;
  readonly width: number;
  readonly severity: Severity;
  readonly code: string;
  /** The message, where the test states it. */
  readonly text?: string;
}

/** A document without its caret lines and the mark `<*>`, and what those say. */
export interface Annotated {
  readonly text: string;
  readonly annotations: readonly Annotation[];
  /** Where the mark stood. */
  readonly cursor?: number;
}

const MARK = '<*>';
const CARETS = /^( *)#( *)(\^+) +(error|warning|information|hint) +([a-z-]+)(?:: (.+))?$/;

/**
 * Takes the caret lines out of a document: `# ^^^ error unit-mismatch: the message` speaks of the nearest line above that
 * is no caret line. Carets that touch the `#` count from the column of the `#`, so that a line's first column can be meant.
 */
export function readAnnotations(lines: readonly string[]): Annotated {
  const kept: string[] = [];
  const annotations: Annotation[] = [];
  for (const line of lines) {
    const match = CARETS.exec(line);
    if (!match) {
      if (/^ *# *\^/.test(line)) throw new Error(`not a caret line: ${line}`);
      kept.push(line);
      continue;
    }
    const [, indent = '', gap = '', carets = '', severity, code = '', text] = match;
    if (kept.length === 0) throw new Error(`a caret line has no line above: ${line}`);
    const column = indent.length + (gap === '' ? 0 : 1 + gap.length);
    const marked = kept.at(-1)?.indexOf(MARK) ?? -1;
    const unmarked = (at: number) => (marked < 0 || at <= marked ? at : at - MARK.length);
    annotations.push({
      line: kept.length - 1,
      column: unmarked(column),
      width: unmarked(column + carets.length) - unmarked(column),
      severity: severity as Severity,
      code,
      ...(text === undefined ? {} : { text }),
    });
  }
  const text = kept.join('\n');
  const cursor = text.indexOf(MARK);
  return cursor < 0 ? { text, annotations } : { text: text.replace(MARK, ''), annotations, cursor };
}

/** A problem as a caret line would state it: of several lines only the first, and an empty place as one column. */
export function annotationOf({ problem, offset }: LocatedProblem, text: string): Annotation {
  const start = offset + problem.span.start;
  const lineStart = text.lastIndexOf('\n', start - 1) + 1;
  const found = text.indexOf('\n', start);
  const end = Math.min(offset + problem.span.end, found < 0 ? text.length : found);
  return {
    line: text.slice(0, start).split('\n').length - 1,
    column: start - lineStart,
    width: Math.max(1, end - start),
    severity: problem.severity,
    code: problem.code,
    text: problem.message,
  };
}

/** Leaves the messages out of those problems that the test states without. */
export function asStated(found: readonly Annotation[], stated: readonly Annotation[]): readonly Annotation[] {
  return found.map((annotation) => {
    const { text: _text, ...place } = annotation;
    const bare = stated.some((other) => other.text === undefined && sortKey(other) === sortKey(place));
    return bare ? place : annotation;
  });
}

/** The document with a caret line for each annotation: what a failing test shows. */
export function annotate(text: string, annotations: readonly Annotation[]): string {
  const sorted = [...annotations].sort((a, b) => sortKey(a).localeCompare(sortKey(b)));
  return text
    .split('\n')
    .flatMap((line, index) => [line, ...sorted.filter((each) => each.line === index).map(caretLine)])
    .join('\n');
}

function caretLine({ column, width, severity, code, text }: Annotation): string {
  const lead = column < 2 ? `${' '.repeat(column)}#` : `#${' '.repeat(column - 1)}`;
  const carets = lead + '^'.repeat(width);
  return `${carets} ${severity} ${code}${text === undefined ? '' : `: ${text}`}`;
}

function sortKey({ line, column, width, severity, code }: Annotation): string {
  return [line, column, width].map((n) => String(n).padStart(6, '0')).join(' ') + severity + code;
}
