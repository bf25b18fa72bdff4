import type { Note } from '../../physics/outcome';
import { kelvins } from '../kelvins';
import { outsideRange } from '../problems/outsideRange';
import { dataTitle } from '../reasons';
import type { Scope } from '../scope';
import type { Given } from './kind';

export type RangeNote = Extract<Note, { kind: 'outside-range' }>;

/** Properties of one species that are continued beyond the same range, as one problem. */
export function reportOutsideRange(notes: readonly RangeNote[], given: Given, scope: Scope): void {
  const [first] = notes;
  if (!first) return;
  const what = notes.map(({ property }) => `the ${dataTitle(property)}`);
  const last = what.pop() ?? '';
  scope.report(
    outsideRange.at(given.place('temperature'), {
      what: [...what, `${last} of ${first.species}`],
      value: kelvins(first.value),
      low: kelvins(first.low),
      high: kelvins(first.high),
    }),
  );
}
