import { meanMolarMass } from '../physics/composition';
import type { Dimension } from '../quantities/dimension';
import { dimension, dimensionless } from '../quantities/dimension';
import { formatNumber } from '../quantities/format';
import { describeDimension } from '../quantities/quantityKinds';
import type { Mixture, MixturePart, Span } from '../syntax/nodes';
import { add, divide, subtract } from './arithmetic';
import { evaluateQuantity } from './expression';
import { fractionsSum } from './problems/fractionsSum';
import { mixedParts } from './problems/mixedParts';
import { outOfBounds } from './problems/outOfBounds';
import type { Fix } from './problems/problem';
import { replacement } from './problems/problem';
import { plainNumber, quantity, show } from './quantity';
import type { Scope } from './scope';
import type { Gas, Quantity } from './values';

/** One part of a mixture with its share of the molecules. */
export interface Part {
  readonly gas: Gas;
  readonly fraction: Quantity;
}

/** What the amounts of a mixture may measure. All parts measure the same. */
const measures: readonly { readonly dimension: Dimension; readonly by: 'fraction' | 'amount' | 'mass' }[] = [
  { dimension: dimensionless, by: 'fraction' },
  { dimension: dimension({ mass: 1, length: -1, time: -2 }), by: 'amount' },
  { dimension: dimension({ amount: 1, time: -1 }), by: 'amount' },
  { dimension: dimension({ amount: 1 }), by: 'amount' },
  { dimension: dimension({ mass: 1, length: 2, time: -3 }), by: 'amount' },
  { dimension: dimension({ mass: 1 }), by: 'mass' },
  { dimension: dimension({ mass: 1, time: -1 }), by: 'mass' },
];

/** Fractions that miss 100 % by less than this are taken as rounded, and scaled. */
const ROUNDING = 5e-4;

export function readParts(
  node: Mixture,
  scope: Scope,
  gasOf: (name: MixturePart['name']) => Gas | undefined,
): readonly Part[] | undefined {
  const rows = node.parts.map((part) => ({ part, gas: gasOf(part.name), amount: readAmount(part, scope) }));
  if (!consistent(rows, scope)) return undefined;
  const known = rows.flatMap(({ part, gas, amount }) => (gas && amount ? [{ part, gas, amount }] : []));
  if (known.length < rows.length) return undefined;
  const [measure] = known.flatMap(({ amount }) => (amount === 'balance' ? [] : [amount]));
  const by = measures.find((each) => each.dimension === measure?.dimension)?.by ?? 'fraction';
  return by === 'fraction' ? byFraction(node, known, scope) : byAmount(known, by);
}

interface Row {
  readonly part: MixturePart;
  readonly gas: Gas | undefined;
  readonly amount: Quantity | 'balance' | undefined;
}

interface KnownRow {
  readonly part: MixturePart;
  readonly gas: Gas;
  readonly amount: Quantity | 'balance';
}

function readAmount({ amount, name }: MixturePart, scope: Scope): Quantity | 'balance' | undefined {
  if (!amount) return undefined;
  if (amount.kind === 'balance') return 'balance';
  const value = evaluateQuantity(amount, scope, 'the share of a gas');
  if (!value || value.si >= 0) return value;
  const subject = name.kind === 'name' ? `the share of ${name.text}` : 'a share';
  scope.report(outOfBounds.at(amount.span, { subject, value: show(value), bound: 'zero or more' }));
  return undefined;
}

