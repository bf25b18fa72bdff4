import type { Analysis } from '../../model/analysis';
import type { Leans } from '../../model/tolerance';
import type { Row } from '../describe/describe';
import { describeBudget } from '../describe/describeBudget';
import { code, list, numbered, paragraphs, plainText, table } from './hoverMarkdown';

/** The results of a declaration: name, value, and the value in another unit. */
export function figureTable(rows: readonly Row[]): string {
  return table(
    ['result', 'value', 'in other units'],
    rows.map(({ name, symbol, text, alternative }) => [
      `${code(name)}${symbol === undefined ? '' : ` ${plainText(symbol)}`}`,
      plainText(text),
      plainText(alternative ?? ''),
    ]),
  );
}

/** How results came about: what is the same for several is said once, and sources are numbered. */
export function methodNotes(rows: readonly Row[]): string {
  const sources = [...new Set(rows.flatMap((row) => row.sources))];
  const groups = new Map<string, string[]>();
  for (const row of rows) {
    const refs = row.sources.map((source) => sources.indexOf(source) + 1).join(', ');
    const how = [...pedigree(row), ...(refs === '' ? [] : [`source ${refs}`])].map(plainText).join('; ');
    groups.set(how, [...(groups.get(how) ?? []), row.name]);
  }
  return paragraphs([
    '**Methods**',
    list([...groups].map(([how, names]) => `${names.map(code).join(', ')}: ${how}`)),
    sources.length > 0 ? '**Sources**' : undefined,
    numbered(sources.map(plainText)),
  ]);
}

/** How one result came about. */
export function methodNote(row: Row): string {
  return paragraphs([pedigree(row).map(plainText).join('; '), list(row.sources.map(plainText))]);
}

/** Which causes bring the tolerance, the three largest. */
export function budgetNote(analysis: Analysis, leans: Leans, of?: string): string | undefined {
  const rows = describeBudget(analysis, leans);
  if (rows.length === 0) return undefined;
  const title = of === undefined ? '**Tolerance from**' : `**Tolerance of** ${code(of)} **from**`;
  return `${title}\n\n${list(rows.map(({ cause, text }) => plainText(`${cause}: ${text}`)))}`;
}

function pedigree({ method, range, assumptions }: Row): string[] {
  return [
    method,
    ...(range === undefined ? [] : [`valid from ${range}`]),
    ...(assumptions.length > 0 ? [`assumed: ${assumptions.join(', ')}`] : []),
  ];
}
