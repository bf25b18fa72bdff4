import type { Analysis } from '../model/analysis';
import type { Declared } from '../model/declare';
import type { Place } from '../model/evaluation';
import { kindOfWord } from '../model/kinds/list';
import { references } from '../model/references';
import { walk } from '../syntax/children';
import { itemAt, pathAt } from '../syntax/locate';
import type { Declaration, Entry, Member, Name, Node } from '../syntax/nodes';

/** All files that are open or known. */
export interface Sight {
  readonly analyses: readonly Analysis[];
}

/** A declaration, in whatever file it stands. */
export interface Target {
  readonly uri: string;
  readonly declared: Declared;
  readonly name: Name;
}

/** A name of a file, and the declaration that it stands for. */
export interface Occurrence {
  readonly start: number;
  readonly end: number;
  readonly target: Target;
  /** It is the name that the declaration introduces. */
  readonly declares: boolean;
}

/** What an offset of a declaration touches. Nodes count from `offset`. */
export interface Touched {
  readonly declared: Declared;
  readonly offset: number;
  /** From the declaration to what is touched. */
  readonly path: readonly Node[];
  readonly node: Node;
}

export function analysisOf({ analyses }: Sight, uri: string): Analysis | undefined {
  return analyses.find((analysis) => analysis.uri === uri);
}

export function touchedAt(analysis: Analysis, offset: number): Touched | undefined {
  const item = itemAt(analysis.file, offset);
  const declared = analysis.declared.find((each) => each.item === item);
  if (!item || !declared) return undefined;
  const path = pathAt(item.declaration, offset - item.offset);
  const node = path.at(-1);
  return node && { declared, offset: item.offset, path, node };
}

/** The name at an offset, where it stands for a declaration. */
export function occurrenceAt(analysis: Analysis, offset: number): Occurrence | undefined {
  const touched = touchedAt(analysis, offset);
  if (touched?.node.kind !== 'name') return undefined;
  const { node } = touched;
  return occurrencesIn(analysis, touched.declared, node.text).find(
    ({ start, end }) => start === touched.offset + node.span.start && end === touched.offset + node.span.end,
  );
}

/** Every name of a file that stands for a declaration; only those that read so, where a text is given. */
export function occurrences(analysis: Analysis, text?: string): readonly Occurrence[] {
  return analysis.declared.flatMap((declared) => occurrencesIn(analysis, declared, text));
}

function occurrencesIn(analysis: Analysis, declared: Declared, text?: string): readonly Occurrence[] {
  const { item, name } = declared;
  if (text !== undefined && !item.text.includes(text)) return [];
  const all: { name: Name; target: Target | undefined; declares: boolean }[] = [
    ...(name ? [{ name, target: { uri: analysis.uri, declared, name }, declares: true }] : []),
    ...mentions(item.declaration)
      .filter((mention) => text === undefined || mention.name.text === text)
      .map((mention) => ({ name: mention.name, target: targetOf(analysis, mention), declares: false })),
  ];
  return all.flatMap(({ name: { span, text: own }, target, declares }) =>
    target && (text === undefined || own === text)
      ? [{ start: item.offset + span.start, end: item.offset + span.end, target, declares }]
      : [],
  );
}

/** A name that may stand for a declaration. */
type Mention =
  | { readonly kind: 'plain' | 'row'; readonly name: Name }
  | { readonly kind: 'property'; readonly name: Name; readonly object: Member['object'] };

const known = new WeakMap<Declaration, readonly Mention[]>();

function mentions(declaration: Declaration): readonly Mention[] {
  const before = known.get(declaration);
  if (before) return before;
  const plain = new Set<Node>(references(declaration));
  const found: Mention[] = [];
  walk(declaration, (node) => {
    if (node.kind === 'entry' && takesWord(declaration, node)) plain.delete(node.value);
    else if (node.kind === 'name' && plain.has(node)) found.push({ kind: 'plain', name: node });
    else if (node.kind === 'row' && node.at.kind === 'name') found.push({ kind: 'row', name: node.at });
    else if (node.kind === 'member' && node.property.kind === 'name')
      found.push({ kind: 'property', name: node.property, object: node.object });
  });
  known.set(declaration, found);
  return found;
}

/** Whether the value is a word of the format, such as molecular. */
export function takesWord({ word }: Declaration, { key }: Entry): boolean {
  const type = kindOfWord(word.text)?.keys.find(({ name }) => name === key.text)?.type.kind;
  return type === 'word' || type === 'words';
}

function targetOf(analysis: Analysis, mention: Mention): Target | undefined {
  const { text } = mention.name;
  switch (mention.kind) {
    case 'plain':
      return targetAt(analysis.find(text));
    case 'row':
      return speciesNamed(analysis, text);
    case 'property':
      return memberOfSystem(analysis, mention.object, text) ?? speciesNamed(analysis, text);
  }
}

function targetAt(place: Place | undefined): Target | undefined {
  const name = place?.declared.name;
  return place && name ? { uri: place.document.uri, declared: place.declared, name } : undefined;
}

function speciesNamed(analysis: Analysis, text: string): Target | undefined {
  const target = targetAt(analysis.find(text));
  return target?.declared.item.declaration.word.text === 'species' ? target : undefined;
}

/** `lock` in `lock_line.lock.pressure` is the chamber of that name. */
function memberOfSystem(analysis: Analysis, object: Member['object'], text: string): Target | undefined {
  const system = object.kind === 'name' ? analysis.find(object.text) : undefined;
  if (!system) return undefined;
  const { document, declared } = system;
  const { declaration } = declared.item;
  if (declaration.word.text !== 'system' || !references(declaration).some((name) => name.text === text))
    return undefined;
  if (document.uri === analysis.uri) return targetAt(analysis.find(text));
  const [part] = document.declarations.byName.get(text) ?? [];
  return part && targetAt({ document, declared: part });
}
