import assert from 'node:assert/strict';
import type { Analysis } from '../../server/src/model/analysis';
import { MAIN, addressOf, textsOf, workspaceOf } from './workspace';

/** A text in a workspace that is edited step by step. After each step its analysis is compared with a fresh one. */
export interface Edited {
  readonly text: () => string;
  readonly analysis: () => Analysis;
  /** Puts another text in place of the one occurrence of a part. */
  readonly replace: (part: string, by: string) => void;
  /** Puts a line above the one that begins so. */
  readonly insertAbove: (start: string, line: string) => void;
  readonly rewrite: (text: string) => void;
  readonly rewriteFile: (name: string, text: string) => void;
}

export function edited(start: string, files: Readonly<Record<string, string>> = {}): Edited {
  const texts = textsOf(start, files);
  const workspace = workspaceOf(texts);
  let analysis = workspace.analyse(MAIN);

  const put = (uri: string, text: string) => {
    texts.set(uri, text);
    analysis = workspace.analyse(MAIN);
    assertSame(analysis, workspaceOf(texts).analyse(MAIN));
  };
  const text = () => texts.get(MAIN) ?? '';

  return {
    text,
    analysis: () => analysis,
    replace: (part, by) => {
      const [before = '', after, ...more] = text().split(part);
      assert.ok(after !== undefined && more.length === 0, `“${part}” does not stand there once`);
      put(MAIN, before + by + after);
    },
    insertAbove: (begin, line) => {
      const at = `\n${text()}`.indexOf(`\n${begin}`);
      assert.ok(at >= 0, `no line begins with “${begin}”`);
      put(MAIN, `${text().slice(0, at)}${line}\n${text().slice(at)}`);
    },
    rewrite: (next) => put(MAIN, next),
    rewriteFile: (name, next) => put(addressOf(name), next),
  };
}

/** Which declarations the last edit evaluated again, in any order. */
export function expectRan(document: Edited, names: readonly string[]): void {
  assert.deepEqual([...document.analysis().ran].sort(), [...names].sort());
}

/** Two analyses of the same text say the same. */
export function assertSame(one: Analysis, other: Analysis): void {
  assert.deepEqual(problemsOf(one), problemsOf(other));
  assert.deepEqual(outcomesOf(one), outcomesOf(other));
}

function problemsOf(analysis: Analysis): unknown {
  return analysis.problems().map(({ problem, offset }) => ({ ...problem, offset }));
}

function outcomesOf(analysis: Analysis): unknown {
  return analysis.declared.map((declared) => ({ id: declared.id, outcome: analysis.outcome(declared) }));
}
