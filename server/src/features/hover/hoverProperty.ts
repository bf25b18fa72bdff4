import { evaluate } from '../../model/expression';
import { laterResults } from '../../model/kinds/list';
import { resultNamed } from '../../model/results';
import type { Gas, Record, Value } from '../../model/values';
import { constantNamed } from '../../quantities/constants';
import { kindNamed } from '../../quantities/quantityKinds';
import type { Member, Name } from '../../syntax/nodes';
import { describeFigure } from '../describe/describe';
import { describeShortly } from '../describe/describeShortly';
import { budgetNote, methodNote } from './hoverFigures';
import { hoverSpecies, shareNote } from './hoverGas';
import { bold, code, paragraphs, plainText } from './hoverMarkdown';
import type { HoverPlace } from './hoverPlace';
import { sentence } from './hoverWord';

/** A property of something: its meaning, its value here, and where that comes from. */
export function hoverProperty(member: Member, { text }: Name, place: HoverPlace): string | undefined {
  const { scope, options } = place;
  const constant = isConst(member) ? hoverConstant(text, member, place) : undefined;
  if (constant !== undefined) return constant;
  const object = evaluate(member.object, scope);
  if (object?.kind !== 'record' && object?.kind !== 'gas') return meaningOfResult(text, later(object, text));
  const species = object.species.get(text);
  if (species) {
    const gas = object.kind === 'gas' ? object : object.gas;
    const known = gas?.composition.species.find(({ formula }) => formula === text);
    const note = shareNote(nameOf(member, place), species, options);
    return known ? hoverSpecies(known, note, options) : paragraphs([bold(text), note]);
  }
  return hoverMember(object, text, place);
}

function hoverMember(object: Record | Gas, name: string, place: HoverPlace): string | undefined {
  const { analysis, options, detail } = place;
  const figure = object.members.get(name);
  if (!figure) return meaningOfResult(name, later(object, name));
  if (figure.kind === 'absent') return meaningOfResult(name, sentence(figure.why));
  const row = describeFigure(name, figure, options);
  const { value } = figure;
  return paragraphs([
    titleOfResult(name),
    meaningLine(name),
    `${bold(row.text)}${row.alternative === undefined ? '' : `, ${plainText(row.alternative)}`}`,
    ...(detail === 'full'
      ? [methodNote(row), value.kind === 'quantity' ? budgetNote(analysis, value.leans) : undefined]
      : []),
  ]);
}

function later(object: Value | undefined, name: string): string | undefined {
  const word = object?.kind === 'record' || object?.kind === 'pending' ? object.word : undefined;
  return word !== undefined && (object?.kind === 'pending' || laterResults(word).includes(name))
    ? 'It is computed by a later version.'
    : undefined;
}

function meaningOfResult(name: string, note: string | undefined): string | undefined {
  if (!resultNamed(name)) return note === undefined ? undefined : paragraphs([code(name), note]);
  return paragraphs([titleOfResult(name), meaningLine(name), note]);
}

function titleOfResult(name: string): string {
  const { symbol } = resultNamed(name) ?? {};
  return `${bold(name)}${symbol === undefined ? '' : ` ${plainText(symbol)}`}`;
}

function meaningLine(name: string): string | undefined {
  const { meaning, quantityKind } = resultNamed(name) ?? {};
  const kind = kindNamed(quantityKind ?? '');
  if (meaning === undefined) return undefined;
  return kind && kind.unit !== '1' ? `${sentence(meaning)} In SI: ${plainText(kind.unit)}.` : sentence(meaning);
}

function isConst({ object }: Member): boolean {
  return object.kind === 'name' && object.text === 'const';
}

function hoverConstant(name: string, member: Member, { analysis, scope, options }: HoverPlace): string | undefined {
  const constant = constantNamed(name);
  if (!constant || analysis.find('const')) return undefined;
  const value = evaluate(member, scope);
  if (!value) return undefined;
  const { symbol, title, source } = constant;
  return paragraphs([
    `${bold(`const.${name}`)} ${plainText(symbol)}, ${plainText(title)}`,
    bold(describeShortly(value, { ...options, digits: 9 })),
    plainText(source),
  ]);
}

function nameOf({ object }: Member, { declared }: HoverPlace): string {
  return declared.item.text.slice(object.span.start, object.span.end);
}
