import assert from 'node:assert/strict';
import { links } from '../../server/src/features/links';
import { analyse } from '../support/analyse';

function check(text: string, expected: readonly string[]): void {
  assert.deepEqual(
    links(analyse(text)).map(({ start, end, target }) => `${text.slice(start, end)} ${target}`),
    expected,
  );
}

describe('links', () => {
  it('leads from each path to its file', () => {
    check('use "a.gas"\nlet x = 1\nuse   "b.gas"', ['a.gas file:///a.gas', 'b.gas file:///b.gas']);
    check('use "a.gas', ['a.gas file:///a.gas']);
    check('use ""\nuse\nlet x = 1', []);
  });
});
