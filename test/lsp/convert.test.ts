import assert from 'node:assert/strict';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { abilitiesOf } from '../../server/src/lsp/abilities';
import { toCompletionItem } from '../../server/src/lsp/convert/completion';
import { toOffset, toRange } from '../../server/src/lsp/convert/range';
import { defaultSettings, readSettings } from '../../server/src/lsp/settings';

describe('what editors without tab stops get', () => {
  const document = TextDocument.create('file:///a.gas', 'tenuity', 1, 'st');
  const abilities = abilitiesOf({ capabilities: {} });
  const check = (insertText: string, plain: string) =>
    it(`${JSON.stringify(insertText)} becomes ${JSON.stringify(plain)}`, () => {
      const item = toCompletionItem(
        document,
        {
          label: 'x',
          kind: 'kind',
          detail: '',
          insertText,
          snippet: true,
          replace: { start: 0, end: 2 },
          sortText: '0',
        },
        abilities,
      );
      assert.equal(item.textEdit?.newText, plain);
      assert.equal(item.insertTextFormat, 1);
    });

  check('state ${1:name} of ${2:N2} {\n\tpressure = ${3:1 Pa}\n}$0', 'state name of N2 {\n\tpressure = 1 Pa\n}');
  check('${1|in,around|} $2', 'in ');
  check('\\$5 ${1:a\\}b} \\\\', '$5 a}b \\');
});

describe('places', () => {
  const document = TextDocument.create('file:///a.gas', 'tenuity', 1, '# 𝜆 µ\r\nlet x = 1\n');

  it('count UTF-16 units, as the protocol does', () => {
    assert.deepEqual(toRange(document, { start: 2, end: 4 }), {
      start: { line: 0, character: 2 },
      end: { line: 0, character: 4 },
    });
    assert.equal(toOffset(document, { line: 1, character: 4 }), document.getText().indexOf('x'));
  });

  it('beyond a line’s end are its end', () => {
    assert.equal(toOffset(document, { line: 0, character: 99 }), '# 𝜆 µ'.length);
    assert.equal(toOffset(document, { line: 99, character: 0 }), document.getText().length);
  });
});

describe('settings', () => {
  it('are the defaults where the client says nothing', () => {
    for (const nothing of [undefined, null, {}, 'on', []]) assert.deepEqual(readSettings(nothing), defaultSettings);
  });

  it('are taken as far as they make sense', () => {
    const given = {
      hints: { enabled: 'failing', digits: 2.5, figures: { state: ['density', 7], site: 'knudsen' } },
      hover: { detail: 'brief' },
    };
    assert.deepEqual(readSettings(given), {
      hints: { enabled: 'failing', digits: 4, figures: { state: ['density'] } },
      hover: { detail: 'brief' },
    });
  });
});
