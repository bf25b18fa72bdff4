import { kindNamed } from '../quantities/quantityKinds';
import type { QuantityKind } from '../quantities/quantityKinds';
import { nearestNames } from '../quantities/nearestNames';
import { dimension } from '../quantities/dimension';
import type { Entry, Span, ThingDeclaration } from '../syntax/nodes';
import { describeValue, evaluate } from './expression';
import type { Bound, Key, Kind } from './kinds/kind';
import { literalOf, mismatch } from './mismatch';
import { evaluateMixture, gasOf } from './mixture';
import { checkNeeds, removal } from './needs';
import { absoluteZero } from './problems/absoluteZero';
import { duplicateKey } from './problems/duplicateKey';
import { outOfBounds } from './problems/outOfBounds';
import { either } from './problems/problem';
import { unknownKey } from './problems/unknownKey';
import { unknownName } from './problems/unknownName';
import { wrongType } from './problems/wrongType';
import { show } from './quantity';
import type { Scope } from './scope';
import type { Quantity, TableValue, Value } from './values';

/** The inputs of a declaration, each of its type and within its bounds; nothing when some are missing or wrong. */
export function readInputs(
  node: ThingDeclaration,
  kind: Kind,
  scope: Scope,
  inherited: ReadonlyMap<string, Value> | 'unknown' = new Map(),
): ReadonlyMap<string, Value> | undefined {
  const own = new Map<string, Value>();
  const entries = new Map<string, Entry>();
  const misspelt: string[] = [];
  let sound = true;
  for (const item of node.block?.items ?? []) {
    if (item.kind !== 'entry') continue;
    const key = kind.keys.find(({ name }) => name === item.key.text);
    if (!key) {
      const nearest = nearestNames(
        item.key.text,
        kind.keys.map(({ name }) => name),
      );
      scope.report(unknownKey.at(item.key.span, { what: kind.title, key: item.key.text, nearest }));
      misspelt.push(...nearest);
      sound = false;
    } else if (entries.has(key.name)) {
      scope.report(duplicateKey.at(item.key.span, { key: key.name, removal: removal(node, item) }));
    } else {
      entries.set(key.name, item);
      const value = readInput(item, key, scope);
      if (value) own.set(key.name, value);
      else sound = false;
    }
  }
  // What is missing may come from the declaration that this one starts from.
  if (inherited === 'unknown') return undefined;
  const given = [...entries.keys()];
  const complete = checkNeeds(node, kind, { given, misspelt, inherited: [...inherited.keys()], entries }, scope);
  return sound && complete ? new Map([...replacedBy(given, kind, inherited), ...own]) : undefined;
}

export function quantityInput(inputs: ReadonlyMap<string, Value>, name: string): Quantity | undefined {
  const value = inputs.get(name);
  return value?.kind === 'quantity' ? value : undefined;
}

/** Where the value of a key stands, for problems that are found only when computing. */
export function placeOf(node: ThingDeclaration, key?: string): Span {
  const entry = node.block?.items.find((item) => item.kind === 'entry' && item.key.text === key);
  return entry?.kind === 'entry' ? entry.value.span : node.name.span;
}

/** A declaration that gives a whole sufficient set anew inherits none of the old one. */
function replacedBy(given: readonly string[], kind: Kind, inherited: ReadonlyMap<string, Value>): [string, Value][] {
  const renewed = kind.needs.filter(({ count, of }) => of.filter((name) => given.includes(name)).length >= count);
  return [...inherited].filter(([name]) => !renewed.some(({ of }) => of.includes(name)));
}

function readInput(entry: Entry, key: Key, scope: Scope): Value | undefined {
  const { value: node } = entry;
  const { type } = key;
  if (node.kind === 'mixture') {
    if (type.kind === 'gas') return evaluateMixture(node, scope);
    scope.report(wrongType.at(node.span, { subject: key.name, wants: wants(key), found: 'a mixture' }));
    return undefined;
  }
  if (type.kind === 'word' && node.kind === 'name') {
    if (type.words.includes(node.text)) return { kind: 'word', text: node.text };
    const nearest = nearestNames(node.text, type.words);
    scope.report(unknownName.at(node.span, { what: `word for ${key.name}`, name: node.text, nearest }));
    return undefined;
  }
  const value = evaluate(node, scope);
  if (!value) return undefined;
  if (type.kind === 'quantity' && value.kind === 'quantity') return checkQuantity(entry, key, value, scope);
  if (type.kind === 'quantity' && value.kind === 'table' && type.orTableOver !== undefined)
    return checkTable(entry, key, value, scope);
  if (fits(value, key)) return value;
  scope.report(wrongType.at(node.span, { subject: key.name, wants: wants(key), found: describeValue(value) }));
  return undefined;
}

