import { conditionNamed } from '../../model/conditions';
import { evaluate } from '../../model/expression';
import { functionNamed } from '../../model/functions';
import type { Key } from '../../model/kinds/kind';
import { kindOfWord } from '../../model/kinds/list';
import type { Scope } from '../../model/scope';
import type { Quantity } from '../../model/values';
import type { Dimension } from '../../quantities/dimension';
import { dimensionless } from '../../quantities/dimension';
import type { QuantityKind } from '../../quantities/quantityKinds';
import { kindNamed, kindsOf } from '../../quantities/quantityKinds';
import type { Arithmetic, Entry, MixturePart, Node } from '../../syntax/nodes';
import { kindMeant } from '../describe/describeUnits';
import { isExpression } from '../refactorings/isExpression';

/** What kinds of quantity fit a place, the likeliest first; their dimensions may differ. */
export interface Wanted {
  readonly dimensions: readonly Dimension[];
  readonly kinds: readonly QuantityKind[];
  /** What is written is a difference: a half-width, or what is added. */
  readonly difference: boolean;
}

export function isWanted({ dimensions }: Wanted, { dimension }: { readonly dimension: Dimension }): boolean {
  return dimensions.includes(dimension);
}

/**
 * What is wanted at the last node of a path: by the key or the condition that it is the value of, or by the other side of
 * a sum or a comparison. Nothing where anything may stand.
 */
export function wantedAt(path: readonly Node[], scope: Scope | undefined): Wanted | undefined {
  const node = path.at(-1);
  const parent = path.at(-2);
  if (!node || !parent) return undefined;
  const around = () => wantedAt(path.slice(0, -1), scope);
  const like = (...others: readonly (Node | undefined)[]) => firstMeasured(others, node, scope);
  switch (parent.kind) {
    case 'number':
    case 'group':
      return around();
    case 'unary':
      return parent.operator === 'not' ? undefined : around();
    case 'arithmetic':
      return wantedInSum(parent, node, like(parent.left, parent.right) ?? around());
    case 'comparison':
      return like(parent.left, parent.right);
    case 'within':
      if (node === parent.halfWidth) return shareFirst(halfWidthOf(like(parent.target, parent.value)));
      return like(parent.target, parent.value);
    case 'between':
      return like(parent.value, parent.low, parent.high);
    case 'tolerance':
      return node === parent.halfWidth ? halfWidthOf(like(parent.value)) : (around() ?? like(parent.halfWidth));
    case 'conversion':
      return node === parent.value ? around() : like(parent.value);
    case 'call': {
      const takes = functionNamed(parent.callee.text)?.takes;
      if (takes === 'number') return wantedKinds('number', 'angle');
      if (takes === 'gas') return wantedKinds('temperature');
      return takes === 'alike' ? (like(...parent.arguments) ?? around()) : placeInTable(parent.callee.text, scope);
    }
    case 'row':
      return wantedInRow(node === parent.at ? 'at' : 'value', path, scope);
    case 'entry':
      return wantedByKey(keyOf(parent, path));
    case 'assume':
      return wantedKinds(
        (parent.name.kind === 'name' ? conditionNamed(parent.name.text)?.quantityKind : undefined) ?? '',
      );
    case 'vary':
      return like(parent.target);
    case 'part':
      return wantedInPart(parent, path, scope);
    case 'display-item':
      return wantedKinds(parent.quantity.kind === 'name' ? parent.quantity.text : '');
    default:
      return undefined;
  }
}

/** The definition of the key of an entry. */
export function keyOf(entry: Entry, path: readonly Node[]): Key | undefined {
  const [declaration] = path;
  if (declaration?.kind !== 'thing') return undefined;
  return kindOfWord(declaration.word.text)?.keys.find(({ name }) => name === entry.key.text);
}

/** The value of a node by itself, where it is a quantity. */
export function measured(node: Node, scope: Scope): Quantity | undefined {
  const value = isExpression(node) ? evaluate(node, scope) : undefined;
  return value?.kind === 'quantity' ? value : undefined;
}

