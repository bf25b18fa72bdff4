import assert from 'node:assert/strict';
import { readFileSync } from 'node:fs';

interface Pattern {
  readonly pattern: string;
  readonly flags?: string;
}

interface LanguageConfiguration {
  readonly comments: { readonly lineComment: string };
  readonly brackets: readonly (readonly [string, string])[];
  readonly autoClosingPairs: readonly { open: string; close: string; notIn: readonly string[] }[];
  readonly wordPattern: Pattern;
  readonly indentationRules: { readonly increaseIndentPattern: Pattern; readonly decreaseIndentPattern: Pattern };
  readonly onEnterRules: readonly { beforeText: Pattern; action: { indent: string; appendText: string } }[];
  readonly folding: { readonly markers: { readonly start: string; readonly end: string } };
}

const configuration = JSON.parse(readFileSync('grammar/language-configuration.json', 'utf8')) as LanguageConfiguration;
const compile = ({ pattern, flags }: Pattern, more = '') => new RegExp(pattern, (flags ?? '') + more);

describe('the language configuration', () => {
  it('indents after a line that leaves a bracket open', () => {
    const increase = compile(configuration.indentationRules.increaseIndentPattern);
    for (const line of [
      'state residual of N2 {',
      'chamber lock { volume = 9 L,',
      'pump dry { speed = [',
      '  speed = [1 mbar: 2 L/s,',
      'let a = max(1 Pa,',
      'use "a{b.gas" {',
      'tube t { # the first',
      'tube t { # not {closed}',
    ]) {
      assert.ok(increase.test(line), line);
    }
    for (const line of [
      'let a = 1 Pa',
      'tube t { bore = 40 mm }',
      'let a = max(1 Pa, 2 Pa)',
      '# a { in a comment',
      'require a < 1 because "b {"',
      'use "open {',
      '}',
    ]) {
      assert.ok(!increase.test(line), line);
    }
  });

  it('outdents a line that begins with a closing bracket', () => {
    const decrease = compile(configuration.indentationRules.decreaseIndentPattern);
    for (const line of ['}', '  }', '  ]', ') }']) assert.ok(decrease.test(line), line);
    for (const line of ['  pressure = 1 Pa }', '# }', '']) assert.ok(!decrease.test(line), line);
  });

  it('decides about long lines at once', () => {
    const increase = compile(configuration.indentationRules.increaseIndentPattern);
    const line = `${'x "y" { z } '.repeat(2000)}"`;
    const start = performance.now();
    assert.ok(!increase.test(line));
    assert.ok(performance.now() - start < 500);
  });

  it('continues documentation, and no other comment', () => {
    const [rule, ...others] = configuration.onEnterRules;
    assert.ok(rule);
    assert.deepEqual(others, []);
    assert.equal(rule.action.appendText, '## ');
    const before = compile(rule.beforeText);
    for (const line of ['## Gas left in the lock', '  ## a']) assert.ok(before.test(line), line);
    for (const line of ['##', '## ', '# a', '### a', 'let a = 1 ## b']) assert.ok(!before.test(line), line);
  });

  it('keeps names, numbers and units whole', () => {
    const words = (line: string) => line.match(compile(configuration.wordPattern, 'g'));
    assert.deepEqual(words('require in_foreline.regime is molecular'), [
      'require',
      'in_foreline',
      'regime',
      'is',
      'molecular',
    ]);
    assert.deepEqual(words('let κ_2 = 1_200 + 3.5e-3 m² ± 5 %'), ['let', 'κ_2', '1_200', '3.5e-3', 'm²', '5', '%']);
    assert.deepEqual(words('17.9 µPa·s, 21 °C'), ['17.9', 'µPa', 's', '21', '°C']);
    assert.ok(!compile(configuration.wordPattern).test(''));
  });

  it('closes each bracket and quote, but not inside strings and comments', () => {
    const closing = configuration.autoClosingPairs.map(({ open, close }) => [open, close]);
    assert.deepEqual(closing, [...configuration.brackets, ['"', '"']]);
    for (const { notIn } of configuration.autoClosingPairs) assert.deepEqual(notIn, ['string', 'comment']);
    assert.equal(configuration.comments.lineComment, '#');
  });

  it('folds between region comments', () => {
    const { start, end } = configuration.folding.markers;
    assert.match('# region Pumps', new RegExp(start));
    assert.match('  #endregion', new RegExp(end));
    assert.doesNotMatch('# regional', new RegExp(start));
    assert.doesNotMatch('let region = 1', new RegExp(start));
  });
});
