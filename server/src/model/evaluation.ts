import { walk } from '../syntax/children';
import type { Node, Tolerance } from '../syntax/nodes';
import { limitsOf, REGIME_LIMITS } from './assumption';
import type { ConditionName } from './conditions';
import { conditionNamed, standardCondition } from './conditions';
import type { Declared } from './declare';
import type { Document, Read } from './document';
import { evaluateDeclaration } from './evaluateDeclaration';
import type { Evaluated, Outcome } from './evaluated';
import { blocked, failed, sameOutcome } from './evaluated';
import { builtInGas, gasNames } from './mixture';
import type { Problem } from './problems/problem';
import type { DeclarationScope, Lookup } from './scope';
import { survey } from './survey';
import type { Quantity } from './values';

/** A declaration in its document. */
export interface Place {
  readonly document: Document;
  readonly declared: Declared;
}

/** The documents that can be seen, each by its address. */
export interface Sight {
  document(uri: string): Document | 'missing' | 'pending';
}

/**
 * One evaluation of a document and of what it uses, all texts standing still. What a declaration gave before is taken over
 * while its text and everything it read are the same; an equal new value keeps the old object, which stops the wave.
 */
export interface Evaluation {
  evaluated(place: Place): Evaluated;
  /** The members of the circle that a declaration is part of. */
  circleOf(place: Place): readonly Place[] | undefined;
  find(document: Document, name: string): Place | undefined;
  /** A scope to evaluate an expression of a declaration again, for showing; its reads are not remembered. */
  scope(place: Place, report: (problem: Problem) => void): DeclarationScope;
  /** The declarations that ran, in order. */
  readonly ran: readonly string[];
}

export function createEvaluation(sight: Sight): Evaluation {
  const done = new Map<Declared, Evaluated>();
  const running = new Map<Declared, Place>();
  const circles = new Map<Declared, readonly Place[]>();
  const prepared = new Set<Document>();
  const names = new Map<Document, string>();
  const ran: string[] = [];

  const find = (document: Document, name: string, reader?: Declared): Place | undefined => {
    const [own] = document.declarations.byName.get(name) ?? [];
    // A state may bear the name of its gas: in it the name means the gas.
    if (own && own === reader && builtInGas(name)) return undefined;
    if (own) return { document, declared: own };
    for (const { uri } of document.uses) {
      const other = sight.document(uri);
      const [declared] = typeof other === 'string' ? [] : (other.declarations.byName.get(name) ?? []);
      if (declared && typeof other !== 'string') return { document: other, declared };
    }
    return undefined;
  };

  const evaluated = (place: Place): Evaluated => {
    prepare(place.document);
    const before = done.get(place.declared);
    if (before) return before;
    if (running.has(place.declared)) closeCircle(place);
    if (circles.has(place.declared)) return { outcome: failed, problems: [] };
    running.set(place.declared, place);
    const result = remembered(place) ?? run(place);
    running.delete(place.declared);
    const final = circles.has(place.declared) ? { outcome: failed, problems: [] } : result;
    done.set(place.declared, final);
    return final;
  };

  /** A condition may turn out to depend on what reads it: all that run since it was asked for are the circle. */
  const closeCircle = ({ declared }: Place) => {
    const stack = [...running.values()];
    const circle = stack.slice(stack.findIndex((each) => each.declared === declared));
    for (const member of circle) circles.set(member.declared, circle);
  };

  /** Dependencies are evaluated first, so that a long chain needs no deep stack. */
  const prepare = (document: Document) => {
    if (prepared.has(document)) return;
    prepared.add(document);
    const { order, circles: found } = survey(document, find);
    for (const circle of found) for (const { declared } of circle) circles.set(declared, circle);
    for (const place of order) evaluated(place);
  };

  const remembered = (place: Place): Evaluated | undefined => {
    const { document, declared } = place;
    const entry = document.memo.get(declared.id);
    if (!entry || entry.text !== declared.item.text) return undefined;
    return entry.reads.every(({ key, seen }) => look(place, key) === seen) ? entry : undefined;
  };

  const run = (place: Place): Evaluated => {
    const { document, declared } = place;
    ran.push(declared.id);
    const reads = new Map<string, Read>();
    const read = (key: string): unknown => {
      const seen = look(place, key);
      reads.set(key, { key, seen });
      return seen;
    };
    const { outcome: own, problems } = evaluateDeclaration(declared.item, (report) => scopeOf(place, read, report));
    // What rests on a condition that is assumed without a value has no value either, not that of the default.
    const outcome = own.kind === 'value' && [...reads.values()].some(lacksCondition) ? blocked : own;
    const before = document.memo.get(declared.id)?.outcome;
    const kept = before && sameOutcome(before, outcome) ? before : outcome;
    const entry = { text: declared.item.text, reads: [...reads.values()], outcome: kept, problems };
    document.memo.set(declared.id, entry);
    return entry;
  };

  /** What there is to see under a key now. */
  const look = ({ document, declared }: Place, key: string): unknown => {
    const [sort, name] = splitKey(key);
    switch (sort) {
      case 'name': {
        const target = find(document, name, declared);
        return target ? evaluated(target).outcome : builtInGas(name);
      }
      case 'assume': {
        const condition = document.declarations.assumed.get(name);
        return condition && evaluated({ document, declared: condition }).outcome;
      }
      case 'file': {
        const uri = document.uses.find(({ path }) => path === name)?.uri;
        const found = uri === undefined ? 'missing' : sight.document(uri);
        return typeof found === 'string' ? found : 'there';
      }
      case 'display':
        return document.display;
      case 'names':
        return namesIn(document);
    }
  };

  /** The names that can be seen, as one text, so that equal lists are equal. */
  const namesIn = (document: Document): string => {
    const known = names.get(document) ?? [...visibleNames(document, sight)].join(' ');
    names.set(document, known);
    return known;
  };

  const scopeOf = (
    place: Place,
    read: (key: ReadKey) => unknown,
    report: (problem: Problem) => void,
  ): DeclarationScope => {
    return {
      report,
      lookUp: (name) => lookup(read(`name:${name}`)),
      names: () => (read('names:') as string).split(' '),
      condition: (name) => conditionValue(name, read(`assume:${name}`)),
      regimeLimits: () => {
        const outcome = read(`assume:${REGIME_LIMITS}`) as Outcome | undefined;
        return limitsOf(outcome?.kind === 'value' ? outcome.value : undefined);
      },
      causeOf: (node) => causeOf(place, node),
      used: (path) => read(`file:${path}`) as 'there' | 'missing' | 'pending',
      display: () => read('display:') as Document['display'],
    };
  };

  return {
    evaluated,
    find,
    ran,
    circleOf: ({ declared }) => circles.get(declared),
    scope: (place, report) => scopeOf(place, (key) => look(place, key), report),
  };
}

