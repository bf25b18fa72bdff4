import { nearestNames } from '../quantities/nearestNames';
import { parseUnit } from '../quantities/parseUnit';
import { kindNamed, quantityKinds } from '../quantities/quantityKinds';
import { units } from '../quantities/units';
import { conditions } from '../model/conditions';
import { functions } from '../model/functions';
import { kinds } from '../model/kinds/list';
import { statements } from '../model/kinds/statements';
import { builtInGas, gasNames } from '../model/mixture';
import { problemKinds } from '../model/problems/list';
import { results } from '../model/results';
import { kindMeant } from '../features/describe/describeUnits';
import { hoverSpecies } from '../features/hover/hoverGas';
import { inSI } from '../features/hover/hoverUnit';

/** A sort of thing that can be explained: its names, and what there is to say of one. */
interface Shelf {
  readonly sort: string;
  readonly names: readonly string[];
  readonly explain: (name: string) => string | undefined;
}

const shelves: readonly Shelf[] = [
  {
    sort: 'a problem',
    names: problemKinds.map(({ code }) => code),
    explain: (name) => {
      const found = problemKinds.find(({ code }) => code === name);
      return found && `${found.title} (${found.severity}).\n\n${found.doc}`;
    },
  },
  {
    sort: 'a kind of declaration',
    names: [...kinds, ...statements].map(({ word }) => word),
    explain: (name) => {
      const kind = kinds.find(({ word }) => word === name);
      const keys = (kind?.keys ?? []).map((key) => `  ${key.name} = ${key.example}   ${key.meaning}`);
      const meaning = kind?.meaning ?? statements.find(({ word }) => word === name)?.meaning;
      return meaning && [sentence(meaning), ...(keys.length > 0 ? ['', ...keys] : [])].join('\n');
    },
  },
  {
    sort: 'a gas',
    names: gasNames,
    explain: (name) => {
      const [species] = builtInGas(name)?.composition.species ?? [];
      return species && hoverSpecies(species, undefined, {}).replace(/\*\*|\\(?=[*_|])/g, '');
    },
  },
  {
    sort: 'a result',
    names: results.map(({ name }) => name),
    explain: (name) => {
      const found = results.find((result) => result.name === name);
      const kind = kindNamed(found?.quantityKind ?? '');
      return (
        found &&
        `${sentence(found.meaning)}${found.symbol ? ` Symbol ${found.symbol}.` : ''}${kind ? ` In ${kind.unit}.` : ''}`
      );
    },
  },
  {
    sort: 'an input',
    names: kinds.flatMap(({ keys }) => keys.map(({ name }) => name)),
    explain: (name) =>
      kinds
        .flatMap(({ title, keys }) =>
          keys
            .filter((key) => key.name === name)
            .map((key) => `Of ${title}: ${key.meaning}, as in ${key.name} = ${key.example}`),
        )
        .join('\n'),
  },
  {
    sort: 'a function',
    names: functions.map(({ name }) => name),
    explain: (name) => {
      const found = functions.find((each) => each.name === name);
      return found && `${found.usage}: ${found.meaning}.`;
    },
  },
  {
    sort: 'a reference condition',
    names: conditions.map(({ name }) => name),
    explain: (name) => {
      const found = conditions.find((each) => each.name === name);
      return found && sentence(found.meaning);
    },
  },
  {
    sort: 'a kind of quantity',
    names: quantityKinds.map(({ name }) => name),
    explain: (name) => {
      const found = kindNamed(name);
      return found && `${sentence(found.meaning)} In ${found.unit}; usual units: ${found.usual.join(', ')}.`;
    },
  },
  {
    sort: 'a unit',
    names: units.flatMap(({ symbol, aliases }) => [symbol, ...aliases]),
    explain: (name) => {
      const parsed = parseUnit(name);
      if (!parsed.ok) return undefined;
      const { unit } = parsed;
      const kind = kindMeant(unit);
      const meanings = unit.parts.map(({ row }) => `${row.symbol}: ${row.meaning} (${row.source})`);
      return [...(kind ? [`A unit of ${kind.title.toLowerCase()}.`] : []), inSI(unit, {}), ...new Set(meanings)].join(
        '\n',
      );
    },
  },
];

/** Everything there is to say of a topic, or the nearest topics when there is nothing. */
export function explain(topic: string): { readonly text: string } | { readonly nearest: readonly string[] } {
  const found = shelves.flatMap(({ sort, explain: look }) => {
    const text = look(topic);
    return text ? [`${topic}, ${sort}\n\n${text}`] : [];
  });
  return found.length > 0
    ? { text: found.join('\n\n') }
    : {
        nearest: nearestNames(
          topic,
          shelves.flatMap(({ names }) => names),
        ),
      };
}

function sentence(phrase: string): string {
  return `${phrase.charAt(0).toUpperCase()}${phrase.slice(1)}.`;
}
