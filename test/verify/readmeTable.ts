import { readFileSync } from 'node:fs';
import { aims } from '../../server/src/verify/aims';
import { book } from '../../server/src/verify/book';
import { compareBook } from '../../server/src/verify/compare';
import type { PropertySummary } from '../../server/src/verify/summary';
import { summarise } from '../../server/src/verify/summary';
import { measured, shareCovered } from '../../server/src/verify/text';

export const README = 'README.md';
const START = '<!-- deviations: npm run verify:readme -->';
const END = '<!-- /deviations -->';

/** The README as it stands, and as it is with the deviations that the program has now. */
export function readmeTexts(): { readonly now: string; readonly due: string } {
  const now = readFileSync(README, 'utf8');
  const start = now.indexOf(START);
  const end = now.indexOf(END);
  if (start < 0 || end < start) throw new Error(`${README} has no place for the deviations`);
  return { now, due: `${now.slice(0, start + START.length)}\n\n${table()}\n\n${now.slice(end)}` };
}

function table(): string {
  return [
    '| result | published values | median deviation | worst | within the stated error | aim |',
    '| --- | --- | --- | --- | --- | --- |',
    ...summarise(compareBook(book)).map(line),
  ].join('\n');
}

function line({ property, measure, all }: PropertySummary): string {
  const { rows, median, worst } = all;
  const cells = [
    `\`${property}\``,
    String(rows),
    measured(median, measure),
    measured(worst, measure),
    shareCovered(all),
    aims.get(property)?.words ?? '–',
  ];
  return `| ${cells.join(' | ')} |`;
}
