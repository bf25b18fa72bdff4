import assert from 'node:assert/strict';
import { bracketedRoot } from '../../server/src/physics/thermo/bracketedRoot';

describe('bracketed root', () => {
  it('finds what is known, from either side and at the ends', () => {
    const near = (got: number, wanted: number) =>
      assert.ok(Math.abs(got - wanted) <= 1e-14 * Math.abs(wanted), `${got}`);
    near(
      bracketedRoot((x) => x * x - 2, 0, 2),
      Math.SQRT2,
    );
    near(
      bracketedRoot((x) => 2 - x * x, 0, 2),
      Math.SQRT2,
    );
    near(
      bracketedRoot((x) => Math.exp(x) - 1e30, 0, 700),
      30 * Math.LN10,
    );
    near(
      bracketedRoot((x) => x ** 9 - 1e-9, 0, 1e3),
      0.1,
    );
    assert.equal(
      bracketedRoot((x) => x - 3, 3, 5),
      3,
    );
    assert.equal(
      bracketedRoot((x) => x - 5, 3, 5),
      5,
    );
  });

  it('takes few steps where the function is nearly straight', () => {
    let calls = 0;
    const f = (x: number) => {
      calls++;
      return Math.log(x) - 1;
    };
    bracketedRoot(f, 2, 3);
    assert.ok(calls < 15, `${calls}`);
  });
});
