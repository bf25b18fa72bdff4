import type { Outcome } from './outcome';
import { failure, success } from './outcome';
import type { Species } from './species/species';

/** Which gases are there, and the share of each in the number of molecules. */
export interface Composition {
  readonly species: readonly Species[];
  readonly moleFractions: readonly number[];
}

export function pure(species: Species): Composition {
  return { species: [species], moleFractions: [1] };
}

/** A composition from mole fractions, which must add up to one within 1e-9; what is left of the difference is shared out. */
export function compositionOfMoles(species: readonly Species[], fractions: readonly number[]): Outcome<Composition> {
  return checked(species, fractions);
}

/** A composition from mass fractions: xᵢ = (wᵢ/Mᵢ) / Σⱼ wⱼ/Mⱼ. */
export function compositionOfMasses(species: readonly Species[], fractions: readonly number[]): Outcome<Composition> {
  const masses = checked(species, fractions);
  if (!masses.ok) return masses;
  const moles = species.map((one, i) => (masses.value.moleFractions[i] ?? 0) / one.molarMass.value);
  return success({ species, moleFractions: scaled(moles, sum(moles)) });
}

/** M̄ = Σ xᵢMᵢ, kg/mol. */
export function meanMolarMass({ species, moleFractions }: Composition): number {
  return species.reduce((total, one, i) => total + (moleFractions[i] ?? 0) * one.molarMass.value, 0);
}

/** wᵢ = xᵢMᵢ/M̄. */
export function massFractions(composition: Composition): number[] {
  const mean = meanMolarMass(composition);
  return composition.species.map((one, i) => ((composition.moleFractions[i] ?? 0) * one.molarMass.value) / mean);
}

function checked(species: readonly Species[], fractions: readonly number[]): Outcome<Composition> {
  if (species.length === 0) return failure({ kind: 'empty-composition' });
  for (const fraction of fractions) {
    if (!(0 <= fraction)) return failure({ kind: 'not-positive', quantity: 'fraction', value: fraction });
  }
  const total = sum(fractions);
  if (fractions.length !== species.length || !(Math.abs(total - 1) <= 1e-9)) {
    return failure({ kind: 'fraction-sum', sum: total });
  }
  return success({ species, moleFractions: scaled(fractions, total) });
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}

function scaled(values: readonly number[], total: number): number[] {
  return values.map((value) => value / total);
}
