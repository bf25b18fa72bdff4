/** A cubic spline through values at equal distances, twice continuously differentiable. */
export interface UniformSpline {
  readonly values: readonly number[];
  /** The second derivatives at the values, with the distance as unit. */
  readonly curvatures: readonly number[];
}

/** At the ends the curvature is that of the cubic through the last four values. */
export function uniformSpline(values: readonly number[]): UniformSpline {
  const last = values.length - 1;
  const at = (index: number) => values[index] ?? NaN;
  const end = (index: number, inward: 1 | -1) =>
    2 * at(index) - 5 * at(index + inward) + 4 * at(index + 2 * inward) - at(index + 3 * inward);
  const curvatures: number[] = values.map(() => 0);
  curvatures[0] = end(0, 1);
  curvatures[last] = end(last, -1);

  // The rows m[i−1] + 4 m[i] + m[i+1] = 6 (second difference) by Thomas's elimination.
  const pivots = values.map(() => 4);
  const right = values.map((_, i) => 6 * (at(i - 1) - 2 * at(i) + at(i + 1)));
  right[1] = (right[1] ?? 0) - end(0, 1);
  right[last - 1] = (right[last - 1] ?? 0) - end(last, -1);
  for (let i = 2; i < last; i += 1) {
    const factor = 1 / (pivots[i - 1] ?? 1);
    pivots[i] = 4 - factor;
    right[i] = (right[i] ?? 0) - factor * (right[i - 1] ?? 0);
  }
  for (let i = last - 1; i > 0; i -= 1) {
    const above = i === last - 1 ? 0 : (curvatures[i + 1] ?? 0);
    curvatures[i] = ((right[i] ?? 0) - above) / (pivots[i] ?? 1);
  }
  return { values, curvatures };
}

/** The value at so many distances from the first, with its slope per distance; within the spline. */
export function splineAt({ values, curvatures }: UniformSpline, place: number): { value: number; slope: number } {
  const interval = Math.min(Math.max(Math.floor(place), 0), values.length - 2);
  const b = place - interval;
  const a = 1 - b;
  const [low, high] = [values[interval] ?? NaN, values[interval + 1] ?? NaN];
  const [m, n] = [curvatures[interval] ?? NaN, curvatures[interval + 1] ?? NaN];
  return {
    value: a * low + b * high + ((a * a * a - a) * m + (b * b * b - b) * n) / 6,
    slope: high - low + ((1 - 3 * a * a) * m + (3 * b * b - 1) * n) / 6,
  };
}
