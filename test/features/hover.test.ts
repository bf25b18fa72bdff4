import assert from 'node:assert/strict';
import { describe, it } from 'mocha';
import { hover } from '../../server/src/features/hover/hover';
import { describeRecord } from '../../server/src/features/describe/describe';
import { gasNames } from '../../server/src/model/mixture';
import { analyse, cursor } from '../support/analyse';

const lock = `display pressure in mbar
let room = 21 °C ± 2 K
gas purge = Ar 95 % ± 1 % + O2 balance
## Gas left in the lock when the valve closes.
state residual of N2 {
  pressure    = 3e-3 mbar ± 10 %
  temperature = room
}
state mixed of purge { pressure = 1 mbar, temperature = room }
tube foreline { bore = 40 mm ± 1 mm, length = 1.8 m }
site in_foreline = residual in foreline
`;

describe('hover on a declaration', () => {
  it('shows its results in the unit of the file and in one other, three columns wide', () => {
    const { markdown } = at(lock.replace('residual of', 'resid<*>ual of'));
    assert.match(markdown, /^\*\*residual\*\*, a state of N2$/m);
    assert.match(markdown, /^Gas left in the lock when the valve closes\.$/m);
    assert.ok(markdown.includes('| `pressure` p | (3.00 ± 0.30)e-3 mbar | 0.300 ± 0.030 Pa |'));
    assert.ok(markdown.includes('| `temperature` T | 294.1 ± 2.0 K | 21.0 ± 2.0 °C |'));
    for (const row of tableRows(markdown)) assert.equal(row.split(/(?<!\\)\|/).length, 5, row);
  });

  it('puts first what an expert asks for first', () => {
    const [, , first, second] = tableRows(at(lock.replace('residual of', '<*>residual of')).markdown);
    assert.match(first ?? '', /^\| `mean_free_path` λ \|/);
    assert.match(second ?? '', /^\| `number_density` n \|/);
  });

  it('says a method, and a source, once for all that share it', () => {
    const { markdown } = at(lock.replace('residual of', '<*>residual of'));
    assert.equal(markdown.split('ideal-gas law').length, 2);
    assert.match(markdown, /`number_density`, `pressure`, `temperature`, `density`: ideal-gas law/);
    assert.equal(markdown.split('10.1023/B:IJOT.0000022327.04529.f3').length, 2);
    assert.match(markdown, /`viscosity`: dilute-gas correlation; valid from 70 to 2000 K; source 1/);
    assert.match(markdown, /`monolayer_time`: .*assumed: a monolayer of 1\.00e19 1\/m²/);
  });

  it('tells the two mean free paths apart', () => {
    const { markdown } = at(lock.replace('residual of', '<*>residual of'));
    assert.match(markdown, /`mean_free_path` is viscosity-based; the hard-sphere path is 1\.9 % longer\./);
  });

  it('tells the causes of the tolerance in the words of the author, largest first, three at most', () => {
    const { markdown } = at(lock.replace('site in', 'si<*>te in'));
    const causes = /\*\*Tolerance of\*\* `knudsen` \*\*from\*\*\n\n((?:- .*\n)+)/.exec(`${markdown}\n`)?.[1] ?? '';
    assert.deepEqual(causes.trim().split('\n'), [
      '- pressure of residual ± 10 %: 93 %',
      '- bore of foreline ± 1 mm: 5.8 %',
      '- stated error of the viscosity of N2: 0.93 %',
    ]);
  });

  it('is the table alone when it is to be brief', () => {
    const { markdown } = at(lock.replace('residual of', '<*>residual of'), 'brief');
    assert.ok(!/Methods|Sources|Tolerance|Hazards/.test(markdown));
    assert.ok(markdown.includes('| `viscosity` η |'));
  });

  it('says what only the species of a mixture have, and gives their shares', () => {
    const { markdown } = at(lock.replace('mixed of', '<*>mixed of'));
    assert.match(markdown, /- only for one species: `partial_pressure`, .*`diffusivity`/);
    assert.ok(markdown.includes('| `O2` | 5.0 ± 1.0 % | 0.050 ± 0.010 mbar |'));
  });

  it('shows a value with what its tolerance comes from, and a mixture by molecules and by mass', () => {
    const value = at(lock.replace('let room', 'let ro<*>om')).markdown;
    assert.match(value, /\*\*21\.0 ± 2\.0 °C\*\*, 294\.1 ± 2\.0 K/);
    assert.match(value, /- room ± 2 K: 100 %/);
    // O2 5 % in Ar: 0.05·31.998 / (0.95·39.95 + 0.05·31.998) with the abridged standard atomic weights of CIAAW 2021.
    assert.ok(
      at(lock.replace('gas purge', 'gas <*>purge')).markdown.includes('| `O2` | 5.0 ± 1.0 % | 4.05 ± 0.82 % |'),
    );
  });

  it('gives the meaning of the word that opens it', () => {
    assert.match(at(lock.replace('tube', 't<*>ube')).markdown, /A straight tube of round section\./);
    assert.match(at('u<*>se "shop.gas"').markdown, /Brings in all names of another file\./);
  });

  it('says why there are no results', () => {
    assert.match(at('let <*>a = nowhere + 1').markdown, /No results: no value is named “nowhere”/);
    assert.match(at('let a = nowhere + 1\nlet <*>b = 2 * a').markdown, /something it uses has no value/);
    assert.match(at('pump <*>dry { speed = 10 L/s }').markdown, /Its results come with a later version\./);
  });
});

