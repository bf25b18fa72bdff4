import assert from 'node:assert/strict';
import { describe, it } from 'mocha';
import type { CodeAction } from '../../server/src/features/codeActions';
import { codeActions, fixAll } from '../../server/src/features/codeActions';
import type { TextEdit } from '../../server/src/features/textEdit';
import type { Analysis } from '../../server/src/model/analysis';
import { analyse, cursor } from '../support/analyse';
import { samples } from './samples';

describe('quick fixes', () => {
  it('come from the problems that the range touches', () => {
    check('tube t { bore = 4 cm, lenght<*> = 1 m }', 'Change to length', 'tube t { bore = 4 cm, length = 1 m }');
    check('let a = 1,<*>5', 'Write 1.5', 'let a = 1.5');
    none('tube t<*> { bore = 4 cm, lenght = 1 m }', 'Change to length');
  });

  it('carry the code of their problem and say which one is meant', () => {
    const found = actions('tube t { bore = 4 cm, lenght<*> = 1 m }').find(({ title }) => title === 'Change to length');
    assert.deepEqual([found?.kind, found?.code, found?.preferred], ['quickfix', 'unknown-key', true]);
  });

  it('remove a declaration that nothing uses, with its documentation', () => {
    const rest = 'let used = 3 mm\nrequire used > 1 mm\n';
    check(`let spare<*> = 1 mm\n${rest}`, 'Remove spare', rest);
    check(`# kept\n\n## About it,\n## at length.\nlet spare<*> = 1 mm  \n${rest}`, 'Remove spare', `# kept\n\n${rest}`);
    check(`${rest}let spare<*> = 1 mm`, 'Remove spare', rest);
    check(`let spare<*> = 1 mm # why\n${rest}`, 'Remove spare', ` # why\n${rest}`);
    none('let us<*>ed = 3 mm\nrequire used > 1 mm', 'Remove used');
  });

  it('are all made at once, where they do not meet', () => {
    const text = 'state s of N2 { presure = 1 mbar, temperature = 300 K }\ntube t { bore = 4 cm, lenght = 1 m }\n';
    const fixed = 'state s of N2 { pressure = 1 mbar, temperature = 300 K }\ntube t { bore = 4 cm, length = 1 m }\n';
    assert.equal(apply(text, fixAll(analyse(text))), fixed);
    assert.deepEqual(fixAll(analyse(fixed)), []);
    const unused = 'let spare = 1 mm\nrequire 1 mm > 0 mm\n';
    assert.deepEqual(fixAll(analyse(unused)), []);
  });
});

