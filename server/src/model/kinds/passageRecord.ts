import { figures } from '../figures';
import { quantityInput } from '../inputs';
import { outOfBounds } from '../problems/outOfBounds';
import { show } from '../quantity';
import type { Scope } from '../scope';
import type { Figure, Quantity, Record, Value, Word } from '../values';
import type { Given } from './kind';

/** What a passage is found to be: its geometry by one exact method, and what comes about otherwise. */
export interface PassageResults {
  readonly method: string;
  readonly geometry: Readonly<{ [name: string]: Quantity | Word }>;
  readonly assumptions?: readonly string[];
  readonly others?: readonly (readonly [string, Figure])[];
}

/** A passage as a record. */
export function passageRecord(word: string, inputs: ReadonlyMap<string, Value>, results: PassageResults): Record {
  const { method, geometry, assumptions = [], others = [] } = results;
  return {
    kind: 'record',
    word,
    inputs,
    species: new Map(),
    members: new Map([...figures(method, geometry, assumptions), ...others]),
  };
}

/** The quantities given for some keys, if all are there. */
export function given<Name extends string>(
  inputs: ReadonlyMap<string, Value>,
  ...names: readonly Name[]
): { readonly [name in Name]: Quantity } | undefined {
  const found = names.map((name) => [name, quantityInput(inputs, name)] as const);
  return found.every(([, value]) => value !== undefined)
    ? (Object.fromEntries(found) as { [name in Name]: Quantity })
    : undefined;
}

/** Reports an input that cannot be beside the others; says whether it was right. */
export function mustBe(
  right: boolean,
  { key, value, bound }: { readonly key: string; readonly value: Quantity; readonly bound: string },
  { place }: Given,
  scope: Scope,
): boolean {
  if (!right) scope.report(outOfBounds.at(place(key), { subject: key, value: show(value), bound }));
  return right;
}