describe('hover on a name in use', () => {
  it('gives the short version and where it is declared', () => {
    const { markdown, token } = at(`${lock}let far = residu<*>al.mean_free_path`);
    assert.equal(token, 'residual');
    assert.match(markdown, /^λ 21\.7 ± 2\.2 mm · n \(7\.39 ± 0\.74\)e19 1\/m³$/m);
    assert.match(markdown, /Declared in line 5\./);
    assert.ok(!markdown.includes('|'));
  });

  it('looks into the files that are used', () => {
    const { text, offset } = cursor('use "shop.gas"\nlet double = 2 * bo<*>re');
    const found = hover(analyse(text, { files: { 'shop.gas': '\nlet bore = 40 mm ± 1 %' } }), offset, {
      detail: 'full',
    });
    assert.match(found?.markdown ?? '', /40\.00 ± 0\.40 mm/);
    assert.match(found?.markdown ?? '', /Declared in line 2 of shop\.gas\./);
  });

  it('names the file of a cause that stands elsewhere', () => {
    const { text, offset } = cursor('use "shop.gas"\nlet <*>double = 2 * bore');
    const found = hover(analyse(text, { files: { 'shop.gas': 'let bore = 40 mm ± 1 %' } }), offset, { detail: 'full' });
    assert.match(found?.markdown ?? '', /- bore ± 1 % in shop\.gas: 100 %/);
  });
});

describe('hover on a property', () => {
  it('gives meaning, symbol, value here, method and source', () => {
    const { markdown, token } = at(`${lock}let far = residual.mean_fr<*>ee_path`);
    assert.equal(token, 'mean_free_path');
    assert.match(markdown, /^\*\*mean_free_path\*\* λ$/m);
    assert.match(markdown, /From the viscosity: the path that Knudsen numbers/);
    assert.match(markdown, /\*\*21\.7 ± 2\.2 mm\*\*, 0\.0217 ± 0\.0022 m/);
    assert.match(markdown, /Lemmon, E\. W\.; Jacobsen/);
  });

  it('says why a mixture has none, what comes later, and what is meant where there is no value', () => {
    assert.match(at(`${lock}let d = mixed.diff<*>usivity`).markdown, /a mixture has no diffusivity of its own/i);
    const port = 'orifice port { bore = 5 mm }\nsite at_port = residual in port\n';
    assert.match(at(`${lock}${port}let c = at_port.conduc<*>tance`).markdown, /computed by a later version/);
    assert.match(at('let c = nothing.visc<*>osity').markdown, /The dynamic viscosity of the dilute gas\./);
  });

  it('knows the constants', () => {
    const { markdown } = at('let a = const.<*>k * 300 K');
    assert.match(markdown, /Boltzmann constant/);
    // SI Brochure, 9th edition (2019), 2.2, exact.
    assert.match(markdown, /1\.38064900e-23 J\/K/);
  });

  it('shows a species of a state as the gas it is, with its share', () => {
    const { markdown } = at(`${lock}let p = mixed.A<*>r.partial_pressure`);
    assert.match(markdown, /^\*\*Ar\*\*, argon$/m);
    assert.match(markdown, /In `mixed`: 95\.0 ± 1\.0 % of the molecules/);
  });
});

