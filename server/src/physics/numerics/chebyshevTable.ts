/** A smooth function of a few variables by its values at Chebyshev’s points, the last variable running fastest. */
export interface ChebyshevTable {
  readonly axes: readonly Axis[];
  readonly values: readonly number[];
}

export interface Axis {
  readonly low: number;
  readonly high: number;
  readonly count: number;
}

/** The points of an axis, ends included, from low to high. */
export function chebyshevPoints({ low, high, count }: Axis): readonly number[] {
  const half = (high - low) / 2;
  return Array.from({ length: count }, (_, i) => low + half * (1 - Math.cos((Math.PI * i) / (count - 1))));
}

/** Fills a table from a function. */
export function tabulate(axes: readonly Axis[], f: (...at: readonly number[]) => number): ChebyshevTable {
  return { axes, values: gridOf(axes).map((at) => f(...at)) };
}

/** All the points of a table, the last variable running fastest. */
export function gridOf(axes: readonly Axis[]): readonly (readonly number[])[] {
  return axes.reduce<readonly (readonly number[])[]>(
    (grid, axis) => grid.flatMap((at) => chebyshevPoints(axis).map((x) => [...at, x])),
    [[]],
  );
}

/** The value there, by the polynomial through all the points (barycentric formula); outside the axes that at their ends. */
export function lookUp({ axes, values }: ChebyshevTable, ...at: readonly number[]): number {
  let rows = values;
  // The last axis runs fastest and is summed up first.
  for (let i = axes.length - 1; i >= 0; i--) {
    const axis = axes[i];
    if (axis) rows = contract(rows, weightsAt(axis, at[i] ?? axis.low));
  }
  return rows[0] ?? NaN;
}

function contract(values: readonly number[], weights: readonly number[]): readonly number[] {
  const rows = values.length / weights.length;
  return Array.from({ length: rows }, (_, row) =>
    weights.reduce((sum, weight, i) => sum + weight * (values[row * weights.length + i] ?? 0), 0),
  );
}

/** The share of each point in the value at x; they add up to one. */
function weightsAt(axis: Axis, x: number): readonly number[] {
  const inside = Math.min(Math.max(x, axis.low), axis.high);
  const points = chebyshevPoints(axis);
  const hit = points.indexOf(inside);
  if (hit >= 0) return points.map((_, i) => (i === hit ? 1 : 0));
  const raw = points.map((point, i) => ((i % 2 === 0 ? 1 : -1) * (isEnd(i, axis) ? 0.5 : 1)) / (inside - point));
  const sum = raw.reduce((a, b) => a + b, 0);
  return raw.map((weight) => weight / sum);
}

function isEnd(i: number, { count }: Axis): boolean {
  return i === 0 || i === count - 1;
}
