/**
 * The root of a continuous function between two arguments at which it differs in sign, by false position with the
 * Illinois rule, which always keeps the root between its ends, and with a halving every fourth step, which makes progress where
 * the function is far from straight. Exact to rounding; the ends themselves may be the root.
 */
export function bracketedRoot(f: (x: number) => number, low: number, high: number): number {
  let a = low;
  let b = high;
  let fa = f(a);
  let fb = f(b);
  if (fa === 0) return a;
  if (fb === 0) return b;
  for (let step = 0; step < mostSteps; step++) {
    const x = step % 4 === 3 ? (a + b) / 2 : between(a, b, (a * fb - b * fa) / (fb - fa));
    const fx = f(x);
    if (fx === 0 || Math.abs(b - a) <= 4 * Number.EPSILON * Math.abs(x)) return x;
    if (fx < 0 === fb < 0) {
      // The old end stays although it did not help: halving its value draws the next step to its side.
      fa /= 2;
    } else {
      a = b;
      fa = fb;
    }
    if (x === b) return x;
    b = x;
    fb = fx;
  }
  return b;
}

/** False position can be thrown off by rounding; the middle never is. */
function between(a: number, b: number, x: number): number {
  return Math.min(a, b) < x && x < Math.max(a, b) ? x : (a + b) / 2;
}

const mostSteps = 400;
