import type { Comparison } from './compare';

/** How far some rows of one property lie from the printed values. */
export interface Deviations {
  readonly rows: number;
  /** Of the magnitudes, as `measure` says. */
  readonly median: number;
  readonly worst: number;
  /** The largest error that we state for one of the figures; nought where they follow from exact formulas. */
  readonly stated: number;
  /** Of the rows with a stated error, how many it covers; half a unit of the last printed digit is added to it. */
  readonly covered: Count;
  /** How many rows are within the tolerance that they name. */
  readonly within: number;
}

export interface Count {
  readonly count: number;
  readonly of: number;
}

export interface PropertySummary {
  readonly property: string;
  /** Deviations are shares of the printed value, or stand in the unit. */
  readonly measure: Measure;
  readonly all: Deviations;
  readonly gases: readonly { readonly gas: string; readonly deviations: Deviations }[];
}

export type Measure = { readonly kind: 'relative' } | { readonly kind: 'absolute'; readonly unit: string };

/** Properties in the order of the book, and in each its gases likewise. */
export function summarise(comparisons: readonly Comparison[]): readonly PropertySummary[] {
  return [...grouped(comparisons, ({ row }) => row.property)].map(([property, own]) => {
    const measure = measureOf(property, own);
    const gases = [...grouped(own, ({ row }) => gasOf(row.gas))].map(([gas, rows]) => {
      return { gas, deviations: deviationsOf(rows, measure) };
    });
    return { property, measure, all: deviationsOf(own, measure), gases };
  });
}

/** `N2`, or `CO2–N2` of a mixture. */
export function gasOf(gas: Comparison['row']['gas']): string {
  return typeof gas === 'string' ? gas : Object.keys(gas).join('–');
}

/** Ours less the printed value, as a share of it or in its unit. */
export function deviation({ difference, printed }: Comparison, measure: Measure): number {
  return measure.kind === 'relative' ? difference / Math.abs(printed) : difference;
}

/** A share of a virial coefficient says nothing, for it may be nought. */
function measureOf(property: string, [first]: readonly Comparison[]): Measure {
  return property === 'second_virial' && first ? { kind: 'absolute', unit: first.row.unit } : { kind: 'relative' };
}

function deviationsOf(rows: readonly Comparison[], measure: Measure): Deviations {
  const magnitudes = rows.map((row) => Math.abs(deviation(row, measure)));
  const scale = ({ printed }: Comparison) => (measure.kind === 'relative' ? 1 : Math.abs(printed));
  const rated = rows.filter(({ statedShare }) => statedShare > 0);
  return {
    rows: rows.length,
    median: median(magnitudes),
    worst: Math.max(...magnitudes),
    stated: Math.max(...rows.map((row) => row.statedShare * scale(row))),
    covered: { count: rated.filter(({ coverage }) => coverage === 'covered').length, of: rated.length },
    within: rows.filter(({ verdict }) => verdict === 'within').length,
  };
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const at = (index: number) => sorted[index] ?? NaN;
  const middle = Math.floor(sorted.length / 2);
  return sorted.length % 2 === 1 ? at(middle) : (at(middle - 1) + at(middle)) / 2;
}

function grouped<T>(all: readonly T[], key: (one: T) => string): ReadonlyMap<string, readonly T[]> {
  const groups = new Map<string, T[]>();
  for (const one of all) groups.set(key(one), [...(groups.get(key(one)) ?? []), one]);
  return groups;
}
