import assert from 'node:assert/strict';
import { hover } from '../../server/src/features/hover/hover';
import { inlayHints } from '../../server/src/features/inlayHints';
import type { Analysis } from '../../server/src/model/analysis';
import { printTree } from '../../server/src/syntax/print';
import type { Annotated } from './annotations';
import { applyFix, changedLines, fixNamed } from './fixes';
import type { Block } from './markdown';

/** A document of a section, with everything that its later blocks need. */
export interface Subject {
  readonly document: Annotated;
  readonly analysis: Analysis;
}

/** What a block that follows a document shows of it. The block holds `expected`; `text` is what it should hold. */
export type Show = (block: Block, subject: Subject) => { readonly expected: string; readonly text: string };

/** The sorts of block, by the word of their fence. */
export const shows: ReadonlyMap<string, Show> = new Map<string, Show>([
  ['fix', showFix],
  ['hover', (block, subject) => ({ expected: textOf(block), text: hoverAt(subject) })],
  ['hints', (block, subject) => ({ expected: textOf(block), text: hintedLines(subject) })],
  ['tree', (block, { analysis }) => ({ expected: textOf(block), text: printTree(analysis.file) })],
]);

function textOf({ lines }: Block): string {
  return lines.join('\n');
}

function showFix(block: Block, { document, analysis }: Subject): ReturnType<Show> {
  const [, code, title] = /^(\S+) "(.+)"$/.exec(block.argument) ?? [];
  assert.ok(code && title, `write a fix as: fix CODE "TITLE", not ${block.argument}`);
  const after = applyFix(document.text, fixNamed(analysis, code, title));
  const expected = textOf(block);
  return { expected, text: expected === after ? after : changedLines(document.text, after) };
}

function hoverAt({ document, analysis }: Subject): string {
  assert.ok(document.cursor !== undefined, 'the document has no mark <*>');
  const found = hover(analysis, document.cursor, { detail: 'full' });
  return found ? `[${document.text.slice(found.start, found.end)}]\n${found.markdown}` : 'nothing';
}

function hintedLines({ document: { text }, analysis }: Subject): string {
  const hints = inlayHints(analysis, { start: 0, end: text.length }, { enabled: 'all', figures: {}, digits: 4 });
  return hints
    .map(({ offset, label }) => `${text.slice(text.lastIndexOf('\n', offset - 1) + 1, offset)} «${label}»`)
    .join('\n');
}
