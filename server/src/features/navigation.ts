import type { Analysis } from '../model/analysis';
import { references as namesUsed } from '../model/references';
import type { Name, Span } from '../syntax/nodes';
import type { Sight, Target, Touched } from './meaning';
import { analysisOf, occurrenceAt, occurrences, touchedAt } from './meaning';

export interface Location {
  readonly uri: string;
  readonly start: number;
  readonly end: number;
}

export interface Highlight {
  readonly start: number;
  readonly end: number;
  readonly kind: 'read' | 'write';
}

/** Where what an offset touches is declared: a name, an input that is asked for as a result, the file of a `use`. */
export function definition(analysis: Analysis, offset: number): Location | undefined {
  const occurrence = occurrenceAt(analysis, offset);
  if (occurrence) return locationOf(occurrence.target);
  const touched = touchedAt(analysis, offset);
  return touched && (fileOf(analysis, touched) ?? inputOf(analysis, touched));
}

export interface ReferenceOptions {
  /** Also where it is declared. */
  readonly declaration?: 'included' | 'left out';
}

/** Every place, in all files, that means the declaration which an offset touches. */
export function references(
  sight: Sight,
  uri: string,
  offset: number,
  { declaration = 'included' }: ReferenceOptions = {},
): readonly Location[] {
  const analysis = analysisOf(sight, uri);
  const target = analysis && occurrenceAt(analysis, offset)?.target;
  if (!target) return [];
  return sight.analyses.flatMap((each) =>
    occurrencesOf(each, target)
      .filter(({ declares }) => declaration === 'included' || !declares)
      .map(({ start, end }) => ({ uri: each.uri, start, end })),
  );
}

/** The same name in this file; of a gas or a word that no file declares every place where it is used. */
export function highlights(analysis: Analysis, offset: number): readonly Highlight[] {
  const target = occurrenceAt(analysis, offset)?.target;
  if (target) {
    return occurrencesOf(analysis, target).map(({ start, end, declares }) => ({
      start,
      end,
      kind: declares ? 'write' : 'read',
    }));
  }
  const touched = touchedAt(analysis, offset);
  if (touched?.node.kind !== 'name' || !isUsed(touched, touched.node)) return [];
  const { text } = touched.node;
  return analysis.declared.flatMap(({ item }) =>
    namesUsed(item.declaration)
      .filter((name) => name.text === text)
      .map(({ span }) => ({ ...absolute(span, item.offset), kind: 'read' as const })),
  );
}

export function occurrencesOf(analysis: Analysis, target: Target): ReturnType<typeof occurrences> {
  return occurrences(analysis, target.name.text).filter((each) => isSame(each.target, target));
}

/** The analyses of two files know a declaration by the same name, but may hold texts of different moments. */
function isSame(a: Target, b: Target): boolean {
  return a.uri === b.uri && a.declared.id === b.declared.id;
}

function isUsed({ declared }: Touched, name: Name): boolean {
  return namesUsed(declared.item.declaration).includes(name);
}

function locationOf({ uri, declared, name }: Target): Location {
  return { uri, ...absolute(name.span, declared.item.offset) };
}

function absolute({ start, end }: Span, offset: number): Span {
  return { start: offset + start, end: offset + end };
}

function fileOf({ uses }: Analysis, { declared, node }: Touched): Location | undefined {
  if (declared.item.declaration.kind !== 'use' || node.kind !== 'text') return undefined;
  const use = uses.find(({ path }) => path === node.text);
  return use && { uri: use.uri, start: 0, end: 0 };
}

/** `foreline.bore` leads to the line of the tube that says it. */
function inputOf(analysis: Analysis, { path, node }: Touched): Location | undefined {
  const member = path.at(-2);
  if (node.kind !== 'name' || member?.kind !== 'member' || member.property !== node) return undefined;
  const place = member.object.kind === 'name' ? analysis.find(member.object.text) : undefined;
  const declaration = place?.declared.item.declaration;
  if (!place || declaration?.kind !== 'thing') return undefined;
  const entry = declaration.block?.items.find((item) => item.kind === 'entry' && item.key.text === node.text);
  if (entry?.kind !== 'entry') return undefined;
  return { uri: place.document.uri, ...absolute(entry.key.span, place.declared.item.offset) };
}
