import { conditionNamed, standardCondition } from '../../model/conditions';
import { REGIME_LIMITS } from '../../model/assumption';
import { functionNamed } from '../../model/functions';
import { kindOfWord } from '../../model/kinds/list';
import { statements } from '../../model/kinds/statements';
import { show } from '../../model/quantity';
import { regimes } from '../../model/regime';
import { formatNumber } from '../../quantities/format';
import { kindNamed } from '../../quantities/quantityKinds';
import type { Name } from '../../syntax/nodes';
import { bold, paragraphs, plainText } from './hoverMarkdown';
import type { HoverPlace } from './hoverPlace';

/** A word of the format with its meaning. */
export function meaningOf(word: string, meaning: string): string {
  return paragraphs([bold(word), sentence(meaning)]);
}

/** The word that opens a declaration. */
export function hoverWord({ text }: Name): string | undefined {
  const meaning = statements.find(({ word }) => word === text)?.meaning ?? kindOfWord(text)?.meaning;
  return meaning === undefined ? undefined : meaningOf(text, meaning);
}

export function hoverFunction({ text }: Name): string | undefined {
  const found = functionNamed(text);
  return found && meaningOf(found.usage, found.meaning);
}

/** `of`, `from`, `through`, `across`, `in`, `around` */
export function hoverRelation({ text }: Name): string | undefined {
  const meaning = relations.get(text);
  return meaning === undefined ? undefined : meaningOf(text, meaning);
}

const relations: ReadonlyMap<string, string> = new Map([
  ['of', 'says what it is made of, or what it belongs to'],
  ['from', 'takes over what another declaration of this kind was given; what is given anew replaces it'],
  ['through', 'names the passage that the gas goes through'],
  ['across', 'names the geometry that the heat crosses'],
  ['in', 'names the geometry that the gas is in'],
  ['around', 'names the particle that the gas surrounds'],
]);

/** `display pressure in …` */
export function hoverDisplayKind({ text }: Name): string | undefined {
  const kind = kindNamed(text);
  if (!kind) return undefined;
  const units = plainText([...new Set([kind.unit, ...kind.usual])].join(', '));
  return paragraphs([bold(kind.title), sentence(kind.meaning), `SI and usual units: ${units}`]);
}

/** `assume ambient_pressure = …` */
export function hoverCondition({ text }: Name, { scope, options }: HoverPlace): string | undefined {
  if (text === REGIME_LIMITS)
    return meaningOf(text, `the Knudsen numbers from which on a regime holds: ${limits(scope)}`);
  const condition = conditionNamed(text);
  if (!condition) return undefined;
  const now = show(scope.condition(condition.name), options);
  const standard = show(standardCondition(condition), options);
  return paragraphs([
    bold(text),
    sentence(condition.meaning),
    plainText(`In this file ${now}; without an assumption ${standard}.`),
  ]);
}

/** `molecular` */
export function hoverRegime({ text }: Name, { scope }: HoverPlace): string | undefined {
  const regime = regimes.find((each) => each === text);
  if (!regime) return undefined;
  return paragraphs([bold(text), sentence(`a flow regime, by the Knudsen number: ${limits(scope)}`)]);
}

function limits(scope: HoverPlace['scope']): string {
  const { slip, transitional, molecular } = scope.regimeLimits();
  const [low, middle, high] = [slip, transitional, molecular].map((limit) => formatNumber(limit, 2));
  return `viscous < ${low} ≤ slip < ${middle} ≤ transitional < ${high} ≤ molecular`;
}

/** A meaning as a sentence of its own. */
export function sentence(text: string): string {
  const capital = text.charAt(0).toUpperCase() + text.slice(1);
  return plainText(/[.!?”]$/.test(capital) ? capital : `${capital}.`);
}
