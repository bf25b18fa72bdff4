import assert from 'node:assert/strict';
import fc from 'fast-check';
import { multiplyRatios, powerRatio, ratio, ratioToNumber } from '../../server/src/quantities/ratio';

describe('exact fractions', () => {
  it('are the nearest double, as a literal is', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-250, max: 1e250, noNaN: true }), (value) =>
        assert.equal(ratioToNumber(ratio(String(value).replace('e+', 'e'))), value),
      ),
      { numRuns: 1000 },
    );
  });

  it('divide correctly rounded, as hardware does', () => {
    const whole = fc.integer({ min: 1, max: 2 ** 31 - 1 });
    fc.assert(fc.property(whole, whole, (a, b) => assert.equal(ratioToNumber(ratio(`${a} / ${b}`)), a / b)));
  });

  it('read products and quotients from the left', () => {
    assert.deepEqual(ratio('6 / 4 * 3'), { num: 9n, den: 2n });
    assert.deepEqual(ratio('0.0254 / 12.7'), { num: 1n, den: 500n });
    assert.deepEqual(powerRatio(ratio('2 / 3'), -2), { num: 9n, den: 4n });
    assert.deepEqual(multiplyRatios(ratio('2 / 3'), ratio('3 / 2')), { num: 1n, den: 1n });
  });
});
