import { h, k } from '../constants';
import type { Note, Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { GasState } from './gasState';
import { gasState } from './gasState';
import type { ModelError } from './modelErrors';
import { modelErrors } from './modelErrors';
import type { StateRequest, Trial } from './request';
import { stateProperties } from './properties';
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
    mixture.set(row.name, figure(row.name, row.compute(state), table.mixture[at]));
  });
  const species = new Map<string, ReadonlyMap<string, Outcome<Figure>>>();
  state.species.forEach((one, i) => {
    const figures = new Map<string, Outcome<Figure>>();
    stateProperties.forEach((row, at) => {
      if (row.computeFor === undefined) return;
      figures.set(row.name, figure(row.name, row.computeFor(one, state), table.species[i]?.[at]));
    });
    species.set(one.species.formula, figures);
  });
  return { mixture, species, modelErrors: modelErrors(request), notes: notesOf(state) };
}

function figure(quantity: string, outcome: Outcome<number>, provenance: Provenance | undefined): Outcome<Figure> {
  if (!outcome.ok) return outcome;
  const { value } = outcome;
  if (!isSound(value) || provenance === undefined) return failure({ kind: 'not-finite', quantity });
  const { method, sources, range } = provenance;
  return success(range === undefined ? { value, method, sources } : { value, method, sources, range }, outcome.notes);
}

/** Numbers below the smallest normal one have lost their digits. Nought itself stands: it is the share of an absent species. */
function isSound(value: number): boolean {
  return value === 0 || (smallestNormal <= value && value < Infinity);
}

const smallestNormal = 2.2250738585072014e-308;

/** The first quantum correction to the pressure is n Λ³ / 2^(5/2): at this limit nearly 1 %. */
const degeneracyLimit = 0.05;

/** The first correction for the volume of the molecules is 2π/3 n d³: at this limit 1 %. */
const covolumeLimit = 0.01;

function notesOf(state: GasState): readonly Note[] {
  const notes: Note[] = [];
  for (const one of state.species) {
    for (const data of [one.viscosity, one.conductivity, one.cp]) {
      if (data.ok) notes.push(...data.notes.filter((note) => !notes.includes(note)));
    }
    const wavelength = h / Math.sqrt(2 * Math.PI * one.mass * k * state.point.temperature);
    const degeneracy = one.numberDensity * wavelength ** 3;
    if (degeneracyLimit < degeneracy) {
      notes.push({ kind: 'quantum', species: one.species.formula, degeneracy, limit: degeneracyLimit });
    }
  }
  const dense = densityNote(state);
  return dense === undefined ? notes : [...notes, dense];
}

function densityNote({ species, point }: GasState): Note | undefined {
  let cubes = 0;
  for (const one of species) {
    if (!one.diameter.ok) return undefined;
    cubes += one.moleFraction * one.diameter.value ** 3;
  }
  const covolume = ((2 * Math.PI) / 3) * point.numberDensity * cubes;
  if (covolume <= covolumeLimit) return undefined;
  return {
    kind: 'dense',
    covolume,
    limit: covolumeLimit,
    spacing: 1 / Math.cbrt(point.numberDensity),
    diameter: Math.cbrt(cubes),
  };
}
