import type { Tolerance } from '../syntax/nodes';
import type { ConditionName } from './conditions';
import type { RegimeLimits } from './regime';
import type { Problem } from './problems/problem';
import type { DisplayUnits } from './quantity';
import type { Quantity, Value } from './values';

/** What an expression can see, and where its problems go. One scope serves one evaluation of one declaration. */
export interface Scope {
  lookUp(name: string): Lookup;
  /** The names that can be seen, for suggestions. */
  names(): Iterable<string>;
  /** A reference condition, as assumed by the file or by default. */
  condition(name: ConditionName): Quantity;
  /** The Knudsen numbers at which the regimes change. */
  regimeLimits(): RegimeLimits;
  /** What an uncertain number is called as a cause of tolerance. */
  causeOf(node: Tolerance): string;
  report(problem: Problem): void;
}

/** What a whole declaration can see besides. */
export interface DeclarationScope extends Scope {
  /** Whether the file of a `use` can be read; it may still be on its way. */
  used(path: string): 'there' | 'missing' | 'pending';
  /** The units that the file shows its results in. */
  display(): DisplayUnits;
}

export type Lookup =
  | { readonly kind: 'found'; readonly value: Value }
  /** The name is declared, but has no value; its own declaration says why. */
  | { readonly kind: 'blocked' }
  | { readonly kind: 'unknown' };
