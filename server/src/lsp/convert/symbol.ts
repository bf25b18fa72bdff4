import type { DocumentSymbol, SymbolInformation, WorkspaceSymbol as ProtocolSymbol } from 'vscode-languageserver';
import { SymbolKind } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { OutlineItem, SymbolKind as Sort } from '../../features/outline';
import type { WorkspaceSymbol } from '../../features/workspaceSymbols';
import type { Documents } from '../documents';
import { toLocation } from './location';
import { toRange } from './range';

const kinds: Readonly<Record<Sort, SymbolKind>> = {
  variable: SymbolKind.Variable,
  constant: SymbolKind.Constant,
  object: SymbolKind.Object,
  struct: SymbolKind.Struct,
  class: SymbolKind.Class,
  module: SymbolKind.Module,
  boolean: SymbolKind.Boolean,
  file: SymbolKind.File,
  property: SymbolKind.Property,
  field: SymbolKind.Field,
};

export function toDocumentSymbol(document: TextDocument, item: OutlineItem): DocumentSymbol {
  const { name, detail, kind, selectionStart, selectionEnd } = item;
  return {
    name,
    detail,
    kind: kinds[kind],
    range: toRange(document, item),
    selectionRange: toRange(document, { start: selectionStart, end: selectionEnd }),
    children: item.children.map((child) => toDocumentSymbol(document, child)),
  };
}

/** For clients that know no nesting. */
export function toSymbolInformation(document: TextDocument, item: OutlineItem): SymbolInformation {
  return { name: item.name, kind: kinds[item.kind], location: { uri: document.uri, range: toRange(document, item) } };
}

export function toWorkspaceSymbol({ name, kind, ...place }: WorkspaceSymbol, documents: Documents): ProtocolSymbol[] {
  const location = toLocation(place, documents);
  return location ? [{ name, kind: kinds[kind], location }] : [];
}
