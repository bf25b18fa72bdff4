import { wants } from '../../model/inputs';
import type { Key } from '../../model/kinds/kind';
import { kindOfWord } from '../../model/kinds/list';
import { quantityKindNote } from './hoverKind';
import type { Name } from '../../syntax/nodes';
import { bold, code, paragraphs, plainText } from './hoverMarkdown';
import type { HoverPlace } from './hoverPlace';
import { sentence } from './hoverWord';

/** A key of a block: what it means and what may be given. */
export function hoverKey({ text }: Name, { declared }: HoverPlace): string | undefined {
  const kind = kindOfWord(declared.item.declaration.word.text);
  const key = kind?.keys.find(({ name }) => name === text);
  if (!kind || !key) return undefined;
  return paragraphs([
    `${bold(key.name)}${key.symbol === undefined ? '' : ` ${plainText(key.symbol)}`}, of ${plainText(kind.title)}`,
    sentence(key.meaning),
    typeNote(key),
    `Example: ${code(`${key.name} = ${key.example}`)}`,
  ]);
}

function typeNote(key: Key): string {
  const { type } = key;
  if (type.kind !== 'quantity') {
    const or = type.kind === 'record' && type.orQuantity ? `, or a ${type.orQuantity.replaceAll('_', ' ')}` : '';
    return sentence(`${wants(key)}${or}`);
  }
  const also = [
    ...(type.orAmountFlow ? ['an amount of gas per time, such as sccm, fits as well'] : []),
    ...(type.orTableOver ? [`a table over ${type.orTableOver.replaceAll('_', ' ')} fits as well`] : []),
    ...(type.orPerSpecies ? ['a value for each species fits as well'] : []),
  ];
  return [quantityKindNote(type.quantity), ...[boundWords[type.bound], ...also].map(sentence)].join(' ');
}

const boundWords = {
  positive: 'above zero',
  'not-negative': 'zero or more',
  fraction: 'between 0 and 1',
  any: 'any sign',
} as const;
