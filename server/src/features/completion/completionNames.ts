import { isWanted } from './completionWanted';
import type { Wanted } from './completionWanted';
import { nameOf } from '../../model/declare';
import type { FunctionDefinition } from '../../model/functions';
import { functions } from '../../model/functions';
import { kindOfWord } from '../../model/kinds/list';
import { gasNames } from '../../model/mixture';
import type { Members, Value } from '../../model/values';
import { constants } from '../../quantities/constants';
import type { Declaration } from '../../syntax/nodes';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';
import type { CompletionPlace } from './completionPlace';
import { showing } from '../describe/describe';
import { describeShortly } from '../describe/describeShortly';

/** A name that a declaration here or in a used file introduces. */
export interface VisibleName {
  readonly name: string;
  /** let, gas, line, site, or the word of the kind. */
  readonly word: string;
  /** Absent while its declaration has none. */
  readonly value?: Value;
  readonly doc?: string;
}

/** All names that can be written at a place but its own. */
export function visibleNames({ analysis, scope, declaration }: CompletionPlace): readonly VisibleName[] {
  const own = nameOf(declaration)?.text;
  const builtIn = new Set(gasNames);
  const names = new Set(scope?.names());
  return [...names].flatMap((name) => {
    const found = name === own ? undefined : analysis.find(name);
    if (!found || (builtIn.has(name) && !found.declared.name)) return [];
    const { declaration: other, doc } = found.declared.item;
    const value = scope?.lookUp(name);
    return [
      {
        name,
        word: wordOf(other),
        ...(value?.kind === 'found' ? { value: value.value } : {}),
        ...(doc === undefined ? {} : { doc }),
      },
    ];
  });
}

/** Names that are declared with one of these words. */
export function namesDeclaredAs(words: readonly string[], place: CompletionPlace): readonly Suggestion[] {
  return visibleNames(place)
    .filter(({ word }) => words.includes(word))
    .map((name) => nameSuggestion(name, place));
}

/** Quantities with a name of their own that fit. */
export function quantitiesNamed(wanted: Wanted | undefined, place: CompletionPlace): readonly Suggestion[] {
  return visibleNames(place)
    .filter(({ value }) => value && fits(value, wanted))
    .map((name) => nameSuggestion(name, place));
}

/** What a sweep may vary: named values, and what has inputs of its own. */
export function variableSuggestions(place: CompletionPlace): readonly Suggestion[] {
  return visibleNames(place)
    .filter(({ word, value }) => value?.kind === 'quantity' || (kindOfWord(word)?.keys ?? []).length > 0)
    .map((name) => nameSuggestion(name, place));
}

/** What an expression may begin with: the values that fit, what has results that fit, functions, constants, other values. */
export function expressionSuggestions(wanted: Wanted | undefined, place: CompletionPlace): readonly Suggestion[] {
  const names = visibleNames(place);
  const group = ({ value }: VisibleName): number => {
    if (!value || value.kind === 'pending') return 3;
    if (fits(value, wanted)) return 0;
    return hasFitting(value, wanted) ? 1 : 2;
  };
  const inGroup = (wantedGroup: number) =>
    names.filter((name) => group(name) === wantedGroup).map((name) => nameSuggestion(name, place));
  return [
    ...inGroup(0),
    ...inGroup(1),
    ...functionSuggestions(wanted, place),
    ...constSuggestion(wanted),
    ...inGroup(2),
    ...inGroup(3),
  ];
}

export function nameSuggestion({ name, word, value, doc }: VisibleName, place: CompletionPlace): Suggestion {
  const { analysis, declared } = place;
  const shown = value && declared ? describeShortly(value, showing(analysis, declared)) : '';
  const detail = value?.kind === 'quantity' ? shown : [word, shown].filter(Boolean).join(', ');
  return suggestion('name', name, detail, doc === undefined ? {} : { documentation: doc });
}

function functionSuggestions(wanted: Wanted | undefined, { following }: CompletionPlace): readonly Suggestion[] {
  const called = following.startsWith('(');
  return functions
    .filter((definition) => !wanted || givesFitting(definition, wanted))
    .map(({ name, usage, meaning }) =>
      suggestion('function', name, usage, {
        documentation: meaning,
        ...(called ? {} : { snippet: `${name}(\${1})` }),
      }),
    );
}

/** A function of numbers gives a number, and one of a gas its own kind; the others give what they take. */
function givesFitting(definition: FunctionDefinition, { kinds }: Wanted): boolean {
  if (definition.takes === 'gas') return kinds.some(({ name }) => name === definition.quantityKind);
  return definition.takes !== 'number' || kinds.some(({ unit }) => unit === '1');
}

function constSuggestion(wanted: Wanted | undefined): readonly Suggestion[] {
  return wanted?.kinds.every(({ unit }) => unit === '1')
    ? []
    : [suggestion('constant', 'const', constants.map(({ symbol }) => symbol).join(' '), { insert: 'const.' })];
}

function fits(value: Value, wanted: Wanted | undefined): boolean {
  return value.kind === 'quantity' && (!wanted || isWanted(wanted, value));
}

function hasFitting(value: Value, wanted: Wanted | undefined): boolean {
  if (value.kind !== 'record' && value.kind !== 'gas') return false;
  return [value.members, ...value.species.values()].some((members) => someFit(members, wanted));
}

function someFit(members: Members, wanted: Wanted | undefined): boolean {
  return [...members.values()].some((figure) => figure.kind === 'figure' && (!wanted || fits(figure.value, wanted)));
}

function wordOf(declaration: Declaration): string {
  return declaration.kind === 'thing' ? declaration.word.text : declaration.kind;
}
