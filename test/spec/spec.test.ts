import assert from 'node:assert/strict';
import { readFileSync } from 'node:fs';
import { problemKinds } from '../../server/src/model/problems/list';
import { analyse } from '../support/analyse';
import { readAnnotations } from '../support/annotations';
import { readSections } from '../support/markdown';
import { spec } from '../support/spec';
import { pages, problemPages } from './pages';

for (const page of pages()) spec(page);

describe('the documents of the README', () => {
  const documents = readSections(readFileSync('README.md', 'utf8')).flatMap(({ blocks }) =>
    blocks.filter(({ word }) => word === 'gas'),
  );

  it('are there, and have no problem', () => {
    assert.ok(documents.length > 0);
    for (const { lines } of documents) assert.deepEqual(analyse(lines.join('\n')).problems(), []);
  });
});

describe('the pages of the problems', () => {
  it('are there for every problem, and for no other', () => {
    assert.deepEqual(
      problemPages().map(({ code }) => code),
      problemKinds.map(({ code }) => code).sort(),
    );
  });

  for (const { code, path } of problemPages()) {
    it(`${code} is raised on its page, with its name as the heading`, () => {
      const sections = readSections(readFileSync(path, 'utf8'));
      assert.equal(sections[0]?.heading, code);
      const documents = sections.flatMap(({ blocks }) => blocks.filter(({ word }) => word === 'gas'));
      const stated = documents.flatMap(({ lines }) => readAnnotations(lines).annotations);
      assert.ok(stated.some((annotation) => annotation.code === code));
    });
  }
});
