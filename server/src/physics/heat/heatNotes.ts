import type { Kelvin } from '../brands';
import type { Note } from '../outcome';
import { notesOf } from '../state/notes';
import type { Conduction } from './conductHeat';
import { gasAt } from './meansBetween';

/** What there is to remark on the gas at either wall. */
export interface HeatNotes {
  readonly hot: readonly Note[];
  readonly cold: readonly Note[];
}

export function heatNotes({ composition, hot, cold, pressure }: Conduction): HeatNotes {
  const notesAt = (temperature: Kelvin): readonly Note[] => {
    const state = gasAt(composition, temperature, pressure, { factors: new Map() });
    return state.ok ? notesOf(state.value) : [];
  };
  return { hot: notesAt(hot), cold: notesAt(cold) };
}
