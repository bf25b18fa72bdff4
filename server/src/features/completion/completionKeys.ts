import { wants } from '../../model/inputs';
import type { Key, Kind } from '../../model/kinds/kind';
import { kindOfWord } from '../../model/kinds/list';
import type { Entry, ThingDeclaration } from '../../syntax/nodes';
import type { Suggestion } from './completionItem';
import { suggestion } from './completionItem';
import { namesDeclaredAs } from './completionNames';
import type { CompletionPlace } from './completionPlace';

/** What may be written on a line of a block: the keys that are missing, what must be there first. */
export function keySuggestions(node: ThingDeclaration, entry: Entry, place: CompletionPlace): readonly Suggestion[] {
  const kind = kindOfWord(node.word.text);
  if (kind?.word === 'system') return networkSuggestions(place);
  if (kind?.word === 'sweep') return studySuggestions(place);
  if (!kind) return [];
  const given = (node.block?.items ?? []).flatMap((item) =>
    item.kind === 'entry' && item !== entry ? [item.key.text] : [],
  );
  const missing = kind.keys.filter(({ name }) => !given.includes(name) && !isSurplus(name, kind, given));
  const inherits = node.head?.relation.text === 'from';
  const required = (key: Key) => !inherits && kind.needs.some(({ of }) => of.includes(key.name));
  const ordered = [...missing.filter(required), ...missing.filter((key) => !required(key))];
  return ordered.map((key) => keySuggestion(key, required(key), place));
}

/** What a system connects. */
export function networkSuggestions(place: CompletionPlace): readonly Suggestion[] {
  return namesDeclaredAs(['inlet', 'chamber', 'line', 'pump', ...passageWords], place);
}

export const passageWords: readonly string[] = [
  'orifice',
  'tube',
  'duct',
  'slit',
  'annulus',
  'cone',
  'bend',
  'bundle',
  'plug',
];

function keySuggestion(key: Key, required: boolean, { following }: CompletionPlace): Suggestion {
  const { name, symbol, meaning, example, type } = key;
  const or = type.kind === 'record' && type.orQuantity !== undefined ? ` or a ${type.orQuantity}` : '';
  const detail = `${wants(key)}${or}${required ? ', needed' : ''}`;
  return suggestion('key', name, detail, {
    documentation: `${symbol === undefined ? '' : `*${symbol}*: `}${meaning}; such as \`${example}\``,
    insert: following.startsWith('=') ? name : `${name} = `,
  });
}

/** One input more than is needed would contradict the others. */
function isSurplus(name: string, { needs }: Kind, given: readonly string[]): boolean {
  return needs.some(({ count, of }) => of.includes(name) && of.filter((each) => given.includes(each)).length >= count);
}

function studySuggestions({ following }: CompletionPlace): readonly Suggestion[] {
  const vary = 'vary ${1:passage}.bore = ${2:16 mm} .. ${3:100 mm} in ${4:25} log steps';
  return [
    suggestion('keyword', 'vary', 'an input, from one value to another', following === '' ? { snippet: vary } : {}),
    suggestion('keyword', 'show', 'the results to list', following === '' ? { insert: 'show ' } : {}),
  ];
}
