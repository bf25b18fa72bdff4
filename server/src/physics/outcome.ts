import type { SourceId } from './sources';

/** What the engine hands back: a value with remarks, or the typed reason why there is none. It never throws and never returns NaN. */
export type Outcome<T> = Success<T> | Failure;

export interface Success<T> {
  readonly ok: true;
  readonly value: T;
  readonly notes: readonly Note[];
}

export interface Failure {
  readonly ok: false;
  readonly reason: Reason;
}

/** Why there is no value. All numbers are SI. */
export type Reason =
  /** The species has no data of this sort. */
  | { readonly kind: 'no-data'; readonly species: string; readonly property: DataKind }
  /** The value lies where nothing published can be trusted or continued. */
  | {
      readonly kind: 'outside-range';
      readonly quantity: string;
      readonly value: number;
      readonly low: number;
      readonly high: number;
      readonly source?: SourceId;
    }
  /** A quantity that must be greater than zero is not. */
  | { readonly kind: 'not-positive'; readonly quantity: string; readonly value: number }
  /** The number is too large or too small to be represented. */
  | { readonly kind: 'not-finite'; readonly quantity: string }
  /** The given quantities do not fix the state. */
  | { readonly kind: 'insufficient'; readonly given: readonly string[] }
  /** More quantities are given than the state has degrees of freedom. */
  | { readonly kind: 'surplus'; readonly given: readonly string[] }
  /** The property belongs to one species; the mixture as a whole has none. */
  | { readonly kind: 'per-species'; readonly property: string }
  /** Above the critical temperature or pressure of a species there is no liquid to be in equilibrium with. */
  | {
      readonly kind: 'above-critical';
      readonly species: string;
      readonly quantity: 'temperature' | 'pressure';
      readonly critical: number;
    }
  /** The passage is known with wholly diffuse walls only. */
  | { readonly kind: 'diffuse-only'; readonly passage: string }
  /** The composition names no species. */
  | { readonly kind: 'empty-composition' }
  /** The fractions do not add up to one. */
  | { readonly kind: 'fraction-sum'; readonly sum: number };

/** What a reader should know about a value that there is. All numbers are SI. */
export type Note =
  /** A correlation was continued beyond its range. */
  | {
      readonly kind: 'outside-range';
      readonly quantity: 'temperature';
      readonly value: number;
      readonly low: number;
      readonly high: number;
      readonly property: DataKind;
      readonly species: string;
    }
  /** Classical statistics fail: the degeneracy n Λ³ of the species is above the limit. */
  | { readonly kind: 'quantum'; readonly species: string; readonly degeneracy: number; readonly limit: number }
  /** Dilute-gas theory fails: the hard-sphere covolume 2π/3 n d³ is above the limit. */
  | {
      readonly kind: 'dense';
      readonly covolume: number;
      readonly limit: number;
      readonly spacing: number;
      readonly diameter: number;
    }
  /** A vapour is above its saturation pressure, which is known unless it is colder than the data reach. */
  | {
      readonly kind: 'condensing';
      readonly species: string;
      readonly phase: 'solid' | 'liquid';
      readonly pressure: number;
      readonly saturation?: number;
    }
  /** The gas departs from the ideal-gas law by Z − 1, as the second virial coefficient tells. */
  | { readonly kind: 'not-ideal'; readonly departure: number; readonly limit: number };

/** The sorts of data that a species may have or lack. */
export type DataKind =
  | 'viscosity'
  | 'conductivity'
  | 'heat_capacity'
  | 'pair_potential'
  | 'saturation_pressure'
  | 'saturation_curve'
  | 'critical_point';

const noNotes: readonly Note[] = [];

export function success<T>(value: T, notes: readonly Note[] = noNotes): Success<T> {
  return { ok: true, value, notes };
}

export function failure(reason: Reason): Failure {
  return { ok: false, reason };
}

/** Applies a formula to the value if there is one; notes and reasons pass through. */
export function map<A, B>(outcome: Outcome<A>, formula: (value: A) => B): Outcome<B> {
  return outcome.ok ? success(formula(outcome.value), outcome.notes) : outcome;
}

/** Applies a formula to two values if there are both. */
export function map2<A, B, C>(a: Outcome<A>, b: Outcome<B>, formula: (a: A, b: B) => C): Outcome<C> {
  if (!a.ok) return a;
  if (!b.ok) return b;
  return success(formula(a.value, b.value), joinedNotes(a.notes, b.notes));
}

/** All the values, if there are all. */
export function all(outcomes: readonly Outcome<number>[]): Outcome<readonly number[]> {
  const values: number[] = [];
  let notes: readonly Note[] = [];
  for (const outcome of outcomes) {
    if (!outcome.ok) return outcome;
    values.push(outcome.value);
    notes = joinedNotes(notes, outcome.notes);
  }
  return success(values, notes);
}

function joinedNotes(a: readonly Note[], b: readonly Note[]): readonly Note[] {
  if (a.length === 0) return b;
  const fresh = b.filter((note) => !a.includes(note));
  return fresh.length === 0 ? a : [...a, ...fresh];
}
