import type { Place } from '../../model/evaluation';
import { kindOfWord } from '../../model/kinds/list';
import { builtInGas } from '../../model/mixture';
import { nominalBoreMeaning } from '../../model/nominalBores';
import type { Name } from '../../syntax/nodes';
import { describeShortly } from '../describe/describeShortly';
import { hoverSpecies, shareNote } from './hoverGas';
import { paragraphs, plainText, shortened } from './hoverMarkdown';
import type { HoverPlace } from './hoverPlace';
import { hoverRegime, meaningOf } from './hoverWord';
import { lineIndex } from '../lines';
import { titleOf } from './hoverTitle';

/** A name in use: the short version of what it is declared as, or the gas or word it stands for. */
export function hoverName(node: Name, place: HoverPlace): string | undefined {
  const { analysis, options } = place;
  const word = isWordOfKey(node, place) ? hoverRegime(node, place) : undefined;
  if (word !== undefined) return word;
  const target = analysis.find(node.text);
  if (target) return shortVersion(target, node, place);
  const gas = builtInGas(node.text);
  const [species] = gas?.composition.species ?? [];
  if (species) return hoverSpecies(species, shareHere(species.formula, place), options);
  const bore = nominalBoreMeaning(node.text);
  if (bore !== undefined) return meaningOf(node.text, bore);
  if (node.text === 'const') return meaningOf('const', 'the physical constants, as in const.k');
  return hoverRegime(node, place);
}

/** `regime = molecular`, `… is molecular`: words of the format, whatever else is declared by that name. */
function isWordOfKey(node: Name, { declared, path }: HoverPlace): boolean {
  const parent = path.at(-2);
  if (parent?.kind === 'is') return node === parent.right;
  if (parent?.kind !== 'entry') return false;
  const key = kindOfWord(declared.item.declaration.word.text)?.keys.find(({ name }) => name === parent.key.text);
  return key?.type.kind === 'word';
}

function shortVersion({ document, declared }: Place, { text }: Name, { analysis, scope, options }: HoverPlace): string {
  const found = scope.lookUp(text);
  const { line } = lineIndex(document.text).positionAt(declared.item.offset);
  const { uri } = document;
  const file = uri === analysis.uri ? '' : ` of ${plainText(uri.slice(uri.lastIndexOf('/') + 1))}`;
  return paragraphs([
    titleOf(declared),
    plainText(shortened(found.kind === 'found' ? describeShortly(found.value, options) : 'it has no value', 300)),
    declared.item.doc === undefined ? undefined : plainText(shortened(declared.item.doc, 300)),
    `Declared in line ${line + 1}${file}.`,
  ]);
}

/** What a mixture here holds of a species. */
function shareHere(formula: string, { analysis, declared, options }: HoverPlace): string | undefined {
  const outcome = analysis.outcome(declared);
  if (outcome.kind !== 'value') return undefined;
  const { value } = outcome;
  const gas = value.kind === 'record' ? value.gas : value;
  if (gas?.kind !== 'gas' || gas.composition.species.length < 2) return undefined;
  return shareNote(declared.name?.text ?? '', gas.species.get(formula), options);
}
