import { contradictoryInput } from '../problems/contradictoryInput';
import { missingInput } from '../problems/missingInput';
import { surplusInput } from '../problems/surplusInput';
import { gasOf } from '../mixture';
import { quantityInput } from '../inputs';
import { entryEdit, removal } from '../needs';
import type { Fix } from '../problems/problem';
import { plainNumber, show } from '../quantity';
import type { Scope } from '../scope';
import type { Gas, Quantity, Record } from '../values';
import type { Given } from './kind';
import { given, mustBe } from './passageRecord';

/** What a conduction is computed from. */
export interface ConductionInputs {
  readonly geometry: Record;
  readonly hotWall: 'inner' | 'outer';
  readonly hot: Quantity;
  readonly cold: Quantity;
  readonly gas: Gas;
  readonly pressure: Quantity;
  readonly hotAccommodation: Quantity;
  readonly coldAccommodation: Quantity;
  /** What was not written, in words. */
  readonly assumptions: { readonly walls: readonly string[]; readonly pressure: string };
}

/** Reads what the keys alone cannot tell: what belongs together, and what cannot be. */
export function conductionInputs(declared: Given, scope: Scope): ConductionInputs | undefined {
  const { inputs, from: geometry, place } = declared;
  const temperatures = given(inputs, 'hot', 'cold');
  const filling = fillingOf(declared, scope);
  const accommodation = accommodationOf(declared, scope);
  if (!geometry || !temperatures || !filling || !accommodation) return undefined;
  const { hot, cold } = temperatures;
  const bound = `above the temperature of the cold wall, ${show(cold)}`;
  if (!mustBe(hot.si > cold.si, { key: 'hot', value: hot, bound }, declared, scope)) return undefined;
  const wall = inputs.get('hot_wall');
  if (wall && geometry.word === 'gap') {
    scope.report(
      contradictoryInput.at(place('hot_wall'), { why: 'hot_wall is for a jacket; the plates of a gap are alike' }),
    );
    return undefined;
  }
  const hotWall = wall?.kind === 'word' && wall.text === 'outer' ? 'outer' : 'inner';
  const side = geometry.word === 'jacket' && !wall ? ['the inner wall is the hot one'] : [];
  return {
    geometry,
    hotWall,
    hot,
    cold,
    gas: filling.gas,
    pressure: filling.pressure,
    hotAccommodation: accommodation.hot,
    coldAccommodation: accommodation.cold,
    assumptions: { walls: [...side, ...accommodation.assumed], pressure: filling.assumed },
  };
}

interface Filling {
  readonly gas: Gas;
  readonly pressure: Quantity;
  readonly assumed: string;
}

/** The gas and its pressure, by themselves or as those of a state. */
function fillingOf({ inputs, node, place }: Given, scope: Scope): Filling | undefined {
  const value = inputs.get('gas');
  const gas = value && gasOf(value);
  const state = inputs.get('state');
  if (state?.kind === 'record') {
    const pressure = state.members.get('pressure');
    if (gas) {
      const twice = ['state', 'gas'];
      const fixes = removals(node, twice);
      scope.report(surplusInput.at(place('gas'), { what: 'a conduction', count: 1, given: twice, fixes }));
      return undefined;
    }
    if (!state.gas || pressure?.kind !== 'figure' || pressure.value.kind !== 'quantity') return undefined;
    return { gas: state.gas, pressure: pressure.value, assumed: `${AT_REST}, whatever that of the state` };
  }
  const pressure = quantityInput(inputs, 'pressure');
  if (!pressure) return undefined;
  if (!gas) {
    const fixes = [{ title: 'Add gas = N2', edits: [entryEdit(node, 'gas = N2')] }];
    scope.report(missingInput.at(place(), { what: 'a conduction', count: 1, of: ['gas'], given: [], fixes }));
    return undefined;
  }
  return { gas, pressure, assumed: AT_REST };
}

const AT_REST = 'the pressure is that of the gas at rest at the mean temperature of the walls';

interface Accommodation {
  readonly hot: Quantity;
  readonly cold: Quantity;
  readonly assumed: readonly string[];
}

function accommodationOf(declared: Given, scope: Scope): Accommodation | undefined {
  const { inputs, node, place } = declared;
  const present = KEYS.filter((key) => inputs.has(key));
  for (const key of present) {
    const value = quantityInput(inputs, key);
    if (value && !mustBe(value.si > 0, { key, value, bound: 'above zero' }, declared, scope)) return undefined;
  }
  if (present.length === KEYS.length) {
    const problem = { what: 'a conduction', count: 2, given: present, fixes: removals(node, present) };
    scope.report(surplusInput.at(place('accommodation'), problem));
    return undefined;
  }
  const both = quantityInput(inputs, 'accommodation');
  const hot = quantityInput(inputs, 'hot_accommodation') ?? both;
  const cold = quantityInput(inputs, 'cold_accommodation') ?? both;
  const assumed =
    hot && cold
      ? []
      : [`${hot ? 'the cold wall' : cold ? 'the hot wall' : 'each wall'} exchanges the energy wholly, α = 1`];
  return { hot: hot ?? plainNumber(1), cold: cold ?? plainNumber(1), assumed };
}

const KEYS = ['accommodation', 'hot_accommodation', 'cold_accommodation'] as const;

function removals(node: Given['node'], keys: readonly string[]): readonly Fix[] {
  const entries = (node.block?.items ?? []).filter((item) => item.kind === 'entry');
  return entries.filter(({ key }) => keys.includes(key.text)).map((entry) => removal(node, entry));
}
