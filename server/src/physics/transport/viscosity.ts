import { k, N_A } from '../constants';
import type { Note, Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { Sourced } from '../sources';
import type { LennardJones, Species } from '../species/species';
import { omega22 } from './collisionIntegrals';
import type { Correlation } from './correlation';
import { correlated } from './correlation';

/**
 * Dilute-gas viscosity of one species, Pa s, at a temperature in K.
 * Within its range the correlation stands. Beyond, it is continued in proportion to the Chapman–Enskog viscosity
 * of the species' 12-6 potential, which joins it without a step, and a note says so. A table of a file without a potential is
 * continued as that of hard spheres.
 */
export function viscosity(species: Species, temperature: number): Outcome<number> {
  const data = species.viscosity;
  if (data === undefined) return failure({ kind: 'no-data', species: species.formula, property: 'viscosity' });
  const { low, high } = data.value;
  if (low <= temperature && temperature <= high) return success(correlated(data.value, temperature));
  const range = { quantity: 'temperature', value: temperature, low, high } as const;
  const growth = growthOf(species, data, temperature);
  if (growth === undefined) return failure({ kind: 'outside-range', ...range, source: data.source });
  const note: Note = { kind: 'outside-range', ...range, property: 'viscosity', species: species.formula };
  return success(correlated(data.value, temperature < low ? low : high) * growth, [note]);
}

/**
 * First-order Chapman–Enskog viscosity of the 12-6 potential, Pa s (Hirschfelder, Curtiss & Bird 1954, eq. 8.2-10):
 * η = 5/16 √(π m k T) / (π σ² Ω(2,2)*). `molarMass` in kg/mol.
 */
export function potentialViscosity(potential: LennardJones, molarMass: number, temperature: number): number {
  const reduced = temperature / potential.wellDepth;
  return hardSphereViscosity(potential.diameter, molarMass, temperature) / omega22(reduced);
}

/** First-order Chapman–Enskog viscosity of hard spheres, Pa s (Chapman & Cowling 1970, section 10.21), without Ω. */
export function hardSphereViscosity(diameter: number, molarMass: number, temperature: number): number {
  return (0.3125 * Math.sqrt((molarMass / N_A) * k * temperature)) / (Math.sqrt(Math.PI) * diameter * diameter);
}

/** The hard-sphere diameter, m, that gives a viscosity in Pa s: the inverse of `hardSphereViscosity`. */
export function diameterOfViscosity(viscosity: number, molarMass: number, temperature: number): number {
  return Math.sqrt((0.3125 * Math.sqrt((molarMass / N_A) * k * temperature)) / (Math.sqrt(Math.PI) * viscosity));
}

/** By what factor the viscosity grows from the end of its range to a temperature beyond it. */
function growthOf(species: Species, data: Sourced<Correlation>, temperature: number): number | undefined {
  const end = temperature < data.value.low ? data.value.low : data.value.high;
  const potential = species.lennardJones?.value;
  if (potential === undefined) return data.source === 'the file' ? Math.sqrt(temperature / end) : undefined;
  const molarMass = species.molarMass.value;
  return potentialViscosity(potential, molarMass, temperature) / potentialViscosity(potential, molarMass, end);
}
