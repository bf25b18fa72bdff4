import assert from 'node:assert/strict';
import { analyse } from '../support/analyse';
import { edited, expectRan } from '../support/edited';
import { outcomeOf, quantityAt } from '../support/values';

const LENGTH = 10_000;
/** Each value one more than the one before. */
const chain = (first: string) => [
  `let x0 = ${first}`,
  ...Array.from({ length: LENGTH }, (_, i) => `let x${i + 1} = x${i} + 1 mm`),
];

describe('long chains', () => {
  it('in the order of the file', () => {
    const analysis = analyse(chain('0 mm').join('\n'));
    assert.deepEqual(analysis.problems(), []);
    assert.ok(Math.abs(quantityAt(analysis, `x${LENGTH}`).si - LENGTH / 1000) < 1e-9);
  });

  it('backwards', () => {
    const analysis = analyse(chain('0 mm').reverse().join('\n'));
    assert.deepEqual(analysis.problems(), []);
    assert.ok(Math.abs(quantityAt(analysis, `x${LENGTH}`).si - LENGTH / 1000) < 1e-9);
  });

  it('with a fault at their beginning, told once', () => {
    const analysis = analyse(chain('3 furlong').join('\n'));
    assert.deepEqual(
      analysis.problems().map(({ problem }) => problem.code),
      ['unknown-unit'],
    );
    assert.equal(outcomeOf(analysis, `x${LENGTH}`).kind, 'blocked');
  });

  it('that close to a circle', () => {
    const analysis = analyse(chain(`x${LENGTH}`).join('\n'));
    assert.equal(analysis.problems().length, LENGTH + 1);
    assert.ok(analysis.problems().every(({ problem }) => problem.code === 'circular-definition'));
  });

  it('in another file, last first', () => {
    const analysis = analyse('use "chain.gas"\nlet end = x10000 + 1 mm', {
      files: { 'chain.gas': chain('0 mm').reverse().join('\n') },
    });
    assert.deepEqual(analysis.problems(), []);
    assert.ok(Math.abs(quantityAt(analysis, 'end').si - (LENGTH + 1) / 1000) < 1e-9);
  });

  it('from file to file', () => {
    const files = Object.fromEntries(
      Array.from({ length: 300 }, (_, i) => [`f${i}.gas`, `use "f${i + 1}.gas"\nlet x${i} = x${i + 1} + 1 mm`]),
    );
    const analysis = analyse('use "f0.gas"\nlet end = x0', { files: { ...files, 'f300.gas': 'let x300 = 1 mm' } });
    assert.deepEqual(analysis.problems(), []);
    assert.ok(Math.abs(quantityAt(analysis, 'end').si - 0.301) < 1e-9);
  });

  it('edited at their end, where one declaration runs', () => {
    const document = edited(chain('0 mm').slice(0, 1000).join('\n'));
    document.replace('x998 + 1 mm', 'x998 + 2 mm');
    expectRan(document, ['x999']);
  });
});

describe('circles', () => {
  const codesOf = (text: string, files: Record<string, string> = {}) =>
    analyse(text, { files })
      .problems()
      .map(({ problem, declared }) => `${declared.id}: ${problem.code}`);

  it('through a condition', () => {
    assert.deepEqual(codesOf('assume standard_temperature = t\nlet t = q * 1 K\nlet q = 5 sccm / (1 mol/s)'), [
      'assume standard_temperature = t: circular-definition',
      't: circular-definition',
      'q: circular-definition',
    ]);
  });

  it('through a condition, whoever asks first', () => {
    for (const order of [
      [0, 1, 2],
      [0, 2, 1],
      [1, 0, 2],
      [1, 2, 0],
      [2, 0, 1],
      [2, 1, 0],
    ]) {
      const lines = ['assume standard_temperature = t', 'let t = q * 1 K', 'let q = 5 sccm / (1 mol/s)'];
      const found = codesOf(order.map((index) => lines[index]).join('\n'));
      assert.deepEqual(
        found.filter((problem) => !problem.endsWith('circular-definition')),
        [],
        order.join(),
      );
      assert.ok(found.length > 0, order.join());
    }
  });

  it('through gauge pressures and the ambient', () => {
    const found = codesOf('assume ambient_pressure = p\nlet p = 1 barg');
    assert.deepEqual(found.filter((problem) => problem.endsWith('circular-definition')).length, 2, found.join());
  });

  it('across files, each telling its own part', () => {
    const files = { 'other.gas': 'use "test.gas"\nlet b = a' };
    assert.deepEqual(codesOf('use "other.gas"\nlet a = b', files), ['a: circular-definition']);
  });

  it('two that share a member', () => {
    assert.deepEqual(codesOf('let a = b + c\nlet b = a\nlet c = a\nlet d = b'), [
      'a: circular-definition',
      'b: circular-definition',
      'c: circular-definition',
    ]);
  });

  it('two apart', () => {
    assert.deepEqual(codesOf('let a = b\nlet b = a\nlet c = d\nlet d = c').length, 4);
  });

  it('a path that only passes by is none', () => {
    assert.deepEqual(codesOf('let a = b + c\nlet b = c\nlet c = 1 mm'), []);
  });

  it('every related place lies in its file', () => {
    const text = 'let a = b\nlet b = c\nlet c = a';
    for (const { problem } of analyse(text).problems()) {
      assert.equal(problem.related.length, 2);
      for (const { offset, length } of problem.related) assert.match(text.slice(offset, offset + length), /^[abc]$/);
    }
  });
});
