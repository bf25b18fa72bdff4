import assert from 'node:assert/strict';
import type { Analysis } from '../../server/src/model/analysis';
import type { Fix } from '../../server/src/model/problems/problem';

/** A fix of an analysis, with where the spans of its edits count from. */
export interface LocatedFix {
  readonly fix: Fix;
  readonly offset: number;
}

/** The one fix of a title that the problems of a code offer. */
export function fixNamed(analysis: Analysis, code: string, title: string): LocatedFix {
  const offered = analysis
    .problems()
    .filter(({ problem }) => problem.code === code)
    .flatMap(({ problem, offset }) => problem.fixes.map((fix) => ({ fix, offset })));
  const [found, second] = offered.filter(({ fix }) => fix.title === title);
  const titles = offered.map(({ fix }) => `“${fix.title}”`).join(', ');
  assert.ok(found, `no problem ${code} offers “${title}”; there are ${titles || 'no fixes'}`);
  assert.equal(second, undefined, `several problems ${code} offer “${title}”`);
  return found;
}

/** The text after a fix. Edits that overlap are a fault of the fix. */
export function applyFix(text: string, { fix, offset }: LocatedFix): string {
  const edits = [...fix.edits].sort((a, b) => b.span.start - a.span.start);
  edits.forEach(({ span }, index) => {
    const later = edits[index - 1];
    assert.ok(!later || span.end <= later.span.start, `the edits of “${fix.title}” overlap`);
  });
  return edits.reduce(
    (changed, { span, text: inserted }) =>
      changed.slice(0, offset + span.start) + inserted + changed.slice(offset + span.end),
    text,
  );
}

/** The lines of the new text that are not in the old one; all of it where lines were only taken away. */
export function changedLines(before: string, after: string): string {
  const [old, now] = [before.split('\n'), after.split('\n')];
  const shared = Math.min(old.length, now.length);
  let top = 0;
  while (top < shared && old[top] === now[top]) top += 1;
  let bottom = 0;
  while (bottom < shared - top && old.at(-1 - bottom) === now.at(-1 - bottom)) bottom += 1;
  const changed = now.slice(top, now.length - bottom);
  return changed.length === 0 ? after : changed.join('\n');
}
