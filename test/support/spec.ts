import assert from 'node:assert/strict';
import { readFileSync, writeFileSync } from 'node:fs';
import type { Analysis } from '../../server/src/model/analysis';
import { annotate, annotationOf, asStated, readAnnotations } from './annotations';
import type { Annotated } from './annotations';
import type { Block, Section } from './markdown';
import { emptySections, readSections, rewrite } from './markdown';
import type { Subject } from './shows';
import { shows } from './shows';
import { MAIN, addressOf, textsOf, workspaceOf } from './workspace';

/**
 * A markdown page as a suite of tests. Headings name the tests; ```` ```gas ```` blocks are documents whose caret lines state
 * every problem; what follows a document speaks of it:
 *
 * - ```` ```file NAME ```` another file, for `use`; it belongs to the whole section
 * - ```` ```fix CODE "TITLE" ```` the document after that fix, or the lines of it that changed
 * - ```` ```hover ```` what hovering over the mark `<*>` shows, after the highlighted text in brackets
 * - ```` ```hints ```` the lines that have a hint, with it in guillemets
 * - ```` ```tree ```` the syntax tree
 *
 * `ONLY="heading"` runs the tests with that in their heading; `UPDATE=1` rewrites what a block shows, never the carets.
 */
export function spec(path: string): void {
  const page = readFileSync(path, 'utf8');
  const changes: Change[] = [];
  describe(path, () => {
    const sections = readSections(page);
    it('has a test below each heading', () => {
      assert.deepEqual(
        emptySections(sections).map(({ line, heading }) => `line ${line + 1}: ${heading}`),
        [],
      );
      const headings = sections.map(({ heading }) => heading);
      assert.deepEqual(
        headings.filter((heading, index) => headings.indexOf(heading) !== index),
        [],
      );
    });
    for (const section of sections) {
      if (section.blocks.length === 0 || !section.heading.includes(process.env['ONLY'] ?? '')) continue;
      it(section.heading, () => runSection(section, changes));
    }
    after(() => {
      if (changes.length > 0) writeFileSync(path, rewrite(page, changes));
    });
  });
}

interface Change {
  readonly block: Block;
  readonly text: string;
}

function runSection({ blocks }: Section, changes: Change[]): void {
  const files = new Map(
    blocks.filter(({ word }) => word === 'file').map((block) => [block.argument, readAnnotations(block.lines)]),
  );
  const others = Object.fromEntries([...files].map(([name, { text }]) => [name, text]));
  const main = blocks.find(({ word }) => word === 'gas')?.lines ?? [];
  const workspace = workspaceOf(textsOf(readAnnotations(main).text, others));
  for (const [name, document] of files) checkProblems(document, workspace.analyse(addressOf(name)));

  let subject: Subject | undefined;
  for (const block of blocks) {
    if (block.word === 'file') continue;
    if (block.word === 'gas') {
      const document = readAnnotations(block.lines);
      subject = { document, analysis: workspaceOf(textsOf(document.text, others)).analyse(MAIN) };
      checkProblems(document, subject.analysis);
      continue;
    }
    const show = shows.get(block.word);
    assert.ok(show, `line ${block.start}: no block is called “${block.word}”`);
    assert.ok(subject, `line ${block.start}: no document stands above this block`);
    const { expected, text } = show(block, subject);
    if (process.env['UPDATE'] && expected !== text) changes.push({ block, text });
    else assert.equal(expected, text);
  }
}

function checkProblems({ text, annotations }: Annotated, analysis: Analysis): void {
  const found = analysis.problems().map((problem) => annotationOf(problem, text));
  assert.equal(annotate(text, asStated(found, annotations)), annotate(text, annotations));
}
