import assert from 'node:assert/strict';
import fc from 'fast-check';
import { lineIndex } from '../../server/src/features/lines';

describe('lines', () => {
  const index = lineIndex('ab\ncd\r\n\re');

  it('counts them with each kind of line break', () => {
    assert.equal(index.lineCount, 4);
    assert.equal(lineIndex('').lineCount, 1);
    assert.deepEqual(index.positionAt(4), { line: 1, character: 1 });
    assert.deepEqual(index.positionAt(8), { line: 3, character: 0 });
  });

  it('keeps to the text', () => {
    assert.deepEqual(index.positionAt(99), { line: 3, character: 1 });
    assert.deepEqual(index.positionAt(-1), { line: 0, character: 0 });
    assert.equal(index.offsetAt({ line: 1, character: 99 }), 5);
    assert.equal(index.offsetAt({ line: 2, character: 99 }), 7);
    assert.equal(index.offsetAt({ line: 99, character: 0 }), 9);
    assert.equal(index.offsetAt({ line: -1, character: 5 }), 0);
  });

  it('goes there and back', () => {
    const text = fc.array(fc.constantFrom('a', 'µ', '😀', '\n', '\r\n')).map((parts) => parts.join(''));
    fc.assert(
      fc.property(text, (each) => {
        const { positionAt, offsetAt } = lineIndex(each);
        for (let offset = 0; offset <= each.length; offset += 1) {
          const insideBreak = each[offset - 1] === '\r' && each[offset] === '\n';
          assert.equal(offsetAt(positionAt(offset)), insideBreak ? offset - 1 : offset);
        }
      }),
    );
  });
});
