import assert from 'node:assert/strict';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
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
    assert.match(out, /1 file; 1 requirement: 1 hold, 0 fail, 0 undecided; 0 errors, 0 warnings\n$/);
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
    const { out } = tenuity(['check', '--all-values', '-'], {
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
    ['an unknown format', ['check', '--format', 'xml', '-'], /--format is text or json/],
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

  it('writes the standard input to the standard output', () => {
    assert.equal(tenuity(['format', '-'], { input: rough }).out, neat);
  });

  it('leaves what cannot be read as it is', () => {
    const broken = 'let   a = = 5\nlet b=2 mm\n';
    assert.equal(tenuity(['format', '-'], { input: broken }).out, 'let   a = = 5\nlet b = 2 mm\n');
  });
});
