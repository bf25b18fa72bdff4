import assert from 'node:assert/strict';
import { folding } from '../../server/src/features/folding';
import { lineIndex } from '../../server/src/features/lines';
import { analyse } from '../support/analyse';

function check(text: string, expected: readonly string[]): void {
  const { positionAt } = lineIndex(text);
  const lines = folding(analyse(text)).map(
    ({ start, end, kind }) => `${positionAt(start).line}-${positionAt(end).line} ${kind}`,
  );
  assert.deepEqual(lines, expected);
}

describe('folding', () => {
  it('blocks, but for their closing line', () => {
    check('tube t {\n  bore = 1 mm\n}', ['0-1 block']);
    check('tube t {\r\n  bore = 1 mm\r\n}', ['0-1 block']);
    check('pump p {\n  speed = [\n    1 mbar: 2 L/s\n  ]\n}', ['0-3 block', '1-2 block']);
    check('tube t { bore = 1 mm }', []);
    check('tube t {\n}', []);
    check('tube t {\n  bore = 1 mm', []);
  });

  it('comments and uses that follow each other', () => {
    check('# a\n# b\n\n# c\nlet a = 1 # d\n# e\n', ['0-1 comment']);
    check('tube t {\n  # a\n  # b\n  bore = 1 mm\n}', ['0-3 block', '1-2 comment']);
    check('use "a.gas"\nuse "b.gas"\n\nuse "c.gas"', ['0-1 imports']);
  });

  it('regions', () => {
    check('# region a\nlet b = 1\n# region c\n# endregion\n# endregion\n# endregion', ['0-4 region', '2-3 region']);
  });
});