describe('hover on a key', () => {
  it('gives meaning, symbol, dimension, usual units and bounds', () => {
    const { markdown, token } = at(lock.replace('pressure    =', 'press<*>ure    ='));
    assert.equal(token, 'pressure');
    assert.match(markdown, /\*\*pressure\*\* p, of a state/);
    assert.match(markdown, /in Pa = kg·m⁻¹·s⁻²\. Usual units: mbar, Pa, Torr.*Above zero\./);
  });

  it('lists the words that fit, and the other things that may be given', () => {
    assert.match(at('flow f through a { re<*>gime = molecular }').markdown, /viscous, slip, transitional or molecular/);
    assert.match(at('flow f through a { up<*>stream = b }').markdown, /The name of a state, or a pressure\./);
    assert.match(at('inlet a of N2 { through<*>put = 1 sccm }').markdown, /An amount of gas per time/);
  });
});

describe('hover on a unit', () => {
  it('says what it is in SI and where that is defined', () => {
    const { markdown, token } = at('let p = 3 To<*>rr');
    assert.equal(token, 'Torr');
    // NIST SP 811 (2008), appendix B.8: 1 torr = 1.333224e2 Pa.
    assert.match(markdown, /1 Torr is 133\.322 Pa\./);
    assert.match(markdown, /NIST SP 811/);
  });

  it('explains the zero of a temperature, gauge pressures and standard flows', () => {
    // NIST SP 811 (2008), appendix B.8: T/K = (t/°F + 459.67)/1.8.
    assert.match(at('let t = 70 °<*>F').markdown, /0 °F is 255\.372 K; a step of 1 °F is 0\.555556 K\./);
    assert.match(at('let p = 2 ba<*>rg').markdown, /above the ambient pressure/);
    assert.match(at('let q = 2 sc<*>cm').markdown, /The standard conditions here are 0 °C and 101\.325 kPa\./);
  });

  it('is there in a display and in a conversion as well', () => {
    assert.equal(at('display pressure in mb<*>ar').token, 'mbar');
    assert.equal(at('let a = (5 bar) in k<*>Pa').token, 'kPa');
  });
});

describe('hover on a number', () => {
  it('gives the same in three other usual units', () => {
    const { markdown, token } = at('let p = <*>1 atm');
    assert.equal(token, '1');
    // NIST SP 811 (2008), appendix B.8: 1 atm = 101 325 Pa = 760 Torr.
    assert.deepEqual(bullets(markdown), ['1.0133e5 Pa', '1013.3 mbar', '760.00 Torr']);
  });

  it('converts points on a scale, sign included, and differences without the zero', () => {
    // NIST SP 811 (2008), 8.5 and B.8: −40 °C is −40 °F and 233.15 K.
    const cold = bullets(at('let t = -<*>40 °C').markdown);
    assert.deepEqual(cold.slice(0, 2), ['233.15 K', '-40.000 °F']);
    assert.deepEqual(bullets(at('let t = 20 °C ± <*>5 K').markdown), ['9.0000 °R']);
    assert.deepEqual(bullets(at('let t = 20 °C ± <*>9 °F').markdown), ['5.0000 K', '9.0000 °R']);
  });

  it('tells gauge pressures as absolute ones', () => {
    const { markdown } = at('assume ambient_pressure = 100 kPa\nlet p = <*>1 barg');
    assert.ok(bullets(markdown).includes('2000.0 mbar'));
    assert.match(markdown, /absolute, with the ambient pressure of 100\.000 kPa/);
  });

  it('tells an amount flow as a throughput at the ambient temperature, and the reference it assumed', () => {
    const { markdown } = at('let q = <*>50 sccm');
    // 50 cm³/min · 1013.25 mbar · 293.15/273.15, by the ideal-gas law.
    assert.match(markdown, /at the ambient temperature, 20\.00 °C: 0\.90620 mbar·L\/s/);
    assert.match(markdown, /standard conditions here are .* and 101\.325 kPa/);
    const warm = at('assume standard_temperature = 20 °C\nlet q = <*>50 sccm').markdown;
    assert.match(warm, /: 0\.84438 mbar·L\/s/);
  });

  it('is silent where there is no unit', () => {
    assert.equal(silent('let x = <*>5'), undefined);
    assert.equal(silent('let x = <*>5 furlong'), undefined);
  });
});

