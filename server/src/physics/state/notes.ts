import { h, k, R } from '../constants';
import type { Note } from '../outcome';
import { condensedPhase, wouldCondense } from '../thermo/saturation';
import type { GasState, SpeciesState } from './gasState';

/** The first quantum correction to the pressure is n Λ³ / 2^(5/2): at this limit nearly 1 %. */
const degeneracyLimit = 0.05;

/** The first correction for the volume of the molecules is 2π/3 n d³: at this limit 1 %. */
const covolumeLimit = 0.01;

/** What a reader should know about a state as a whole. */
export function notesOf(state: GasState): readonly Note[] {
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
  if (dense !== undefined) notes.push(dense);
  const condensing = state.species.flatMap((one) => condensationNote(one, state));
  // A vapour that condenses is no gas at that state, so it does not matter how ideal it would be.
  return condensing.length > 0 ? [...notes, ...condensing] : [...notes, ...idealityNote(state)];
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

function condensationNote({ species, moleFraction, saturation }: SpeciesState, { point }: GasState): readonly Note[] {
  const { temperature } = point;
  const pressure = moleFraction * point.pressure;
  if (!wouldCondense(species, temperature, pressure)) return [];
  const note = {
    kind: 'condensing',
    species: species.formula,
    phase: condensedPhase(species, temperature),
    pressure,
  } as const;
  return [saturation.ok ? { ...note, saturation: saturation.value } : note];
}

/** The ideal-gas law, by which pressure, temperature and density are tied here, is off by as much. */
function idealityNote(state: GasState): readonly Note[] {
  const { virial, point } = state;
  if (!virial.ok) return [];
  const departure = (virial.value * point.pressure) / (R * point.temperature);
  return idealityLimit < Math.abs(departure) ? [{ kind: 'not-ideal', departure, limit: idealityLimit }] : [];
}

const idealityLimit = 0.01;
