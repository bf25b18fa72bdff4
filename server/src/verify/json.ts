import type { Circumstances } from './circumstances';
import type { Comparison } from './compare';
import type { Deviations } from './summary';
import { gasOf, summarise } from './summary';

/** What `verify --format json` prints. Deviations are shares, or in the unit that is named. */
export interface JsonVerification {
  readonly versions: readonly string[];
  readonly constants: readonly { name: string; value: number; unit: string; source: string }[];
  readonly verdict: 'within' | 'beyond';
  readonly properties: readonly JsonProperty[];
  /** Those that are off, or every one. */
  readonly rows: readonly JsonRow[];
}

export interface JsonProperty extends Deviations {
  readonly property: string;
  /** Empty where deviations are shares. */
  readonly unit: string;
  readonly gases: readonly ({ readonly gas: string } & Deviations)[];
}

export interface JsonRow {
  readonly property: string;
  readonly gas: string;
  /** K and Pa. */
  readonly temperature: number;
  readonly pressure: number;
  readonly printed: string;
  readonly unit: string;
  /** Null where there is no value. */
  readonly ours: number | null;
  readonly difference: number | null;
  readonly tolerance: number | null;
  readonly verdict: 'within' | 'beyond';
  readonly source: string;
  readonly where: string;
}

export function verifyJson(
  { versions, constants }: Circumstances,
  comparisons: readonly Comparison[],
  { rows }: { readonly rows: 'beyond' | 'all' },
): JsonVerification {
  const beyond = comparisons.filter(({ verdict }) => verdict === 'beyond');
  return {
    versions,
    constants: constants.map(({ name, value, unit, source }) => ({ name, value, unit, source })),
    verdict: beyond.length === 0 ? 'within' : 'beyond',
    properties: summarise(comparisons).map(({ property, measure, all, gases }) => ({
      property,
      unit: measure.kind === 'absolute' ? measure.unit : '',
      ...all,
      gases: gases.map(({ gas, deviations }) => ({ gas, ...deviations })),
    })),
    rows: (rows === 'all' ? comparisons : beyond).map(jsonRow),
  };
}

function jsonRow({ row, ours, difference, tolerance, verdict }: Comparison): JsonRow {
  const { property, gas, temperature, pressure, printed, unit, source, where } = row;
  return {
    ...{ property, gas: gasOf(gas), temperature, pressure, printed, unit },
    ...{ ours: orNull(ours), difference: orNull(difference), tolerance: orNull(tolerance) },
    ...{ verdict, source, where },
  };
}

/** JSON has no word for what is not a number. */
function orNull(value: number): number | null {
  return Number.isFinite(value) ? value : null;
}
