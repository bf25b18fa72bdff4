import { toSI, toSIDifference, fromSI } from '../quantities/conversion';
import type { Unit, UnitFault } from '../quantities/parseUnit';
import { parseUnit, unitOf } from '../quantities/parseUnit';
import type { Expression, NumberLiteral, Span, Unary, UnitText } from '../syntax/nodes';
import { ambiguousTemperature } from './problems/ambiguousTemperature';
import { absoluteZero } from './problems/absoluteZero';
import { decimalComma } from './problems/decimalComma';
import { gaugePressure } from './problems/gaugePressure';
import { noValue } from './problems/noValue';
import { replacement } from './problems/problem';
import { unknownUnit } from './problems/unknownUnit';
import { plainNumber, quantity, show } from './quantity';
import type { Scope } from './scope';
import type { Quantity } from './values';

/** How a literal is meant: as a value, or as a difference (after ± or added to something). */
export type LiteralRole = 'value' | 'difference';

/**
 * Reads a number with its unit. Offset temperatures and gauge pressures are converted here, with the minus before them,
 * because they are points on a scale: in the algebra there are only kelvin and absolute pressures.
 */
export function readLiteral(
  node: NumberLiteral,
  scope: Scope,
  role: LiteralRole = 'value',
  minus?: Unary,
): Quantity | undefined {
  if (node.comma) {
    scope.report(decimalComma.at(node.digits, { digits: node.text, inList: false }));
    return undefined;
  }
  const value = minus ? -node.value : node.value;
  const span = minus ? { start: minus.span.start, end: node.span.end } : node.span;
  const unit = node.unit && readUnit(node.unit, scope);
  if (node.unit && !unit) return undefined;
  if (!Number.isFinite(unit ? toSI(value, unit) : value)) {
    scope.report(noValue.at(span, { why: 'the number is too large to be represented' }));
    return undefined;
  }
  if (!unit) return plainNumber(value);
  if (role === 'difference')
    return { ...quantity(toSIDifference(value, unit, reference(unit, scope)), unit.dimension), ...keptUnit(unit) };
  switch (unit.kind) {
    case 'gauge':
      return readGauge(span, value, unit, scope);
    case 'offset':
      return readOffset(span, value, unit, scope);
    case 'plain':
    case 'standard-flow':
      return { ...quantity(toSI(value, unit, reference(unit, scope)), unit.dimension), unit };
  }
}

/** Reads a unit; what is wrong with it is reported at the very part. */
export function readUnit(node: UnitText, scope: Pick<Scope, 'report'>): Unit | undefined {
  const result = parseUnit(node.text);
  if (result.ok) return result.unit;
  reportUnitFault(node, result.fault, scope);
  return undefined;
}

/** Whether an expression is a literal such as `25 °C`: a point on a scale, not yet a quantity of the algebra. */
export function offsetLiteral(node: Expression): NumberLiteral | undefined {
  switch (node.kind) {
    case 'number': {
      const unit = node.unit && parseUnit(node.unit.text);
      return unit?.ok && unit.unit.kind === 'offset' ? node : undefined;
    }
    case 'unary':
      return node.operator === 'not' ? undefined : offsetLiteral(node.operand);
    case 'group':
      return offsetLiteral(node.inner);
    case 'tolerance':
      return offsetLiteral(node.value);
    default:
      return undefined;
  }
}

/** Whether an expression is a literal such as `2 barg`. In parentheses it is an absolute pressure already. */
export function gaugeLiteral(node: Expression): NumberLiteral | undefined {
  if (node.kind === 'tolerance') return gaugeLiteral(node.value);
  const unit = node.kind === 'number' && node.unit ? parseUnit(node.unit.text) : undefined;
  return node.kind === 'number' && unit?.ok && unit.unit.kind === 'gauge' ? node : undefined;
}

function readGauge(span: Span, value: number, unit: Unit, scope: Scope): Quantity {
  const ambient = scope.condition('ambient_pressure');
  const si = toSI(value, unit) + ambient.si;
  const absoluteUnit = unitOf(unit.text === 'barg' ? 'bar' : 'psi');
  const absolute = `${String(Number(fromSI(si, absoluteUnit).toPrecision(8)))} ${absoluteUnit.text}`;
  scope.report(gaugePressure.at(span, { ambient: show(ambient, { unit: unitOf('kPa') }), absolute }));
  return { ...quantity(si, unit.dimension, ambient.leans), unit: absoluteUnit };
}

function readOffset(span: Span, value: number, unit: Unit, scope: Scope): Quantity | undefined {
  const si = toSI(value, unit);
  if (!(si > 0)) {
    scope.report(absoluteZero.at(span, { subject: 'the temperature', value: `${String(value)} ${unit.text}` }));
    return undefined;
  }
  return { ...quantity(si, unit.dimension), unit, quantityKind: 'temperature' };
}

/** A difference is shown in its unit only where that has no zero of its own. */
function keptUnit(unit: Unit): { unit?: Unit } {
  return unit.kind === 'plain' || unit.kind === 'standard-flow' ? { unit } : {};
}

function reference(unit: Unit, scope: Scope): { temperature: number; pressure: number } | undefined {
  if (unit.standardPower === 0) return undefined;
  return { temperature: scope.condition('standard_temperature').si, pressure: scope.condition('standard_pressure').si };
}

function reportUnitFault(node: UnitText, fault: UnitFault, scope: Pick<Scope, 'report'>): void {
  const span =
    'start' in fault ? { start: node.span.start + fault.start, end: node.span.start + fault.end } : node.span;
  switch (fault.kind) {
    case 'unknown':
      scope.report(unknownUnit.at(span, { name: fault.name, nearest: fault.nearest }));
      return;
    case 'offset-in-product':
      scope.report(
        ambiguousTemperature.at(span, {
          written: fault.name,
          why: 'is a point on a scale and cannot be part of a product; write K',
          readings: [{ ...replacement(span, 'K', 'Use K'), preferred: true }],
        }),
      );
      return;
    case 'gauge-in-product': {
      const plain = fault.name.replace(/g$/, '');
      scope.report(unknownUnit.at(span, { name: fault.name, nearest: [plain] }));
      return;
    }
    case 'malformed':
      scope.report(unknownUnit.at(node.span, { name: node.text, nearest: [] }));
  }
}
