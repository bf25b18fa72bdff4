import type { Problem } from './problems/problem';
import type { Value } from './values';

/** What evaluating a declaration gives. Everything in it is relative to the declaration, so it stays valid when that moves. */
export interface Evaluated {
  readonly outcome: Outcome;
  readonly problems: readonly Problem[];
}

export type Outcome =
  | { readonly kind: 'value'; readonly value: Value }
  /** It has problems of its own. */
  | { readonly kind: 'failed' }
  /** Something it uses has no value; the problem stands there. */
  | { readonly kind: 'blocked' }
  /** The declaration has no value by its nature: `use`, `display`. */
  | { readonly kind: 'none' };

export const failed: Outcome = { kind: 'failed' };
export const blocked: Outcome = { kind: 'blocked' };
export const none: Outcome = { kind: 'none' };

/** Whether two outcomes say the same, so that what depends on them need not run again. */
export function sameOutcome(a: Outcome, b: Outcome): boolean {
  return same(a, b);
}

/** Structural equality of values: plain objects, arrays and maps of the same. */
function same(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (a instanceof Map || b instanceof Map) return a instanceof Map && b instanceof Map && sameMaps(a, b);
  const keys = Object.keys(a);
  if (keys.length !== Object.keys(b).length) return false;
  return keys.every((key) => key in b && same(a[key as keyof typeof a], b[key as keyof typeof b]));
}

function sameMaps(a: ReadonlyMap<unknown, unknown>, b: ReadonlyMap<unknown, unknown>): boolean {
  if (a.size !== b.size) return false;
  for (const [key, value] of a) if (!b.has(key) || !same(value, b.get(key))) return false;
  return true;
}
