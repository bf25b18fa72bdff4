import { show } from '../../model/quantity';
import type { Scope } from '../../model/scope';
import { dimensionless } from '../../quantities/dimension';
import { formatNumber } from '../../quantities/format';
import type { Unit } from '../../quantities/parseUnit';
import { unitOf } from '../../quantities/parseUnit';
import type { QuantityKind } from '../../quantities/quantityKinds';
import { quantityKinds } from '../../quantities/quantityKinds';
import type { UnitRow } from '../../quantities/units';
import { units as rows } from '../../quantities/units';
import { allSpellings } from '../../quantities/unitSpellings';
import type { NumberLiteral } from '../../syntax/nodes';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';
import { measuredFirst } from './completionMeasuredFirst';
import type { CompletionPlace } from './completionPlace';
import type { Wanted } from './completionWanted';
import { isWanted, measured, wantedAt, wantsPlainNumber } from './completionWanted';
import { kindMeant } from '../describe/describeUnits';
import { readingOfSi, siOfReading, withUnit } from '../refactorings/literalReading';

/** The units that fit after a number, after `in` and in `display`: the usual ones first. */
export function unitSuggestions(place: CompletionPlace): readonly Suggestion[] {
  const wanted = wantedAt(place.path, place.scope);
  const texts = wanted ? unitsWanted(wanted, place.typed) : usualUnits(measuredFirst(quantityKinds));
  return texts.map((text) => unitSuggestion(unitOf(text), wanted, place));
}

function unitsWanted(wanted: Wanted, typed: string): readonly string[] {
  if (wantsPlainNumber(wanted)) return [];
  const ladders = wanted.kinds.flatMap(({ ladder }) => ladder).filter((text) => text !== '1');
  const alike = rows.filter((row) => isAlike(row, wanted) && !(wanted.difference && row.kind === 'gauge'));
  return unique([
    ...usualUnits(wanted.kinds),
    ...ladders,
    ...alike.map(({ symbol }) => symbol),
    ...(typed === '' ? [] : speltLike(typed, wanted)),
  ]);
}

/** A watt has the dimension of a throughput, but nobody means one by it. */
function isAlike({ dimension, symbol }: UnitRow, wanted: Wanted): boolean {
  if (dimension === dimensionless || !isWanted(wanted, { dimension })) return false;
  const meant = kindMeant(unitOf(symbol));
  return meant !== undefined && wanted.kinds.includes(meant);
}

/** Units with rarer prefixes are offered once they are begun. */
function speltLike(typed: string, wanted: Wanted): readonly string[] {
  return allSpellings
    .filter(({ row, canonical }) => isAlike(row, wanted) && canonical.startsWith(typed))
    .map(({ canonical }) => canonical);
}

function usualUnits(kinds: readonly QuantityKind[]): readonly string[] {
  return unique(kinds.flatMap(({ usual }) => usual)).filter((text) => text !== '1');
}

function unitSuggestion(unit: Unit, wanted: Wanted | undefined, place: CompletionPlace): Suggestion {
  const [only, second] = unit.parts;
  const plain = only && !second && only.power === 1 && !only.prefix;
  return suggestion('unit', unit.text, detailOf(unit, wanted, place), {
    ...(plain ? { documentation: only.row.meaning } : {}),
    insert: isTight(unit, place) ? ` ${unit.text}` : unit.text,
  });
}

/** Right after the digits a unit begins with its space, but for the degree of angle. */
function isTight(unit: Unit, { path, replace, analysis }: CompletionPlace): boolean {
  const number = path.at(-2);
  return number?.kind === 'number' && unit.text !== '°' && analysis.text.charAt(replace.start - 1) !== ' ';
}

/** What the number would be with this unit, told in another; or the value before `in`, told in this one. */
function detailOf(unit: Unit, wanted: Wanted | undefined, place: CompletionPlace): string {
  const { path, scope } = place;
  const parent = path.at(-2);
  if (parent?.kind === 'conversion') {
    const value = scope && measured(parent.value, scope);
    return value?.dimension === unit.dimension ? show(value, { unit }) : '';
  }
  return parent?.kind === 'number' && scope ? converted(parent, unit, wanted, place, scope) : (titleOf(unit) ?? '');
}

function converted(
  number: NumberLiteral,
  unit: Unit,
  wanted: Wanted | undefined,
  { path, analysis }: CompletionPlace,
  scope: Scope,
): string {
  const kind = wanted?.kinds.find(({ dimension }) => dimension === unit.dimension) ?? kindMeant(unit);
  const other = kind && otherUnit(unit, kind, analysis.display.get(kind.name));
  if (!other) return '';
  const around = path.at(-3);
  const sign = around?.kind === 'unary' && around.operator === '-' ? -1 : 1;
  const role = wanted?.difference ? 'difference' : 'value';
  const si = siOfReading(sign * number.value, unit, role, scope);
  return withUnit(formatNumber(readingOfSi(si, other, role, scope), 4), other);
}

/** The file's own unit, the coherent one, or the most usual other one. */
function otherUnit(unit: Unit, kind: QuantityKind, own: Unit | undefined): Unit | undefined {
  const candidates = [own, unitOf(kind.unit), ...kind.usual.map(unitOf)];
  return candidates.find((other) => other && other.text !== unit.text);
}

function titleOf(unit: Unit): string | undefined {
  return kindMeant(unit)?.title.toLowerCase();
}

function unique(texts: readonly string[]): readonly string[] {
  return [...new Set(texts)];
}
