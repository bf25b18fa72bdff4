import assert from 'node:assert/strict';
import { describe, it } from 'mocha';
import { completion } from '../../server/src/features/completion/completion';
import type { CompletionItem } from '../../server/src/features/completion/completionItem';
import { kinds } from '../../server/src/model/kinds/list';
import { statements } from '../../server/src/model/kinds/statements';
import { analyse, cursor } from '../support/analyse';
import { samples } from './samples';

/** What the completions of the tests may name. */
const bench = `let room = 21 °C ± 2 K
let size = 40 mm
gas purge = Ar 95 % + O2 5 %
state residual of purge { pressure = 3e-3 mbar, temperature = room }
tube foreline { bore = size, length = 1.8 m }
particle dust { diameter = 1 µm, density = 2 g/cm³ }
chamber lock { volume = 14 L }
line roughing = foreline
site in_foreline = residual in foreline
`;

describe('completion at the start of a line', () => {
  it('offers every statement and every kind, each as a whole declaration', () => {
    check(
      '<*>',
      [...statements, ...kinds].map(({ word }) => word),
    );
    checkText('st<*>', 'state', kinds.find(({ word }) => word === 'state')?.snippet ?? '');
    check(`${bench}\n<*>\ntube other { bore = 1 mm, length = 1 m }`, { has: ['let', 'state'], not: ['residual'] });
  });

  it('offers the word alone where the line goes on', () => {
    checkText('ste<*> cold of N2 { }', 'state', 'state');
    checkText('<*> x = 3 mm', 'let', 'let');
  });

  it('offers nothing where a new name is to be given', () => {
    for (const marked of ['let <*>', 'state <*>', 'gas <*>', 'tube <*> {', 'site <*>', 'blah <*>', 'use <*>'])
      check(marked, []);
  });

  it('offers what may follow the name', () => {
    check('state cold <*>', ['of', 'from']);
    check('flow bleed <*>', ['through']);
    check('tube wide <*>', []);
  });
});

describe('completion in a block', () => {
  it('offers the missing keys, those first that are needed', () => {
    check('tube t { <*> }', ['bore', 'length', 'roughness', 'accommodation']);
    check('tube t {\n  accommodation = 1\n  length = 1 m\n  <*>\n}', ['bore', 'roughness']);
    check('chamber c { vol<*>', {
      has: ['volume', 'wall_area', 'temperature', 'outgassing'],
      not: ['bore', 'let', 'state'],
    });
  });

  it('offers no input that would be one too many', () => {
    check('state s of N2 {\n  pressure = 1 mbar\n  <*>\n}', {
      has: ['temperature', 'density', 'number_density'],
      not: ['pressure'],
    });
    check('state s of N2 { pressure = 1 mbar, temperature = 300 K, <*> }', ['speed', 'collision_diameter']);
  });

  it('writes the equals sign unless it is there', () => {
    checkText('tube t { bo<*> }', 'bore', 'bore = ');
    checkText('tube t { bo<*> = 3 mm }', 'bore', 'bore');
  });

  it('offers what a system connects and what a sweep does', () => {
    check(`${bench}system s {\n  <*>\n}`, ['foreline', 'lock', 'roughing']);
    check(`${bench}system s {\n  lock -> <*>\n}`, ['foreline', 'lock', 'roughing']);
    check('sweep s { <*> }', ['vary', 'show']);
    check(`${bench}sweep s { vary <*> }`, ['room', 'size', 'residual', 'foreline', 'dust', 'lock']);
    check(`${bench}sweep s { vary foreline.<*> }`, ['bore', 'length']);
    check(`${bench}sweep s { vary foreline.bore = 1 mm .. 9 mm in 25 <*> }`, ['log steps', 'steps']);
  });

  it('offers no keys of a kind there is not', () => {
    check('tueb t { <*> }', []);
  });
});

