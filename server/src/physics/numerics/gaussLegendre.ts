/** Nodes and weights of a rule ∫f ≈ Σ wᵢ f(xᵢ). */
export interface Rule {
  readonly nodes: Float64Array;
  readonly weights: Float64Array;
}

const known = new Map<number, Rule>();

/** The Gauss–Legendre rule of n points on −1 … 1: exact for polynomials up to the degree 2n − 1. */
export function gaussLegendre(n: number): Rule {
  const before = known.get(n);
  if (before) return before;
  const rule = { nodes: new Float64Array(n), weights: new Float64Array(n) };
  for (let i = 0; i < n; i++) {
    let x = Math.cos((Math.PI * (i + 0.75)) / (n + 0.5));
    let slope = 0;
    // Newton's method from Tricomi's estimate settles in a few steps.
    for (let step = 0; step < 10; step++) {
      const { value, derivative } = legendre(n, x);
      slope = derivative;
      x -= value / derivative;
    }
    rule.nodes[n - 1 - i] = x;
    rule.weights[n - 1 - i] = 2 / ((1 - x * x) * slope * slope);
  }
  known.set(n, rule);
  return rule;
}

/** The Legendre polynomial of degree n inside −1 … 1, with its derivative. */
export function legendre(n: number, x: number): { readonly value: number; readonly derivative: number } {
  let before = 1;
  let value = n === 0 ? 1 : x;
  for (let k = 2; k <= n; k++) [before, value] = [value, ((2 * k - 1) * x * value - (k - 1) * before) / k];
  return { value, derivative: n === 0 ? 0 : (n * (before - x * value)) / (1 - x * x) };
}

/** The rule of n points on each panel between neighbouring breaks. */
export function onPanels(breaks: readonly number[], n: number): Rule {
  const { nodes, weights } = gaussLegendre(n);
  const panels = breaks.length - 1;
  const rule = { nodes: new Float64Array(n * panels), weights: new Float64Array(n * panels) };
  breaks.slice(1).forEach((high, panel) => {
    const low = breaks[panel] ?? high;
    const half = (high - low) / 2;
    nodes.forEach((x, i) => {
      rule.nodes[panel * n + i] = low + half * (1 + x);
      rule.weights[panel * n + i] = half * (weights[i] ?? 0);
    });
  });
  return rule;
}

/** Breaks that start with the first width and grow by the factor, so that what happens near the lower end is resolved. */
export function gradedBreaks(low: number, high: number, first: number, growth: number): readonly number[] {
  const breaks = [low];
  for (let width = first, next = low + first; next < high - width / 4; width *= growth, next += width)
    breaks.push(next);
  return [...breaks, high];
}

export function integrate({ nodes, weights }: Rule, f: (x: number) => number): number {
  return nodes.reduce((sum, x, i) => sum + (weights[i] ?? 0) * f(x), 0);
}
