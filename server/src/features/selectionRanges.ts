import type { Analysis } from '../model/analysis';
import type { Span } from '../syntax/nodes';
import { touchedAt } from './meaning';

/** The stretches of text around an offset, the smallest first, the whole file last. */
export function selectionRanges(analysis: Analysis, offset: number): readonly Span[] {
  const whole = { start: 0, end: analysis.text.length };
  const touched = touchedAt(analysis, offset);
  const around = (touched?.path ?? []).map(({ span }) => ({
    start: (touched?.offset ?? 0) + span.start,
    end: (touched?.offset ?? 0) + span.end,
  }));
  const ranges: Span[] = [];
  for (const range of [whole, ...around]) {
    const before = ranges.at(-1);
    if (before && (range.start < before.start || range.end > before.end || range.start > offset || range.end < offset))
      continue;
    if (range.start !== before?.start || range.end !== before.end) ranges.push(range);
  }
  return ranges.reverse();
}