describe('completion of a value', () => {
  it('offers named values of the right dimension first, with their value', () => {
    checkFirst(`${bench}tube t { bore = <*> }`, ['size', 'residual']);
    checkFirst(`${bench}state s of N2 { temperature = <*> }`, ['room', 'residual']);
    assert.equal(item(`${bench}tube t { bore = <*> }`, 'size').detail, '40.00 mm');
    assert.equal(item(`${bench}state s of N2 { temperature = <*> }`, 'room').detail, '21.0 ± 2.0 °C');
  });

  it('offers records, gases and words where those are wanted', () => {
    check(`${bench}bundle b { of = <*> }`, ['foreline']);
    check(`${bench}conduction c across g { state = <*> }`, ['residual']);
    checkFirst(`${bench}conduction c across g { gas = <*> }`, ['purge', 'H2', 'D2', 'He']);
    check('flow f through l { regime = <*> }', ['viscous', 'slip', 'transitional', 'molecular']);
    checkFirst(`${bench}flow f through roughing { upstream = <*> }`, ['residual']);
    check('chamber c { outgassing = [<*>', { has: ['H2O', 'N2'], not: ['volume'] });
    check('assume regime_limits = [<*>', ['slip', 'transitional', 'molecular']);
  });

  it('offers functions and constants in expressions, fit for what is wanted', () => {
    check(`${bench}let a = <*>`, { has: ['room', 'size', 'residual', 'sqrt', 'exp', 'const'], not: ['a', 'let'] });
    check(`${bench}tube t { bore = <*> }`, { has: ['sqrt', 'max', 'const'], not: ['exp', 'sin'] });
    checkText('let a = sq<*>', 'sqrt', 'sqrt(${1})');
    checkText('let a = sq<*>(4)', 'sqrt', 'sqrt');
    checkFirst(`${bench}let a = max(size, <*>`, ['size']);
    checkFirst(`${bench}let a = 3 K + <*>`, ['room']);
    checkFirst(`${bench}require residual.mean_free_path > <*>`, ['size']);
  });

  it('offers no declaration its own name', () => {
    check('let a = 3 mm\nlet b = <*>', { has: ['a'], not: ['b'] });
  });

  it('offers the names of a used file', () => {
    const { text, offset } = cursor('use "shop.gas"\nlet a = <*>');
    const files = { 'shop.gas': 'let shop_size = 16 mm\n' };
    const items = completion(analyse(text, { files }), offset);
    assert.equal(items.find(({ label }) => label === 'shop_size')?.detail, '16.00 mm');
  });
});

