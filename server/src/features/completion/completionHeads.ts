import { kindOfWord, kinds } from '../../model/kinds/list';
import type { Head, Name, SiteDeclaration } from '../../syntax/nodes';
import { gasSuggestions } from './completionGases';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';
import { networkSuggestions, passageWords } from './completionKeys';
import { namesDeclaredAs } from './completionNames';
import type { CompletionPlace } from './completionPlace';

/** After `through` and `across`. */
export function headSuggestions({ relation }: Head, place: CompletionPlace): readonly Suggestion[] {
  return relationSuggestions(relation.text, place);
}

/** What may follow the relation of a kind: `of` a gas, `from` a state, `through` a passage. */
export function relationSuggestions(relation: string, place: CompletionPlace): readonly Suggestion[] {
  const { declaration } = place;
  const kind = declaration.kind === 'thing' ? kindOfWord(declaration.word.text) : undefined;
  const head = kind?.heads.find((each) => each.relation === relation);
  switch (head?.wants) {
    case 'gas':
      return gasSuggestions(place);
    case 'record':
      return namesDeclaredAs(head.words ?? [], place);
    case 'route':
      return routeSuggestions(place);
    case undefined:
      return [];
  }
}

/** What gas can go through; in a system all that it connects. */
export function routeSuggestions(place: CompletionPlace): readonly Suggestion[] {
  if (place.declaration.kind === 'thing' && place.declaration.word.text === 'system') return networkSuggestions(place);
  return namesDeclaredAs(['line', ...passageWords], place);
}

/** `site NAME = STATE in GEOMETRY` */
export function siteSuggestions(node: Name, site: SiteDeclaration, place: CompletionPlace): readonly Suggestion[] {
  if (node === site.state) return namesDeclaredAs(['state'], place);
  if (node !== site.geometry) return [];
  if (site.relation.kind === 'hole') {
    return [suggestion('keyword', 'in', 'a geometry'), suggestion('keyword', 'around', 'a particle')];
  }
  const particles = site.relation.text === 'around';
  const geometries = kinds.filter(({ role }) => role === 'geometry').map(({ word }) => word);
  return namesDeclaredAs(
    [...geometries, 'line'].filter((word) => (word === 'particle') === particles),
    place,
  );
}
