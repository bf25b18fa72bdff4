import type { Dimension } from '../quantities/dimension';
import type { Unit } from '../quantities/parseUnit';
import type { Composition } from '../physics/composition';
import type { Span } from '../syntax/nodes';
import type { Leans } from './tolerance';

/** A physical quantity in coherent SI units, with what its tolerance consists of. */
export interface Quantity {
  readonly kind: 'quantity';
  readonly si: number;
  readonly dimension: Dimension;
  /** How each uncertain input and method moves this value; see tolerance.ts. */
  readonly leans: Leans;
  /** The unit the author wrote or asked for; it serves showing only. */
  readonly unit?: Unit;
  /** The kind of quantity, where the dimension alone does not tell: a throughput is not a power. */
  readonly quantityKind?: string;
}

/** A word of the format, such as a regime. */
export interface Word {
  readonly kind: 'word';
  readonly text: string;
  /** The words it could have been, where they are a closed list. */
  readonly of?: readonly string[];
  /** The words that the tolerance behind it reaches, where they are several. */
  readonly reached?: readonly string[];
}

/** A text in quotes. */
export interface Phrase {
  readonly kind: 'phrase';
  readonly text: string;
}

/** `[x: y, …]`, sorted by x. */
export interface TableValue {
  readonly kind: 'table';
  readonly rows: readonly { readonly at: Quantity; readonly value: Quantity }[];
}

/** A table whose rows are named, such as one value a species. */
export interface NamedTable {
  readonly kind: 'named-table';
  readonly rows: ReadonlyMap<string, Quantity>;
}

/** A gas: what it consists of. The fractions carry their tolerance; `composition` holds their best values. */
export interface Gas {
  readonly kind: 'gas';
  readonly composition: Composition;
  readonly fractions: readonly Quantity[];
  /** What files state of those of its molecules that are not built in, by name. */
  readonly stated: ReadonlyMap<string, StatedSpecies>;
  readonly members: Members;
  readonly species: ReadonlyMap<string, Members>;
}

/** A molecule that a file declares: what is given of it, with its tolerance. */
export interface StatedSpecies {
  readonly name: string;
  readonly inputs: ReadonlyMap<string, Value>;
}

/** Whether a condition holds. */
export interface Verdict {
  readonly kind: 'verdict';
  readonly status: 'holds' | 'fails' | 'undecided';
  /** What the best values say, where the tolerances leave it undecided. */
  readonly holds: boolean;
  /** How far from the limit, as a share of the limit; negative when it fails. Absent where nothing is measured. */
  readonly margin?: number;
  /** What was compared, for a reader. */
  readonly sides: readonly Side[];
  /** What moves the distance to the limit. */
  readonly leans: Leans;
  /** The simple condition that decided, within the declaration. */
  readonly relation?: Span;
  /** Whether that condition stands under a “not”. */
  readonly negated?: boolean;
}

/** One side of a condition: a quantity with the word that leads it in, or a bare word. */
export interface Side {
  readonly text: string;
  readonly value?: Quantity;
}

/** The results of a declaration that computes several: a state, a passage, a site. */
export interface Record {
  readonly kind: 'record';
  /** The word of its kind: state, tube, … */
  readonly word: string;
  readonly members: Members;
  readonly species: ReadonlyMap<string, Members>;
  /** What was given, for declarations that start from this one. */
  readonly inputs: ReadonlyMap<string, Value>;
  /** The gas it is about, if any. */
  readonly gas?: Gas;
}

/** A declaration that is understood but whose results come with a later version. */
export interface Pending {
  readonly kind: 'pending';
  readonly word: string;
}

export type Value = Quantity | Word | Phrase | TableValue | NamedTable | Gas | Verdict | Record | Pending;

export type Members = ReadonlyMap<string, Figure>;

/** One computed result with its pedigree, or the reason why there is none. */
export type Figure =
  | { readonly kind: 'figure'; readonly value: Quantity | Word; readonly provenance: Provenance }
  | { readonly kind: 'absent'; readonly why: string };

export interface Provenance {
  readonly method: string;
  /** Full references, ready to be read. */
  readonly sources: readonly string[];
  /** Where the method is valid, in words. */
  readonly range?: string;
  /** What was assumed without being written, in words. */
  readonly assumptions: readonly string[];
}