describe('hover on a gas', () => {
  it('gives formula, names, molar mass, data and their range, hazards and the caution', () => {
    const { markdown, token } = at('gas fuel = N<*>H3 20 % + H2 balance');
    assert.equal(token, 'NH3');
    assert.match(markdown, /^\*\*NH3\*\*, ammonia$/m);
    assert.match(markdown, /In `fuel`: 20\.00 % of the molecules/);
    assert.match(markdown, /Molar mass 17\.0310 g\/mol/);
    assert.match(markdown, /viscosity from 196\.0 K to 680\.0 K, stated error 2\.0 %: Fenghour/);
    // Regulation (EC) No 1272/2008, annex VI, table 3, ammonia (anhydrous).
    assert.match(markdown, /acute toxicity, inhalation \(Acute Tox\. 3, H331\)/);
    assert.match(markdown, /safety data sheet, local codes and licensed practice/);
  });

  it('goes by the common names, and in tables by species', () => {
    assert.match(at('state a of nitro<*>gen { pressure = 1 Pa }').markdown, /^\*\*N2\*\*/m);
    assert.match(
      at('chamber a { volume = 1 L, outgassing = [H<*>2O: 1e-8 mbar·L/(s·cm²)] }').markdown,
      /^\*\*H2O\*\*/m,
    );
  });

  it('never calls anything safe', () => {
    for (const name of gasNames) {
      const { markdown } = at(`state a of <*>${name} { pressure = 1 Pa, temperature = 300 K }`);
      assert.doesNotMatch(markdown, /\b(?:safe|harmless|not hazardous|no hazard)\b/i);
    }
  });
});

describe('hover on a requirement', () => {
  const failing = `${lock}require in_foreline.knudsen >= 10 because "no | backflow"`;

  it('gives the status, both sides, the reason and the causes of the tolerance', () => {
    const { markdown, token } = at(failing.replace('require', 'requ<*>ire'));
    assert.equal(token, 'require');
    assert.match(markdown, /^\*\*require\*\*, fails, margin −95 %$/m);
    assert.ok(markdown.includes('| found | 0.543 ± 0.056 |  |'));
    assert.ok(markdown.includes('| limit | 10.00 |  |'));
    assert.match(markdown, /no \\\| backflow/);
    assert.match(markdown, /- pressure of residual ± 10 %: 93 %/);
  });

  it('is meant between the tokens of the condition', () => {
    const { markdown, token } = at(failing.replace('>=', '><*>='));
    assert.equal(token, 'in_foreline.knudsen >= 10');
    assert.match(markdown, /^\*\*require\*\*/);
  });

  it('says which way the best values fall where the tolerances decide nothing', () => {
    const { markdown } = at(`${lock}pre<*>fer in_foreline.knudsen > 0.5`);
    assert.match(markdown, /undecided: the tolerances reach the limit, the best values meet it by 8\.7 %/);
  });

  it('names the part of a condition that decided', () => {
    const { markdown } = at(`${lock}req<*>uire in_foreline.knudsen > 0.1 and in_foreline.knudsen > 10`);
    assert.match(markdown, /Decided by in_foreline\.knudsen is 0\.543 ± 0\.056; wanted \\> 10/);
  });
});

