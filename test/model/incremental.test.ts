import assert from 'node:assert/strict';
import { edited, expectRan } from '../support/edited';

const CHAIN = `let room = 20 °C
let wall = room + 5 K
state feed of N2 { pressure = 1 mbar, temperature = wall }
let spare = 3 mm
tube foreline { bore = 40 mm, length = 1 m }
site here = feed in foreline
require here.knudsen > 1e-4
`;

describe('what an edit evaluates', () => {
  it('nothing when the text is the same', () => {
    const document = edited(CHAIN);
    const before = document.analysis();
    document.rewrite(CHAIN);
    assert.equal(document.analysis(), before);
  });

  it('a literal, what uses it, and nothing else', () => {
    const document = edited(CHAIN);
    document.replace('20 °C', '21 °C');
    expectRan(document, ['room', 'wall', 'feed', 'here', 'require here.knudsen > 1e-4']);
    document.replace('40 mm', '41 mm');
    expectRan(document, ['foreline', 'here', 'require here.knudsen > 1e-4']);
  });

  it('a spare value alone', () => {
    const document = edited(CHAIN);
    document.replace('3 mm', '4 mm');
    expectRan(document, ['spare']);
  });

  it('nothing for a comment or an empty line above', () => {
    const document = edited(CHAIN);
    document.insertAbove('state feed', '# a remark');
    expectRan(document, []);
    document.insertAbove('let room', '');
    expectRan(document, []);
    document.insertAbove('let wall', '## documentation');
    expectRan(document, []);
  });

  it('nothing when a declaration moves', () => {
    const document = edited(CHAIN);
    const [first = '', ...rest] = CHAIN.split('\n');
    document.rewrite([...rest, first, ''].join('\n'));
    expectRan(document, []);
  });

  it('only the declaration when its value stays equal', () => {
    const document = edited(CHAIN);
    document.replace('20 °C', '(20 °C)');
    expectRan(document, ['room']);
    document.replace('room + 5 K', 'room + (2 K + 3 K)');
    expectRan(document, ['wall']);
  });

  it('nothing but requirements when a unit is displayed otherwise', () => {
    const document = edited(`display length in mm\nlet a = 3 mm\nlet b = a * 2\nrequire b > 10 mm\nrequire b > 1 mm\n`);
    document.replace('in mm', 'in m');
    expectRan(document, ['display length in m', 'require b > 10 mm']);
  });

  it('only the readers of a condition', () => {
    const document = edited(
      'assume standard_temperature = 0 °C\nlet flow = 5 sccm\nlet double = 2 * flow\nlet bore = 3 mm\nstate feed of N2 { pressure = 1 mbar, temperature = 20 °C }\n',
    );
    document.replace('0 °C\n', '20 °C\n');
    expectRan(document, ['assume standard_temperature = 20 °C', 'flow', 'double']);
  });

  it('the readers of a condition that is assumed no longer', () => {
    const document = edited('assume standard_temperature = 20 °C\nlet flow = 5 sccm\nlet bore = 3 mm\n');
    document.replace('assume standard_temperature = 20 °C\n', '');
    expectRan(document, ['flow']);
  });

  it('the readers of the other file, and only those of what changed there', () => {
    const document = edited('use "shop.gas"\nlet a = room + 1 K\nlet b = bore * 2\nlet c = a + 1 K\n', {
      'shop.gas': 'let room = 20 °C\nlet bore = 3 mm\n',
    });
    document.rewriteFile('shop.gas', 'let room = 21 °C\nlet bore = 3 mm\n');
    expectRan(document, ['room', 'a', 'c']);
    document.rewriteFile('shop.gas', '# moved\nlet bore = 3 mm\nlet room = 21 °C\n');
    expectRan(document, []);
  });

  it('the users of a name that the other file declares no longer', () => {
    const document = edited('use "shop.gas"\nlet a = room + 1 K\nlet b = bore * 2\n', {
      'shop.gas': 'let room = 20 °C\nlet bore = 3 mm\n',
    });
    document.rewriteFile('shop.gas', 'let bore = 3 mm\n');
    expectRan(document, ['a']);
    assert.deepEqual(codes(document), ['unknown-name']);
  });

  it('both sides of a renaming', () => {
    const document = edited('let a = 3 mm\nlet b = a * 2\nlet c = 1 mm\n');
    document.replace('let a', 'let x');
    expectRan(document, ['x', 'b']);
    assert.deepEqual(codes(document), ['unknown-name']);
    document.replace('a * 2', 'x * 2');
    expectRan(document, ['b']);
    assert.deepEqual(codes(document), []);
  });

  it('the users of what is removed, and again of what comes back', () => {
    const document = edited('let a = 3 mm\nlet b = a * 2\nlet c = b + 1 mm\nlet d = 1 mm\n');
    document.replace('let a = 3 mm\n', '');
    expectRan(document, ['b', 'c']);
    document.rewrite(`let a = 4 mm\n${document.text()}`);
    expectRan(document, ['a', 'b', 'c']);
    assert.deepEqual(codes(document), []);
  });

  it('the users of what fails, once', () => {
    const document = edited('let a = 3 mm\nlet b = a * 2\nlet c = b + 1 mm\n');
    document.replace('3 mm', '3 furlong');
    expectRan(document, ['a', 'b', 'c']);
    assert.deepEqual(codes(document), ['unknown-unit']);
    document.replace('3 furlong', '4 furlong');
    expectRan(document, ['a']);
  });

  it('a gas that is declared over a built-in one', () => {
    const document = edited('state feed of air { pressure = 1 mbar, temperature = 20 °C }\nlet b = 2 mm\n');
    document.insertAbove('let b', 'gas air = N2 80 % + O2 20 %');
    expectRan(document, ['air', 'feed']);
  });

  it('the suggestions for a name that is not declared yet', () => {
    const document = edited('let a = rooom + 1 K\nlet b = 2 mm\n');
    document.insertAbove('let b', 'let room = 20 °C');
    const [problem] = document.analysis().problems();
    assert.match(problem?.problem.message ?? '', /did you mean room/);
  });

  it('the members of a circle that opens and closes', () => {
    const document = edited('let a = 3 mm\nlet b = a * 2\nlet c = b + 1 mm\n');
    document.replace('a = 3 mm', 'a = b / 2');
    assert.deepEqual(codes(document), ['circular-definition', 'circular-definition']);
    document.replace('a = b / 2', 'a = 3 mm');
    assert.deepEqual(codes(document), []);
  });

  it('no more than there is: what is removed is forgotten', () => {
    const document = edited('let a = 3 mm\nlet b = 2 mm\n');
    document.replace('let a = 3 mm\n', '');
    document.insertAbove('let b', 'let a = 3 mm');
    expectRan(document, ['a']);
  });
});

function codes(document: ReturnType<typeof edited>): readonly string[] {
  return document
    .analysis()
    .problems()
    .map(({ problem }) => problem.code);
}
