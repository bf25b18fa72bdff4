import assert from 'node:assert/strict';
import { workspaceSymbols } from '../../server/src/features/workspaceSymbols';
import { sightOf } from './sight';

function check(query: string, expected: readonly string[]): void {
  const { sight } = sightOf({
    'a.gas': 'tube foreline { bore = 1 mm }\n<*>let fine = 1\nrequire fine > 0',
    'b.gas': 'gas offered = N2\nlet other = 2',
  });
  const found = workspaceSymbols(sight.analyses, query);
  assert.deepEqual(
    found.map(({ name, kind, uri }) => `${uri.slice('file:///'.length)} ${name} ${kind}`),
    expected,
  );
}

describe('workspaceSymbols', () => {
  it('lists the names of all files, the closest first', () => {
    check('fo', ['a.gas foreline struct']);
    check('OFF', ['b.gas offered class']);
    check('fe', ['b.gas offered class', 'a.gas foreline struct', 'a.gas fine variable']);
    check('xyz', []);
    check('', ['a.gas foreline struct', 'a.gas fine variable', 'b.gas offered class', 'b.gas other variable']);
  });
});
