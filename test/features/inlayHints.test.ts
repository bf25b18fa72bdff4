import assert from 'node:assert/strict';
import { describe, it } from 'mocha';
import type { HintSettings } from '../../server/src/features/inlayHints';
import { inlayHints, longestHint } from '../../server/src/features/inlayHints';
import { analyse } from '../support/analyse';

const all: HintSettings = { enabled: 'all', figures: {}, digits: 4 };

const nitrogen = `state residual of N2 {
  pressure    = 3e-3 mbar ± 10 %
  temperature = 21 °C
}
`;
const tube = 'tube foreline { bore = 40 mm, length = 1.8 m }\n';

describe('inlay hints', () => {
  it('show what an expert asks for first, symbol, value and unit', () => {
    assert.deepEqual(labels(`${nitrogen}${tube}site s = residual in foreline\ngas mix = Ar 95 % + O2 balance`), [
      'λ 21.73 mm · n 7.387e19 1/m³',
      'V 2.262 L · A 12.57 cm²',
      'Kn 0.5433 · transitional',
      // 0.95·39.95 + 0.05·31.998 g/mol with the abridged standard atomic weights of CIAAW 2021.
      'M 39.55 g/mol',
    ]);
  });

  it('stand at the end of the line where the declaration opens, behind everything on it', () => {
    assert.equal(lineOf(nitrogen), 'state residual of N2 {');
    assert.equal(lineOf('let a = 2 * 3 mm   # a comment'), 'let a = 2 * 3 mm   # a comment');
    assert.equal(lineOf(`${tube.trim()}\r\nlet a = 5 mm\r\n`), tube.trim());
    assert.equal(lineOf('let a = (1 mm\n  + 2 mm)\n'), '  + 2 mm)');
    assert.equal(lineOf(tube.trim()), tube.trim());
  });

  it('show a value where the text does not say it already', () => {
    assert.deepEqual(labels('let room = 21 °C ± 2 K\nlet warm = room + 5 K'), ['= 26.0 ± 2.0 °C']);
    assert.deepEqual(labels('let a = 5 mm\nlet b = -40 °C\nlet c = "text"\nlet d = (3 bar)'), []);
    assert.deepEqual(labels('let a = 2 * 5 mm'), ['= 10.00 mm']);
    // NIST SP 811 (2008), appendix B.8: 1 atm is 101 325 Pa; a gauge pressure counts from it unless the file says otherwise.
    assert.deepEqual(labels('let a = 2 barg'), ['= 3.013 bar']);
    assert.deepEqual(labels('let a = 1 < 2'), ['holds, margin 50 %']);
  });

  it('say in words whether a requirement holds, and by how much', () => {
    assert.deepEqual(labels('require 1.31 > 1'), ['holds, margin 31 %']);
    assert.deepEqual(labels('require 0.88 >= 1'), ['fails, margin −12 %']);
    assert.deepEqual(labels('prefer 1.05 ± 0.2 > 1'), ['undecided']);
    assert.deepEqual(
      labels(`${nitrogen}${tube}site s = residual in foreline\nrequire s.regime is slip`).at(-1),
      'fails',
    );
  });

  it('are silent where there is no value', () => {
    assert.deepEqual(labels('let a = nowhere\nlet b = 2 * a\npump dry { speed = 10 L/s }\nuse "none.gas"'), []);
    assert.deepEqual(labels('assume ambient_temperature = 25 °C\ndisplay pressure in mbar'), []);
  });

  it('use the unit of the file and the digits of the settings', () => {
    const text = `display length in µm, number_density in 1/cm³\n${nitrogen}`;
    assert.deepEqual(labels(text), ['λ 21730 µm · n 7.387e13 1/cm³']);
    assert.deepEqual(labels(text, { ...all, digits: 3 }), ['λ 21700 µm · n 7.39e13 1/cm³']);
  });

  it('show the figures that a setting names, those that fit', () => {
    const figures = { state: ['mean_speed', 'nonsense', 'viscosity', 'thermal_conductivity'], tube: [] };
    assert.deepEqual(labels(`${nitrogen}${tube}`, { ...all, figures }), ['c̄ 471.5 m/s · η 17.61 µPa·s']);
  });

  it('leave out the later figure rather than cut one short', () => {
    assert.deepEqual(labels('inlet leak of air { throughput = 1e-6 mbar·L/s }'), ['q 1.000e-6 mbar·L/s']);
    const long = 'let flux = (1.234e-5 mbar·L/(s·cm²) ± 10 %) * 2';
    for (const label of labels(long)) assert.ok(label.length <= longestHint, label);
    assert.equal(labels(long).length, 1);
  });

  it('keep their width while the digits change', () => {
    const widths = [1.1, 1.25, 2.3, 3.999, 5, 9.87].map((pressure) =>
      labels(nitrogen.replace('3e-3', `${pressure}e-3`).replace('21 °C', '20.5 °C')).join(),
    );
    const lengths = new Set(widths.map((label) => label.replace(/^λ [\d.]+/, 'λ 0.000').length));
    assert.equal(lengths.size, 1, widths.join('\n'));
    for (const label of widths) assert.equal(/^λ ([\d.]+)/.exec(label)?.[1]?.replace('.', '').length, 4, label);
  });

  it('show only what does not hold, or nothing, as the settings ask', () => {
    const text = `${nitrogen}require 1 > 2\nrequire 2 > 1\nrequire 1.05 ± 0.2 > 1`;
    assert.deepEqual(labels(text, { ...all, enabled: 'failing' }), ['fails, margin −50 %', 'undecided']);
    assert.deepEqual(labels(text, { ...all, enabled: 'off' }), []);
  });

  it('come for the lines that are asked for', () => {
    const text = 'let a = 2 * 1 mm\nlet b = 2 * a\nlet c = 2 * b';
    const second = text.indexOf('let b');
    const found = inlayHints(analyse(text), { start: second, end: text.indexOf('\nlet c') }, all);
    assert.deepEqual(
      found.map(({ label }) => label),
      ['= 4.000 mm'],
    );
  });

  it('tell the method, the tolerance or both sides in their tooltip', () => {
    const [state] = hints(nitrogen);
    assert.match(state?.tooltip ?? '', /`mean_free_path`: 21\.7 ± 2\.2 mm, from the viscosity/);
    const [failing] = hints('let a = 3 mm\nrequire a > 5 mm');
    assert.match(failing?.tooltip ?? '', /a is 3\.000 mm; wanted \\> 5 mm/);
    const [value] = hints('let a = 2 * (3 mm ± 1 mm)');
    assert.match(value?.tooltip ?? '', /6\.0 ± 2\.0 mm, at 95 % coverage/);
  });

  it('never throw, stay short, and come once a line, however a text is cut', () => {
    const text = `${nitrogen}${tube}site s = residual in foreline
gas mix = Ar 95 % ± 1 % + O2 balance
let ratio = residual.mean_free_path / foreline.bore in %
let alias = residual
line both = foreline & foreline
require s.knudsen > 0.5 because "reason"
inlet leak of air { throughput = 5 sccm }
`;
    assert.equal(hints(text).length, 9);
    for (let length = 0; length <= text.length; length += 3) checkHints(text.slice(0, length));
    for (let start = 0; start < text.length; start += 7) checkHints(text.slice(0, start) + text.slice(start + 1));
  });
});

function checkHints(text: string): void {
  const seen = new Set<number>();
  for (const { offset, label, tooltip } of hints(text)) {
    assert.ok(label.length <= longestHint && label !== '', label);
    assert.ok(offset === text.length || text[offset] === '\n', `inside a line of ${JSON.stringify(text)}`);
    assert.ok(!seen.has(offset));
    assert.doesNotMatch(label + tooltip, /NaN|undefined|\[object/);
    seen.add(offset);
  }
}

function hints(text: string, settings = all) {
  return inlayHints(analyse(text), { start: 0, end: text.length }, settings);
}

function labels(text: string, settings = all): string[] {
  return hints(text, settings).map(({ label }) => label);
}

/** The line at whose end the first hint stands, up to the hint. */
function lineOf(text: string): string {
  const offset = hints(text)[0]?.offset ?? 0;
  return text.slice(text.lastIndexOf('\n', offset - 1) + 1, offset);
}
