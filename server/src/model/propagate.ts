import type { Leans } from './tolerance';

/**
 * Carries tolerances through a computed kind by differences: the model is run once more, up and down, for every cause of
 * tolerance behind its inputs, with all inputs moved together along that cause, so that correlated inputs stay correlated.
 * The stated error of each correlation is a cause too.
 */
export interface Model<Result> {
  readonly inputs: readonly { readonly si: number; readonly leans: Leans }[];
  run(inputs: readonly number[], factors: ReadonlyMap<string, number>): Result;
  /** The errors of the methods that a run rests on: relative half-widths by key. */
  errorsOf(result: Result): readonly { readonly key: string; readonly relative: number }[];
  /** The value of each result, by name; what has none is left out. */
  valuesOf(result: Result): ReadonlyMap<string, number>;
}

export interface Propagated<Result> {
  readonly result: Result;
  readonly leans: ReadonlyMap<string, Leans>;
}

/** Small against the half-width, so that the slope at the value is taken; large against rounding. */
const STEP = 1e-2;

const noFactors: ReadonlyMap<string, number> = new Map();

export function propagate<Result>(model: Model<Result>): Propagated<Result> {
  const best = model.inputs.map(({ si }) => si);
  const result = model.run(best, noFactors);
  const leans = new Map<string, Map<string, number>>();

  const lean = (cause: string, up: Result, down: Result) => {
    const below = model.valuesOf(down);
    for (const [name, above] of model.valuesOf(up)) {
      const amount = (above - (below.get(name) ?? NaN)) / (2 * STEP);
      if (!Number.isFinite(amount) || amount === 0) continue;
      const own = leans.get(name) ?? new Map<string, number>();
      // An input may lean on a correlation that the model uses too; then both ways count, signs and all.
      leans.set(name, own.set(cause, (own.get(cause) ?? 0) + amount));
    }
  };

  for (const cause of new Set(model.inputs.flatMap((input) => [...input.leans.keys()]))) {
    const moved = (by: number) =>
      model.run(
        model.inputs.map(({ si, leans: own }) => si + by * (own.get(cause) ?? 0)),
        noFactors,
      );
    lean(cause, moved(STEP), moved(-STEP));
  }
  for (const { key, relative } of model.errorsOf(result)) {
    const scaled = (by: number) => model.run(best, new Map([[key, 1 + by * relative]]));
    lean(key, scaled(STEP), scaled(-STEP));
  }
  return { result, leans };
}
