import assert from 'node:assert/strict';
import type { Analysis } from '../../server/src/model/analysis';
import { applyFix } from './fixes';

/** What holds of the problems of every text. */
export function checkProblems(analysis: Analysis): void {
  for (const { problem, offset, declared } of analysis.problems()) {
    const { length } = declared.item.text;
    const where = `${problem.code} at ${offset} in ${JSON.stringify(analysis.text)}: ${problem.message}`;
    assert.equal(offset, declared.item.offset, where);
    const { start, end } = problem.span;
    if (!(0 <= start && start <= end && end <= length)) assert.fail(where);
    if (BROKEN.test(problem.message) || problem.message === '') assert.fail(where);
    for (const fix of problem.fixes) {
      if (BROKEN.test(fix.title) || fix.edits.length === 0) assert.fail(`${where}: ${fix.title}`);
      for (const edit of fix.edits) {
        if (!(0 <= edit.span.start && edit.span.start <= edit.span.end && edit.span.end <= length)) assert.fail(where);
        if (BROKEN.test(edit.text)) assert.fail(`${where}: ${edit.text}`);
      }
      assert.notEqual(
        applyFix(analysis.text, { fix, offset }),
        analysis.text,
        `${where}: ${fix.title} changes nothing`,
      );
    }
  }
}

/** What no reader may ever see. */
const BROKEN = /\bNaN\b|\bInfinity\b|\bundefined\b|\[object |\bnull\b/;
