import assert from 'node:assert/strict';
import { prepareRename, rename } from '../../server/src/features/rename';
import { applyEdits } from '../../server/src/features/textEdit';
import { sightOf } from './sight';

type Files = Readonly<Record<string, string>>;

function check(files: Files, name: string, expected: Files): void {
  const { sight, uri, offset } = sightOf(files);
  const renamed = rename(sight, uri, offset, name);
  assert.ok(renamed.kind === 'renamed', JSON.stringify(renamed));
  const after = [...renamed.edits].map(([address, edits]) => {
    const { text } = sight.analyses.find((analysis) => analysis.uri === address)!;
    return [address.slice('file:///'.length), applyEdits(text, edits)];
  });
  assert.deepEqual(Object.fromEntries(after), expected);
}

function checkRefused(files: Files | string, name: string, reason: RegExp): void {
  const { sight, uri, offset } = sightOf(typeof files === 'string' ? { 'a.gas': files } : files);
  const found = rename(sight, uri, offset, name);
  assert.ok(found.kind === 'refused', JSON.stringify([...(found.kind === 'renamed' ? found.edits : [])]));
  assert.match(found.reason, reason);
}

describe('rename', () => {
  it('changes every file that uses the name', () => {
    check(
      { 'a.gas': 'let <*>a = 1\nlet b = a', 'b.gas': 'use "a.gas"\nlet c = a * 2', 'c.gas': 'let a = 1' },
      'first',
      { 'a.gas': 'let first = 1\nlet b = first', 'b.gas': 'use "a.gas"\nlet c = first * 2' },
    );
    check({ 'a.gas': 'use "b.gas"\nlet c = <*>a', 'b.gas': 'let a = 1' }, 'x', {
      'a.gas': 'use "b.gas"\nlet c = x',
      'b.gas': 'let x = 1',
    });
    check({ 'a.gas': 'chamber <*>c { volume = 1 L }\nsystem y { c -> c }\nrequire y.c.pressure > 1 Pa' }, 'lock', {
      'a.gas': 'chamber lock { volume = 1 L }\nsystem y { lock -> lock }\nrequire y.lock.pressure > 1 Pa',
    });
    check({ 'a.gas': 'let <*>a = 1' }, 'a', {});
  });

  it('says what is renamed', () => {
    const { sight, uri, offset } = sightOf({ 'a.gas': 'let abc = 1\nlet b = a<*>bc' });
    assert.deepEqual(prepareRename(sight, uri, offset), {
      kind: 'renamable',
      start: 20,
      end: 23,
      placeholder: 'abc',
    });
  });

  it('refuses what is not the author’s', () => {
    checkRefused('state s of <*>N2 {}', 'x', /N2 is a built-in gas/);
    checkRefused('state s of nitro<*>gen {}', 'x', /nitrogen/);
    checkRefused('tube t { <*>bore = 1 mm }', 'x', /bore is a key of the format/);
    checkRefused('tube t { bore = 1 mm }\nlet b = t.bo<*>re', 'x', /bore is a result of the format/);
    checkRefused('tu<*>be t { bore = 1 mm }', 'x', /tube is a word of the format/);
    checkRefused('let a = <*>b', 'x', /b is not declared/);
    checkRefused('let a = 1<*>2', 'x', /no name here/);
  });

  it('refuses names that cannot be or are taken', () => {
    checkRefused('let <*>a = 1', '1a', /a name is/);
    checkRefused('let <*>a = 1', 'a b', /a name is/);
    checkRefused('let <*>a = 1', '', /a name is/);
    checkRefused('let <*>a = 1', 'within', /a word of the format/);
    checkRefused('let <*>a = 1', 'state', /a word of the format/);
    checkRefused('let <*>a = 1', 'sqrt', /a word of the format/);
    checkRefused('let <*>a = 1', 'DN40', /a nominal bore/);
    checkRefused('let <*>a = 1', 'N2', /a built-in gas/);
    checkRefused('let <*>a = 1\nlet b = 2', 'b', /b is already declared in a\.gas/);
    checkRefused({ 'a.gas': 'let <*>a = 1', 'b.gas': 'use "a.gas"\nlet b = a' }, 'b', /already declared in b\.gas/);
    checkRefused(
      { 'a.gas': 'let <*>a = 1', 'b.gas': 'use "a.gas"\nuse "c.gas"\nlet d = e', 'c.gas': 'let e = 2' },
      'e',
      /already declared in c\.gas/,
    );
  });

  it('leaves a file alone that has a name of its own', () => {
    check({ 'a.gas': 'let <*>a = 1', 'b.gas': 'use "a.gas"\nlet e = 2' }, 'e', { 'a.gas': 'let e = 1' });
  });
});