describe('converting a number', () => {
  it('writes it in the other usual units of its kind, exactly and shortly', () => {
    // Factors: NIST SP 811 (2008), appendix B.8; the inch is 25.4 mm.
    check('tube t { bore = 40<*> mm, length = 1 m }', 'Convert to 0.04 m', 'tube t { bore = 0.04 m, length = 1 m }');
    check('let a = 3e-3 mb<*>ar', 'Convert to 0.3 Pa', 'let a = 0.3 Pa');
    check('let a = <*>1 atm', 'Convert to 760 Torr', 'let a = 760 Torr');
    check('let a = <*>1 in', 'Convert to 25.4 mm', 'let a = 25.4 mm');
    check('let a = <*>90°', 'Convert to 1.570796327 rad', 'let a = 1.570796327 rad');
    check('let a = <*>1 bar', 'Convert to 1e5 Pa', 'let a = 1e5 Pa');
    check('let a = <*>36 m³/h', 'Convert to 10 L/s', 'let a = 10 L/s');
  });

  it('takes the half-width along where that has a unit of its own', () => {
    check('let a = 4<*>0 mm ± 0.1 mm', 'Convert to 0.04 m ± 1e-4 m', 'let a = 0.04 m ± 1e-4 m');
    check('let a = <*>3 mbar ± 10 %', 'Convert to 300 Pa', 'let a = 300 Pa ± 10 %');
    check('let a = 40 mm ± 0.1<*> mm', 'Convert to 100 µm', 'let a = 40 mm ± 100 µm');
    check('let a = 1<*> % ± 0.1 %', 'Convert to 10000 ppm ± 1000 ppm', 'let a = 10000 ppm ± 1000 ppm');
    check('let a = [40 mm ± 0.1 mm]<*>', 'Convert to 0.04 m ± 1e-4 m', 'let a = 0.04 m ± 1e-4 m', 'selection');
  });

  it('reads a temperature on its scale, sign included', () => {
    // 0 °C is 273.15 K; °F = 1.8 °C + 32 (SI Brochure 2.3.1, NIST SP 811 B.8).
    check('let a = 20 °C<*> ± 2 K', 'Convert to 293.15 K ± 2 K', 'let a = 293.15 K ± 2 K');
    check('let a = -40<*> °C', 'Convert to -40 °F', 'let a = -40 °F');
    check('let a = -5<*> °C ± 1 K', 'Convert to 268.15 K ± 1 K', 'let a = 268.15 K ± 1 K');
    check('let a = 77<*> K', 'Convert to -196.15 °C', 'let a = -196.15 °C');
  });

  it('leaves alone what would change its meaning', () => {
    none('let a = 300 K + 5<*> K', /°C|°F/);
    none('let a = 300 K - 5<*> °C', /Convert/);
    none('let a = 20 °C<*> ± 5 %', /Convert/);
    none('let a = 300 K<*> ± 5 %', /°C/);
    none('let a = 5<*>', /Convert/);
    none('let a = 5<*> mbarr', /Convert/);
    none('let a = 1e308<*> km', /Infinity/);
  });

  it('makes a gauge pressure absolute with the ambient one', () => {
    check(
      'assume ambient_pressure = 1 bar\nlet a = 1.5<*> barg',
      'Convert to 2500 mbar',
      'assume ambient_pressure = 1 bar\nlet a = 2500 mbar',
    );
  });

  it('converts standard flows at the reference of the file', () => {
    // ṅ = p V̇ / (R T): 1 slm at 0 °C and 101 325 Pa is 7.435e-4 mol/s (CODATA 2018 R, ideal gas).
    const mol = actions('let a = 1<*> slm').find(({ title }) => title.endsWith('mol/s'));
    assert.match(mol?.title ?? '', /^Convert to 7\.4358\d*e-4 mol\/s$/);
    const warm = actions('assume standard_temperature = 20 °C\nlet a = 1<*> slm').find(({ title }) =>
      title.endsWith('mol/s'),
    );
    assert.match(warm?.title ?? '', /^Convert to 6\.9285\d*e-4 mol\/s$/);
  });

  it('comes back to where it started', () => {
    for (const [there, start] of [
      ['Torr', '3e-3 mbar'],
      ['in', '40 mm'],
      ['°F', '21.5 °C'],
      ['m³/h', '7 L/s'],
    ] as const) {
      const converted = applied(`let a = <*>${start}`, new RegExp(` ${there}$`));
      const unit = start.slice(start.indexOf(' '));
      const back = applied(converted.replace('= ', '= <*>'), new RegExp(`${unit}$`));
      assert.equal(Number(/= (\S+)/.exec(back)?.[1]), Number(start.split(' ')[0]));
    }
  });
});

