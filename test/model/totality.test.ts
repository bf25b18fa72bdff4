import { analyse } from '../support/analyse';
import { checkProblems } from '../support/analysisInvariants';
import { documents, samples } from '../support/corpus';
import { MAIN, textsOf, workspaceOf } from '../support/workspace';

describe('every text has an analysis', () => {
  it('each beginning of each sample', () => {
    for (const { text } of samples()) beginnings(text, 1);
  });

  it('each beginning of the documents, by steps', () => {
    for (const { text } of documents()) beginnings(text, 5);
  });

  it('each document without one of its characters, by steps', () => {
    documents().forEach(({ text }, index) => {
      for (let at = index % 6; at < text.length; at += 6)
        checkProblems(analyse(text.slice(0, at) + text.slice(at + 1)));
    });
  });

  it('texts of a hundred thousand of the same', () => {
    for (const text of ['(', '-', '1 + ', 'abs(', 'not ', '2 ^ ', 'a.', '[', '{', '"', 'x ']) {
      checkProblems(analyse(`let a = ${text.repeat(100_000)}1\nlet b = a\nrequire b > 1`));
    }
  });

  it('sums of ten thousand terms', () => {
    checkProblems(analyse(`let a = ${'1 mm + '.repeat(10_000)}1 mm`));
  });
});

/** Analyses a text as it is typed. */
function beginnings(text: string, step: number): void {
  const texts = textsOf('');
  const workspace = workspaceOf(texts);
  for (let end = 0; end <= text.length; end += step) {
    texts.set(MAIN, text.slice(0, end));
    checkProblems(workspace.analyse(MAIN));
  }
}
