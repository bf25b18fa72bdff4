import type { Declared } from './declare';
import type { Document, Shape } from './document';
import type { Place } from './evaluation';
import { components } from './graph';
import { references } from './references';

/** The order to evaluate a document in, dependencies first, and the circles that have no order. */
export interface Survey {
  readonly order: readonly Place[];
  readonly circles: readonly (readonly Place[])[];
}

/** Where a name that stands in a document is declared. */
export type Find = (document: Document, name: string, reader?: Declared) => Place | undefined;

export function survey(document: Document, find: Find): Survey {
  return document.uses.length === 0 ? surveyAlone(document, find) : surveyAll(document, find);
}

/** The survey of a document that uses no other follows from its shape alone; most keystrokes leave that as it is. */
const known = new WeakMap<
  Shape,
  { readonly order: readonly number[]; readonly circles: readonly (readonly number[])[] }
>();

function surveyAlone(document: Document, find: Find): Survey {
  const { all } = document.declarations;
  const before = known.get(document.shape);
  if (before) {
    const place = (index: number): Place[] => {
      const declared = all[index];
      return declared ? [{ document, declared }] : [];
    };
    return { order: before.order.flatMap(place), circles: before.circles.map((circle) => circle.flatMap(place)) };
  }
  const found = surveyAll(document, find);
  const indices = new Map(all.map((declared, index) => [declared, index]));
  const indexOf = ({ declared }: Place) => indices.get(declared) ?? -1;
  known.set(document.shape, {
    order: found.order.map(indexOf),
    circles: found.circles.map((circle) => circle.map(indexOf)),
  });
  return found;
}

function surveyAll(document: Document, find: Find): Survey {
  const places = new Map<Declared, Place>(
    document.declarations.all.map((declared) => [declared, { document, declared }]),
  );
  const successors = (declared: Declared): readonly Declared[] => {
    const own = places.get(declared)?.document ?? document;
    return references(declared.item.declaration).flatMap(({ text }) => {
      const target = find(own, text, declared);
      if (!target) return [];
      if (!places.has(target.declared)) places.set(target.declared, target);
      return [target.declared];
    });
  };
  const order: Place[] = [];
  const circles: (readonly Place[])[] = [];
  for (const { members, circular } of components(document.declarations.all, successors)) {
    const group = members.flatMap((member) => places.get(member) ?? []);
    order.push(...group);
    if (circular) circles.push(group);
  }
  return { order, circles };
}
