import assert from 'node:assert/strict';
import type { Analysis } from '../../server/src/model/analysis';
import type { Outcome } from '../../server/src/model/evaluated';
import type { Quantity, Value } from '../../server/src/model/values';

/** The outcome of a declaration, by its name or the text that stands for it. */
export function outcomeOf(analysis: Analysis, id: string): Outcome {
  const declared = analysis.declared.find((each) => each.id === id);
  assert.ok(declared, `nothing is called ${id}`);
  return analysis.outcome(declared);
}

/** The value of a declaration, or a failing test. */
export function valueOf(analysis: Analysis, id: string): Value {
  const outcome = outcomeOf(analysis, id);
  assert.ok(
    outcome.kind === 'value',
    `${id} is ${outcome.kind}: ${analysis
      .problems()
      .map(({ problem }) => problem.message)
      .join('; ')}`,
  );
  return outcome.value;
}

/** The quantity that a name or a path such as `feed.O2.mole_fraction` stands for. */
export function quantityAt(analysis: Analysis, path: string): Quantity {
  const [name = '', ...properties] = path.split('.');
  let value: Value = valueOf(analysis, name);
  const last = properties.pop();
  if (last !== undefined) {
    assert.ok(value.kind === 'record' || value.kind === 'gas', `${name} has no results`);
    const [species] = properties;
    const members = species === undefined ? value.members : value.species.get(species);
    const figure = members?.get(last);
    assert.ok(figure?.kind === 'figure', `there is no ${path}`);
    value = figure.value;
  }
  assert.ok(value.kind === 'quantity', `${path} is no quantity`);
  return value;
}
