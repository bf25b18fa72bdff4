import assert from 'node:assert/strict';
import fc from 'fast-check';
import { speciesList } from '../../server/src/physics/species/list';
import { halfWidth } from '../../server/src/model/tolerance';
import type { Members } from '../../server/src/model/values';
import { analyse } from '../support/analyse';
import { checkProblems } from '../support/analysisInvariants';
import { outcomeOf } from '../support/values';

/** Sound records over the whole range of what can be written: every figure is finite, whatever the warnings say. */
const decades = (low: number, high: number) =>
  fc.double({ min: low, max: high, noNaN: true }).map((exponent) => (10 ** exponent).toPrecision(4));
const pressure = decades(-15, 9);
const temperature = decades(-1, 5);
const relative = fc.constantFrom('', ' ± 1 %', ' ± 20 %');
const formula = fc.constantFrom(...speciesList.map((species) => species.formula));
const share = fc.integer({ min: 0, max: 100 });
const gas = fc.oneof(
  formula,
  fc.tuple(formula, share, formula).map(([a, percent, b]) => `${a} ${percent} % + ${b} balance`),
  fc.tuple(formula, formula, formula).map(([a, b, c]) => `${a} 20 % + ${b} 30 % + ${c} 50 %`),
);

const record = fc.tuple(gas, pressure, relative, temperature, relative, decades(-3, 5), decades(-6, 6)).map(
  ([of, p, dp, T, dT, bore, limit]) => `state feed of ${of} { pressure = ${p} Pa${dp}, temperature = ${T} K${dT} }
tube passage { bore = ${bore} mm ± 1 %, length = 1 m }
site here = feed in passage
require here.knudsen > ${limit}
prefer feed.mean_free_path between ${limit} µm and ${limit} m`,
);

describe('random states', () => {
  it('have finite figures and clear messages', () => {
    let figures = 0;
    fc.assert(
      fc.property(record, (text) => {
        const analysis = analyse(text);
        checkProblems(analysis);
        const outcome = outcomeOf(analysis, 'feed');
        if (outcome.kind !== 'value' || outcome.value.kind !== 'record') return;
        for (const members of [outcome.value.members, ...outcome.value.species.values()])
          figures += checkFigures(members, text);
      }),
      { numRuns: 600 },
    );
    assert.ok(figures > 10_000, `${figures} figures were looked at`);
  });
});

function checkFigures(members: Members, text: string): number {
  let count = 0;
  for (const [name, figure] of members) {
    if (figure.kind === 'absent') {
      assert.notEqual(figure.why, '', name);
      continue;
    }
    if (figure.value.kind !== 'quantity') continue;
    const { si, leans } = figure.value;
    if (!Number.isFinite(si) || !Number.isFinite(halfWidth(leans))) assert.fail(`${name} is ${si} in ${text}`);
    count += 1;
  }
  return count;
}
