import type { Key } from '../../model/kinds/kind';
import type { MixturePart, Name } from '../../syntax/nodes';
import { boreSuggestions } from './completionBores';
import { gasSuggestions } from './completionGases';
import { relationSuggestions } from './completionHeads';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';
import { expressionSuggestions, namesDeclaredAs, quantitiesNamed } from './completionNames';
import type { CompletionPlace } from './completionPlace';
import { wantedAt } from './completionWanted';

/** What may be the value of a key, by its type. */
export function valueSuggestions(key: Key, place: CompletionPlace): readonly Suggestion[] {
  const { type } = key;
  const wanted = wantedAt(place.path, place.scope);
  switch (type.kind) {
    case 'quantity':
      return [...expressionSuggestions(wanted, place), ...boreSuggestions(key)];
    case 'word':
      return type.words.map((word) => suggestion('word', word, key.meaning));
    case 'words':
      return [];
    case 'gas':
      return gasSuggestions(place);
    case 'record': {
      const records = namesDeclaredAs(type.words, place);
      return type.orQuantity === undefined ? records : [...records, ...expressionSuggestions(wanted, place)];
    }
  }
}

/** In a mixture: its gases and their amounts. After a word such as `from` it is one name of a kind. */
export function partSuggestions(node: Name, part: MixturePart, place: CompletionPlace): readonly Suggestion[] {
  if (node !== part.name) {
    const rest = suggestion('keyword', 'balance', 'what the other parts leave');
    return [rest, ...quantitiesNamed(wantedAt(place.path, place.scope), place)];
  }
  const around = place.path.at(-4);
  if (around?.kind === 'head') return relationSuggestions(around.relation.text, place);
  return gasSuggestions(place);
}
