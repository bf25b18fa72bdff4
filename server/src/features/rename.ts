import type { Analysis } from '../model/analysis';
import { functions } from '../model/functions';
import { kinds } from '../model/kinds/list';
import { statements } from '../model/kinds/statements';
import { builtInGas } from '../model/mixture';
import type { Occurrence, Sight, Target } from './meaning';
import { analysisOf, occurrenceAt, touchedAt } from './meaning';
import { occurrencesOf } from './navigation';
import type { TextEdit } from './textEdit';

export interface Refusal {
  readonly kind: 'refused';
  readonly reason: string;
}

/** What is to be renamed, and the name to begin with. */
export interface Renamable {
  readonly kind: 'renamable';
  readonly start: number;
  readonly end: number;
  readonly placeholder: string;
}

export interface Renamed {
  readonly kind: 'renamed';
  /** The edits of each file, by its address, in order. */
  readonly edits: ReadonlyMap<string, readonly TextEdit[]>;
}

/** Whether there is a name at the offset that can be changed, and if not, why. */
export function prepareRename(sight: Sight, uri: string, offset: number): Renamable | Refusal {
  const found = find(sight, uri, offset);
  if (found.kind === 'refused') return found;
  const { start, end, target } = found.occurrence;
  return { kind: 'renamable', start, end, placeholder: target.name.text };
}

/** The edits that give a declaration another name wherever it is used. */
export function rename(sight: Sight, uri: string, offset: number, name: string): Renamed | Refusal {
  const found = find(sight, uri, offset);
  if (found.kind === 'refused') return found;
  const { target } = found.occurrence;
  if (name === target.name.text) return { kind: 'renamed', edits: new Map() };
  const fault = faultOf(name);
  if (fault !== undefined) return refused(fault);
  const files = sight.analyses.map((analysis) => ({ analysis, places: occurrencesOf(analysis, target) }));
  for (const { analysis, places } of files) {
    const taken = collision(analysis, target, name, places);
    if (taken !== undefined) return refused(taken);
  }
  const edits = files
    .filter(({ places }) => places.length > 0)
    .map(
      ({ analysis, places }) => [analysis.uri, places.map(({ start, end }) => ({ start, end, text: name }))] as const,
    );
  return { kind: 'renamed', edits: new Map(edits) };
}

type Found = { readonly kind: 'found'; readonly occurrence: Occurrence } | Refusal;

function find(sight: Sight, uri: string, offset: number): Found {
  const analysis = analysisOf(sight, uri);
  if (!analysis) return refused('this file is not open');
  const occurrence = occurrenceAt(analysis, offset);
  if (!occurrence) return refused(whyNot(analysis, offset));
  if (!analysisOf(sight, occurrence.target.uri)) return refused('the file that declares this name is not open');
  return { kind: 'found', occurrence };
}

function whyNot(analysis: Analysis, offset: number): string {
  const touched = touchedAt(analysis, offset);
  if (touched?.node.kind !== 'name') return 'there is no name here';
  const { node, path } = touched;
  const parent = path.at(-2);
  if (parent?.kind === 'member' && parent.property === node) return `${node.text} is a result of the format`;
  if (parent?.kind === 'entry' && parent.key === node) return `${node.text} is a key of the format`;
  if (node === touched.declared.item.declaration.word) return `${node.text} is a word of the format`;
  if (builtInGas(node.text)) return `${node.text} is a built-in gas`;
  return `${node.text} is not declared in any file`;
}

const NAME = /^[a-zA-Z_\u00C0-\u024F\u0370-\u03FF][a-zA-Z0-9_\u00C0-\u024F\u0370-\u03FF]*$/u;

/** The words that end a name's place in the grammar, or open a line of a block. */
const GRAMMAR_WORDS =
  'of from through across in around because and or not is within between balance log steps vary show const'.split(' ');

const reserved: ReadonlySet<string> = new Set([
  ...GRAMMAR_WORDS,
  ...statements.map(({ word }) => word),
  ...kinds.map(({ word }) => word),
  ...functions.map((each) => each.name),
]);

function faultOf(name: string): string | undefined {
  if (!NAME.test(name)) return 'a name is a letter or “_”, then letters, digits and “_”';
  if (reserved.has(name)) return `${name} is a word of the format`;
  if (/^DN\d+$/.test(name)) return `${name} is a nominal bore`;
  return builtInGas(name) ? `${name} is a built-in gas` : undefined;
}

/** Why the new name would mean something else in a file. */
function collision(
  analysis: Analysis,
  target: Target,
  name: string,
  places: readonly Occurrence[],
): string | undefined {
  const other = analysis.find(name);
  if (!other) return undefined;
  const own = other.document.uri === analysis.uri;
  const sees = analysis.uri === target.uri || analysis.uses.some(({ uri }) => uri === target.uri);
  // A file that does not use the target may keep a name of its own.
  if (places.length === 0 && (own || !sees)) return undefined;
  const where = own ? analysis.uri : other.document.uri;
  return `${name} is already declared in ${where.slice(where.lastIndexOf('/') + 1)}`;
}

function refused(reason: string): Refusal {
  return { kind: 'refused', reason };
}
