import { describeDimension } from '../quantities/quantityKinds';
import { dimensionless } from '../quantities/dimension';
import type { Expression, Table } from '../syntax/nodes';
import { add, divide, map, multiply, subtract } from './arithmetic';
import { evaluateQuantity } from './expression';
import { mismatch } from './mismatch';
import { contradictoryInput } from './problems/contradictoryInput';
import { outsideRange } from './problems/outsideRange';
import { show } from './quantity';
import type { Scope } from './scope';
import type { NamedTable, Quantity, TableValue } from './values';

/** `[x: y, …]`. A table whose rows are all named, as `[H2O: …, N2: …]`, is looked up by name instead. */
export function evaluateTable(node: Table, scope: Scope): TableValue | NamedTable | undefined {
  return node.rows.length > 0 && node.rows.every((row) => row.at.kind === 'name')
    ? namedTable(node, scope)
    : quantityTable(node, scope);
}

function namedTable(node: Table, scope: Scope): NamedTable | undefined {
  const rows = new Map<string, Quantity>();
  let complete = true;
  for (const row of node.rows) {
    const value = evaluateQuantity(row.value, scope, 'a table');
    if (value && row.at.kind === 'name') rows.set(row.at.text, value);
    else complete = false;
  }
  return complete ? { kind: 'named-table', rows } : undefined;
}

function quantityTable(node: Table, scope: Scope): TableValue | undefined {
  const rows: { at: Quantity; value: Quantity }[] = [];
  let complete = node.rows.length > 0;
  for (const row of node.rows) {
    const at = evaluateQuantity(row.at, scope, 'a table');
    const value = evaluateQuantity(row.value, scope, 'a table');
    const [first] = rows;
    const fits = at && value && alike(row.at, at, first?.at, scope) && alike(row.value, value, first?.value, scope);
    if (fits) rows.push({ at, value });
    else complete = false;
  }
  rows.sort((a, b) => a.at.si - b.at.si);
  if (rows.some((row, index) => row.at.si === rows[index + 1]?.at.si)) {
    scope.report(contradictoryInput.at(node.span, { why: 'two rows of the table stand at the same place' }));
    return undefined;
  }
  return complete ? { kind: 'table', rows } : undefined;
}

function alike(node: Expression, value: Quantity, first: Quantity | undefined, scope: Scope): boolean {
  if (!first || first.dimension === value.dimension) return true;
  const { dimension } = first;
  mismatch(node, value, { subject: 'this column of the table', dimension, wants: describeDimension(dimension) }, scope);
  return false;
}

/**
 * The table's value at a place: between the rows linear, or log–log where both sides are positive and span a decade.
 * Outside the rows the nearest piece is continued, and a warning says so.
 */
export function interpolate(table: TableValue, at: Quantity, node: Expression, scope: Scope): Quantity | undefined {
  const { rows } = table;
  const [first] = rows;
  const last = rows.at(-1);
  if (!first || !last) return undefined;
  if (at.si < first.at.si || at.si > last.at.si) {
    const words = { what: 'the table', value: show(at), low: show(first.at), high: show(last.at) };
    scope.report(outsideRange.at(node.span, words));
  }
  if (rows.length === 1) return first.value;
  const found = rows.findIndex((row) => row.at.si > at.si);
  const upper = Math.max(1, found < 0 ? rows.length - 1 : found);
  const [a, b] = [rows[upper - 1], rows[upper]];
  if (!a || !b) return undefined;
  return spansDecades(rows) && at.si > 0 ? logarithmic(a, b, at) : linear(a, b, at);
}

interface Row {
  readonly at: Quantity;
  readonly value: Quantity;
}

function linear(a: Row, b: Row, at: Quantity): Quantity {
  const share = divide(subtract(at, a.at), subtract(b.at, a.at));
  return { ...add(a.value, multiply(subtract(b.value, a.value), share)), ...shownLike(a.value) };
}

function logarithmic(a: Row, b: Row, at: Quantity): Quantity {
  const log = (x: Quantity) =>
    map({ kind: 'quantity', si: x.si, dimension: dimensionless, leans: x.leans }, Math.log(x.si), 1 / x.si);
  const share = divide(subtract(log(at), log(a.at)), subtract(log(b.at), log(a.at)));
  const exponent = add(log(a.value), multiply(subtract(log(b.value), log(a.value)), share));
  const si = Math.exp(exponent.si);
  return { ...map({ ...exponent, dimension: a.value.dimension }, si, si), ...shownLike(a.value) };
}

function shownLike({ unit }: Quantity): Pick<Quantity, 'unit'> {
  return unit ? { unit } : {};
}

function spansDecades(rows: readonly Row[]): boolean {
  return ([(row: Row) => row.at.si, (row: Row) => row.value.si] as const).every((side) => {
    const values = rows.map(side);
    const least = Math.min(...values);
    return least > 0 && Math.max(...values) >= 10 * least;
  });
}
