import { map2, success } from '../outcome';
import type { SpeciesState } from './gasState';
import { isStated } from '../species/species';
import type { StateProperty } from './property';
import { ofSpecies } from './property';

/* When a vapour condenses or freezes. Symbols: p_s saturation pressure, pᵢ partial pressure, T_d dew point. */

const correlated = 'saturation pressure as correlated, over the solid below the triple point, over the liquid above it';

/** What is done with the saturation pressure, and where that comes from. */
const through = (what?: string): Pick<StateProperty, 'method' | 'methodFor'> => ({
  method: joined(what, correlated),
  methodFor: (species) => ({
    method: joined(what, isStated(species) ? 'saturation pressure as the file states it' : correlated),
    sources: [],
  }),
});
const joined = (what: string | undefined, from: string) => (what === undefined ? from : `${what}; ${from}`);

const saturated = { sources: [], restsOn: ['saturation_pressure'] } as const;

const pressureOf = (one: SpeciesState, pressure: number) => success(one.moleFraction * pressure);

export const condensationProperties: readonly StateProperty[] = [
  {
    ...ofSpecies('saturation_pressure', (one) => one.saturation),
    symbol: 'p_s',
    quantityKind: 'pressure',
    ...through(),
    ...saturated,
  },
  {
    ...ofSpecies('condensation_margin', (one, { point }) =>
      map2(one.saturation, pressureOf(one, point.pressure), (saturation, pressure) => saturation / pressure),
    ),
    symbol: 'p_s/p',
    quantityKind: 'number',
    ...through('saturation pressure over partial pressure'),
    ...saturated,
  },
  {
    ...ofSpecies('dew_point', (one) => one.dewPoint),
    symbol: 'T_d',
    quantityKind: 'temperature',
    ...through('the temperature at which the saturation pressure is the partial pressure'),
    ...saturated,
  },
];