describe('completion of a unit', () => {
  it('offers the units of the key, the usual ones first, with the value converted', () => {
    checkFirst('state s of N2 { pressure = 3 <*> }', ['mbar', 'Pa', 'Torr', 'mTorr', 'bar', 'atm', 'psi']);
    check('state s of N2 { pressure = 3 <*> }', { has: ['psig', 'mmHg'], not: ['mm', 'K'] });
    // 1 mbar is 100 Pa; 1 Torr is 101 325/760 Pa (NIST SP 811, appendix B.8).
    assert.equal(item('state s of N2 { pressure = 3 <*> }', 'mbar').detail, '300.0 Pa');
    assert.equal(item('state s of N2 { pressure = 3 <*> }', 'Torr').detail, '400.0 Pa');
    assert.equal(item('display pressure in Torr\nstate s of N2 { pressure = 1 <*> }', 'atm').detail, '760.0 Torr');
    // 0 °C is 273.15 K (SI Brochure, 2.3.1), with the sign counted in.
    assert.equal(item('state s of N2 { temperature = -10 <*> }', '°C').detail, '263.2 K');
  });

  it('replaces the unit begun, and puts the space where there is none', () => {
    checkText('state s of N2 { pressure = 3 m<*> }', 'mbar', 'mbar', 'm');
    checkText('state s of N2 { pressure = 3<*> }', 'mbar', ' mbar', '');
    checkText('state s of N2 { pressure = 3 mb<*>ar }', 'Pa', 'Pa', 'mbar');
    checkText('let q = 20 mbar·L/<*>', 'mbar·L/s', 'mbar·L/s', 'mbar·L/');
    checkText('bend b { angle = 90<*> }', '°', '°', '');
  });

  it('offers a rarer prefix once it is begun', () => {
    check('state s of N2 { pressure = 3 h<*> }', { has: ['hPa'], not: [] });
    check('state s of N2 { pressure = 3 <*> }', { has: [], not: ['hPa'] });
  });

  it('knows what the other side measures', () => {
    checkFirst(`${bench}require residual.mean_free_path > 3 <*>`, ['mm', 'm', 'µm', 'in']);
    checkFirst(`${bench}let a = size + 3 <*>`, ['mm', 'm']);
    checkFirst(`${bench}require size between 1 mm and 3 <*>`, ['mm', 'm']);
    checkFirst(`${bench}require size within 5 <*>`, ['%', 'ppm']);
    checkFirst(`${bench}require size within 5 % of 3 <*>`, ['mm', 'm']);
    checkFirst(`${bench}sweep s { vary foreline.bore = 16 <*> }`, ['mm', 'm']);
    check(`${bench}let a = residual.temperature in <*>`, { has: ['°C', 'K', '°F'], not: ['mbar'] });
    assert.equal(item(`${bench}let a = size in <*>`, 'µm').detail, '40000 µm');
  });

  it('takes a half-width in the unit of its value or in per cent', () => {
    checkFirst('tube t { bore = 40 mm ± 1 <*> }', ['mm', 'm']);
    check('tube t { bore = 40 mm ± 1 <*> }', { has: ['%'], not: [] });
    check('state s of N2 { temperature = 20 °C ± 2 <*> }', ['K', '°R']);
  });

  it('takes tables, mixtures, conditions and amount flows', () => {
    checkFirst('pump p { speed = [1 <*>', ['mbar', 'Pa']);
    checkFirst('pump p { speed = [1 mbar: 2 <*>', ['L/s', 'm³/h']);
    check('inlet l of air { throughput = 3 <*> }', { has: ['mbar·L/s', 'sccm', 'slm'], not: ['W', 'mm'] });
    checkFirst('gas g = Ar 95 <*>', ['%', 'ppm', 'ppb', 'mbar']);
    check('gas g = Ar 95 % + O2 5 <*>', ['%', 'ppm', 'ppb']);
    checkFirst('assume ambient_pressure = 950 <*>', ['mbar', 'Pa']);
  });

  it('offers all usual units where anything may stand, and none to a plain number', () => {
    check('let a = 3 <*>', { has: ['mm', 'mbar', '°C', 'sccm', '%', 'L/s'], not: [] });
    check(`${bench}require in_foreline.knudsen > 3 <*>`, []);
    check('let a = 1<*>2 mm', []);
  });
});

describe('completion after a point', () => {
  it('offers the results there are, with their value now, those first that an expert asks for', () => {
    checkFirst(`${bench}let a = residual.<*>`, ['mean_free_path', 'number_density', 'pressure', 'temperature']);
    assert.equal(item(`${bench}let a = residual.<*>`, 'temperature').detail, '294.1 ± 2.0 K');
    assert.equal(item(`${bench}let a = in_foreline.<*>`, 'regime').detail, 'transitional');
    check(`${bench}let a = foreline.<*>`, { has: ['volume', 'area', 'transmission_probability'], not: ['knudsen'] });
  });

  it('offers nominal bores where a bore is asked for, and nowhere else', () => {
    check('tube t { bore = <*> }', { has: ['DN40', 'DN63', 'sqrt'], not: ['DN42'] });
    check('tube t { length = <*> }', { has: ['sqrt'], not: ['DN40'] });
  });

  it('offers what fits first', () => {
    checkFirst(`${bench}state s of N2 { temperature = residual.<*> }`, ['temperature']);
    checkFirst(`${bench}require 3 mm < foreline.<*>`, ['bore', 'length']);
  });

  it('offers the species of a mixture, and what each has', () => {
    check(`${bench}let a = residual.<*>`, { has: ['Ar', 'O2'], not: [] });
    check(`${bench}let a = residual.Ar.<*>`, { has: ['partial_pressure', 'mole_fraction'], not: ['Ar', 'O2'] });
    assert.equal(item(`${bench}let a = residual.Ar.<*>`, 'mole_fraction').detail, '95.00 %');
    check('state pure of N2 { pressure = 1 Pa, temperature = 300 K }\nlet a = pure.<*>', {
      has: ['pressure'],
      not: ['N2'],
    });
  });

  it('offers constants with their value', () => {
    check('let a = const.<*>', { has: ['k', 'N_A', 'R', 'c'], not: ['sqrt'] });
    // SI Brochure, 9th edition, table 1.
    assert.equal(item('let a = const.<*>', 'k').detail, '1.38065e-23 J/K');
  });

  it('works on a line that is nothing yet', () => {
    check(`${bench}residual.<*>`, { has: ['pressure', 'Ar'], not: ['let'] });
    check(`${bench}blah residual.Ar.<*>`, { has: ['partial_pressure'], not: ['let'] });
    check(`${bench}require residual.<*>\nlet b = 1 mm`, { has: ['pressure'], not: ['let'] });
  });

  it('offers nothing of what has no results', () => {
    check(`${bench}let a = size.<*>`, []);
    check(`${bench}let a = nothing.<*>`, []);
    check(`${bench}pump dry { speed = 10 L/s }\nlet a = dry.<*>`, []);
  });
});