type ReadSort = 'name' | 'names' | 'assume' | 'file' | 'display';
function lacksCondition({ key, seen }: Read): boolean {
  return key.startsWith('assume:') && seen !== undefined && (seen as Outcome).kind !== 'value';
}

type ReadKey = `${ReadSort}:${string}`;

function splitKey(key: string): [ReadSort, string] {
  const colon = key.indexOf(':');
  return [key.slice(0, colon) as ReadSort, key.slice(colon + 1)];
}

function lookup(seen: unknown): Lookup {
  if (seen === undefined) return { kind: 'unknown' };
  const found = seen as Outcome | { kind: 'gas' };
  if (found.kind === 'gas') return { kind: 'found', value: found as Extract<Lookup, { kind: 'found' }>['value'] };
  return found.kind === 'value' ? { kind: 'found', value: found.value } : { kind: 'blocked' };
}

function conditionValue(name: ConditionName, seen: unknown): Quantity {
  const outcome = seen as Outcome | undefined;
  if (outcome?.kind === 'value' && outcome.value.kind === 'quantity') return outcome.value;
  const condition = conditionNamed(name);
  if (!condition) throw new Error(`no condition is named ${name}`);
  return standardCondition(condition);
}

function* visibleNames(document: Document, sight: Sight): Iterable<string> {
  yield* document.declarations.byName.keys();
  for (const { uri } of document.uses) {
    const other = sight.document(uri);
    if (typeof other !== 'string') yield* other.declarations.byName.keys();
  }
  yield* gasNames;
}

const causes = new WeakMap<Node, ReadonlyMap<Tolerance, string>>();

/** `FILE#residual.pressure`: the file, the declaration and the key; a counter where an expression has several. */
function causeOf({ document, declared }: Place, node: Tolerance): string {
  const { declaration } = declared.item;
  const known = causes.get(declaration) ?? causesOf(declaration);
  causes.set(declaration, known);
  return `${document.uri}#${declared.id}${known.get(node) ?? ''}`;
}

function causesOf(declaration: Node): ReadonlyMap<Tolerance, string> {
  const found = new Map<Tolerance, string>();
  const counts = new Map<string, number>();
  const collect = (root: Node, key: string) => {
    walk(root, (node) => {
      if (node.kind === 'entry' && key === '') collect(node, `.${node.key.text}`);
      if (node.kind !== 'tolerance' || found.has(node)) return;
      const count = (counts.get(key) ?? 0) + 1;
      counts.set(key, count);
      found.set(node, count === 1 ? key : `${key}~${count}`);
    });
  };
  collect(declaration, '');
  return found;
}
