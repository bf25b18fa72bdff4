import { R } from '../constants';
import type { Note, Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { Species } from '../species/species';
import { molarHeatCapacity } from '../thermo/heatCapacity';
import { correlated } from './correlation';
import { viscosity } from './viscosity';

/**
 * Dilute-gas thermal conductivity of one species as correlated, W/(m K), at a temperature in K.
 * Beyond its range it is continued in proportion to the kinetic-theory conductivity, which joins it without a step.
 */
export function correlatedConductivity(species: Species, temperature: number): Outcome<number> {
  const data = species.conductivity;
  if (data === undefined) return failure({ kind: 'no-data', species: species.formula, property: 'conductivity' });
  const { low, high } = data.value;
  if (low <= temperature && temperature <= high) return success(correlated(data.value, temperature));
  const end = temperature < low ? low : high;
  const there = kinetic(species, temperature);
  const atEnd = kinetic(species, end);
  if (!there.ok) return there;
  if (!atEnd.ok) return atEnd;
  const range = { quantity: 'temperature', value: temperature, low, high } as const;
  const note: Note = { kind: 'outside-range', ...range, property: 'conductivity', species: species.formula };
  return success(correlated(data.value, end) * (there.value / atEnd.value), [note]);
}

/**
 * Thermal conductivity of one gas by kinetic theory, W/(m K), from its viscosity (Pa s) and molar heat capacity cv (J/(mol K)).
 * One atom: λ = 15/4 R/M η, first-order Chapman–Enskog; the higher orders, below 0.5 %, are left out.
 * More atoms: modified Eucken, λ M/(η cv) = 1.32 + 1.77 R/cv (Poling, Prausnitz & O'Connell 2001, eq. 10-3.3): within about
 * 10 % where the molecules are not polar.
 */
export function kineticConductivity(species: Species, viscosity: number, cv: number): number {
  const perMole = viscosity / species.molarMass.value;
  return isMonatomic(species) ? 3.75 * R * perMole : perMole * (1.32 * cv + 1.77 * R);
}

/** How a species conducts heat here: by a correlation of its own, as one atom does, or by Eucken's rule. */
export function conductionMethod(species: Species): 'correlation' | 'monatomic' | 'eucken' {
  if (species.conductivity !== undefined) return 'correlation';
  return isMonatomic(species) ? 'monatomic' : 'eucken';
}

function isMonatomic(species: Species): boolean {
  return species.heatCapacity?.value.kind === 'monatomic';
}

/** Without a heat capacity, only the growth of the viscosity counts. */
function kinetic(species: Species, temperature: number): Outcome<number> {
  const eta = viscosity(species, temperature);
  if (!eta.ok) return eta;
  const heat = species.heatCapacity?.value;
  if (heat === undefined) return eta;
  return success(kineticConductivity(species, eta.value, molarHeatCapacity(heat, temperature) - R));
}