describe('completion of statements', () => {
  it('offers gases after of, states after from, passages after through', () => {
    checkFirst(`${bench}state s of <*>`, ['purge', 'H2', 'D2', 'He']);
    check('state s of <*>', { has: ['N2', 'nitrogen', 'air', 'carbon_dioxide'], not: ['residual'] });
    assert.equal(item('state s of <*>', 'N2').detail, 'nitrogen');
    assert.match(item('state s of <*>', 'CO').documentation ?? '', /flammable gas.*safety data sheet/);
    check(`${bench}state s from <*>`, ['residual']);
    check(`${bench}flow f through <*>`, ['foreline', 'roughing']);
    check(`${bench}line l = foreline -> <*>`, ['foreline', 'roughing']);
    check(`${bench}pumpdown p of <*>`, []);
  });

  it('offers the states, the words and the geometries of a site', () => {
    check(`${bench}site s = <*>`, ['residual']);
    check(`${bench}site s = residual <*>`, ['in', 'around']);
    check(`${bench}site s = residual in <*>`, ['foreline', 'lock', 'roughing']);
    check(`${bench}site s = residual around <*>`, ['dust']);
  });

  it('offers gases in a mixture, and the balance for an amount', () => {
    check('gas g = Ar 95 % + <*>', { has: ['O2', 'helium'], not: ['balance'] });
    check('let part = 5 %\nlet other = 3 mm\ngas g = Ar <*>', ['balance', 'part']);
  });

  it('offers quantities and their units to display', () => {
    check('display <*>', { has: ['pressure', 'length', 'throughput'], not: ['number'] });
    checkText('display pre<*>', 'pressure', 'pressure in ');
    check('display pressure <*>', ['in']);
    checkFirst('display pressure in <*>', ['mbar', 'Pa', 'Torr']);
    check('display pressure in mbar, <*>', { has: ['length'], not: ['pressure'] });
    checkFirst('display pressure in mbar, throughput in <*>', ['mbar·L/s', 'Torr·L/s']);
  });

  it('offers conditions with what holds otherwise', () => {
    checkText('assume <*>', 'ambient_temperature', 'ambient_temperature = ${1:20 °C}');
    checkText('assume <*>', 'standard_pressure', 'standard_pressure = ${1:1013.25 mbar}');
    checkText('assume am<*> = 3 bar', 'ambient_pressure', 'ambient_pressure');
    check('assume <*>', { has: ['site_density', 'regime_limits'], not: ['pressure'] });
  });

  it('offers the words after is, and says which one it is now', () => {
    check(`${bench}require in_foreline.regime is <*>`, ['viscous', 'slip', 'transitional', 'molecular']);
    assert.equal(item(`${bench}require in_foreline.regime is mol<*>`, 'transitional').detail, 'as it is now');
    check(`${bench}require size is <*>`, []);
  });

  it('offers how a requirement goes on', () => {
    check(`${bench}require size <*>`, ['within', 'between', 'in']);
    check(`${bench}require in_foreline.regime <*>`, ['is']);
    check(`${bench}require size > 3 mm <*>`, ['because', 'and', 'or']);
    check(`${bench}require size within 5 % <*>`, ['of']);
    check(`${bench}require size between 1 mm <*>`, ['and']);
  });
});

