import assert from 'node:assert/strict';
import { spawnSync } from 'node:child_process';
import {
  chmodSync,
  lstatSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { tenuity } from './tenuity';

const WRONG_UNIT = 'state residual of N2 {\n  pressure = 3 mm\n  temperature = 21 °C\n}\n';

describe('tenuity check', () => {
  let folder: string;
  before(() => (folder = mkdtempSync(path.join(os.tmpdir(), 'tenuity-'))));
  after(() => rmSync(folder, { recursive: true, force: true }));

  const file = (name: string, text: string | Buffer): string => {
    const full = path.join(folder, name);
    writeFileSync(full, text);
    return full;
  };

  it('says what is wrong with a unit, where, and what could have been meant, and exits with 1', () => {
    const { code, out } = tenuity(['check', '-'], { input: WRONG_UNIT });
    assert.equal(code, 1);
    assert.match(
      out,
      /^-:2:16: error: pressure is a pressure, but mm is a length; did you mean mmHg, mbar, Pa\? \[unit-mismatch\]$/m,
    );
    assert.match(out, /^ {4} {2}pressure = 3 mm\n {4} {15}\^\^$/m);
    assert.match(out, /fixes: Use mmHg · Use mbar/);
  });

  it('exits with 0 when all holds, and tells it in one line', () => {
    const held = file('held.gas', 'let a = 2 mm\nrequire a > 1 mm\n');
    const { code, out, err } = tenuity(['check', held]);
    assert.equal(code, 0);
    assert.equal(err, '');
    assert.match(out, /^1 file; 1 requirement: 1 holds; no errors, no warnings\n$/m);
  });

  it('exits with 1 when a requirement fails', () => {
    assert.equal(tenuity(['check', '-'], { input: 'require 1 mm > 2 mm\n' }).code, 1);
  });

  it('lets a preference that is not met pass, unless it is strict', () => {
    const input = 'prefer 1 mm > 2 mm\n';
    assert.equal(tenuity(['check', '-'], { input }).code, 0);
    assert.equal(tenuity(['check', '--strict', '-'], { input }).code, 1);
  });

  it('prints the record of a sample as its reader should see it', () => {
    const { code, out } = tenuity(['check', '--values', 'samples/load-lock.gas']);
    const expected = 'test/cli/expected/load-lock.txt';
    if (process.env['UPDATE']) writeFileSync(expected, out);
    assert.equal(out, readFileSync(expected, 'utf8'));
    assert.equal(code, 0);
  });

  it('shows every result with its method when asked', () => {
    const { out } = tenuity(['check', '--values=all', '-'], {
      input: 'state a of He { pressure = 1 Pa, temperature = 300 K }\n',
    });
    assert.match(out, /mean_free_path_hard_sphere +\S+ .*hard spheres/);
    assert.match(out, /impingement_rate .*Hertz–Knudsen/);
  });

  it('takes names across files, and says when one cannot be read', () => {
    file('gases.gas', 'gas mine = He 10 % + N2 balance\n');
    const user = file('user.gas', 'use "gases.gas"\nstate a of mine { pressure = 1 Pa, temperature = 300 K }\n');
    assert.equal(tenuity(['check', user]).code, 0);
    const lost = file('lost.gas', 'use "nowhere.gas"\n');
    const { code, out } = tenuity(['check', lost]);
    assert.equal(code, 1);
    assert.match(out, /\[file-not-found\]/);
  });

  it('ends when files use each other in a circle', () => {
    file('one.gas', 'use "two.gas"\nlet a = b\n');
    const two = file('two.gas', 'use "one.gas"\nlet b = a\n');
    const { code, out } = tenuity(['check', two]);
    assert.equal(code, 1);
    assert.match(out, /\[circular-definition\]/);
  });

  it('checks the files of a folder', () => {
    const { code, out } = tenuity(['check', 'samples']);
    assert.equal(code, 0);
    assert.match(out, /^samples\/load-lock\.gas$/m);
  });

  it('names the standard input as told', () => {
    const { out } = tenuity(['check', '--stdin-filename', 'draft.gas', '-'], { input: WRONG_UNIT });
    assert.match(out, /^draft\.gas:2:16: error/m);
  });

  for (const [title, args, message] of [
    ['an unknown option', ['check', '--vales', 'x.gas'], /no option --vales; did you mean --values\?/],
    ['an unknown command', ['chek', 'x.gas'], /no command “chek”; did you mean check\?/],
    ['an unknown format', ['check', '--format', 'xml', '-'], /--format is text or json, not “xml”/],
    ['an unknown measure of values', ['check', '--values=most', '-'], /--values is all, not “most”/],
    ['an option that lacks its value', ['check', '--format'], /--format needs a value/],
    ['a flag with a value', ['check', '--strict=1', '-'], /--strict takes no value/],
    ['no file', ['check'], /no file is named/],
    ['a file that is not there', ['check', 'nowhere.gas'], /nowhere\.gas: there is no such file/],
    ['a folder without a file', ['check', 'test/cli/expected'], /holds no gas-state file/],
  ] as const) {
    it(`exits with 2 for ${title}`, () => {
      const { code, out, err } = tenuity(args);
      assert.equal(code, 2);
      assert.equal(out, '');
      assert.match(err, message);
    });
  }

  it('exits with 2 for what is not a text', () => {
    const { code, err } = tenuity(['check', file('binary.gas', Buffer.from([1, 0, 2]))]);
    assert.equal(code, 2);
    assert.match(err, /is not a text/);
  });

  it('exits with 2 for a text in another encoding than UTF-8', () => {
    const { code, err } = tenuity(['check', file('latin.gas', Buffer.from('let a = 1 \u00B0C\n', 'latin1'))]);
    assert.equal(code, 2);
    assert.match(err, /is not a text in UTF-8/);
  });

  it('passes over a folder that is named like a file', () => {
    const inside = mkdtempSync(path.join(folder, 'records-'));
    mkdirSync(path.join(inside, 'folder.gas'));
    writeFileSync(path.join(inside, 'one.gas'), 'let a = 1 mm\n');
    assert.equal(tenuity(['check', inside]).code, 0);
  });

  it('takes what looks like an option for a file behind --', () => {
    const { code, err } = tenuity(['check', '--', '--strict']);
    assert.equal(code, 2);
    assert.match(err, /--strict: there is no such file/);
  });

  it('lists a used file whose fault leaves a name without a value, and exits with 1', () => {
    file('faulty.gas', 'let gap = 3 mmm\n');
    const user = file('relies.gas', 'use "faulty.gas"\nrequire gap > 1 mm\n');
    const { code, out } = tenuity(['check', user]);
    assert.equal(code, 1);
    assert.match(out, /undecided +line 2 +require gap > 1 mm\n +cannot be judged/);
    assert.match(out, /faulty\.gas:1:13: error: .*\[unknown-unit\]/);
    assert.match(out, /^2 files; /m);
  });

  it('does not pass a requirement on what is not computed', () => {
    const input = 'line l = t\ntube t { bore = 1 mm, length = 1 m }\nrequire l.conductance > 1 L/s\n';
    const { code, out } = tenuity(['check', '-'], { input });
    assert.equal(code, 1);
    assert.match(out, /cannot be judged/);
  });

  it('lets no text of a file drive the terminal', () => {
    const { out } = tenuity(['check', '-'], { input: 'require 1 mm > 2 mm because "\u001B[2J\u202E\u0007"\n' });
    // eslint-disable-next-line no-control-regex
    assert.doesNotMatch(out, /[\u0000-\u0009\u000B-\u001F\u007F-\u009F\u202E]/);
  });

  it('shows of a line that no terminal holds what is around the place', () => {
    const input = `let a = ${'1 mm + '.repeat(100)}2 qq + ${'1 mm + '.repeat(100)}1 mm\n`;
    const lines = tenuity(['check', '-'], { input }).out.split('\n');
    assert.ok(Math.max(...lines.map((line) => line.length)) < 140);
    const [line = '', mark = ''] = lines.slice(lines.findIndex((each) => each.includes('…')));
    assert.equal(line.slice(mark.indexOf('^'), mark.lastIndexOf('^') + 1), 'qq');
  });

  it('lists problems in the order of their places', () => {
    const { out } = tenuity(['check', '-'], { input: 'require a.\nlet b = 2 qq + 3 qqq\n' });
    const places = [...out.matchAll(/^-:(\d+):(\d+):/gm)].map(
      ([, line, column]) => Number(line) * 1000 + Number(column),
    );
    assert.ok(places.length > 2);
    assert.deepEqual(
      places,
      [...places].sort((a, b) => a - b),
    );
  });

  it('ends quietly when its reader has seen enough', () => {
    const many = file('many.gas', 'let a = 1 qq\n'.repeat(5000));
    const { stderr } = spawnSync('sh', ['-c', `"${process.execPath}" dist/cli.js check "${many}" | head -n 1`], {
      encoding: 'utf8',
    });
    assert.equal(stderr, '');
  });

  it('says the same twice', () => {
    const args = ['check', '--values=all', '--format', 'json', 'samples'];
    assert.equal(tenuity(args).out, tenuity(args).out);
  });

  it('takes an empty file and one with a byte order mark', () => {
    assert.equal(tenuity(['check', file('empty.gas', '')]).code, 0);
    assert.equal(tenuity(['check', file('marked.gas', '\uFEFFlet a = 1 mm\n')]).code, 0);
  });

  it('colours only where it is asked to or talks to a terminal', () => {
    const escape = '\u001B[';
    assert.ok(!tenuity(['check', '-'], { input: WRONG_UNIT }).out.includes(escape));
    assert.ok(tenuity(['check', '-'], { input: WRONG_UNIT, env: { FORCE_COLOR: '1' } }).out.includes(escape));
    assert.ok(
      !tenuity(['check', '-'], { input: WRONG_UNIT, env: { FORCE_COLOR: '1', NO_COLOR: '1' } }).out.includes(escape),
    );
  });
});

describe('tenuity', () => {
  it('says how it is used', () => {
    for (const args of [
      [],
      ['--help'],
      ['check', '--help'],
      ['format', '--help'],
      ['explain', '--help'],
      ['serve', '--help'],
    ]) {
      const { code, out } = tenuity(args);
      assert.equal(code, 0);
      assert.match(out, /tenuity/);
    }
  });

  it('tells its version', () => {
    const { version } = JSON.parse(readFileSync('package.json', 'utf8')) as { version: string };
    assert.equal(tenuity(['--version']).out, `${version}\n`);
  });
});

describe('tenuity explain', () => {
  for (const [topic, expected] of [
    ['unit-mismatch', /measures something else/],
    ['mean_free_path', /viscosity/],
    ['mbar', /unit of pressure/],
    ['°C', /0 °C is 273\.15/],
    ['Ω', /ohm/],
    ['N2', /nitrogen[\s\S]*safety data sheet/],
    ['tube', /bore = 40 mm/],
    ['bore', /inner diameter/],
    ['sqrt', /square root/],
    ['site_density', /monolayer/],
    ['throughput', /mbar·L\/s/],
  ] as const) {
    it(`knows ${topic}`, () => {
      const { code, out } = tenuity(['explain', topic]);
      assert.equal(code, 0);
      assert.match(out, expected);
    });
  }

  it('suggests what is near to an unknown topic', () => {
    const { code, err } = tenuity(['explain', 'mean_free_pth']);
    assert.equal(code, 2);
    assert.match(err, /did you mean mean_free_path\?/);
  });
});

describe('tenuity format', () => {
  const rough = 'let   a=5 um+-1 %\n';
  const neat = 'let a = 5 µm ± 1 %\n';
  let folder: string;
  before(() => (folder = mkdtempSync(path.join(os.tmpdir(), 'tenuity-'))));
  after(() => rmSync(folder, { recursive: true, force: true }));

  it('rewrites a file once', () => {
    const full = path.join(folder, 'rough.gas');
    writeFileSync(full, rough);
    assert.equal(tenuity(['format', '--check', full]).code, 1);
    assert.equal(readFileSync(full, 'utf8'), rough);
    assert.equal(tenuity(['format', full]).code, 0);
    assert.equal(readFileSync(full, 'utf8'), neat);
    assert.equal(tenuity(['format', '--check', full]).code, 0);
  });

  it('keeps the byte order mark, the permissions and a link, and leaves nothing beside the file', () => {
    const inside = mkdtempSync(path.join(folder, 'kept-'));
    const [full, link] = [path.join(inside, 'marked.gas'), path.join(inside, 'link.gas')];
    writeFileSync(full, `\uFEFF${rough}`);
    chmodSync(full, 0o660);
    symlinkSync('marked.gas', link);
    assert.equal(tenuity(['format', link]).code, 0);
    assert.equal(readFileSync(full, 'utf8'), `\uFEFF${neat}`);
    assert.equal(statSync(full).mode & 0o777, 0o660);
    assert.ok(lstatSync(link).isSymbolicLink());
    assert.deepEqual(readdirSync(inside).sort(), ['link.gas', 'marked.gas']);
  });

  it('does not touch a text in another encoding than UTF-8', () => {
    const full = path.join(folder, 'latin.gas');
    const bytes = Buffer.from('let   a=1 mm # 5 \u00B0C\n', 'latin1');
    writeFileSync(full, bytes);
    assert.equal(tenuity(['format', full]).code, 2);
    assert.deepEqual(readFileSync(full), bytes);
  });

  it('writes the standard input to the standard output', () => {
    assert.equal(tenuity(['format', '-'], { input: rough }).out, neat);
  });

  it('finds the samples as they should be', () => {
    const { code, err } = tenuity(['format', '--check', 'samples']);
    assert.equal(err, '');
    assert.equal(code, 0);
  });

  it('leaves what cannot be read as it is', () => {
    const broken = 'let   a = = 5\nlet b=2 mm\n';
    assert.equal(tenuity(['format', '-'], { input: broken }).out, 'let   a = = 5\nlet b = 2 mm\n');
  });
});
