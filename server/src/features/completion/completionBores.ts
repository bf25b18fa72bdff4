import type { Key } from '../../model/kinds/kind';
import { nominalBoreMeaning, nominalBoreNames } from '../../model/nominalBores';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';

const all: readonly Suggestion[] = nominalBoreNames.map((name) =>
  suggestion('constant', name, 'nominal bore', { documentation: nominalBoreMeaning(name) ?? '' }),
);

/** The nominal bores, where a bore is asked for. Elsewhere they may be written too, but are hardly meant. */
export function boreSuggestions({ name }: Key): readonly Suggestion[] {
  return name.endsWith('bore') ? all : [];
}
