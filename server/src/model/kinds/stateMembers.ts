import type { Outcome } from '../../physics/outcome';
import type { Figure as EngineFigure, StateFigures } from '../../physics/state/evaluateState';
import { unitOf } from '../../quantities/parseUnit';
import { kindNamed } from '../../quantities/quantityKinds';
import { divide } from '../arithmetic';
import { figure } from '../figures';
import { quantityInput } from '../inputs';
import { kelvinRange } from '../kelvins';
import { quantity, show } from '../quantity';
import { citation, explainReason } from '../reasons';
import { resultNamed } from '../results';
import type { Scope } from '../scope';
import type { Leans } from '../tolerance';
import { exact } from '../tolerance';
import type { Figure, Members, Quantity } from '../values';
import type { Given } from './kind';

/** What the engine found of a state, with its tolerances, as members of the gas and of each species. */
export function stateMembers(
  figures: StateFigures,
  leans: ReadonlyMap<string, Leans>,
  given: Given,
  scope: Scope,
): { readonly members: Members; readonly species: ReadonlyMap<string, Members> } {
  const assumptions = assumptionsOf(given, scope);
  const members = new Map([...membersOf(figures.mixture, '', leans, assumptions), ...streamOf(given)]);
  keepGiven(members, given);
  addMach(members);
  const species = new Map(
    [...figures.species].map(([formula, each]) => [formula, membersOf(each, `${formula}.`, leans, assumptions)]),
  );
  return { members, species };
}

/** A result that is an input is exactly that input: a half-width found by differences would be rounded. */
function keepGiven(members: Map<string, Figure>, { inputs }: Given): void {
  for (const [name, found] of members) {
    const input = repeatable.has(name) ? quantityInput(inputs, name) : undefined;
    if (!input || found.kind !== 'figure' || found.value.kind !== 'quantity') continue;
    members.set(name, { ...found, value: { ...found.value, si: input.si, leans: input.leans } });
  }
}

const repeatable: ReadonlySet<string> = new Set(['pressure', 'temperature', 'number_density', 'density']);

function membersOf(
  figures: ReadonlyMap<string, Outcome<EngineFigure>>,
  prefix: string,
  leans: ReadonlyMap<string, Leans>,
  assumptions: (name: string) => readonly string[],
): Members {
  return new Map(
    [...figures].map(([name, outcome]) => [
      name,
      memberOf(name, outcome, leans.get(prefix + name) ?? exact, assumptions(name)),
    ]),
  );
}

function memberOf(name: string, outcome: Outcome<EngineFigure>, leans: Leans, assumptions: readonly string[]): Figure {
  if (!outcome.ok) return { kind: 'absent', why: explainReason(outcome.reason) };
  const { value, method, sources, range } = outcome.value;
  const { quantityKind = 'number', unit } = resultNamed(name) ?? {};
  const kind = kindNamed(quantityKind);
  if (!kind) return { kind: 'absent', why: `${name} is of no known kind` };
  return figure(
    {
      ...quantity(value, kind.dimension, leans),
      quantityKind: kind.name,
      ...(unit === undefined ? {} : { unit: unitOf(unit) }),
    },
    {
      method,
      sources: sources.map(citation),
      ...(range ? { range: kelvinRange(range) } : {}),
      assumptions,
    },
  );
}

/** What a figure takes for granted. */
function assumptionsOf(given: Given, scope: Scope): (name: string) => readonly string[] {
  const sites = `a monolayer of ${show(scope.condition('site_density'), { unit: unitOf('1/m²'), digits: 3 })}, every molecule staying`;
  const stated = given.inputs.has('collision_diameter') ? ['the collision diameter that the file states'] : [];
  return (name) => {
    if (name === 'monolayer_time') return [sites];
    if (name === 'condensation_margin' || name === 'dew_point') return ['what condenses is of this species alone'];
    return name === 'mean_free_path_hard_sphere' || name === 'collision_frequency' ? stated : [];
  };
}

function streamOf({ inputs }: Given): Members {
  const speed = quantityInput(inputs, 'speed');
  return speed
    ? new Map([['speed', figure(plain(speed, 'speed'), { method: 'as given', sources: [], assumptions: [] })]])
    : new Map();
}

function addMach(members: Map<string, Figure>): void {
  const speed = members.get('speed');
  const sound = members.get('sound_speed');
  if (speed?.kind !== 'figure' || sound?.kind !== 'figure') return;
  if (speed.value.kind !== 'quantity' || sound.value.kind !== 'quantity') return;
  members.set(
    'mach',
    figure(plain(divide(speed.value, sound.value), 'number'), {
      ...sound.provenance,
      method: `stream speed over sound speed; ${sound.provenance.method}`,
    }),
  );
}

function plain({ unit: _unit, ...value }: Quantity, quantityKind: string): Quantity {
  return { ...value, quantityKind };
}
