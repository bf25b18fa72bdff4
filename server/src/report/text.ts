import type { Analysis, LocatedProblem } from '../model/analysis';
import type { Declared } from '../model/declare';
import type { Severity } from '../model/problems/problem';
import { describeRecord, showing } from '../features/describe/describe';
import { describePercent } from '../features/describe/describePercent';
import { describeShortly } from '../features/describe/describeShortly';
import type { LineIndex } from '../features/lines';
import { lineIndex } from '../features/lines';
import { aligned, columnsOf } from './columns';
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
  return shown.length === 0 ? '' : `${[emphasis.strong(file), ...shown].join('\n\n')}\n`;
}

/** The closing line over all files. */
export function textSummary(analyses: readonly Analysis[]): string {
  const problems = analyses.flatMap((analysis) => analysis.problems().map(({ problem }) => problem.severity));
  const statuses = analyses.flatMap((analysis) => requirementsOf(analysis).map(({ status }) => status));
  const of = <T>(all: readonly T[], one: T) => all.filter((each) => each === one).length;
  const requirements =
    statuses.length === 0
      ? 'no requirements'
      : `${counted(statuses.length, 'requirement')}: ${of(statuses, 'holds')} hold, ${of(statuses, 'fails')} fail, ${of(statuses, 'undecided')} undecided`;
  return `${counted(analyses.length, 'file')}; ${requirements}; ${counted(of(problems, 'error'), 'error')}, ${counted(of(problems, 'warning'), 'warning')}`;
}

function counted(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`;
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
  const rows = requirementsOf(analysis).flatMap(({ status, margin, text, because, offset, strength }) => [
    {
      status,
      cells: [
        status,
        margin === undefined ? '' : `margin ${describePercent(margin)}`,
        `line ${lines.positionAt(offset).line + 1}`,
        `${strength} ${text}`,
      ],
    },
    ...(because === undefined ? [] : [{ status: undefined, cells: ['', '', '', because] }]),
  ]);
  return aligned(
    rows.map(({ cells }) => cells),
    {
      indent: 2,
      style: (cell, column, row) => {
        const status = rows[row]?.status;
        if (status === undefined) return emphasis.quiet(cell);
        return column === 0 ? emphasis.status(cell, status) : cell;
      },
    },
  );
}

function problemSection(file: string, analysis: Analysis, emphasis: Emphasis): string {
  const lines = lineIndex(analysis.text);
  // What is merely unused is faded in the editor; in a terminal it would be noise.
  const told = analysis.problems().filter(({ problem }) => problem.severity !== 'hint');
  return told.map((problem) => problemText(file, analysis.text, problem, lines, emphasis)).join('\n');
}

/** `lock.gas:9:14: error: … [unit-mismatch]`, the line, the place in it, and what could be done. */
function problemText(
  file: string,
  text: string,
  { problem, offset }: LocatedProblem,
  lines: LineIndex,
  emphasis: Emphasis,
): string {
  const start = lines.positionAt(offset + problem.span.start);
  const end = lines.positionAt(offset + problem.span.end);
  const from = lines.offsetAt({ line: start.line, character: 0 });
  const line = text.slice(from).split(/\r\n|\n|\r/, 1)[0] ?? '';
  const before = columnsOf(line.slice(0, start.character));
  const width =
    end.line === start.line
      ? columnsOf(line.slice(start.character, end.character))
      : columnsOf(line.slice(start.character));
  const place = `${file}:${start.line + 1}:${start.character + 1}`;
  const told = [
    `${place}: ${emphasis.severity(problem.severity, problem.severity)}: ${problem.message} ${emphasis.quiet(`[${problem.code}]`)}`,
    `    ${line.replaceAll('\t', ' ')}`,
    `    ${' '.repeat(before)}${emphasis.severity('^'.repeat(Math.max(1, width)), problem.severity)}`,
  ];
  if (problem.fixes.length > 0)
    told.push(`    ${emphasis.quiet(`fixes: ${problem.fixes.map(({ title }) => title).join(' · ')}`)}`);
  return told.join('\n');
}