describe('extracting a value', () => {
  it('names it after its key, above the declaration and its documentation', () => {
    check(
      'let a = 1 mm\n## The line.\ntube t {\n  bore = 4<*>0 mm ± 0.1 mm\n  length = 1 m\n}',
      'Extract to let bore',
      'let a = 1 mm\nlet bore = 40 mm ± 0.1 mm\n## The line.\ntube t {\n  bore = bore\n  length = 1 m\n}',
    );
    check(
      'state s of N2 { temperature = -5<*> °C ± 1 K }',
      'Extract to let temperature',
      'let temperature = -5 °C ± 1 K\nstate s of N2 { temperature = temperature }',
    );
  });

  it('finds a name that is free', () => {
    check(
      'let bore = 1 mm\ntube t { bore = 4<*> mm }',
      'Extract to let t_bore',
      'let bore = 1 mm\nlet t_bore = 4 mm\ntube t { bore = t_bore }',
    );
    check(
      'let bore = 1 mm\nlet t_bore = 2 mm\ntube t { bore = 4<*> mm }',
      'Extract to let t_bore_2',
      'let bore = 1 mm\nlet t_bore = 2 mm\nlet t_bore_2 = 4 mm\ntube t { bore = t_bore_2 }',
    );
    check(
      'pumpdown p of s { from = 1<*> atm }',
      'Extract to let p_from',
      'let p_from = 1 atm\npumpdown p of s { from = p_from }',
    );
  });

  it('takes what is selected', () => {
    check(
      'tube t { bore = 2 * [(1 mm + 2 mm)] }<*>',
      'Extract to let bore',
      'let bore = (1 mm + 2 mm)\ntube t { bore = 2 * bore }',
      'selection',
    );
    check(
      'require [t.volume] > 2 L<*>',
      'Extract to let t_volume',
      'let t_volume = t.volume\nrequire t_volume > 2 L',
      'selection',
    );
    check(
      'require t.volume > 2 <*>L',
      'Extract to let volume_limit',
      'let volume_limit = 2 L\nrequire t.volume > volume_limit',
    );
    check(
      'let a = 3 * [sqrt(4 mm²)]<*>',
      'Extract to let value',
      'let value = sqrt(4 mm²)\nlet a = 3 * value',
      'selection',
    );
  });

  it('keeps an expression of several lines together', () => {
    check(
      'tube t { bore = max([1 mm +\n  2 mm], 3 mm) }<*>',
      'Extract to let bore',
      'let bore = (1 mm +\n  2 mm)\ntube t { bore = max(bore, 3 mm) }',
      'selection',
    );
  });

  it('ends its line as the file does', () => {
    check(
      'tube t {\r\n  bore = 4<*> mm\r\n}',
      'Extract to let bore',
      'let bore = 4 mm\r\ntube t {\r\n  bore = bore\r\n}',
    );
  });

  it('stands before its declaration where two share a line', () => {
    check(
      'tube a { bore = 1 mm } tube t { bore = 4<*> mm }',
      'Extract to let bore',
      'tube a { bore = 1 mm } let bore = 4 mm\ntube t { bore = bore }',
    );
  });

  it('leaves alone what has a name, is no value or would change its meaning', () => {
    none('let a = 4<*> mm', /Extract/);
    none('tube t { bore = si<*>ze }', /Extract/);
    none('let a = 300 K - 5 °C<*>', /Extract/);
    none('gas g = Ar 95<*> % + O2 5 %', /Extract/);
    none('require 3<*> <', /Extract to let .*>/);
  });
});

describe('inlining a value', () => {
  it('writes the value in the place of the name', () => {
    check('let a = 3 mm\ntube t { bore = <*>a }', 'Inline a', 'let a = 3 mm\ntube t { bore = 3 mm }');
    check('let a = t.volume\nrequire <*>a > 2 L', 'Inline a', 'let a = t.volume\nrequire t.volume > 2 L');
    check('let a = t\nlet b = <*>a.volume', 'Inline a', 'let a = t\nlet b = t.volume');
  });

  it('puts parentheses where it would be read otherwise', () => {
    const sum = 'let a = 1 mm + 2 mm\n';
    check(`${sum}let b = 3 * <*>a`, 'Inline a', `${sum}let b = 3 * (1 mm + 2 mm)`);
    check(`${sum}let b = <*>a + 3 mm`, 'Inline a', `${sum}let b = 1 mm + 2 mm + 3 mm`);
    check(`${sum}let b = 3 mm - <*>a`, 'Inline a', `${sum}let b = 3 mm - (1 mm + 2 mm)`);
    check(`${sum}let b = max(<*>a, 3 mm)`, 'Inline a', `${sum}let b = max(1 mm + 2 mm, 3 mm)`);
    check(`${sum}require <*>a > 2 mm`, 'Inline a', `${sum}require 1 mm + 2 mm > 2 mm`);
    check('let a = 3 mm\nlet b = <*>a^2', 'Inline a', 'let a = 3 mm\nlet b = (3 mm)^2');
    check('let a = 3\nlet b = 2^<*>a', 'Inline a', 'let a = 3\nlet b = 2^3');
    check('let a = 3 mm\nlet b = <*>a in m', 'Inline a', 'let a = 3 mm\nlet b = (3 mm) in m');
    check('let a = 4 m / 2\nlet b = 8 m / <*>a', 'Inline a', 'let a = 4 m / 2\nlet b = 8 m / (4 m / 2)');
  });

  it('says so where a tolerance would count as another one', () => {
    const two = 'let a = 3 mm ± 1 mm\nlet b = a\n';
    check(`${two}let c = <*>a`, 'Inline a, its tolerance independent here', `${two}let c = 3 mm ± 1 mm`);
    check('let a = 3 mm ± 1 mm\nlet c = <*>a', 'Inline a', 'let a = 3 mm ± 1 mm\nlet c = 3 mm ± 1 mm');
  });

  it('keeps the value of what it goes into', () => {
    for (const [value, use] of [
      ['1 mm + 2 mm', '5 mm - a'],
      ['2 mm ± 1 mm', '3 * a'],
      ['3 mm', 'a / 2 mm'],
      ['-2', 'a^2'],
      ['-2 mm', '3 mm - a'],
      ['4 m / 2', 'a / a'],
    ] as const) {
      const text = `let a = ${value}\nlet b = ${use}`;
      const after = applied(text.replace(/a(?=[^a]*$)/, '<*>a'), /^Inline/);
      assert.deepEqual(siOf(analyse(after)), siOf(analyse(text)), after);
    }
  });

  it('leaves alone what would change its meaning', () => {
    none('let a = 20 °C\nlet b = <*>a + 5 K', /Inline/);
    none('let a = [1 mbar: 2 L/s, 2 mbar: 3 L/s]\nlet b = <*>a(1 mbar)', /Inline/);
    none('let a<*> = 3 mm\nlet b = a', /Inline/);
    none('state s of N2 { pressure = 1 mbar, temperature = 300 K }\nlet b = <*>s.pressure', /Inline/);
    none('let a = \nlet b = <*>a', /Inline/);
  });
});

