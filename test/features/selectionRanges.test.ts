import assert from 'node:assert/strict';
import { selectionRanges } from '../../server/src/features/selectionRanges';
import { analyse, cursor } from '../support/analyse';

function check(marked: string, expected: readonly string[]): void {
  const { text, offset } = cursor(marked);
  assert.deepEqual(
    selectionRanges(analyse(text), offset).map(({ start, end }) => text.slice(start, end)),
    expected,
  );
}

describe('selectionRanges', () => {
  it('grows from the word to the file', () => {
    const text = 'let a = 1\ntube t { bore = 2 * 4 mm }';
    check(text.replace('mm', 'm<*>m'), [
      'mm',
      '4 mm',
      '2 * 4 mm',
      'bore = 2 * 4 mm',
      '{ bore = 2 * 4 mm }',
      'tube t { bore = 2 * 4 mm }',
      text,
    ]);
    check('# only\n<*>', ['# only\n']);
    check('<*>', ['']);
  });
});
