import type { Dimension } from '../quantities/dimension';
import { dimensionless } from '../quantities/dimension';
import { nearestNames } from '../quantities/nearestNames';
import { describeDimension, describeUnit, kindsOf } from '../quantities/quantityKinds';
import type { QuantityKind } from '../quantities/quantityKinds';
import { parseUnit } from '../quantities/parseUnit';
import { allSpellings } from '../quantities/unitSpellings';
import type { Expression, NumberLiteral } from '../syntax/nodes';
import { missingUnit } from './problems/missingUnit';
import { unitMismatch } from './problems/unitMismatch';
import type { Scope } from './scope';
import type { Quantity } from './values';

export interface Wanted {
  /** What the value is for: “pressure”. */
  readonly subject: string;
  readonly dimension: Dimension;
  /** With its article: “a pressure”. */
  readonly wants: string;
  readonly kind?: QuantityKind;
}

/** Reports a value of the wrong dimension at the very unit that is wrong, with the units that could have been meant. */
export function mismatch(node: Expression, found: Quantity, wanted: Wanted, scope: Pick<Scope, 'report'>): void {
  const literal = literalOf(node);
  if (literal && !literal.unit) {
    const units = usualUnits(wanted).slice(0, 4);
    scope.report(
      missingUnit.at(literal.span, { subject: wanted.subject, wants: wanted.wants, digits: literal.text, units }),
    );
    return;
  }
  const unit = literal?.unit;
  const parsed = unit && parseUnit(unit.text);
  scope.report(
    unitMismatch.at(unit?.span ?? node.span, {
      subject: wanted.subject,
      wants: wanted.wants,
      found: unit?.text ?? 'this',
      measures: parsed?.ok ? describeUnit(parsed.unit) : describeDimension(found.dimension),
      ...(unit ? { unit: { span: unit.span, candidates: unitsMeant(unit.text, wanted) } } : {}),
      ...advice(found.dimension, wanted.dimension),
    }),
  );
}

/** The number behind a sign, a parenthesis or a tolerance. */
export function literalOf(node: Expression): NumberLiteral | undefined {
  switch (node.kind) {
    case 'number':
      return node;
    case 'unary':
      return literalOf(node.operand);
    case 'group':
      return literalOf(node.inner);
    case 'tolerance':
    case 'conversion':
      return literalOf(node.value);
    default:
      return undefined;
  }
}

/** The units of a dimension that could have been meant by another: those spelt alike, then the usual ones. */
export function unitsMeant(written: string, wanted: Pick<Wanted, 'dimension' | 'kind'>): readonly string[] {
  const sameDimension = allSpellings.filter(({ row }) => row.dimension === wanted.dimension);
  const usual = usualUnits(wanted);
  const startsAlike = usual
    .concat(sameDimension.filter(({ prefix }) => !prefix).map(({ canonical }) => canonical))
    .filter((text) => text.startsWith(written) || written.startsWith(text));
  const speltAlike = nearestNames(written, usual);
  return [...new Set([...startsAlike, ...speltAlike, ...usual])].slice(0, 5);
}

function usualUnits({ dimension, kind }: Pick<Wanted, 'dimension' | 'kind'>): string[] {
  const kinds = kind ? [kind] : kindsOf(dimension).slice(0, 1);
  return kinds.flatMap(({ usual }) => usual).filter((text) => text !== '1');
}

const throughput = parseUnit('Pa·m³/s');
const amountFlow = parseUnit('mol/s');

/** Two mistakes that another unit does not mend. */
function advice(found: Dimension, wanted: Dimension): { advice?: string } {
  if (!throughput.ok || !amountFlow.ok) return {};
  const [byVolume, byAmount] = [throughput.unit.dimension, amountFlow.unit.dimension];
  if (found === byAmount && wanted === byVolume)
    return { advice: 'an amount of gas becomes a throughput at a temperature: multiply by const.R and that' };
  if (found === byVolume && wanted === byAmount)
    return { advice: 'a throughput becomes an amount of gas at a temperature: divide by const.R and that' };
  return wanted === dimensionless && found !== dimensionless ? { advice: 'divide by a quantity of the same kind' } : {};
}
