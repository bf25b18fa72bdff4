import { unitOf } from '../quantities/parseUnit';
import { resultNamed } from './results';
import type { Figure, Members, Provenance, Quantity, Word } from './values';

/** Results that one exact method gives all at once. */
export function figures(
  method: string,
  values: Readonly<{ [name: string]: Quantity | Word }>,
  assumptions: readonly string[] = [],
  sources: readonly string[] = [],
): Members {
  const provenance: Provenance = { method, sources, assumptions };
  return new Map(Object.entries(values).map(([name, value]) => [name, figure(named(name, value), provenance)]));
}

export function figure(value: Quantity | Word, provenance: Provenance): Figure {
  return { kind: 'figure', value, provenance };
}

function named(name: string, value: Quantity | Word): Quantity | Word {
  if (value.kind === 'word') return value;
  const { quantityKind, unit } = resultNamed(name) ?? {};
  // A result is shown in the file's unit for it, not in whatever its inputs happened to be written in.
  const { unit: _unit, ...plain } = value;
  return {
    ...plain,
    ...(quantityKind === undefined ? {} : { quantityKind }),
    ...(unit === undefined ? {} : { unit: unitOf(unit) }),
  };
}
