import type { Note, Outcome } from '../outcome';
import { failure, success } from '../outcome';
import { gasState } from './gasState';
import type { ModelError } from './modelErrors';
import { modelErrors } from './modelErrors';
import type { StateRequest, Trial } from './request';
import { notesOf } from './notes';
import { stateProperties } from './properties';
import type { StateProperty } from './property';
import type { Provenance } from './provenance';
import { provenanceTable } from './provenance';

export type { StateRequest, Trial } from './request';
export type { ModelError } from './modelErrors';

/** A value in SI units and how it came about. */
export interface Figure extends Provenance {
  readonly value: number;
}

/** All figures of a state, of the gas as a whole and of each species by its formula, by the names of the properties. */
export interface StateFigures {
  readonly mixture: ReadonlyMap<string, Outcome<Figure>>;
  readonly species: ReadonlyMap<string, ReadonlyMap<string, Outcome<Figure>>>;
  readonly modelErrors: readonly ModelError[];
  readonly notes: readonly Note[];
}

const noTrial: Trial = { factors: new Map() };

/** Everything there is to say of a gas at one state. With a trial, its correlations and methods are scaled by their factors. */
export function evaluateState(request: StateRequest, trial: Trial = noTrial): StateFigures {
  const state = gasState(request, trial);
  const table = provenanceTable(request.composition);
  const mixture = new Map<string, Outcome<Figure>>();
  stateProperties.forEach((row, at) => {
    mixture.set(row.name, figure(row, row.compute(state), table.mixture[at]));
  });
  const species = new Map<string, ReadonlyMap<string, Outcome<Figure>>>();
  state.species.forEach((one, i) => {
    const figures = new Map<string, Outcome<Figure>>();
    stateProperties.forEach((row, at) => {
      if (row.computeFor === undefined) return;
      figures.set(row.name, figure(row, row.computeFor(one, state), table.species[i]?.[at]));
    });
    species.set(one.species.formula, figures);
  });
  return { mixture, species, modelErrors: modelErrors(request), notes: notesOf(state) };
}

function figure(row: StateProperty, outcome: Outcome<number>, provenance: Provenance | undefined): Outcome<Figure> {
  if (!outcome.ok) return outcome;
  const { value } = outcome;
  const magnitude = row.signed ? Math.abs(value) : value;
  if (!isSound(magnitude) || provenance === undefined) return failure({ kind: 'not-finite', quantity: row.name });
  const { method, sources, range } = provenance;
  return success(range === undefined ? { value, method, sources } : { value, method, sources, range }, outcome.notes);
}

/** Numbers below the smallest normal one have lost their digits. Nought itself stands: it is the share of an absent species. */
function isSound(value: number): boolean {
  return value === 0 || (smallestNormal <= value && value < Infinity);
}

const smallestNormal = 2.2250738585072014e-308;
