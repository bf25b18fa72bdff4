import { kindNamed } from '../quantities/quantityKinds';
import { unitOf } from '../quantities/parseUnit';
import { exact } from './tolerance';
import type { Quantity } from './values';

/**
 * Nominal bores of flanges, mm: the series of ISO 1609 and ISO 2861, which is R10 of the preferred numbers (ISO 3) without 12,5.
 * ISO 1609:2020, 3.1: “value intended to both identify the flange and specify the largest practical size of tubing”.
 */
const series = [10, 16, 20, 25, 32, 40, 50, 63, 80, 100, 125, 160, 200, 250, 320, 400, 500, 630, 800, 1000] as const;

/** Where the tubing that is common with a flange differs from its name (ISO 1609:2020, note 4 to 3.1). */
const practical: ReadonlyMap<string, string> = new Map([
  ['DN63', '70 mm or 65 mm'],
  ['DN160', '153 mm'],
]);

const bores: ReadonlyMap<string, number> = new Map(series.map((size) => [`DN${size}`, size]));

/** `DN10` … `DN1000`: they can be written wherever a length can. */
export const nominalBoreNames: readonly string[] = [...bores.keys()];

export function nominalBore(name: string): Quantity | undefined {
  const size = bores.get(name);
  const kind = kindNamed('length');
  if (size === undefined || !kind) return undefined;
  const unit = unitOf('mm');
  return {
    kind: 'quantity',
    si: size * unit.factor,
    dimension: kind.dimension,
    leans: exact,
    unit,
    quantityKind: 'length',
  };
}

/** What such a name stands for, for a reader. */
export function nominalBoreMeaning(name: string): string | undefined {
  const size = bores.get(name);
  if (size === undefined) return undefined;
  const common = practical.get(name);
  const tubing = common === undefined ? '' : ` ISO 1609 gives ${common} as its practical diameter.`;
  return `the nominal bore ${size} mm of ISO 1609 and ISO 2861; the tubing in use may be wider or narrower.${tubing}`;
}
