/**
 * Tolerances by linear propagation (JCGM 100:2008, 5.1 and 5.2), at 95 % coverage.
 *
 * A value does not carry one half-width but its *leans*: for every independent cause (an uncertain number of the file,
 * the stated error of a correlation) the signed amount by which the value moves when the cause moves by its own half-width.
 * Two values that share a cause are correlated, and the algebra below gets that right without knowing it: `a - a` leans nowhere.
 */
export type Leans = ReadonlyMap<string, number>;

export const exact: Leans = new Map();

/** The half-width at 95 % coverage: independent causes add in squares. */
export function halfWidth(leans: Leans): number {
  let sum = 0;
  for (const lean of leans.values()) sum += lean * lean;
  return Math.sqrt(sum);
}

/** The lean of one cause. */
export function leanOn(cause: string, amount: number): Leans {
  return amount === 0 ? exact : new Map([[cause, amount]]);
}

/** The leans of `a·x + b·y` for the leans of x and y. */
export function combine(a: number, x: Leans, b: number, y: Leans): Leans {
  if (x.size === 0) return scale(b, y);
  if (y.size === 0) return scale(a, x);
  const sum = new Map(scale(a, x));
  for (const [cause, lean] of y) put(sum, cause, (sum.get(cause) ?? 0) + b * lean);
  return sum;
}

export function scale(factor: number, leans: Leans): Leans {
  if (leans.size === 0 || factor === 1) return leans;
  const scaled = new Map<string, number>();
  for (const [cause, lean] of leans) put(scaled, cause, factor * lean);
  return scaled;
}

/** Which cause brings which share of the variance, largest first. */
export function budget(leans: Leans): readonly { readonly cause: string; readonly share: number }[] {
  const total = halfWidth(leans) ** 2;
  if (total === 0) return [];
  return [...leans].map(([cause, lean]) => ({ cause, share: (lean * lean) / total })).sort((a, b) => b.share - a.share);
}

/** A lean of zero is no lean. Overflow is left to the value, which is checked. */
function put(leans: Map<string, number>, cause: string, lean: number): void {
  if (lean === 0 || !Number.isFinite(lean)) leans.delete(cause);
  else leans.set(cause, lean);
}