const amountFlow = dimension({ amount: 1, time: -1 });

function checkQuantity(entry: Entry, key: Key, value: Quantity, scope: Scope): Quantity | undefined {
  const { type } = key;
  if (type.kind !== 'quantity' || entry.value.kind === 'mixture') return undefined;
  const kind = kindNamed(type.quantity);
  if (!kind) return undefined;
  if (type.orAmountFlow && value.dimension === amountFlow) return value;
  if (value.dimension !== kind.dimension) {
    mismatch(entry.value, value, { subject: key.name, dimension: kind.dimension, wants: wants(key), kind }, scope);
    return undefined;
  }
  return within(entry, key.name, value, kind, type.bound, scope) ? { ...value, quantityKind: kind.name } : undefined;
}

/** Every row of a table is of the right kinds and within the bounds. */
function checkTable(entry: Entry, key: Key, table: TableValue, scope: Scope): TableValue | undefined {
  const { type } = key;
  if (type.kind !== 'quantity' || entry.value.kind === 'mixture') return undefined;
  const [over, kind] = [kindNamed(type.orTableOver ?? ''), kindNamed(type.quantity)];
  const [first] = table.rows;
  if (!over || !kind || !first) return undefined;
  const literal = entry.value.kind === 'table' ? entry.value.rows[0] : undefined;
  const place = `the places of ${key.name}`;
  if (first.at.dimension !== over.dimension) {
    const wanted = {
      subject: place,
      dimension: over.dimension,
      wants: withArticle(over.title.toLowerCase()),
      kind: over,
    };
    mismatch(literal?.at ?? entry.value, first.at, wanted, scope);
    return undefined;
  }
  if (first.value.dimension !== kind.dimension && !(type.orAmountFlow && first.value.dimension === amountFlow)) {
    const wanted = { subject: key.name, dimension: kind.dimension, wants: wants(key), kind };
    mismatch(literal?.value ?? entry.value, first.value, wanted, scope);
    return undefined;
  }
  return table.rows.every((row) => within(entry, key.name, row.value, kind, type.bound, scope)) &&
    table.rows.every((row) => within(entry, place, row.at, over, 'positive', scope))
    ? table
    : undefined;
}

function within(
  entry: Entry,
  subject: string,
  value: Quantity,
  kind: QuantityKind,
  bound: Bound,
  scope: Scope,
): boolean {
  if (entry.value.kind === 'mixture') return false;
  const place = literalOf(entry.value)?.span ?? entry.value.span;
  if (kind.name === 'temperature' && !(value.si > 0)) {
    scope.report(absoluteZero.at(place, { subject, value: show(value) }));
    return false;
  }
  const right = BOUNDS[bound];
  if (right.holds(value.si)) return true;
  scope.report(outOfBounds.at(place, { subject, value: show(value), bound: right.words }));
  return false;
}

const BOUNDS: { readonly [bound in Bound]: { readonly words: string; holds(si: number): boolean } } = {
  positive: { words: 'above zero', holds: (si) => si > 0 },
  'not-negative': { words: 'zero or more', holds: (si) => si >= 0 },
  fraction: { words: 'between 0 and 1', holds: (si) => si >= 0 && si <= 1 },
  any: { words: 'finite', holds: () => true },
};

function fits(value: Value, { type }: Key): boolean {
  switch (type.kind) {
    case 'quantity':
      return (
        (value.kind === 'table' && type.orTableOver !== undefined) ||
        (value.kind === 'named-table' && type.orPerSpecies === true)
      );
    case 'word':
      return false;
    case 'words':
      return value.kind === 'phrase';
    case 'gas':
      return gasOf(value) !== undefined;
    case 'record':
      if (value.kind === 'record' || value.kind === 'pending') return type.words.includes(value.word);
      return value.kind === 'quantity' && kindNamed(type.orQuantity ?? '')?.dimension === value.dimension;
  }
}

/** What a key wants, with its article. */
export function wants({ type }: Key): string {
  switch (type.kind) {
    case 'quantity':
      return withArticle((kindNamed(type.quantity)?.title ?? type.quantity).toLowerCase());
    case 'word':
      return `one of ${either(type.words)}`;
    case 'words':
      return 'a text in quotes';
    case 'gas':
      return 'a gas';
    case 'record':
      return `the name of ${either(type.words.map(withArticle))}`;
  }
}

function withArticle(noun: string): string {
  return /^[aeiou]/.test(noun) ? `an ${noun}` : `a ${noun}`;
}
