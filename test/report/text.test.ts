import assert from 'node:assert/strict';
import { aligned, columnsOf } from '../../server/src/report/columns';
import { excerpt } from '../../server/src/report/excerpt';
import { printable } from '../../server/src/report/printable';
import { plain, textFile } from '../../server/src/report/text';
import { analyse } from '../support/analyse';
import { samples } from '../support/corpus';

describe('the text of a check', () => {
  it('can be written of every beginning of a record, each mark below its line', () => {
    for (const { source, text } of samples()) {
      for (let end = 0; end <= text.length; end += 29) {
        const written = textFile(source, analyse(text.slice(0, end)), { values: 'all', emphasis: plain });
        const lines = written.split('\n');
        assert.deepEqual(
          lines.filter((line) => /undefined|NaN|\[object|\s$/.test(line)),
          [],
        );
        for (const [index, line] of lines.entries()) {
          if (!/^ {4} *\^+$/.test(line)) continue;
          const above = lines[index - 1] ?? '';
          // What is missing is marked behind the end; and a blank at the end is not shown.
          assert.ok(columnsOf(line) <= columnsOf(above) + 2, `${above}\n${line}`);
        }
      }
    }
  });

  it('says what has no value and why', () => {
    const text = 'let a = 3 mmm\nlet b = 2 * a\n';
    const written = textFile('x.gas', analyse(text), { values: 'main', emphasis: plain });
    assert.match(written, /^ {2}a {2}has a problem {6}let$/m);
    assert.match(written, /^ {2}b {2}waits for a value {2}let$/m);
  });
});

describe('columns', () => {
  it('are as wide as what a terminal shows', () => {
    assert.equal(columnsOf('c̄ = 3 µm'), 8);
    assert.equal(columnsOf('真空'), 4);
    assert.equal(columnsOf('ｶ'.normalize('NFKC')), 2);
  });

  it('stand below each other, without blanks at the end', () => {
    const style = (cell: string) => cell;
    assert.equal(
      aligned(
        [
          ['a', 'c̄', 'x'],
          ['long', '', ''],
          ['', 'm'],
        ],
        { indent: 1, style },
      ),
      ' a     c̄  x\n long\n       m',
    );
  });
});

describe('an excerpt', () => {
  it('is the whole line where that is short', () => {
    assert.deepEqual(excerpt('\tlet a = 3 mm', 11, 13), { line: ' let a = 3 mm', indent: 11, width: 2 });
  });

  it('marks one column where nothing is', () => {
    assert.deepEqual(excerpt('', 0, 0), { line: '', indent: 0, width: 1 });
  });

  it('marks the place wherever it is in a long line', () => {
    const line = Array.from({ length: 200 }, (_, index) => `<${String(index).padStart(3, '0')}>`).join('');
    for (let start = 0; start < line.length; start += 5) {
      const { line: shown, indent, width } = excerpt(line, start, start + 5);
      assert.ok(shown.length <= 122);
      assert.equal(shown.slice(indent, indent + width), line.slice(start, start + 5));
    }
  });

  it('never shows half a sign', () => {
    const line = '🙂'.repeat(200);
    for (let start = 0; start < 100; start += 1) assert.doesNotMatch(excerpt(line, start, start + 1).line, /\p{Cs}/u);
  });
});

describe('what is printable', () => {
  it('keeps its length and holds nothing that drives a terminal', () => {
    for (let code = 0; code < 0x10000; code += 1) {
      const shown = printable(String.fromCharCode(code));
      assert.equal(shown.length, 1);
      assert.doesNotMatch(shown, /\p{Cc}|\p{Bidi_Control}|\p{Cs}/u, code.toString(16));
    }
  });

  it('leaves ordinary text alone', () => {
    const text = 'λ 21.7 ± 2.3 mm · “c̄” — 真空 🙂 м';
    assert.equal(printable(text), text);
  });
});
