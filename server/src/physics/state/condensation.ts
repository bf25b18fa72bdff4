import { map2, success } from '../outcome';
import type { SpeciesState } from './gasState';
import type { StateProperty } from './property';
import { ofSpecies } from './property';

/* When a vapour condenses or freezes. Symbols: p_s saturation pressure, pᵢ partial pressure, T_d dew point. */

const method = 'saturation pressure as correlated, over the solid below the triple point, over the liquid above it';
const saturated = { sources: [], restsOn: ['saturation_pressure'] } as const;

const pressureOf = (one: SpeciesState, pressure: number) => success(one.moleFraction * pressure);

export const condensationProperties: readonly StateProperty[] = [
  {
    ...ofSpecies('saturation_pressure', (one) => one.saturation),
    symbol: 'p_s',
    quantityKind: 'pressure',
    method,
    ...saturated,
  },
  {
    ...ofSpecies('condensation_margin', (one, { point }) =>
      map2(one.saturation, pressureOf(one, point.pressure), (saturation, pressure) => saturation / pressure),
    ),
    symbol: 'p_s/p',
    quantityKind: 'number',
    method: `saturation pressure over partial pressure; ${method}`,
    ...saturated,
  },
  {
    ...ofSpecies('dew_point', (one) => one.dewPoint),
    symbol: 'T_d',
    quantityKind: 'temperature',
    method: `the temperature at which the saturation pressure is the partial pressure; ${method}`,
    ...saturated,
  },
];
