import assert from 'node:assert/strict';
import path from 'node:path';
import { analyse } from '../support/analyse';
import { samples } from '../support/corpus';

describe('the samples', () => {
  const files = Object.fromEntries(samples().map(({ source, text }) => [path.basename(source), text]));

  it('are there', () => {
    assert.ok(samples().length > 0);
  });

  for (const { source, text } of samples()) {
    it(`${source} is without a mistake`, () => {
      const errors = analyse(text, { files })
        .problems()
        .filter(({ problem }) => problem.severity === 'error' && problem.code !== 'requirement-fails');
      assert.deepEqual(
        errors.map(({ problem }) => problem.message),
        [],
      );
    });
  }
});
