import fc from 'fast-check';
import { edited } from '../support/edited';

/** Lines that speak of each other in every way the format has, right and wrong. */
const LINES = [
  ...[
    'let a = 3 mm',
    'let a = 4 mm ± 1 mm',
    'let a = b',
    'let b = a * 2',
    'let b = 2 * c',
    'let c = a + b',
    'let c = aa + 1 mm',
  ],
  ...[
    'let aa = 1 mm',
    'let bb = c',
    'let a = 3 furlong',
    'let b = 20 °C',
    'let c = a in cm',
    'let d = 5 sccm',
    'let d = 1 barg',
  ],
  ...[
    'assume standard_temperature = 20 °C',
    'assume standard_temperature = t',
    'let t = 25 °C',
    'let t = d * 1 K / (1 mol/s)',
  ],
  ...[
    'assume ambient_pressure = 950 mbar',
    'display length in in',
    'display length in mm',
    'use "shop.gas"',
    'use "none.gas"',
  ],
  ...['gas g = Ar 95 % + O2 5 %', 'gas g = Ar 90 % + x 10 %', 'gas x = He', 'gas air = N2', 'gas x = g'],
  ...[
    'state s of g { pressure = 1 mbar, temperature = t }',
    'state s of air { pressure = p, temperature = 20 °C }',
    'let p = 1 mbar',
  ],
  ...[
    'state w from s { temperature = 80 °C }',
    'tube f { bore = a, length = 1 m }',
    'site h = s in f',
    'orifice f { area = 3 mm² }',
  ],
  ...[
    'require h.knudsen > 1',
    'require a > 2 mm',
    'prefer h.regime is molecular',
    'require f.bore > b',
    'let k = [a: 1, b: 2]',
    'let y = k(c)',
  ],
  ...['let broken = (', 'tube f {', '}', '# remark', '## documentation', '', 'let p = shop', 'nonsense here'],
];

describe('edits in any order', () => {
  it('leave the analysis that a fresh look has', () => {
    const line = fc.constantFrom(...LINES);
    const edit = fc.record({ at: fc.nat(11), line, action: fc.constantFrom('insert', 'replace', 'remove', 'shop') });
    fc.assert(
      fc.property(fc.array(line, { maxLength: 10 }), fc.array(edit, { maxLength: 12 }), (start, edits) => {
        const lines = [...start];
        const document = edited(lines.join('\n'), { 'shop.gas': 'let shop = 3 mbar\nlet a = 7 mm' });
        for (const { at, line: text, action } of edits) {
          if (action === 'shop') {
            document.rewriteFile('shop.gas', `use "test.gas"\nlet shop = 3 mbar\n${text}`);
            continue;
          }
          lines.splice(at, action === 'insert' ? 0 : 1, ...(action === 'remove' ? [] : [text]));
          document.rewrite(lines.join('\n'));
        }
      }),
      { numRuns: 300 },
    );
  });
});
