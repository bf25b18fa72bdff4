import { formatNumber } from '../quantities/format';
import { aligned } from '../report/columns';
import type { Emphasis } from '../report/text';
import type { Comparison } from './compare';
import type { Circumstances } from './circumstances';
import type { Deviations, Measure, PropertySummary } from './summary';
import { deviation, gasOf, summarise } from './summary';

export interface VerifyTextOptions {
  /** Which rows are listed one by one: those that are off, or every one. */
  readonly rows: 'beyond' | 'all';
  readonly emphasis: Emphasis;
}

/** The comparison as a reader sees it in a terminal. */
export function verifyText(
  circumstances: Circumstances,
  comparisons: readonly Comparison[],
  { rows, emphasis }: VerifyTextOptions,
): string {
  const summaries = summarise(comparisons);
  const listed = rows === 'all' ? comparisons : comparisons.filter(({ verdict }) => verdict === 'beyond');
  const sections = [
    circumstancesText(circumstances),
    summaryTable(summaries, emphasis),
    NOTES,
    ...(listed.length === 0 ? [] : [rowTable(listed, summaries, emphasis)]),
    conclusion(comparisons),
  ];
  return `${sections.join('\n\n')}\n`;
}

/** A deviation or an error: `0.35 %`, `2.1 cm³/mol`. */
export function measured(value: number, measure: Measure): string {
  if (!Number.isFinite(value)) return '–';
  if (measure.kind === 'absolute') return `${formatNumber(value, 2)} ${measure.unit}`;
  if (value !== 0 && Math.abs(value) < LEAST_SHARE) return '< 0.01 %';
  return `${formatNumber(100 * value, 2)} %`;
}

/** Of the rows with a stated error: `97 %`. */
export function shareCovered({ covered: { count, of } }: Deviations): string {
  return of === 0 ? '–' : `${formatNumber((100 * count) / of, 3)} %`;
}

const LEAST_SHARE = 1e-4;

const NOTES = [
  'stated: the largest error, 95 %, that the program states for one of these figures',
  'covered: the share of rows that the stated error and the last printed digit cover, where there is a stated error',
  'within: the rows within the tolerance that the book names for them',
].join('\n');

function circumstancesText({ versions, constants }: Circumstances): string {
  const rows = constants.map(({ symbol, value, unit, title, source }) => [
    `${symbol} = ${String(value).replace('e+', 'e')} ${unit}`,
    title,
    source,
  ]);
  return `${versions.join(', ')}\n\n${aligned(rows, { indent: 0, style: (cell) => cell })}`;
}

function summaryTable(summaries: readonly PropertySummary[], emphasis: Emphasis): string {
  const rows = [['property', 'gas', 'rows', 'median', 'worst', 'stated', 'covered', 'within']];
  const strong = new Set([0]);
  for (const { property, measure, all, gases } of summaries) {
    strong.add(rows.length);
    rows.push([property, 'all', ...cells(all, measure)]);
    rows.push(...gases.map(({ gas, deviations }) => ['', gas, ...cells(deviations, measure)]));
  }
  return aligned(rows, { indent: 0, style: (cell, _, row) => (strong.has(row) ? emphasis.strong(cell) : cell) });
}

function cells(deviations: Deviations, measure: Measure): string[] {
  const { rows, median, worst, stated, within } = deviations;
  return [
    String(rows),
    measured(median, measure),
    measured(worst, measure),
    stated === 0 ? '–' : measured(stated, measure),
    shareCovered(deviations),
    `${within}/${rows}`,
  ];
}

function rowTable(listed: readonly Comparison[], summaries: readonly PropertySummary[], emphasis: Emphasis): string {
  const measures = new Map(summaries.map(({ property, measure }) => [property, measure]));
  const rows = listed.map((comparison) => {
    const { row, verdict, ours } = comparison;
    const measure = measures.get(row.property) ?? { kind: 'relative' };
    return [
      verdict,
      row.property,
      gasOf(row.gas),
      `${row.printed} ${row.unit}`,
      formatNumber(ours, 6),
      measured(deviation(comparison, measure), measure),
      `${row.source}, ${row.where}`,
    ];
  });
  return aligned([['', 'property', 'gas', 'printed', 'ours', 'deviation', 'source'], ...rows], {
    indent: 0,
    style: (cell, column, row) => {
      if (row === 0) return emphasis.strong(cell);
      if (column === 0) return emphasis.status(cell, cell === 'within' ? 'holds' : 'fails');
      return column === 6 ? emphasis.quiet(cell) : cell;
    },
  });
}

function conclusion(comparisons: readonly Comparison[]): string {
  const beyond = comparisons.filter(({ verdict }) => verdict === 'beyond').length;
  const count = `${comparisons.length} published values`;
  return beyond === 0 ? `${count}, all within their tolerance` : `${count}, ${beyond} beyond their tolerance`;
}
