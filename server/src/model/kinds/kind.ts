import type { Span, ThingDeclaration } from '../../syntax/nodes';
import type { Scope } from '../scope';
import type { Gas, Record, Value } from '../values';

/**
 * A kind of declaration of the form `word NAME … { … }`. One file in this folder defines it wholly: what it takes, what it
 * computes and what is shown first. The list of kinds is list.ts.
 */
export interface Kind {
  readonly word: string;
  /** What it is, with its article. */
  readonly title: string;
  readonly meaning: string;
  /** What other declarations may use it as. */
  readonly role: 'state' | 'geometry' | 'conduct' | 'part' | 'study' | 'substance';
  readonly heads: readonly HeadDefinition[];
  readonly keys: readonly Key[];
  readonly needs: readonly Need[];
  /** The results an expert asks for first; the hint shows them. */
  readonly hint: readonly string[];
  /** Results that a later version computes. */
  readonly later: readonly string[];
  /** A snippet of the whole declaration, with tab stops. */
  readonly snippet: string;
  /** Absent while the kind is read and checked but not computed. */
  compute?(given: Given, scope: Scope): Record | Gas | undefined;
}

/** `of GAS`, `from STATE`, `through LINE` */
export interface HeadDefinition {
  readonly relation: string;
  readonly wants: 'gas' | 'record' | 'route';
  /** The kinds of record that fit. */
  readonly words?: readonly string[];
}

export interface Key {
  readonly name: string;
  readonly meaning: string;
  readonly symbol?: string;
  readonly type: KeyType;
  /** A value to begin with, for the fix that adds the key and for completion. */
  readonly example: string;
}

export type KeyType =
  | {
      readonly kind: 'quantity';
      /** The name of a kind of quantity. */
      readonly quantity: string;
      readonly bound: Bound;
      /** A throughput may also be given as an amount flow. */
      readonly orAmountFlow?: true;
      /** A table over this kind of quantity fits as well. */
      readonly orTableOver?: string;
      /** A table with a row for each species fits as well. */
      readonly orPerSpecies?: true;
    }
  | { readonly kind: 'word'; readonly words: readonly string[] }
  | { readonly kind: 'words'; readonly meaning: string }
  | { readonly kind: 'gas' }
  | { readonly kind: 'record'; readonly words: readonly string[]; readonly orQuantity?: string };

export type Bound = 'positive' | 'not-negative' | 'fraction' | 'any';

/** So many of these keys must be given, not more and not fewer. */
export interface Need {
  readonly count: number;
  readonly of: readonly string[];
}

/** A declaration as read: everything of its type and within its bounds. */
export interface Given {
  readonly node: ThingDeclaration;
  readonly inputs: ReadonlyMap<string, Value>;
  readonly gas?: Gas;
  readonly from?: Record;
  /** Where to report what concerns an input, or the declaration's name. */
  readonly place: (key?: string) => Span;
}

export function length(
  name: string,
  meaning: string,
  example: string,
  options: { symbol?: string; bound?: Bound } = {},
): Key {
  return ofQuantity(name, 'length', meaning, example, options);
}

export function ofQuantity(
  name: string,
  quantity: string,
  meaning: string,
  example: string,
  { symbol, bound = 'positive' }: { symbol?: string; bound?: Bound } = {},
): Key {
  return { name, meaning, ...(symbol ? { symbol } : {}), example, type: { kind: 'quantity', quantity, bound } };
}

/** Every passage may say how its walls reflect molecules. */
export const accommodation: Key = ofQuantity(
  'accommodation',
  'fraction',
  'the tangential momentum accommodation of the walls; 1, wholly diffuse, is assumed without it',
  '1',
  { symbol: 'α', bound: 'fraction' },
);
