import type { DataKind, Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { SourceId } from '../sources';
import type { Species } from '../species/species';
import type { GasState, SpeciesState } from './gasState';

/** One output of a gas state: what it is called, how it is worked out, and on which data it rests. */
export interface StateProperty {
  readonly name: string;
  readonly symbol: string;
  /** The name of its kind in `quantities`. */
  readonly quantityKind: string;
  /** Whether each species has a figure of its own. */
  readonly perSpecies: boolean;
  /** Whether it may be below zero, which for all others would be a fault. */
  readonly signed?: true;
  /** The method by its usual name, and where it is published. */
  readonly method: string;
  readonly sources: readonly SourceId[];
  /** The method for several species, where it differs. */
  readonly mixed?: Method;
  /** The method for one species, where it depends on the species. */
  readonly methodFor?: (species: Species) => Method;
  /** The data of the species that the figure rests on. */
  readonly restsOn: readonly DataKind[];
  /** Of the gas as a whole. */
  readonly compute: (state: GasState) => Outcome<number>;
  /** Of one species within it. */
  readonly computeFor?: (one: SpeciesState, state: GasState) => Outcome<number>;
}

export interface Method {
  readonly method: string;
  readonly sources: readonly SourceId[];
}

/** A figure that a species has and a mixture has not: of the gas as a whole only where it is one species. */
export function ofSpecies(
  name: string,
  compute: (one: SpeciesState, state: GasState) => Outcome<number>,
): Pick<StateProperty, 'name' | 'perSpecies' | 'compute' | 'computeFor'> {
  return {
    name,
    perSpecies: true,
    compute: (state) => {
      const [only, second] = state.species;
      return only !== undefined && second === undefined
        ? compute(only, state)
        : failure({ kind: 'per-species', property: name });
    },
    computeFor: compute,
  };
}

/** The mean over molecules, Σ xᵢ yᵢ, of what each species has. */
export function overMolecules(state: GasState, value: (one: SpeciesState) => Outcome<number>): Outcome<number> {
  let sum = 0;
  let notes = success(0).notes;
  for (const one of state.species) {
    const outcome = value(one);
    if (!outcome.ok) return outcome;
    sum += one.moleFraction * outcome.value;
    if (notes.length < outcome.notes.length) notes = outcome.notes;
  }
  return success(sum, notes);
}

/** The sum over species. */
export function total(state: GasState, value: (one: SpeciesState) => number): Outcome<number> {
  return success(state.species.reduce((sum, one) => sum + value(one), 0));
}
