import assert from 'node:assert/strict';
import { kelvin, pascal } from '../../server/src/physics/brands';
import type { Composition } from '../../server/src/physics/composition';
import { compositionOfMoles, pure } from '../../server/src/physics/composition';
import type { Outcome } from '../../server/src/physics/outcome';
import { speciesByName } from '../../server/src/physics/species/list';
import type { Species } from '../../server/src/physics/species/species';
import { solveState } from '../../server/src/physics/state/closure';
import type { Figure, StateFigures, StateRequest } from '../../server/src/physics/state/evaluateState';
import { evaluateState } from '../../server/src/physics/state/evaluateState';

const siteDensity = 1e19;
export const atmosphere = 101325;

export function gas(name: string): Species {
  const species = speciesByName(name);
  assert.ok(species, `no gas ${name}`);
  return species;
}

/** The value of an outcome, or a failing test. */
export function valueOf<T>(outcome: Outcome<T> | undefined): T {
  assert.ok(outcome?.ok, JSON.stringify(outcome));
  return outcome.value;
}

export function mixture(parts: Readonly<Record<string, number>>): Composition {
  return valueOf(compositionOfMoles(Object.keys(parts).map(gas), Object.values(parts)));
}

/** What to evaluate for a gas, or for a mixture, at a temperature in K and a pressure in Pa. */
export function request(of: string | Composition, temperature: number, pressure: number): StateRequest {
  const composition = typeof of === 'string' ? pure(gas(of)) : of;
  const point = valueOf(solveState(composition, { temperature: kelvin(temperature), pressure: pascal(pressure) }));
  return { composition, point, siteDensity };
}

export function figures(of: string | Composition, temperature: number, pressure = atmosphere): StateFigures {
  return evaluateState(request(of, temperature, pressure));
}

/** A figure of the gas as a whole, in SI. */
export function whole(state: StateFigures, property: string): number {
  return valueOf(state.mixture.get(property)).value;
}

/** A figure of one species, in SI. */
export function part(state: StateFigures, species: string, property: string): number {
  return valueOf(state.species.get(species)?.get(property)).value;
}

/** Every figure there is, with its name. */
export function everyFigure(state: StateFigures): { readonly name: string; readonly outcome: Outcome<Figure> }[] {
  const named = (prefix: string, map: ReadonlyMap<string, Outcome<Figure>>) =>
    [...map].map(([name, outcome]) => ({ name: prefix + name, outcome }));
  return [...named('', state.mixture), ...[...state.species].flatMap(([formula, map]) => named(`${formula}.`, map))];
}

/** Equal to within a relative difference. */
export function near(a: number, b: number, relative: number, what = ''): void {
  assert.ok(a === b || Math.abs(a / b - 1) <= relative, `${what} ${a}, ${b}`);
}
