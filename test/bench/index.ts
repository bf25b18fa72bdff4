import { Bench } from 'tinybench';
import { createWorkspace } from '../../server/src/model/workspace';
import { pure } from '../../server/src/physics/composition';
import { kelvin, pascal } from '../../server/src/physics/brands';
import { speciesByName } from '../../server/src/physics/species/list';
import { solveState } from '../../server/src/physics/state/closure';
import { evaluateState } from '../../server/src/physics/state/evaluateState';
import { createParser } from '../../server/src/syntax/parse';
import { againstC } from './againstC';
import { record } from './record';

// What things cost against each other. Seconds depend on the machine; ratios tell whether cost follows the change.

const bench = new Bench({ time: 400 });

for (const lines of [200, 2000]) {
  const text = record(lines);
  const edits = typing(text);
  bench.add(`evaluate ${lines} lines afresh`, () => {
    workspaceOf(() => text).analyse('record');
  });
  let now = text;
  const workspace = workspaceOf(() => now);
  workspace.analyse('record');
  bench.add(`a keystroke in ${lines} lines`, () => {
    now = edits();
    workspace.analyse('record');
  });
  const parse = createParser();
  parse(text);
  bench.add(`parse a keystroke in ${lines} lines`, () => {
    parse(edits());
  });
}

for (const parts of [['N2'], ['N2', 'O2', 'Ar', 'H2O', 'CO2']]) {
  const species = parts.flatMap((name) => speciesByName(name) ?? []);
  const [first] = species;
  if (!first) throw new Error(`no gas is named ${parts.join()}`);
  const composition =
    species.length === 1 ? pure(first) : { species, moleFractions: species.map(() => 1 / species.length) };
  const point = solveState(composition, { pressure: pascal(1), temperature: kelvin(293.15) });
  if (!point.ok) throw new Error('the state cannot be solved');
  const request = { composition, point: point.value, siteDensity: 1e19 };
  bench.add(`all figures of a state of ${parts.length === 1 ? 'a pure gas' : 'five species'}`, () => {
    evaluateState(request);
  });
}

bench.runSync();

const costs = new Map(
  bench.tasks.flatMap(({ name, result }) => ('latency' in result ? [[name, result.latency.p50] as const] : [])),
);
for (const [name, cost] of costs) console.log(`${name.padEnd(46)} ${cost.toFixed(4).padStart(10)} ms`);

const ratio = (title: string, above: string, below: string) => {
  const value = (costs.get(above) ?? NaN) / (costs.get(below) ?? NaN);
  console.log(`${title.padEnd(58)} ${value.toPrecision(3).padStart(8)}`);
};
console.log('');
ratio('a keystroke against the whole, 2000 lines', 'a keystroke in 2000 lines', 'evaluate 2000 lines afresh');
ratio('a keystroke in 2000 lines against one in 200', 'a keystroke in 2000 lines', 'a keystroke in 200 lines');
ratio(
  'five species against a pure gas',
  'all figures of a state of five species',
  'all figures of a state of a pure gas',
);

againstC();

function workspaceOf(text: () => string) {
  return createWorkspace({ read: () => ({ text: text() }), resolve: (_from, path) => path });
}

/** Types digits into a pressure in the middle of the text, one more at each call. */
function typing(text: string): () => string {
  const at = text.indexOf('e-3 mbar', text.length / 2);
  let count = 0;
  return () => {
    count += 1;
    return `${text.slice(0, at)}${count % 100}${text.slice(at)}`;
  };
}
