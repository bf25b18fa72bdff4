import type { Analysis } from '../../model/analysis';
import { functionNamed } from '../../model/functions';
import type { Entry, Name } from '../../syntax/nodes';
import { followingSuggestions } from './completionFollowing';
import { gasSuggestions } from './completionGases';
import { headSuggestions, routeSuggestions, siteSuggestions } from './completionHeads';
import type { CompletionItem, Suggestion } from './completionItem';
import { keySuggestions } from './completionKeys';
import { memberSuggestions, strayMemberSuggestions } from './completionMembers';
import { expressionSuggestions, variableSuggestions } from './completionNames';
import type { CompletionPlace } from './completionPlace';
import { completionPlace } from './completionPlace';
import { unitSuggestions } from './completionUnits';
import { partSuggestions, valueSuggestions } from './completionValues';
import { keyOf, wantedAt } from './completionWanted';
import {
  conditionSuggestions,
  openingSuggestions,
  quantitySuggestions,
  regimeSuggestions,
  wordSuggestions,
} from './completionWords';

/** What can be written at an offset, the likeliest first; only what fits the place. */
export function completion(analysis: Analysis, offset: number): readonly CompletionItem[] {
  const place = completionPlace(analysis, offset);
  if (!place) return [];
  const found = new Map<string, Suggestion>();
  for (const each of suggestions(place)) if (!found.has(each.label)) found.set(each.label, each);
  return [...found.values()].map((each, index) => ({
    ...each,
    replace: place.replace,
    sortText: String(index).padStart(4, '0'),
  }));
}

function suggestions(place: CompletionPlace): readonly Suggestion[] {
  const node = place.path.at(-1);
  switch (node?.kind) {
    case 'unit':
      return unitSuggestions(place);
    case 'junk':
      return [...strayMemberSuggestions(place), ...followingSuggestions(node, place)];
    case 'name':
      return nameSuggestions(node, place);
    default:
      return [];
  }
}

function nameSuggestions(node: Name, place: CompletionPlace): readonly Suggestion[] {
  const parent = place.path.at(-2);
  switch (parent?.kind) {
    case 'stray':
      return openingSuggestions(place);
    case 'thing':
      return node === parent.word ? openingSuggestions(place) : [];
    case 'let':
      return node === parent.name ? [] : expressionHere(place);
    case 'gas':
      return [];
    case 'line':
      return node === parent.name ? [] : routeSuggestions(place);
    case 'site':
      return siteSuggestions(node, parent, place);
    case 'assume':
      return node === parent.name ? conditionSuggestions(place) : expressionHere(place);
    case 'display-item':
      return place.declaration.kind === 'display' ? quantitySuggestions(place.declaration, place) : [];
    case 'head':
      return headSuggestions(parent, place);
    case 'series':
    case 'parallel':
    case 'connection':
      return routeSuggestions(place);
    case 'part':
      return partSuggestions(node, parent, place);
    case 'entry':
      if (node !== parent.key) return entrySuggestions(parent, place);
      return place.declaration.kind === 'thing' ? keySuggestions(place.declaration, parent, place) : [];
    case 'vary':
      return node === parent.target ? variableSuggestions(place) : expressionHere(place);
    case 'member':
      return node === parent.property ? memberSuggestions(parent, place) : expressionHere(place);
    case 'is':
      return node === parent.right ? wordSuggestions(parent, place) : expressionHere(place);
    case 'call':
      return node === parent.arguments[0] && functionNamed(parent.callee.text)?.takes === 'gas'
        ? gasSuggestions(place)
        : expressionHere(place);
    case 'row':
      return node === parent.at ? rowSuggestions(place) : expressionHere(place);
    default:
      return expressionHere(place);
  }
}

function expressionHere(place: CompletionPlace): readonly Suggestion[] {
  return expressionSuggestions(wantedAt(place.path, place.scope), place);
}

function entrySuggestions(entry: Entry, place: CompletionPlace): readonly Suggestion[] {
  const key = keyOf(entry, place.path);
  return key ? valueSuggestions(key, place) : expressionHere(place);
}

/** The rows of a table are named where it has one for each species, or for each regime. */
function rowSuggestions(place: CompletionPlace): readonly Suggestion[] {
  if (place.declaration.kind === 'assume') return regimeSuggestions();
  const entry = place.path.at(-4);
  const key = entry?.kind === 'entry' ? keyOf(entry, place.path) : undefined;
  if (key?.type.kind !== 'quantity' || !key.type.orPerSpecies) return expressionHere(place);
  return [...gasSuggestions(place), ...(key.type.orTableOver === undefined ? [] : expressionHere(place))];
}
