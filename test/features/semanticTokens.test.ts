import assert from 'node:assert/strict';
import { readFileSync } from 'node:fs';
import { semanticTokens } from '../../server/src/features/semanticTokens';
import type { SemanticToken } from '../../server/src/features/semanticTokens';
import { analyse } from '../support/analyse';
import { colour, load } from '../grammar/colours';
import { everyForm, samples } from './samples';

function check(text: string, expected: readonly string[]): void {
  const found = semanticTokens(analyse(text));
  assert.deepEqual(
    found.map((token) => `${text.slice(token.start, token.start + token.length)} ${named(token)}`),
    expected,
  );
}

function named({ type, modifiers }: SemanticToken): string {
  return [type, ...modifiers].join('.');
}

interface Manifest {
  readonly contributes: { readonly semanticTokenScopes: readonly { readonly scopes: Record<string, string[]> }[] };
}

/** The scope that the manifest gives a token: of the most particular rule that fits. */
function scopeOf({ type, modifiers }: SemanticToken): string {
  const manifest = JSON.parse(readFileSync('package.json', 'utf8')) as Manifest;
  const scopes = manifest.contributes.semanticTokenScopes[0]!.scopes;
  const fitting = [...modifiers.map((modifier) => `${type}.${modifier}`), type].find((rule) => rule in scopes);
  return scopes[fitting ?? '']?.[0] ?? '';
}

describe('semanticTokens', () => {
  it('tells names by what they stand for', () => {
    check('let a = sqrt(2)', [
      'let keyword',
      'a variable.declaration',
      '= operator',
      'sqrt function.defaultLibrary',
      '2 number',
    ]);
    check('state s of nitrogen { temperature = a } # b', [
      'state type',
      's variable.declaration',
      'of keyword',
      'nitrogen gas.defaultLibrary',
      'temperature property',
      '= operator',
      '# b comment',
    ]);
    check('gas He_like = He\nlet CO = const.k / He_like.molar_mass', [
      'gas type',
      'He_like variable.declaration',
      '= operator',
      'He gas.defaultLibrary',
      'let keyword',
      'CO variable.declaration',
      '= operator',
      'const variable.readonly',
      'k variable.readonly',
      '/ operator',
      'He_like gas',
      'molar_mass property',
    ]);
    check('## c\nrequire a.regime is not slip because "b"', [
      'require keyword',
      'regime property',
      'is keyword',
      'not keyword',
      'slip variable.readonly',
      'because keyword',
      '"b" string',
    ]);
  });

  it('keeps to a range', () => {
    const text = 'let a = 1\nlet b = 2\n';
    const found = semanticTokens(analyse(text), { range: { start: 10, end: 19 } });
    assert.deepEqual(
      found.map(({ start }) => start),
      [10, 14, 16, 18],
    );
  });

  for (const [name, text] of samples) {
    it(`gives ${name} sorted tokens of one line each`, () => {
      let end = 0;
      for (const { start, length } of semanticTokens(analyse(text))) {
        assert.ok(start >= end && length > 0, `at ${start}`);
        assert.doesNotMatch(text.slice(start, start + length), /[\r\n]/);
        end = start + length;
      }
    });
  }

  it('has the colours of the grammar, but for gases that the file declares', async () => {
    const grammar = await load('source.tenuity');
    const lines = colour(grammar, everyForm).map((tokens, line) => tokens.map((token) => ({ ...token, line })));
    const starts = everyForm
      .split('\n')
      .reduce<number[]>((all, line) => [...all, (all.at(-1) ?? 0) + line.length + 1], [0]);
    const different: string[] = [];
    for (const token of semanticTokens(analyse(everyForm))) {
      const line = starts.findIndex((start) => start > token.start) - 1;
      const text = everyForm.slice(token.start, token.start + token.length);
      const scopes = lines[line]!.filter((each) => each.text.trim() === text).map(({ scope }) => scope);
      const wanted = scopeOf(token)
        .replace(/\.tenuity$/, '')
        .replace(/\.(?:number-sign|double)$/, '');
      const fits = scopes.some((scope) => scope.startsWith(wanted));
      const punctuation = token.type === 'comment' || token.type === 'string';
      if (!fits && !punctuation) different.push(`${line + 1} ${text}: ${named(token)}, ${scopes.join(' ')}`);
    }
    assert.deepEqual(different, []);
  });
});
