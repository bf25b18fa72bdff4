import { builtInGas, gasNames } from '../../model/mixture';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';
import { namesDeclaredAs } from './completionNames';
import type { CompletionPlace } from './completionPlace';

/** The gases that can be written: those of the files first, then the built-in ones by their formulas, then by their names. */
export function gasSuggestions(place: CompletionPlace): readonly Suggestion[] {
  const own = namesDeclaredAs(['gas', 'species'], place);
  return [...own, ...builtIn.filter(({ label }) => !own.some((each) => each.label === label))];
}

const described: readonly Suggestion[] = gasNames.flatMap((name) => {
  const [species] = builtInGas(name)?.composition.species ?? [];
  if (!species) return [];
  const { formula, names, hazards } = species;
  const caution =
    hazards.length === 0
      ? undefined
      : `${hazards.map(({ value }) => value).join(', ')} — follow the safety data sheet, the local codes and licensed practice`;
  const detail = name === formula ? names.join(', ') : formula;
  return [suggestion('gas', name, detail, caution === undefined ? {} : { documentation: caution })];
});

const formulas = new Set(
  gasNames.flatMap((name) => builtInGas(name)?.composition.species.map(({ formula }) => formula) ?? []),
);

const builtIn: readonly Suggestion[] = [
  ...described.filter(({ label }) => formulas.has(label)),
  ...described.filter(({ label }) => !formulas.has(label)),
];
