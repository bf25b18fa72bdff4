import type { Analysis } from '../model/analysis';
import type { Declared } from '../model/declare';
import type { Severity } from '../model/problems/problem';
import { describeRecord, showing } from '../features/describe/describe';
import { describePercent } from '../features/describe/describePercent';
import { describeShortly } from '../features/describe/describeShortly';
import { lineIndex } from '../features/lines';
import { aligned } from './columns';
import { excerpt } from './excerpt';
import { printable } from './printable';
import type { PlacedProblem } from './problems';
import { problemsOf } from './problems';
import type { RequirementRow } from './requirements';
import { requirementsOf } from './requirements';

/** How words are set off on a terminal; on paper not at all. */
export interface Emphasis {
  strong(text: string): string;
  quiet(text: string): string;
  severity(text: string, severity: Severity): string;
  status(text: string, status: 'holds' | 'fails' | 'undecided'): string;
}

export const plain: Emphasis = {
  strong: (text) => text,
  quiet: (text) => text,
  severity: (text) => text,
  status: (text) => text,
};

export interface TextOptions {
  /** How much of the record is shown: nothing, the main figures, or every result. */
  readonly values: 'none' | 'main' | 'all';
  readonly emphasis: Emphasis;
}

/** One file as a reader sees it in a terminal: its record, its requirements, its problems. */
export function textFile(file: string, analysis: Analysis, options: TextOptions): string {
  const { emphasis } = options;
  const sections = [
    recordSection(analysis, options),
    requirementSection(analysis, emphasis),
    problemSection(file, analysis, emphasis),
  ];
  const shown = sections.filter((section) => section !== '');
  return shown.length === 0 ? '' : `${[emphasis.strong(printable(file)), ...shown].join('\n\n')}\n`;
}

/** The closing line over all files. */
export function textSummary(analyses: readonly Analysis[]): string {
  const severities = analyses.flatMap((analysis) => analysis.problems().map(({ problem }) => problem.severity));
  const verdicts = analyses.flatMap((analysis) => requirementsOf(analysis).map(verdictOf));
  const met = VERDICTS.flatMap((verdict) => {
    const count = of(verdicts, verdict);
    const word = count === 1 ? verdict : (MANY[verdict] ?? verdict);
    return count === 0 ? [] : [`${count} ${word}`];
  });
  const requirements =
    verdicts.length === 0 ? 'no requirements' : `${counted(verdicts.length, 'requirement')}: ${met.join(', ')}`;
  const problems = `${counted(of(severities, 'error'), 'error')}, ${counted(of(severities, 'warning'), 'warning')}`;
  return `${counted(analyses.length, 'file')}; ${requirements}; ${problems}`;
}

type Verdict = 'holds' | 'fails' | 'not met' | 'undecided';
const VERDICTS: readonly Verdict[] = ['holds', 'fails', 'not met', 'undecided'];
const MANY: Readonly<Partial<Record<Verdict, string>>> = { holds: 'hold', fails: 'fail' };

/** A preference does not fail; it is not met. */
function verdictOf({ status, strength }: RequirementRow): Verdict {
  return status === 'fails' && strength === 'prefer' ? 'not met' : status;
}

function of<T>(all: readonly T[], one: T): number {
  return all.filter((each) => each === one).length;
}

function counted(count: number, noun: string): string {
  return `${count === 0 ? 'no' : count} ${noun}${count === 1 ? '' : 's'}`;
}

function recordSection(analysis: Analysis, { values, emphasis }: TextOptions): string {
  if (values === 'none') return '';
  const rows = analysis.declared.flatMap((declared) => recordRows(analysis, declared, values));
  return aligned(rows, {
    indent: 2,
    style: (cell, column) => (column === 0 ? cell : column === 2 ? emphasis.quiet(cell) : cell),
  });
}

function recordRows(analysis: Analysis, declared: Declared, values: 'main' | 'all'): string[][] {
  const { name, item } = declared;
  const outcome = analysis.outcome(declared);
  if (!name) return [];
  const word = item.declaration.word.text;
  if (outcome.kind !== 'value')
    return [[name.text, outcome.kind === 'failed' ? 'has a problem' : 'waits for a value', word]];
  const main = describeShortly(outcome.value, showing(analysis, declared));
  const description = values === 'all' ? describeRecord(analysis, declared) : undefined;
  const all = [
    ...(description?.rows ?? []).map((row) => [`  ${row.name}`, row.text, row.method]),
    ...(description?.species ?? []).flatMap(({ formula, rows }) =>
      rows.map((row) => [`  ${formula}.${row.name}`, row.text, row.method]),
    ),
  ];
  return [[name.text, main, word], ...all];
}

function requirementSection(analysis: Analysis, emphasis: Emphasis): string {
  const lines = lineIndex(analysis.text);
  const rows = requirementsOf(analysis).flatMap((row) => {
    const { margin, text, because, offset, strength, evaluated } = row;
    const measured = margin === undefined ? '' : `margin ${describePercent(margin)}`;
    const line = `line ${lines.positionAt(offset).line + 1}`;
    const below = [...(because === undefined ? [] : [because]), ...(evaluated ? [] : [UNJUDGED])];
    return [
      { verdict: verdictOf(row), cells: [verdictOf(row), measured, line, `${strength} ${text}`] },
      ...below.map((remark) => ({ verdict: undefined, cells: ['', '', '', remark] })),
    ];
  });
  return aligned(
    rows.map(({ cells }) => cells),
    {
      indent: 2,
      style: (cell, column, row) => {
        const verdict = rows[row]?.verdict;
        if (verdict === undefined) return emphasis.quiet(cell);
        return column === 0 ? emphasis.status(cell, verdict === 'not met' ? 'undecided' : verdict) : cell;
      },
    },
  );
}

const UNJUDGED = 'cannot be judged: something in it has no value';

function problemSection(file: string, analysis: Analysis, emphasis: Emphasis): string {
  const lines = lineIndex(analysis.text);
  // What is merely unused is faded in the editor; in a terminal it would be noise.
  const told = problemsOf(analysis).filter(({ problem }) => problem.severity !== 'hint');
  return told
    .map((placed) => {
      const { line } = placed.start;
      const from = lines.offsetAt({ line, character: 0 });
      const to = lines.offsetAt({ line, character: Number.MAX_SAFE_INTEGER });
      return problemText(file, analysis.text.slice(from, to), placed, emphasis);
    })
    .join('\n');
}

/** `lock.gas:9:14: error: … [unit-mismatch]`, the line, the place in it, and what could be done. */
function problemText(file: string, whole: string, { problem, start, end }: PlacedProblem, emphasis: Emphasis): string {
  const { severity, message, code, fixes } = problem;
  const place = `${printable(file)}:${start.line + 1}:${start.character + 1}`;
  const { line, indent, width } = excerpt(
    whole,
    start.character,
    end.line === start.line ? end.character : whole.length,
  );
  const told = [
    `${place}: ${emphasis.severity(severity, severity)}: ${printable(message)} ${emphasis.quiet(`[${code}]`)}`,
    `    ${line}`,
    `    ${' '.repeat(indent)}${emphasis.severity('^'.repeat(width), severity)}`,
  ];
  const titles = fixes.map(({ title }) => printable(title));
  if (titles.length > 0) told.push(`    ${emphasis.quiet(`fixes: ${titles.join(' · ')}`)}`);
  return told.map((each) => each.trimEnd()).join('\n');
}
