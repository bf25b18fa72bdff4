import assert from 'node:assert/strict';
import fc from 'fast-check';
import { createParser, parse } from '../../server/src/syntax/parse';
import { printTree } from '../../server/src/syntax/print';
import { documents, samples } from '../support/corpus';
import { checkTree } from '../support/syntaxInvariants';

const specimens = [...samples(), ...documents()];

/** What somebody may type, or a paste may bring, anywhere. */
const INSERTIONS = [
  '{',
  '}',
  '(',
  ')',
  '[',
  '"',
  '#',
  '\n',
  '=',
  ',',
  '.',
  '±',
  '-',
  '->',
  ' let ',
  '1',
  '1,5',
  '°',
  '\0',
];

describe('every text has a tree', () => {
  it('the documents themselves', () => {
    assert.ok(specimens.length > 100);
    for (const { text } of specimens) checkTree(parse(text));
  });

  it('each beginning of each document', () => {
    for (const { text } of specimens) {
      const update = createParser();
      for (let end = 0; end < text.length; end += 1) checkTree(update(text.slice(0, end)));
    }
  });

  it('each document without one of its characters', () => {
    for (const { text } of specimens) {
      const update = createParser();
      for (let at = 0; at < text.length; at += 1) checkTree(update(text.slice(0, at) + text.slice(at + 1)));
    }
  });

  it('each document with something put in', () => {
    specimens.forEach(({ text }, index) => {
      const update = createParser();
      for (let at = index % 7; at < text.length; at += 7) {
        const inserted = INSERTIONS[(at + index) % INSERTIONS.length] ?? '';
        checkTree(update(text.slice(0, at) + inserted + text.slice(at)));
      }
    });
  });

  it('words and marks in any order', () => {
    fc.assert(
      fc.property(fc.array(fc.constantFrom(...TOKENS), { maxLength: 40 }), (tokens) =>
        checkTree(parse(tokens.join(''))),
      ),
      { numRuns: 3000 },
    );
  });

  it('characters in any order', () => {
    const unit = fc.oneof(
      fc.constantFrom('\0', '\ud800', '\udc00', '\ufeff', '\r', '\u2028', '"', '{'),
      fc.string({ unit: 'binary', maxLength: 1 }),
    );
    fc.assert(
      fc.property(fc.array(unit, { maxLength: 60 }), (parts) => checkTree(parse(parts.join('')))),
      { numRuns: 2000 },
    );
  });
});

const TOKENS = [
  ...['let', 'gas', 'state', 'tube', 'site', 'line', 'require', 'use', 'display', 'assume', 'sweep', 'vary', 'show'],
  ...[
    'of',
    'from',
    'in',
    'is',
    'not',
    'and',
    'or',
    'within',
    'between',
    'because',
    'balance',
    'log',
    'steps',
    'through',
  ],
  ...['a', 'N2', 'bore', 'λ', '3', '1.5', '2,5', '1e-3', '.', '..', '5 mm', '20 °C', '95 %', 'mbar·L/s', '"text"', '"'],
  ...[
    '=',
    '+',
    '-',
    '*',
    '/',
    '^',
    '±',
    '+-',
    '<',
    '>=',
    '==',
    '!',
    '->',
    '&',
    ':',
    ',',
    ';',
    '{',
    '}',
    '(',
    ')',
    '[',
    ']',
  ],
  ...[' ', ' ', ' ', '\n', '\n', '\r\n', '\t', '# remark', '## doc', '?', '\u00a0'],
];

describe('texts at the edges', () => {
  const holds = (text: string) => {
    const file = parse(text);
    checkTree(file);
    return file;
  };

  it('nothing at all, white space, comments', () => {
    for (const text of ['', ' ', '\n\n', '# a remark', '## a remark\n', '\ufeff', '\r\n'])
      assert.equal(holds(text).items.length, 0);
  });

  it('no newline at the end', () => {
    assert.equal(printTree(holds('let a = 3 mm')), '(let a 3mm)');
    assert.equal(printTree(holds('let a = 3 mm # remark')), '(let a 3mm)');
  });

  it('line ends of other systems', () => {
    const text = 'tube a {\n  bore = 40 mm # wide\n  length = 1 m\n}\nlet b = 3 mm\n';
    assert.equal(printTree(holds(text.replaceAll('\n', '\r\n'))), printTree(holds(text)));
  });

  it('a byte order mark', () => {
    assert.equal(printTree(holds('\ufefflet a = 3 mm\n')), '(let a 3mm)');
  });

  it('characters that are none', () => {
    for (const text of ['let a = \0', 'let \ud800 = 3', 'let a = "\udc00"', '\0\0\0', 'let a = 3 mm\0']) holds(text);
  });

  it('a declaration beside each of them', () => {
    for (const bad of ['\0', '\ud800', '(((', '"', '{', '???', '= 3', '->']) {
      assert.equal(
        printTree(holds(`${bad}\nlet b = 2 mm`))
          .split('\n')
          .at(-1),
        '(let b 2mm)',
        bad,
      );
    }
  });

  it('a line of a million characters', () => {
    holds(`let a = ${'1 + '.repeat(250_000)}1`);
    holds(`let ${'a'.repeat(1_000_000)} = 1`);
    holds(`let a = "${'x'.repeat(1_000_000)}"`);
    holds('x '.repeat(500_000));
  });
});

describe('nesting', () => {
  const DEPTH = 100_000;

  for (const [what, text] of [
    ['parentheses', `let a = ${'('.repeat(DEPTH)}1${')'.repeat(DEPTH)}`],
    ['parentheses that are not closed', `let a = ${'('.repeat(DEPTH)}`],
    ['signs', `let a = ${'-'.repeat(DEPTH)}1`],
    ['calls', `let a = ${'abs('.repeat(DEPTH)}1`],
    ['brackets', `let a = ${'['.repeat(DEPTH)}`],
    ['braces', `tube a ${'{'.repeat(DEPTH)}`],
    ['powers', `let a = ${'2 ^ '.repeat(DEPTH)}2`],
    ['not', `require ${'not '.repeat(DEPTH)}1`],
    ['routes', `line a = ${'('.repeat(DEPTH)}b`],
    ['units', `let a = 3 ${'('.repeat(DEPTH)}m`],
  ] as const) {
    it(`a hundred thousand ${what} end with their declaration`, () => {
      const file = parse(`${text}\nlet b = 2 mm\n`);
      assert.equal(file.items.length, 2);
      const [, after] = file.items;
      assert.equal(printTree(after!.declaration), '(let b 2mm)');
    });
  }

  it('a hundred deep is read', () => {
    const file = parse(`let a = ${'('.repeat(100)}1${')'.repeat(100)}`);
    checkTree(file);
    assert.ok(!printTree(file).includes('junk'));
  });
});
