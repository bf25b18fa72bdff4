/** A property at one temperature, K, or at one place of another quantity. */
export interface Point {
  readonly at: number;
  readonly value: number;
}

/**
 * A table read at a place: between its points linear, or log–log where both sides are positive and span a decade.
 * Beyond them the value at the end stands. The points stand in order.
 */
export function interpolated(points: readonly Point[], at: number): number {
  const [first] = points;
  const last = points.at(-1);
  if (first === undefined || last === undefined) return NaN;
  if (at <= first.at) return first.value;
  if (last.at <= at) return last.value;
  const upper = points.findIndex((point) => at < point.at);
  const b = points[upper] ?? last;
  const a = points[upper - 1] ?? first;
  return spanDecades(points) ? Math.exp(between(log(a), log(b), Math.log(at))) : between(a, b, at);
}

/** The straight line through two points. */
export function between(a: Point, b: Point, at: number): number {
  return a.value + ((b.value - a.value) * (at - a.at)) / (b.at - a.at);
}

function log({ at, value }: Point): Point {
  return { at: Math.log(at), value: Math.log(value) };
}

function spanDecades(points: readonly Point[]): boolean {
  return [points.map(({ at }) => at), points.map(({ value }) => value)].every((side) => {
    const least = Math.min(...side);
    return 0 < least && 10 * least <= Math.max(...side);
  });
}
