import fc from 'fast-check';
import { hover } from '../../server/src/features/hover/hover';
import { inlayHints } from '../../server/src/features/inlayHints';
import { speciesList } from '../../server/src/physics/species/list';
import { allSpellings } from '../../server/src/quantities/unitSpellings';
import { kinds } from '../../server/src/model/kinds/list';
import { analyse } from '../support/analyse';
import { checkProblems } from '../support/analysisInvariants';

/** Random records: well formed for the most part, with values from the impossible to the usual. */
const number = fc.oneof(
  fc.constantFrom('0', '1', '-1', '1e-300', '1e300', '1e400', '5', '20', '1_000', '2,5', '0.0', '.5', '99.9', '273.15'),
  fc.double({ noNaN: true, noDefaultInfinity: true }).map((value) => String(value)),
  fc.integer({ min: 0, max: 100 }).map(String),
);
const unit = fc.oneof(
  fc.constantFrom(
    'mbar',
    'Pa',
    'K',
    '°C',
    '°F',
    'mm',
    'm',
    'sccm',
    '%',
    'ppm',
    'barg',
    'psig',
    'mbar·L/s',
    '1/m³',
    'kg/m³',
    'g',
    '',
  ),
  fc.constantFrom(...allSpellings.map(({ text }) => text)),
  fc.constantFrom('furlong', 'm^24', 'm^25', 'K^-1', 'mbar·/s', '°C/h', 'm/s/s', '1/1', '(m', 'µ'),
);
const literal = fc.tuple(number, unit).map(([n, u]) => (u === '' ? n : `${n} ${u}`));
const name = fc.constantFrom('a', 'b', 'c', 'd', 's', 't', 'f', 'h', 'g', 'N2', 'air', 'const', 'x');
const path = fc.oneof(
  name,
  fc
    .tuple(name, fc.constantFrom('pressure', 'bore', 'knudsen', 'regime', 'N2', 'mole_fraction', 'k', 'u', 'nothing'))
    .map((p) => p.join('.')),
);
const expression = fc.letrec<{ expression: string }>((tie) => ({
  expression: fc.oneof(
    { maxDepth: 3, depthSize: 'small' },
    literal,
    path,
    fc.tuple(literal, literal).map(([v, w]) => `${v} ± ${w}`),
    fc
      .tuple(
        tie('expression'),
        fc.constantFrom('+', '-', '*', '/', '^', '<', '>=', '==', 'and', 'or'),
        tie('expression'),
      )
      .map((p) => p.join(' ')),
    fc
      .tuple(fc.constantFrom('-', 'not ', '('), tie('expression'))
      .map(([sign, e]) => (sign === '(' ? `(${e})` : sign + e)),
    fc
      .tuple(
        fc.constantFrom('sqrt', 'exp', 'ln', 'log10', 'max', 'round', 'tan', 'a'),
        fc.array(tie('expression'), { maxLength: 2 }),
      )
      .map(([f, list]) => `${f}(${list.join(', ')})`),
    fc.tuple(tie('expression'), unit).map(([e, u]) => `${e} in ${u}`),
    fc.tuple(tie('expression'), literal, literal).map(([e, l, h]) => `${e} within ${l} of ${h}`),
    fc.tuple(tie('expression'), literal, literal).map(([e, l, h]) => `${e} between ${l} and ${h}`),
    fc
      .array(fc.tuple(literal, literal), { maxLength: 3 })
      .map((rows) => `[${rows.map((row) => row.join(': ')).join(', ')}]`),
  ),
})).expression;
const gas = fc.oneof(name, fc.constantFrom(...speciesList.map(({ formula }) => formula)));
const mixture = fc
  .array(fc.tuple(gas, fc.oneof(literal, fc.constant('balance'), fc.constant(''))), { minLength: 1, maxLength: 4 })
  .map((parts) => parts.map((part) => part.join(' ')).join(' + '));
const thing = fc.constantFrom(...kinds).chain(({ word, keys, heads }) =>
  fc
    .tuple(
      name,
      fc.array(fc.tuple(fc.constantFrom(...keys.map((key) => key.name), 'odd'), expression), { maxLength: 4 }),
      heads.length > 0
        ? fc.tuple(fc.constantFrom(...heads.map((head) => head.relation)), mixture)
        : fc.constant(undefined),
    )
    .map(([own, entries, head]) => {
      const block = entries.map((entry) => entry.join(' = ')).join(', ');
      return `${word} ${own} ${head ? `${head.join(' ')} ` : ''}{ ${block} }`;
    }),
);
const declaration = fc.oneof(
  fc.tuple(name, expression).map(([n, e]) => `let ${n} = ${e}`),
  fc.tuple(name, mixture).map(([n, m]) => `gas ${n} = ${m}`),
  { arbitrary: thing, weight: 3 },
  fc.tuple(gas, literal, literal).map(([g, p, t]) => `state s of ${g} { pressure = ${p}, temperature = ${t} }`),
  fc.tuple(literal, literal).map(([d, l]) => `tube f { bore = ${d}, length = ${l} }`),
  fc.constant('site h = s in f'),
  fc.tuple(fc.constantFrom('require', 'prefer'), expression).map((p) => p.join(' ')),
  fc
    .tuple(
      fc.constantFrom('ambient_pressure', 'standard_temperature', 'site_density', 'regime_limits', 'odd'),
      expression,
    )
    .map(([c, e]) => `assume ${c} = ${e}`),
  fc.tuple(fc.constantFrom('pressure', 'length', 'temperature', 'odd'), unit).map(([q, u]) => `display ${q} in ${u}`),
);
const record = fc.array(declaration, { maxLength: 7 }).map((lines) => lines.join('\n'));

describe('random records', () => {
  it('never break the analysis or its messages', () => {
    fc.assert(
      fc.property(record, (text) => checkProblems(analyse(text))),
      { numRuns: 2500 },
    );
  });

  it('never break hovers and hints', () => {
    fc.assert(
      fc.property(record, (text) => {
        const analysis = analyse(text);
        for (let offset = 0; offset <= text.length; offset += 3)
          checkText(text, hover(analysis, offset, { detail: 'full' })?.markdown);
        const hints = inlayHints(analysis, { start: 0, end: text.length }, { enabled: 'all', figures: {}, digits: 4 });
        for (const { label, tooltip } of hints) checkText(text, `${label} ${tooltip}`);
      }),
      { numRuns: 300 },
    );
  });

  it('never break it by any characters', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 80 }), (text) => checkProblems(analyse(text))),
      { numRuns: 1000 },
    );
  });
});

function checkText(source: string, shown = ''): void {
  if (/\bNaN\b|\bInfinity\b|\bundefined\b|\[object /.test(shown)) throw new Error(`${source} shows ${shown}`);
}
