import assert from 'node:assert/strict';
import { folding } from '../../server/src/features/folding';
import { format } from '../../server/src/features/format/format';
import { links } from '../../server/src/features/links';
import { definition, highlights, references } from '../../server/src/features/navigation';
import type { OutlineItem } from '../../server/src/features/outline';
import { outline } from '../../server/src/features/outline';
import { prepareRename, rename } from '../../server/src/features/rename';
import { selectionRanges } from '../../server/src/features/selectionRanges';
import { semanticTokens } from '../../server/src/features/semanticTokens';
import { workspaceSymbols } from '../../server/src/features/workspaceSymbols';
import type { Analysis } from '../../server/src/model/analysis';
import { analyse } from '../support/analyse';
import { everyForm } from './samples';

/** What the editor gets must lie within the text. */
function within(analysis: Analysis, { start, end }: { readonly start: number; readonly end: number }): void {
  assert.ok(0 <= start && start <= end && end <= analysis.text.length, `${start} to ${end}`);
}

function checkFile(analysis: Analysis): void {
  for (const range of [...folding(analysis), ...links(analysis), ...format(analysis.text)]) within(analysis, range);
  for (const token of semanticTokens(analysis))
    within(analysis, { start: token.start, end: token.start + token.length });
  for (const symbol of workspaceSymbols([analysis], '')) within(analysis, symbol);
  for (const item of outline(analysis)) checkOutline(analysis, item);
}

function checkOutline(analysis: Analysis, item: OutlineItem): void {
  within(analysis, item);
  assert.ok(item.name !== '' && item.start <= item.selectionStart && item.selectionEnd <= item.end, item.name);
  for (const child of item.children) {
    assert.ok(item.start <= child.start && child.end <= item.end, child.name);
    checkOutline(analysis, child);
  }
}

function checkOffset(analysis: Analysis, offset: number): void {
  const sight = { analyses: [analysis] };
  const { uri } = analysis;
  definition(analysis, offset);
  for (const range of [...highlights(analysis, offset), ...references(sight, uri, offset)]) within(analysis, range);
  const ranges = selectionRanges(analysis, offset);
  ranges.forEach((range, index) => {
    assert.ok(range.start <= offset && offset <= range.end, `${offset}`);
    const outer = ranges[index + 1];
    assert.ok(!outer || (outer.start <= range.start && range.end <= outer.end), `${offset}`);
  });
  const found = prepareRename(sight, uri, offset);
  const renamed = rename(sight, uri, offset, 'quite_new');
  assert.equal(renamed.kind === 'refused', found.kind === 'refused');
}

describe('every offset', () => {
  it('has an answer in a whole text', () => {
    const analysis = analyse(everyForm);
    checkFile(analysis);
    for (let offset = 0; offset <= everyForm.length; offset += 1) checkOffset(analysis, offset);
  });

  it('has an answer at the end of every beginning of a text', () => {
    for (let end = 0; end <= everyForm.length; end += 3) {
      const analysis = analyse(everyForm.slice(0, end));
      checkFile(analysis);
      checkOffset(analysis, end);
      checkOffset(analysis, Math.floor(end / 2));
    }
  });

  it('has an answer in texts that lack a character', () => {
    for (let at = 0; at < everyForm.length; at += 7) {
      const analysis = analyse(everyForm.slice(0, at) + everyForm.slice(at + 1));
      checkFile(analysis);
      checkOffset(analysis, at);
    }
  });
});