function firstMeasured(
  others: readonly (Node | undefined)[],
  node: Node,
  scope: Scope | undefined,
): Wanted | undefined {
  for (const other of others) {
    const value = other && other !== node && scope ? measured(other, scope) : undefined;
    if (value) return wantedLike(value);
  }
  return undefined;
}

function wantedLike({ dimension, quantityKind, unit }: Quantity): Wanted {
  const known = kindNamed(quantityKind ?? '') ?? (unit && kindMeant(unit));
  const kinds = known?.dimension === dimension ? [known] : kindsOf(dimension);
  return { dimensions: [dimension], kinds, difference: false };
}

/** What is added or subtracted is a difference; a product takes anything. */
function wantedInSum({ operator, right }: Arithmetic, node: Node, wanted: Wanted | undefined): Wanted | undefined {
  if (operator !== '+' && operator !== '-') return undefined;
  return wanted && { ...wanted, difference: node === right };
}

/** A half-width has the unit of its value, or is a share of it. A share of a temperature would be ambiguous. */
function halfWidthOf(value: Wanted | undefined): Wanted | undefined {
  if (!value) return wantedKinds('fraction');
  const temperature = value.kinds.some(({ name }) => name === 'temperature');
  if (temperature) return { ...wantedKindsOf(['temperature_difference']), difference: true };
  return { ...wantedKindsOf([...value.kinds.map(({ name }) => name), 'fraction']), difference: true };
}

/** How near is near is told in per cent more often than not. */
function shareFirst(wanted: Wanted | undefined): Wanted | undefined {
  return wanted && { ...wanted, kinds: [...wanted.kinds].reverse() };
}

function wantedByKey(key: Key | undefined): Wanted | undefined {
  if (key?.type.kind === 'record')
    return key.type.orQuantity === undefined ? undefined : wantedKinds(key.type.orQuantity);
  if (key?.type.kind !== 'quantity') return undefined;
  return wantedKinds(key.type.quantity, ...(key.type.orAmountFlow ? ['amount_flow'] : []));
}

/** In a table of a key the key tells; elsewhere the other rows do. */
function wantedInRow(side: 'at' | 'value', path: readonly Node[], scope: Scope | undefined): Wanted | undefined {
  const table = path.at(-3);
  const entry = path.at(-4);
  const row = path.at(-2);
  if (table?.kind !== 'table') return undefined;
  const key = entry?.kind === 'entry' ? keyOf(entry, path) : undefined;
  if (key?.type.kind === 'quantity') {
    return wantedKinds(side === 'value' ? key.type.quantity : (key.type.orTableOver ?? ''));
  }
  const others = table.rows.filter((each) => each !== row).map((each) => each[side]);
  return row && firstMeasured(others, row, scope);
}

/** Parts of a mixture are fractions, partial pressures, flows or masses, all of one kind. */
function wantedInPart(part: MixturePart, path: readonly Node[], scope: Scope | undefined): Wanted | undefined {
  const mixture = path.at(-3);
  const others = mixture?.kind === 'mixture' ? mixture.parts.filter((each) => each !== part) : [];
  return (
    firstMeasured(
      others.map(({ amount }) => amount),
      part,
      scope,
    ) ?? wantedKinds('fraction', 'pressure', 'amount_flow', 'mass')
  );
}

function placeInTable(name: string, scope: Scope | undefined): Wanted | undefined {
  const found = scope?.lookUp(name);
  const [row] = found?.kind === 'found' && found.value.kind === 'table' ? found.value.rows : [];
  return row && wantedLike(row.at);
}

function wantedKinds(...names: readonly string[]): Wanted | undefined {
  const wanted = wantedKindsOf(names);
  return wanted.kinds.length === 0 ? undefined : wanted;
}

function wantedKindsOf(names: readonly string[]): Wanted {
  const kinds = names.map(kindNamed).filter((kind) => kind !== undefined);
  return { dimensions: kinds.map(({ dimension }) => dimension), kinds, difference: false };
}

/** Plain numbers are asked for their size, not for a unit. */
export function wantsPlainNumber({ dimensions, kinds }: Wanted): boolean {
  return dimensions.every((each) => each === dimensionless) && kinds[0]?.name === 'number';
}
