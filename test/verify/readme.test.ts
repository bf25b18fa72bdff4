import assert from 'node:assert/strict';
import { readmeTexts } from './readmeTable';

describe('the README', () => {
  it('tells the deviations that the program has now; npm run verify:readme writes them', () => {
    const { now, due } = readmeTexts();
    assert.equal(now, due);
  });
});
