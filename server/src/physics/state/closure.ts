import type { Kelvin, KilogramPerCubicMetre, Pascal, PerCubicMetre } from '../brands';
import { kelvin, pascal, perCubicMetre } from '../brands';
import type { Composition } from '../composition';
import { meanMolarMass } from '../composition';
import { k, N_A } from '../constants';
import type { Outcome } from '../outcome';
import { failure, success } from '../outcome';

/** A gas at rest in equilibrium: pressure, temperature and number density, tied by p = nkT. */
export interface StatePoint {
  readonly temperature: Kelvin;
  readonly pressure: Pascal;
  readonly numberDensity: PerCubicMetre;
}

/** What may be given of a state. Exactly two must be, and not both densities. */
export interface StateInputs {
  readonly pressure?: Pascal;
  readonly temperature?: Kelvin;
  readonly numberDensity?: PerCubicMetre;
  readonly density?: KilogramPerCubicMetre;
}

/** The state that two of its quantities fix, by the ideal-gas law. */
export function solveState(composition: Composition, inputs: StateInputs): Outcome<StatePoint> {
  const given = stateInputs.filter((name) => inputs[name] !== undefined);
  for (const quantity of given) {
    const value = inputs[quantity] ?? 0;
    if (Number.isNaN(value) || value === Infinity) return failure({ kind: 'not-finite', quantity });
    if (value <= 0) return failure({ kind: 'not-positive', quantity, value });
  }
  if (2 < given.length) return failure({ kind: 'surplus', given });
  const { pressure: p, temperature: T, density } = inputs;
  const n = inputs.numberDensity ?? (density === undefined ? undefined : numberDensityOf(composition, density));
  if (p !== undefined && T !== undefined) return point(T, p, p / (k * T));
  if (p !== undefined && n !== undefined) return point(p / (n * k), p, n);
  if (T !== undefined && n !== undefined) return point(T, n * k * T, n);
  return failure({ kind: 'insufficient', given });
}

const stateInputs = ['pressure', 'temperature', 'numberDensity', 'density'] as const;

function numberDensityOf(composition: Composition, density: number): number {
  return (density / meanMolarMass(composition)) * N_A;
}

function point(temperature: number, pressure: number, numberDensity: number): Outcome<StatePoint> {
  if (!representable(temperature)) return failure({ kind: 'not-finite', quantity: 'temperature' });
  if (!representable(pressure)) return failure({ kind: 'not-finite', quantity: 'pressure' });
  if (!representable(numberDensity)) return failure({ kind: 'not-finite', quantity: 'numberDensity' });
  return success({
    temperature: kelvin(temperature),
    pressure: pascal(pressure),
    numberDensity: perCubicMetre(numberDensity),
  });
}

function representable(value: number): boolean {
  return 0 < value && value < Infinity;
}
