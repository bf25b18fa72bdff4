import assert from 'node:assert/strict';
import { readdirSync, readFileSync } from 'node:fs';
import Ajv from 'ajv';
import { jsonFile } from '../../server/src/report/json';
import schema from '../../server/src/report/check.schema.json';
import { analyse } from '../support/analyse';
import { tenuity } from '../cli/tenuity';

const validate = new Ajv({ allowUnionTypes: true }).compile(schema);

function valid(report: unknown): void {
  assert.ok(validate(report), JSON.stringify(validate.errors));
}

describe('the JSON of a check', () => {
  const samples = readdirSync('samples').filter((name) => name.endsWith('.gas'));

  it('fits its schema for every sample, printed by the command line', () => {
    const { out } = tenuity(['check', '--format', 'json', 'samples']);
    const report = JSON.parse(out) as { files: unknown[] };
    valid(report);
    assert.equal(report.files.length, samples.length);
  });

  it('fits its schema for broken files', () => {
    for (const name of samples) {
      const text = readFileSync(`samples/${name}`, 'utf8');
      for (let end = 0; end < text.length; end += 41) {
        const report = { tenuity: '0', files: [jsonFile(name, analyse(text.slice(0, end)))] };
        // What JSON cannot say, it says as null.
        valid(JSON.parse(JSON.stringify(report)));
      }
    }
  });

  it('gives values and tolerances in coherent SI units, with method and source', () => {
    const { declarations } = jsonFile('x', analyse('state a of N2 { pressure = 1 mbar ± 10 %, temperature = 300 K }'));
    const [state] = declarations;
    assert.equal(state?.kind, 'state');
    const { pressure, mean_free_path: path } = state.results;
    assert.deepEqual([pressure?.value, pressure?.unit], [100, 'Pa']);
    // By differences: exact but for rounding.
    assert.ok(Math.abs((pressure?.tolerance ?? 0) - 10) < 1e-9);
    assert.equal(path?.unit, 'm');
    assert.match(path.method, /viscosity/);
    assert.match(path.source, /Lemmon/);
    assert.ok(path.tolerance > 0.1 * (path.value as number));
  });

  it('gives each species of a mixture its own results', () => {
    const [state] = jsonFile(
      'x',
      analyse('state a of Ar 95 % + O2 5 % { pressure = 1 Pa, temperature = 300 K }'),
    ).declarations;
    assert.deepEqual(Object.keys(state?.species ?? {}), ['Ar', 'O2']);
    assert.equal(state?.species?.['O2']?.['partial_pressure']?.value, 0.05);
  });

  it('gives the value of a let, a word and a margin', () => {
    const text =
      'let a = 3 mm ± 0.1 mm\ntube t { bore = a, length = 1 m }\nstate s of He { pressure = 1e-3 Pa, temperature = 300 K }\nsite p = s in t\nrequire a > 2 mm because "so"\nrequire p.regime is molecular\n';
    const { declarations, requirements } = jsonFile('x', analyse(text));
    assert.deepEqual(declarations[0]?.results['value'], {
      value: 0.003,
      unit: 'm',
      tolerance: 0.0001,
      method: 'as declared',
      source: '',
    });
    const regime = declarations.find(({ name }) => name === 'p')?.results['regime'];
    assert.deepEqual([regime?.value, regime?.unit], ['molecular', '']);
    assert.deepEqual(requirements, [
      { line: 5, text: 'a > 2 mm', strength: 'require', because: 'so', status: 'holds', margin: 0.5 },
      { line: 6, text: 'p.regime is molecular', strength: 'require', status: 'holds', margin: null },
    ]);
  });

  it('calls a requirement undecided when something in it has no value', () => {
    const { requirements, diagnostics } = jsonFile('x', analyse('let a = 3 mmm\nrequire a > 2 mm'));
    assert.equal(requirements[0]?.status, 'undecided');
    assert.deepEqual(
      diagnostics.map(({ code, line, column }) => [code, line, column]),
      [['unknown-unit', 1, 11]],
    );
  });
});
