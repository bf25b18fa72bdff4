import assert from 'node:assert/strict';
import fc from 'fast-check';
import { format } from '../../server/src/features/format/format';
import { canonicalUnit } from '../../server/src/features/format/formatSpacing';
import { applyEdits } from '../../server/src/features/textEdit';
import { tokensOf } from '../../server/src/features/tokens';
import { parse } from '../../server/src/syntax/parse';
import { analyse } from '../support/analyse';
import { samples } from './samples';

function check(before: string, after: string): void {
  assert.equal(formatted(before), after);
  assert.equal(formatted(after), after, 'a second time');
}

function formatted(text: string, range?: { start: number; end: number }): string {
  return applyEdits(text, format(text, range ? { range } : {}));
}

/** What a text consists of, but for white space and the spelling of units. */
function content(text: string): readonly string[] {
  const { items } = parse(text);
  let at = 0;
  const found: string[] = [];
  const comments = (to: number) => {
    found.push(...(text.slice(at, to).match(/#[^\r\n]*/g) ?? []).map((comment) => comment.trimEnd()));
  };
  for (const { offset, text: own, declaration } of items) {
    comments(offset);
    for (const token of tokensOf(declaration, own)) {
      if (token.kind === 'unit') found.push(canonicalUnit(token.text));
      else if (token.text === '+-') found.push('±');
      else found.push(token.kind === 'comment' || token.kind === 'junk' ? token.text.trimEnd() : token.text);
    }
    at = offset + own.length;
  }
  comments(text.length);
  return found;
}

/** What the declarations give, without what names the text itself. */
function outcomes(text: string): unknown {
  const analysis = analyse(text);
  return analysis.declared.map((declared) => plain(analysis.outcome(declared)));
}

function plain(value: unknown): unknown {
  if (value instanceof Map) return [...value].map(([key, each]) => [stem(key), plain(each)]);
  if (Array.isArray(value)) return value.map(plain);
  if (typeof value !== 'object' || value === null) return value;
  const kept = Object.entries(value).filter(([key]) => key !== 'relation' && key !== 'parts' && key !== 'unit');
  return Object.fromEntries(kept.map(([key, each]) => [key, plain(each)]));
}

/** A nameless declaration is known by its text, which formatting changes. */
function stem(key: unknown): unknown {
  return typeof key === 'string' && key.includes('#') ? key.slice(0, key.indexOf('#')) : key;
}

function holdsFor(text: string): void {
  const after = formatted(text);
  assert.deepEqual(content(after), content(text));
  assert.equal(formatted(after), after, 'a second time');
}

describe('format', () => {
  it('spaces', () => {
    check('let  a=1', 'let a = 1\n');
    check('let a = ( 1+2 )*-3 ', 'let a = (1 + 2) * -3\n');
    check('let a = + -3 - - 2', 'let a = + -3 - -2\n');
    check('let a = d ^ 2 + r^-1', 'let a = d^2 + r^-1\n');
    check('let a = 5 mm ^2', 'let a = 5 mm ^ 2\n');
    check('let a = 20 L/4 s', 'let a = 20 L / 4 s\n');
    check('let a = max( b ,c)', 'let a = max(b, c)\n');
    check('let a = [1 mbar:2 L/s,3 mbar :4 L/s]', 'let a = [1 mbar: 2 L/s, 3 mbar: 4 L/s]\n');
    check('line l=a->(b&c)', 'line l = a -> (b & c)\n');
    check('require a.regime  is  not molecular', 'require a.regime is not molecular\n');
    check('tube t{bore=1 mm,length=2 m}', 'tube t { bore = 1 mm, length = 2 m }\n');
    check('tube t{ }', 'tube t {}\n');
    check(
      'sweep s { vary t.bore=1 mm..2 mm in 5 log steps }',
      'sweep s { vary t.bore = 1 mm .. 2 mm in 5 log steps }\n',
    );
  });

  it('units and tolerances, never numbers', () => {
    check('let a = 1_200.50E+03um +-5%', 'let a = 1_200.50E+03 µm ± 5 %\n');
    check('let a = 2e-8 mbar*l/s/cm2', 'let a = 2e-8 mbar·L/(s·cm²)\n');
    check('let a = 21degC+-2K', 'let a = 21 °C ± 2 K\n');
    check('let a = 90 deg', 'let a = 90°\n');
    check('let a = 5in in  mm', 'let a = 5 in in mm\n');
    check('let a = 5 furlong', 'let a = 5 furlong\n');
    check('display pressure in mbar,throughput in mbar*l/s', 'display pressure in mbar, throughput in mbar·L/s\n');
  });

  it('lines', () => {
    check('\n\nlet a = 1\n\n\n\nlet b = 2  \n\n', 'let a = 1\n\nlet b = 2\n');
    check('let a = 1\r\n\r\n\r\nlet b=2', 'let a = 1\r\n\r\nlet b = 2\r\n');
    check('tube t {\nbore = 1 mm;\n    length = 2 m\n  }', 'tube t {\n  bore = 1 mm;\n  length = 2 m\n}\n');
    check('tube t\n  {\n bore = 1 mm }', 'tube t\n{\n  bore = 1 mm }\n');
    check(
      'pump p {\nspeed = [\n1 mbar: 2 L/s,\n2 mbar: 3 L/s\n]\n}',
      'pump p {\n  speed = [\n    1 mbar: 2 L/s,\n    2 mbar: 3 L/s\n  ]\n}\n',
    );
    check('let a = (1 +\n2)', 'let a = (1 +\n  2)\n');
    check('require a > 1\nbecause "b"', 'require a > 1\n  because "b"\n');
    check('\uFEFF  let a = 1', '\uFEFFlet a = 1\n');
    check('', '');
    check(' \n ', '');
  });

  it('keeps columns that are there', () => {
    check('tube t {\n  bore   = 1 mm\n  length = 2 m\n}\n', 'tube t {\n  bore   = 1 mm\n  length = 2 m\n}\n');
    check('tube t {\n bore  =1 mm\n length=2 m\n}\n', 'tube t {\n  bore   = 1 mm\n  length = 2 m\n}\n');
    check('tube t {\n bore =1 mm\n  length=2 m\n}\n', 'tube t {\n  bore = 1 mm\n  length = 2 m\n}\n');
    check('tube t { bore   = 1 mm, length = 2 m }\n', 'tube t { bore = 1 mm, length = 2 m }\n');
    check('tube t {\n  bore     = 1 mm\n}\n', 'tube t {\n  bore = 1 mm\n}\n');
  });

  it('comments', () => {
    check('let a = 1 # b  ', 'let a = 1  # b\n');
    check('let a=1      # b\nlet cc = 2   # d\n', 'let a = 1    # b\nlet cc = 2   # d\n');
    check('let a = 1 # b\nlet cc = 2 # d\n', 'let a = 1  # b\nlet cc = 2  # d\n');
    check('  # a\n   ##  b\nlet a = 1', '# a\n##  b\nlet a = 1\n');
    check('tube t {  # a\n# b\nbore = 1 mm # c\n# d\n}', 'tube t {  # a\n  # b\n  bore = 1 mm  # c\n  # d\n}\n');
    check('let a = (1 + # b\n# c\n2)', 'let a = (1 +  # b\n  # c\n  2)\n');
    check('require a > 1\n# b\nbecause "c"', 'require a > 1\n  # b\n  because "c"\n');
  });

  it('leaves a declaration with an error as it is', () => {
    for (const broken of [
      'let   a =',
      'tube  t {\n bore=1 mm',
      'let  a = (1',
      'let  a=1,5 mm',
      'line  l=(a->b',
      'what  = 5',
      'let  a = 1 2',
    ]) {
      check(`let b=1\n${broken}\n`, `let b = 1\n${broken}\n`);
    }
  });

  it('formats the lines of a range', () => {
    const text = 'let a=1\nlet b=2  \nlet c=3\n';
    assert.equal(formatted(text, { start: 10, end: 10 }), 'let a=1\nlet b = 2\nlet c=3\n');
    const block = 'tube t {\nbore=1 mm  \n  \n}\n';
    const newLine = block.indexOf('\n', 9);
    assert.equal(formatted(block, { start: newLine, end: newLine }), 'tube t {\n  bore = 1 mm\n  \n}\n');
  });

  for (const [name, text] of samples) {
    it(`keeps content and results of ${name}`, () => {
      holdsFor(text);
      assert.deepEqual(outcomes(formatted(text)), outcomes(text));
    });
  }

  it('keeps the content of texts that are changed at random', () => {
    const pieces = [
      '{',
      '}',
      '(',
      ')',
      '[',
      ']',
      '\n',
      '\r\n',
      ' ',
      '  ',
      '\t',
      '#',
      '# x',
      '"',
      ',',
      ';',
      '=',
      '^',
      '-',
      '+',
      '+-',
    ];
    const words = [
      '->',
      '±',
      '..',
      'in',
      'let',
      'um',
      '1',
      '1,5',
      '°',
      '/',
      '\uFEFF',
      '\u00A0',
      '.',
      ':',
      'mm^2',
      'of',
      '\r',
    ];
    const change = fc.record({
      at: fc.double({ min: 0, max: 1, noNaN: true }),
      remove: fc.nat(6),
      insert: fc.constantFrom('', ...pieces, ...words),
    });
    const text = fc.constantFrom(...samples.map(([, sample]) => sample));
    fc.assert(
      fc.property(text, fc.array(change, { minLength: 1, maxLength: 8 }), (sample, changes) => {
        const changed = changes.reduce((before, { at, remove, insert }) => {
          const start = Math.floor(at * before.length);
          return before.slice(0, start) + insert + before.slice(start + remove);
        }, sample);
        holdsFor(changed);
        const after = formatted(changed);
        assert.deepEqual(outcomes(after), outcomes(changed));
      }),
      { numRuns: 150 },
    );
  });

  it('keeps the content of texts that lose or gain white space', () => {
    const text = fc.constantFrom(...samples.map(([, sample]) => sample));
    fc.assert(
      fc.property(text, fc.infiniteStream(fc.nat(9)), (sample, draws) => {
        const changed = sample.replace(/[ \n]|(?<=[-+*/^=,:])/g, (space) => {
          const draw = Number(draws.next().value);
          return draw < 2 ? '' : draw < 4 ? ' ' : draw < 5 ? '   ' : draw < 6 ? `${space}\n` : space;
        });
        holdsFor(changed);
      }),
      { numRuns: 150 },
    );
  });
});