describe('completion anywhere', () => {
  it('offers nothing in comments and texts', () => {
    for (const marked of ['# <*>', 'let a = 3 mm # si<*>', '## <*>\nlet a = 3 mm', 'use "<*>', 'use "<*>"'])
      check(`${bench}${marked}`, []);
    check(`${bench}require size > 1 mm because "si<*>ze"`, []);
  });

  it('works in half-typed blocks between whole declarations', () => {
    check(`${bench}state s of N2 {\n  pressure = <*>\n\nlet after = 3 Pa\n`, {
      has: ['after', 'residual'],
      not: ['s'],
    });
    check(`${bench}state s of N2 {\n  pressure = 3 m\n  <*>\n`, { has: ['temperature'], not: ['pressure'] });
    check(`blah\nstate s of N2 { pressure = 3 m<*>\n}`, { has: ['mbar'], not: ['mm'] });
  });

  it('has an answer at every place of a text and of all its beginnings', function () {
    this.timeout(60_000);
    for (const [, text] of samples) {
      const whole = analyse(text);
      for (let offset = 0; offset <= text.length; offset += 1) checkSound(completion(whole, offset), text, offset);
      for (let end = 0; end <= text.length; end += 3) {
        const begun = text.slice(0, end);
        checkSound(completion(analyse(begun), end), begun, end);
      }
    }
  });
});

type Expected = readonly string[] | { readonly has: readonly string[]; readonly not: readonly string[] };

/** The labels at the mark: all of them in order, or some that must and some that must not be there. */
function check(marked: string, expected: Expected): void {
  const labels = itemsAt(marked).map(({ label }) => label);
  if (!('has' in expected)) {
    assert.deepEqual(labels, expected, marked);
    return;
  }
  for (const label of expected.has)
    assert.ok(labels.includes(label), `${label} not in ${labels.join(', ')}: ${marked}`);
  for (const label of expected.not) assert.ok(!labels.includes(label), `${label} in ${labels.join(', ')}: ${marked}`);
}

function checkFirst(marked: string, expected: readonly string[]): void {
  const labels = itemsAt(marked).map(({ label }) => label);
  assert.deepEqual(labels.slice(0, expected.length), expected, marked);
}

/** What an item inserts, and what that replaces. */
function checkText(marked: string, label: string, insertText: string, replaced?: string): void {
  const { text } = cursor(marked);
  const found = item(marked, label);
  assert.equal(found.insertText, insertText);
  assert.equal(found.snippet, insertText.includes('${'));
  if (replaced !== undefined) assert.equal(text.slice(found.replace.start, found.replace.end), replaced);
}

function item(marked: string, label: string): CompletionItem {
  const items = itemsAt(marked);
  const found = items.find((each) => each.label === label);
  assert.ok(found, `${label} not in ${items.map((each) => each.label).join(', ')}: ${marked}`);
  return found;
}

function itemsAt(marked: string): readonly CompletionItem[] {
  const { text, offset } = cursor(marked);
  return completion(analyse(text), offset);
}

function checkSound(items: readonly CompletionItem[], text: string, offset: number): void {
  const labels = items.map(({ label }) => label);
  assert.deepEqual([...new Set(labels)], labels);
  for (const { replace, sortText, insertText } of items) {
    assert.ok(replace.start <= offset && offset <= replace.end && replace.end <= text.length);
    assert.ok(!text.slice(replace.start, replace.end).includes('\n'));
    assert.ok(insertText !== '' && sortText.length === 4);
  }
}
