import type { Hover as ProtocolHover } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { Hover } from '../../features/hover/hover';
import type { Abilities } from '../abilities';
import { toMarkup } from './markup';
import { toRange } from './range';

export function toHover(document: TextDocument, found: Hover, { markdownHover }: Abilities): ProtocolHover {
  return { contents: toMarkup(found.markdown, { markdown: markdownHover }), range: toRange(document, found) };
}