describe('code actions anywhere', () => {
  it('have edits within the text that do not meet, at every place of a text and of its beginnings', function () {
    this.timeout(60_000);
    for (const [, text] of samples) {
      const whole = analyse(text);
      for (let start = 0; start <= text.length; start += 1) {
        for (const end of [start, Math.min(text.length, start + 9)])
          for (const { edits } of codeActions(whole, { start, end })) apply(text, edits);
      }
      for (let end = 0; end <= text.length; end += 7) {
        const begun = text.slice(0, end);
        const analysis = analyse(begun);
        for (const { edits } of codeActions(analysis, { start: end, end })) apply(begun, edits);
        apply(begun, fixAll(analysis));
      }
    }
  });
});

/** The whole text after an action; with `selection`, what stands between [ ] is selected and the mark is ignored. */
function check(marked: string, title: string, expected: string, how: 'cursor' | 'selection' = 'cursor'): void {
  const { text, found } = how === 'cursor' ? at(marked) : selected(marked.replace('<*>', ''));
  const action = found.find((each) => each.title === title);
  assert.ok(action, `“${title}” is not among ${found.map((each) => each.title).join(' · ')}: ${marked}`);
  assert.equal(apply(text, action.edits), expected);
}

function none(marked: string, title: string | RegExp): void {
  const titles = actions(marked).map((each) => each.title);
  assert.deepEqual(
    titles.filter((each) => (typeof title === 'string' ? each === title : title.test(each))),
    [],
    marked,
  );
}

function applied(marked: string, title: RegExp): string {
  const { text, found } = at(marked);
  const action = found.find((each) => title.test(each.title));
  assert.ok(action, `${title.source} is not among ${found.map((each) => each.title).join(' · ')}: ${marked}`);
  return apply(text, action.edits);
}

function actions(marked: string): readonly CodeAction[] {
  return at(marked).found;
}

function at(marked: string): { readonly text: string; readonly found: readonly CodeAction[] } {
  const { text, offset } = cursor(marked);
  return { text, found: codeActions(analyse(text), { start: offset, end: offset }) };
}

function selected(marked: string): { readonly text: string; readonly found: readonly CodeAction[] } {
  const start = marked.indexOf('[');
  const end = marked.indexOf(']') - 1;
  const text = marked.replace('[', '').replace(']', '');
  return { text, found: codeActions(analyse(text), { start, end }) };
}

function apply(text: string, edits: readonly TextEdit[]): string {
  const ordered = [...edits].sort((a, b) => b.start - a.start);
  ordered.forEach(({ start, end }, index) => {
    assert.ok(0 <= start && start <= end && end <= (ordered[index - 1]?.start ?? text.length));
  });
  return ordered.reduce((changed, edit) => changed.slice(0, edit.start) + edit.text + changed.slice(edit.end), text);
}

/** The value of `b`. */
function siOf(analysis: Analysis): number {
  const place = analysis.find('b');
  const outcome = place && analysis.outcome(place.declared);
  assert.ok(outcome?.kind === 'value' && outcome.value.kind === 'quantity');
  return outcome.value.si;
}