describe('hover on the words of the format', () => {
  const meanings: readonly (readonly [string, string, RegExp])[] = [
    ['let a = sq<*>rt(4)', 'sqrt', /The square root/],
    ['let a = con<*>st.k', 'const', /physical constants/],
    ['state a o<*>f N2 { pressure = 1 Pa }', 'of', /made of/],
    ['state a fr<*>om b { pressure = 1 Pa }', 'from', /takes over/i],
    [`${lock}site b = residual i<*>n foreline`, 'in', /geometry/],
    [
      'assume ambient_tem<*>perature = 25 °C',
      'ambient_temperature',
      /In this file 25\.00 °C; without an assumption 293\.2 K/,
    ],
    ['assume regime_li<*>mits = [slip: 0.02]', 'regime_limits', /viscous \\< 0\.020 ≤ slip/],
    ['display through<*>put in mbar·L/s', 'throughput', /pressure times volume/],
    [`${lock}require in_foreline.regime is mole<*>cular`, 'molecular', /A flow regime/],
    ['flow f through a { regime = vis<*>cous }', 'viscous', /A flow regime/],
    ['gas a = Ar 95 % + O2 bal<*>ance', 'balance', /what the other parts leave/i],
  ];
  for (const [marked, word, meaning] of meanings) {
    it(`explains ${word}`, () => {
      const { token, markdown } = at(marked);
      assert.equal(token, word);
      assert.match(markdown, meaning);
    });
  }
});

describe('hover elsewhere', () => {
  const nothing = [
    '# a com<*>ment\nlet a = 5 mm',
    'use "sh<*>op.gas"',
    'let a <*> = 5 mm',
    'let a = 5 mm\n\n<*>\n',
    'require 1 < 2 because "a rea<*>son"',
    'nonsen<*>se here',
    '<*>',
  ];
  for (const marked of nothing) {
    it(`is silent at ${JSON.stringify(marked)}`, () => assert.equal(silent(marked), undefined));
  }
});

describe('hover as a text', () => {
  it('shows what the author wrote as written, without headings', () => {
    const { markdown } = at('## # Big | bar\n## Under\n## ===\n## _a_ *b* <i>\nlet <*>a = 5 mm');
    assert.ok(markdown.includes('\\# Big \\| bar\nUnder\n\\===\n\\_a\\_ \\*b\\* \\<i\\>'));
  });

  it('stays below 20 kB, whatever the file holds', () => {
    const parts = ['H2', 'D2', 'He', 'Ne', 'Ar', 'Kr', 'Xe', 'N2', 'O2', 'CO', 'CO2', 'H2O', 'CH4', 'NH3', 'SF6'];
    const mixture = [...parts.map((name) => `${name} 1 % ± 0.1 %`), 'air balance'].join(' + ');
    const doc = `## ${'Ⅷ'.repeat(3000)}\n`.repeat(5);
    const name = 'x'.repeat(5000);
    const { markdown } = at(`${doc}state <*>${name} of ${mixture} { pressure = 1 mbar, temperature = 300 K ± 1 K }`);
    assert.ok(markdown.includes('mean_free_path'));
    assert.ok(Buffer.byteLength(markdown) < 20_000, `${Buffer.byteLength(markdown)} bytes`);
  });
});

