import { multiply } from '../../model/arithmetic';
import { evaluate } from '../../model/expression';
import { readLiteral } from '../../model/literal';
import { quantity, show } from '../../model/quantity';
import type { Quantity } from '../../model/values';
import { constantNamed } from '../../quantities/constants';
import { parseUnit, unitOf } from '../../quantities/parseUnit';
import { kindNamed } from '../../quantities/quantityKinds';
import type { Expression, Node, NumberLiteral } from '../../syntax/nodes';
import { kindMeant, otherUnits } from '../describe/describeUnits';
import { bold, list, paragraphs, plainText } from './hoverMarkdown';
import type { HoverPlace } from './hoverPlace';
import { referenceOf } from './hoverUnit';
import { sentence } from './hoverWord';

/** Significant digits of a conversion. */
const digits = 5;

/** A number with its unit: the same in three other usual units. */
export function hoverNumber(node: NumberLiteral, place: HoverPlace): string | undefined {
  const parsed = node.unit && parseUnit(node.unit.text);
  if (!parsed?.ok) return undefined;
  const { unit } = parsed;
  const difference = unit.dimension === kelvin && isDifference(place.path);
  const whole = difference ? node : withSign(node, place.path);
  const value = difference ? readLiteral(node, place.scope, 'difference') : evaluate(whole, place.scope);
  if (value?.kind !== 'quantity' || value.dimension !== unit.dimension) return undefined;
  const kind = difference ? kindNamed('temperature_difference') : undefined;
  const others = otherUnits(value, unit, kind ?? kindMeant(unit)).slice(0, 3);
  const written = place.declared.item.text.slice(whole.span.start, whole.span.end);
  return paragraphs([
    `${bold(written)}${difference ? ', a difference' : ''}`,
    list(others.map((other) => plainText(show(value, { ...place.options, unit: other, digits })))),
    unit.kind === 'gauge' ? gaugeNote(place) : undefined,
    throughputNote(value, place),
    [unit, ...others].map((each) => referenceOf(each, place.options)).find((note) => note !== undefined),
  ]);
}

const kelvin = unitOf('K').dimension;

/** The sign of −5 °C belongs to the reading on the scale. */
function withSign(node: NumberLiteral, path: readonly Node[]): Expression {
  const parent = path.at(-2);
  return parent?.kind === 'unary' && parent.operator === '-' ? parent : node;
}

/** A temperature after ±, or added to another, is a difference. */
function isDifference(path: readonly Node[]): boolean {
  return path.some((node) => {
    if (node.kind === 'tolerance') return path.includes(node.halfWidth);
    const sum = node.kind === 'arithmetic' && (node.operator === '+' || node.operator === '-');
    return sum && path.includes(node.right);
  });
}

function gaugeNote({ scope }: HoverPlace): string {
  const ambient = show(scope.condition('ambient_pressure'), { unit: unitOf('kPa'), digits: 6 });
  return sentence(`a gauge pressure; these are absolute, with the ambient pressure of ${ambient}`);
}

/** An amount of gas per time is a throughput once its temperature is known: q = ṅ R T. */
function throughputNote(value: Quantity, { scope, options }: HoverPlace): string | undefined {
  if (value.dimension !== unitOf('mol/s').dimension) return undefined;
  const temperature = scope.condition('ambient_temperature');
  const gasConstant = quantity(constantNamed('R').value, unitOf('J/(mol·K)').dimension);
  const { unit: _unit, ...throughput } = multiply(value, multiply(gasConstant, temperature));
  const shown = show({ ...throughput, quantityKind: 'throughput' }, { ...options, digits });
  const at = show(temperature, { unit: unitOf('°C'), digits: 4 });
  return sentence(`as a throughput at the ambient temperature, ${at}: ${shown}`);
}
