/** Where an integrand is read, and with what weight. */
export interface Node {
  readonly at: number;
  readonly weight: number;
}

/**
 * Speeds for ∫ f(c) e^(−c²) dc from 0 to infinity, where f may change on any scale of c: the trapezoidal rule in ln c,
 * which converges exponentially. What lies below `smallest` is left out.
 */
export function speeds(smallest: number, step = 0.2): readonly Node[] {
  const first = Math.floor(Math.log(smallest) / step);
  const last = Math.ceil(Math.log(6.2) / step);
  return Array.from({ length: last - first + 1 }, (_, index) => {
    const c = Math.exp((first + index) * step);
    return { at: c, weight: step * c * Math.exp(-c * c) };
  });
}
