import type { Note } from '../../physics/outcome';
import type { Scope } from '../scope';
import type { Given } from './kind';
import type { RangeNote } from './reportOutsideRange';
import { reportOutsideRange } from './reportOutsideRange';
import { reportStateNote } from './reportStateNote';

/** What the engine remarks on a state: what leaves the same range says so together, all else by itself. */
export function reportStateNotes(notes: readonly Note[], given: Given, scope: Scope): void {
  for (const group of byRange(notes.filter((note) => note.kind === 'outside-range'))) {
    reportOutsideRange(group, given, scope);
  }
  for (const note of notes) if (note.kind !== 'outside-range') reportStateNote(note, given, scope);
}

function byRange(notes: readonly RangeNote[]): readonly (readonly RangeNote[])[] {
  const groups = new Map<string, RangeNote[]>();
  for (const note of notes) {
    const key = `${note.species} ${note.low} ${note.high}`;
    groups.set(key, [...(groups.get(key) ?? []), note]);
  }
  return [...groups.values()];
}