describe('describeRecord', () => {
  it('gives the results as plain rows with their pedigree', () => {
    const analysis = analyse(lock);
    const declared = analysis.declared.find(({ id }) => id === 'mixed');
    assert.ok(declared);
    const description = describeRecord(analysis, declared);
    const row = description?.rows.find(({ name }) => name === 'pressure');
    assert.deepEqual(
      { ...row, value: undefined },
      {
        name: 'pressure',
        symbol: 'p',
        meaning: 'the absolute pressure',
        value: undefined,
        text: '1.000 mbar',
        alternative: '100.0 Pa',
        method: 'ideal-gas law, p = nkT',
        sources: [],
        assumptions: [],
      },
    );
    assert.ok(description?.absent.some(({ name }) => name === 'diffusivity'));
    assert.deepEqual(
      description?.species.map(({ formula }) => formula),
      ['Ar', 'O2'],
    );
  });

  it('has nothing to say of a declaration without results', () => {
    const analysis = analyse('let a = 5 mm\nlet b = nowhere');
    for (const declared of analysis.declared) assert.equal(describeRecord(analysis, declared), undefined);
  });
});

describe('hover at every offset', () => {
  const broad = `use "shop.gas"
display pressure in mbar, throughput in mbar·L/s
assume standard_temperature = 20 °C
${lock}species oil { molar_mass = 300 g/mol, hazards = "none known" }
state warm from residual { temperature = 350 K ± 2 % }
let cold = -40 °C
let gauge = 2 barg
let fraction = max(residual.mean_free_path, 1 mm) / foreline.bore in %
let odd = (const.k * 300 K)^0.5 + nowhere
inlet leak of air { throughput = 5 sccm }
chamber lock { volume = 14 L, outgassing = [H2O: 2e-8 mbar·L/s/cm², N2: 1e-9 mbar·L/s/cm²] }
pump dry { speed = [1e-2 mbar: 2 L/s, 1 mbar: 10 L/s] }
line roughing = foreline -> (foreline & foreline)
flow bleed through roughing { upstream = residual, downstream = 1e-3 mbar, regime = molecular }
system whole { leak -> lock
  lock -> roughing -> dry }
sweep sizes { vary foreline.bore = 16 mm .. 100 mm in 25 log steps
  show bleed.conductance }
require in_foreline.regime is molecular because "no backflow"
require mixed.Ar.partial_pressure within 5 % of 0.9 mbar and not (1 mm > 2 mm)
prefer residual.mean_free_path between 1 mm and 30 mm
`;

  it('covers the offset, says something, and never throws', () => {
    assert.ok(check(broad) > 500);
  });

  it('holds for texts that are cut off anywhere', () => {
    for (let length = 0; length < broad.length; length += 11) check(broad.slice(0, length), Math.max(0, length - 40));
    for (let start = 0; start < broad.length; start += 97) check(broad.slice(start), 0, 40);
  });

  /** How many offsets have a hover. */
  function check(text: string, from = 0, count = Infinity): number {
    const analysis = analyse(text, { files: { 'shop.gas': 'let shop = 2 mm ± 1 %' } });
    let found = 0;
    for (let offset = from; offset <= Math.min(text.length, from + count); offset++) {
      const result = hover(analysis, offset, { detail: offset % 2 === 0 ? 'full' : 'brief' });
      if (!result) continue;
      found++;
      assert.ok(result.start <= offset && offset <= result.end && result.start < result.end);
      assert.doesNotMatch(result.markdown, /\b(?:NaN|undefined|Infinity|null)\b|^#|\[object/m);
      assert.ok(Buffer.byteLength(result.markdown) < 20_000);
    }
    return found;
  }
});

function at(marked: string, detail: 'brief' | 'full' = 'full'): { markdown: string; token: string } {
  const { text, offset } = cursor(marked);
  const found = hover(analyse(text), offset, { detail });
  assert.ok(found, `nothing at the mark of ${marked}`);
  return { markdown: found.markdown, token: text.slice(found.start, found.end) };
}

function silent(marked: string): unknown {
  const { text, offset } = cursor(marked);
  return hover(analyse(text), offset, { detail: 'full' });
}

function tableRows(markdown: string): string[] {
  return markdown.split('\n').filter((line) => line.startsWith('|'));
}

function bullets(markdown: string): string[] {
  return markdown.split('\n').flatMap((line) => (line.startsWith('- ') ? [line.slice(2).replace(/^\\/, '')] : []));
}
