import assert from 'node:assert/strict';
import { readFileSync } from 'node:fs';
import type { JsonVerification } from '../../server/src/verify/json';
import { tenuity } from './tenuity';

describe('tenuity verify', () => {
  it('says by property and gas how far the figures are, what ran, and exits with 0', () => {
    const { code, out, err } = tenuity(['verify']);
    assert.equal(code, 0);
    assert.equal(err, '');
    assert.match(out, /^tenuity \d+\.\d+\.\d+, Node\.js \d+\.\d+\.\d+, \w+ \w+$/m);
    assert.match(out, /^k = 1\.380649e-23 J\/K +Boltzmann constant +SI Brochure/m);
    assert.match(out, /^property +gas +rows +median +worst +stated +covered +within$/m);
    assert.match(out, /^viscosity +all +\d+ +0\.\d+ %/m);
    assert.match(out, /^ +N2 +8 +/m);
    assert.match(out, /^\d+ published values, all within their tolerance\n$/m);
    assert.ok(!out.includes('Lemmon'));
  });

  it('lists every value with its source when asked', () => {
    const { code, out } = tenuity(['verify', '--all']);
    assert.equal(code, 0);
    assert.match(out, /^within +viscosity +N2 +17\.8771 µPa·s +17\.877\d +< 0\.01 % +Lemmon & Jacobsen 2004, table V/m);
    assert.equal(out.match(/^within /gm)?.length, Number(/^(\d+) published/m.exec(out)?.[1]));
  });

  it('gives the same as JSON', () => {
    const { code, out } = tenuity(['verify', '--format', 'json', '--all']);
    assert.equal(code, 0);
    const { verdict, versions, constants, properties, rows } = JSON.parse(out) as JsonVerification;
    assert.equal(verdict, 'within');
    assert.equal(versions.length, 3);
    assert.ok(constants.some(({ name, value }) => name === 'R' && value === 8.31446261815324));
    assert.equal(
      rows.length,
      properties.reduce((sum, each) => sum + each.rows, 0),
    );
    assert.ok(rows.every(({ ours, source, where }) => ours !== null && source !== '' && where !== ''));
    const brief = JSON.parse(tenuity(['verify', '--format=json']).out) as JsonVerification;
    assert.deepEqual(brief, { ...brief, properties, rows: [] });
  });

  it('takes no files', () => {
    assert.equal(tenuity(['verify', 'lock.gas']).code, 2);
  });

  it('is not carried by the language server', () => {
    const title = 'viscosity against the handbook';
    assert.ok(readFileSync('dist/cli.js', 'utf8').includes(title));
    for (const server of ['dist/server.js', 'dist/web/server.js'])
      assert.ok(!readFileSync(server, 'utf8').includes(title), server);
  });
});
