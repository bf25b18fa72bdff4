import type { Declared } from './declare';
import type { Document } from './document';
import type { Place } from './evaluation';
import { references } from './references';

/**
 * The shortest way from a member of a circle through names back to itself, without its end. Where the way leads through a
 * reference condition, which no name shows, or is very long, only the members that come first.
 */
export function roundFrom(
  start: Place,
  circle: readonly Place[],
  find: (document: Document, name: string) => Place | undefined,
): readonly Place[] {
  const members = membersOf(circle);
  const seen = new Set<Declared>([start.declared]);
  const steps: Step[] = [{ place: start }];
  for (const step of steps) {
    for (const { text } of references(step.place.declared.item.declaration)) {
      const place = find(step.place.document, text);
      if (place?.declared === start.declared) return wayTo(step);
      if (!place || !members.has(place.declared) || seen.has(place.declared)) continue;
      seen.add(place.declared);
      steps.push({ place, from: step });
    }
    if (steps.length > MOST_STEPS) break;
  }
  const others = circle.slice(0, MOST_SHOWN + 1).filter(({ declared }) => declared !== start.declared);
  return [start, ...others];
}

/** A circle of thousands is told by each of its thousands. */
const MOST_STEPS = 100;

/** No reader follows more. */
export const MOST_SHOWN = 8;

interface Step {
  readonly place: Place;
  readonly from?: Step;
}

function wayTo(last: Step): readonly Place[] {
  const way: Place[] = [];
  for (let step: Step | undefined = last; step; step = step.from) way.unshift(step.place);
  return way;
}

const known = new WeakMap<readonly Place[], ReadonlySet<Declared>>();

function membersOf(circle: readonly Place[]): ReadonlySet<Declared> {
  const members = known.get(circle) ?? new Set(circle.map(({ declared }) => declared));
  known.set(circle, members);
  return members;
}