/** Every part has an amount, all measure the same, and at most one is the balance. */
function consistent(rows: readonly Row[], scope: Scope): boolean {
  let sound = true;
  const fault = (span: Span, why: string) => {
    scope.report(mixedParts.at(span, { why }));
    sound = false;
  };
  const [first] = rows.flatMap(({ amount }) => (amount && amount !== 'balance' ? [amount] : []));
  const balances = rows.filter(({ amount }) => amount === 'balance');
  for (const { part, amount } of rows) {
    if (!part.amount && part.name.kind === 'name')
      fault(part.span, `${part.name.text} needs its share, such as 5 % or balance`);
    if (!amount || amount === 'balance' || !part.amount) continue;
    const { span } = part.amount;
    const measure = measures.find((each) => each.dimension === amount.dimension);
    if (!measure)
      fault(
        span,
        `a share is a fraction, a pressure, a flow or a mass, but this is ${describeDimension(amount.dimension)}`,
      );
    else if (first && first.dimension !== amount.dimension) {
      fault(
        span,
        `the parts are of one kind: the first is ${describeDimension(first.dimension)}, but this is ${describeDimension(amount.dimension)}`,
      );
    }
  }
  const [, secondBalance] = balances;
  if (secondBalance) fault(secondBalance.part.span, 'only one part can be the balance');
  const [balance] = balances;
  if (balance && first && first.dimension !== dimensionless)
    fault(balance.part.span, 'a balance completes fractions; here the parts are amounts');
  return sound;
}

function byFraction(node: Mixture, rows: readonly KnownRow[], scope: Scope): readonly Part[] | undefined {
  const given = rows.flatMap(({ amount }) => (amount === 'balance' ? [] : [amount]));
  const sum = given.reduce(add, quantity(0, dimensionless));
  const balanced = given.length < rows.length;
  if (balanced ? sum.si > 1 + ROUNDING : Math.abs(sum.si - 1) > ROUNDING) {
    scope.report(
      fractionsSum.at(node.span, { sum: `${formatNumber(100 * sum.si, 5)} %`, fixes: repairs(rows, given, sum.si) }),
    );
    return undefined;
  }
  // Of parts without a balance each may be uncertain, but they still are the whole.
  if (!balanced)
    return rows.map(({ gas, amount }) => ({
      gas,
      fraction: amount === 'balance' ? plainNumber(0) : divide(amount, sum),
    }));
  const rest = subtract(plainNumber(1), sum);
  return rows.map(({ gas, amount }) => ({
    gas,
    fraction: amount === 'balance' ? { ...rest, si: Math.max(0, rest.si) } : amount,
  }));
}

function byAmount(rows: readonly KnownRow[], by: 'amount' | 'mass'): readonly Part[] {
  const amounts = rows.map(({ gas, amount }) => {
    if (amount === 'balance') return plainNumber(0);
    return by === 'amount' ? amount : divide(amount, molarMassOf(gas));
  });
  const sum = amounts.reduce(add);
  return rows.map(({ gas }, index) => ({ gas, fraction: divide(amounts[index] ?? plainNumber(0), sum) }));
}

function molarMassOf({ members, composition }: Gas): Quantity {
  const mass = members.get('molar_mass');
  return mass?.kind === 'figure' && mass.value.kind === 'quantity'
    ? mass.value
    : plainNumber(meanMolarMass(composition));
}

/** Scale all, or let the last part take up the rest. */
function repairs(rows: readonly KnownRow[], given: readonly Quantity[], sum: number): readonly Fix[] {
  const last = rows.at(-1)?.part.amount;
  const rest = sum - (given.at(-1)?.si ?? 0);
  const fixes: Fix[] = [];
  if (last && last.kind !== 'balance' && rest < 1 && given.length === rows.length) {
    fixes.push({ ...replacement(last.span, 'balance', 'Make the last part the balance'), preferred: true });
  }
  if (sum > 0 && given.length === rows.length) {
    const edits = rows.flatMap(({ part, amount }) =>
      part.amount && amount !== 'balance'
        ? [{ span: part.amount.span, text: `${trimmed((100 * amount.si) / sum)} %` }]
        : [],
    );
    fixes.push({ title: 'Scale the fractions to 100 %', edits });
  }
  return fixes;
}

function trimmed(value: number): string {
  return String(Number(value.toPrecision(6)));
}
