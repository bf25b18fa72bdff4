import { speciesByName } from '../physics/species/list';
import type { Hazard, Species } from '../physics/species/species';
import type { Span } from '../syntax/nodes';
import { associating } from './problems/associating';
import { hazard } from './problems/hazard';
import { either } from './problems/problem';
import type { Scope } from './scope';
import type { Gas } from './values';

/** What a reader should know of a gas wherever it is used. It is said once, where the gas is put together. */
export function reportGasRemarks({ composition }: Gas, span: Span, scope: Scope): void {
  const present = composition.species.filter((_, index) => 0 < (composition.moleFractions[index] ?? 0));
  const hazards = [...burning(present), ...toxic(present)];
  if (hazards.length > 0) scope.report(hazard.at(span, { hazards }));
  for (const { formula, associates } of present) {
    if (associates) scope.report(associating.at(span, { species: formula, into: associates.value }));
  }
}

const fuels: readonly Hazard[] = ['pyrophoric gas', 'pyrophoric liquid', 'flammable gas', 'flammable liquid'];

/** Something that burns together with something that lets it burn. */
function burning(present: readonly Species[]): readonly string[] {
  const fuel = present.flatMap((species) => {
    const worst = fuels.find((name) => classes(species).includes(name));
    return worst === undefined ? [] : [`${species.formula} (${worst})`];
  });
  const oxidisers = present.filter(oxidises).map(({ formula }) => formula);
  if (fuel.length === 0 || oxidisers.length === 0) return [];
  return [`${either(fuel, 'and')} with the oxidiser ${either(oxidisers, 'and')}`];
}

function toxic(present: readonly Species[]): readonly string[] {
  return present.flatMap((species) => {
    const acute = classes(species).filter((name) => name.startsWith('acute toxicity'));
    return acute.length === 0 ? [] : [`${species.formula} (${acute.join(', ')})`];
  });
}

/** A blend such as air oxidises if a part of it does. */
function oxidises(species: Species): boolean {
  const parts = Object.keys(species.blend?.value ?? {}).map(speciesByName);
  return [species, ...parts].some((part) => part !== undefined && classes(part).includes('oxidising gas'));
}

function classes({ hazards }: Species): readonly Hazard[] {
  return hazards.map(({ value }) => value);
}
