import type { Analysis } from '../../model/analysis';
import type { LiteralRole } from '../../model/literal';
import type { Scope } from '../../model/scope';
import { dimensionless } from '../../quantities/dimension';
import type { Unit } from '../../quantities/parseUnit';
import { parseUnit, unitOf } from '../../quantities/parseUnit';
import type { Node, NumberLiteral, Span } from '../../syntax/nodes';
import { wantedAt } from '../completion/completionWanted';
import { kindMeant } from '../describe/describeUnits';
import { readingOfSi, siOfReading, writeQuantity } from './literalReading';
import { selectionAt } from './selection';
import type { TextEdit } from '../textEdit';
import type { Refactoring } from './refactoring';

/** Writes a number in the other usual units of its kind, and its half-width with it where that has a unit of its own. */
export function convertLiteral(analysis: Analysis, range: Span): readonly Refactoring[] {
  const selection = selectionAt(analysis, range);
  const path = selection ? pathToNumber(selection.path) : [];
  const number = path.at(-1);
  if (!selection || number?.kind !== 'number') return [];
  const scope = analysis.scope(selection.declared);
  const reading = readingAt(number, path);
  const unit = unitOfLiteral(number);
  if (!reading || !unit) return [];
  const { offset } = selection.declared.item;
  return unitsFor(unit, reading, path, scope).flatMap((target) => {
    const written = reading.literals.map((literal) => rewritten(literal, target, scope));
    const edits = written.flatMap((edit) =>
      edit ? [{ start: offset + edit.start, end: offset + edit.end, text: edit.text }] : [],
    );
    if (edits.length < written.length) return [];
    return [{ title: `Convert to ${edits.map(({ text }) => text).join(' ± ')}`, edits }];
  });
}

/** A selection of the value with its tolerance means both; the value leads. */
function pathToNumber(path: readonly Node[]): readonly Node[] {
  const end = path.at(-1);
  if (end?.kind === 'unit' && path.at(-2)?.kind === 'number') return path.slice(0, -1);
  if (end?.kind === 'tolerance' || end?.kind === 'unary') {
    const inner = end.kind === 'tolerance' ? end.value : end.operand;
    return pathToNumber([...path, inner]);
  }
  return path;
}

interface Reading {
  /** What is rewritten together, in the order of the text. */
  readonly literals: readonly Literal[];
  /** Whether the value stands alone, so that it may count from a zero of its own. */
  readonly alone: boolean;
}

interface Literal {
  readonly value: number;
  readonly unit: Unit;
  readonly role: LiteralRole;
  readonly span: Span;
}

/** How the number is meant: with its sign where it is a reading, with its half-width, in a sum or alone. */
function readingAt(number: NumberLiteral, path: readonly Node[]): Reading | undefined {
  const parent = path.at(-2);
  const tolerance = parent?.kind === 'tolerance' ? parent : undefined;
  const literal = literalOf(number, number === tolerance?.halfWidth ? 'difference' : 'value');
  if (!literal) return undefined;
  if (literal.role === 'difference') return { literals: [literal], alone: false };
  // −5 °C ± 2 K is minus a toleranced number: the sign stands around both.
  const around = tolerance ? path.at(-3) : parent;
  const sign = around?.kind === 'unary' && around.operator === '-' ? around : undefined;
  const start = sign?.span.start ?? literal.span.start;
  const value = { ...literal, value: sign ? -literal.value : literal.value, span: { ...literal.span, start } };
  const alone = !path.some((node) => node.kind === 'arithmetic' || (node.kind === 'unary' && node !== sign));
  if (tolerance?.halfWidth.kind !== 'number') return { literals: [value], alone: alone && !tolerance };
  const width = literalOf(tolerance.halfWidth, 'difference');
  return width?.unit.dimension === value.unit.dimension
    ? { literals: [value, width], alone }
    : { literals: [value], alone: false };
}

function literalOf(node: NumberLiteral, role: LiteralRole): Literal | undefined {
  const unit = node.comma ? undefined : unitOfLiteral(node);
  return unit && { value: node.value, unit, role, span: node.span };
}

function unitOfLiteral({ unit }: NumberLiteral): Unit | undefined {
  const parsed = unit && parseUnit(unit.text);
  return parsed?.ok ? parsed.unit : undefined;
}

/** The usual units of what is wanted here, or of what the unit is for. A share stays a share. */
function unitsFor(unit: Unit, { alone }: Reading, path: readonly Node[], scope: Scope): readonly Unit[] {
  const wanted = wantedAt(path, scope)?.kinds.find(
    ({ dimension, usual }) => dimension === unit.dimension && usual[0] !== '1',
  );
  const kind = wanted && unit.dimension !== dimensionless ? wanted : kindMeant(unit);
  const scaled = ({ kind: each }: Unit) => each === 'offset' || each === 'gauge';
  if (!kind || (scaled(unit) && !alone)) return [];
  return kind.usual
    .map(unitOf)
    .filter((target) => target.text !== unit.text && target.text !== '1' && (alone || !scaled(target)));
}

/** Nothing where the number would be too large or too small to be written. */
function rewritten({ value, unit, role, span }: Literal, target: Unit, scope: Scope): TextEdit | undefined {
  // A half-width has no use for a scale with a zero of its own.
  const own = role === 'difference' && target.kind === 'gauge' ? unit : target;
  const reading = readingOfSi(siOfReading(value, unit, role, scope), own, role, scope);
  const lost = !Number.isFinite(reading) || (reading === 0 && value !== 0 && own.kind === 'plain');
  return lost ? undefined : { ...span, text: writeQuantity(reading, own) };
}
