import assert from 'node:assert/strict';
import { readFileSync, readdirSync } from 'node:fs';
import type { IGrammar } from 'vscode-textmate';
import { parseGrammarTestCase, runGrammarTestCase } from 'vscode-tmgrammar-test/dist/unit/index';
import { functions } from '../../server/src/model/functions';
import { speciesList } from '../../server/src/physics/species/list';
import { allSpellings } from '../../server/src/quantities/unitSpellings';
import { colour, load, registry } from './colours';

const FIXTURES = 'test/grammar/syntax';

describe('the TextMate grammar', () => {
  let grammar: IGrammar;
  before(async () => {
    grammar = await load('source.tenuity');
  });

  for (const file of readdirSync(FIXTURES)) {
    it(`colours ${file}`, async () => {
      const fixture = parseGrammarTestCase(readFileSync(`${FIXTURES}/${file}`, 'utf8'));
      assert.ok(fixture.assertions.length > 5);
      assert.deepEqual(await runGrammarTestCase(registry, fixture), []);
    });
  }

  it('takes every spelling of every unit for a unit, tight or after a space', () => {
    for (const { text } of allSpellings) {
      for (const space of ['', ' ']) {
        const [line] = colour(grammar, `let x = 3${space}${text}`);
        assert.deepEqual(line?.at(-1), { text, scope: 'keyword.other.unit.tenuity' }, `3${space}${text}`);
      }
    }
  });

  it('takes every built-in gas for a gas', () => {
    for (const { formula } of speciesList) {
      const [alone, member] = colour(grammar, `let a = ${formula}\nlet b = feed.${formula}.partial_pressure`);
      assert.deepEqual(alone?.at(-1), { text: formula, scope: 'support.class.gas.tenuity' });
      assert.ok(
        member?.some(({ text, scope }) => text === formula && scope === 'support.class.gas.tenuity'),
        formula,
      );
    }
  });

  it('takes every function for a function, and only where it is called', () => {
    for (const { name } of functions) {
      const [called, named] = colour(grammar, `let a = ${name}(2)\nlet b = ${name}`);
      assert.ok(
        called?.some(({ text, scope }) => text === name && scope === 'support.function.tenuity'),
        name,
      );
      assert.deepEqual(named?.at(-1), { text: name, scope: 'variable.other.readwrite.tenuity' });
    }
  });

  it('leaves no word without a colour', () => {
    const starters = readdirSync('client/starters').map((file) => readFileSync(`client/starters/${file}`, 'utf8'));
    assert.equal(starters.length, 3);
    for (const line of starters.flatMap((text) => colour(grammar, text))) {
      for (const { text, scope } of line) assert.notEqual(scope, 'source.tenuity', text);
    }
  });

  it('recovers at the next line from a string that is never closed', () => {
    const [, next] = colour(grammar, 'use "shop\nlet a = 1 Pa');
    assert.deepEqual(next?.at(0), { text: 'let', scope: 'keyword.control.tenuity' });
  });
});

describe('gas-state code in Markdown', () => {
  const scopes = async (fence: string) => {
    const lines = colour(await load('text.html.markdown'), `${fence}\nlet a = 1 Pa\n\`\`\`\nlet b = 2 Pa`);
    return [lines[1]?.at(0)?.scope, lines[3]?.at(0)?.scope];
  };

  it('is coloured up to the end of its fence', async () => {
    for (const fence of ['```gas', '```tenuity', '``` Gas', '```gas title="lock"']) {
      assert.deepEqual(await scopes(fence), ['keyword.control.tenuity', 'text.html.markdown'], fence);
    }
  });

  it('is left alone in another language', async () => {
    for (const fence of ['```', '```gasket', '```text gas']) {
      assert.deepEqual(await scopes(fence), ['text.html.markdown', 'text.html.markdown'], fence);
    }
  });
});
