import type { TextEdit as ProtocolEdit, WorkspaceEdit } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { Session } from '../session';
import type { Stretch } from './range';
import { toRange } from './range';

interface Edit extends Stretch {
  readonly text: string;
}

export function toTextEdit(document: TextDocument, { text, ...place }: Edit): ProtocolEdit {
  return { range: toRange(document, place), newText: text };
}

/** The edits of files, by their addresses, each for the version that it was computed from. */
export function toWorkspaceEdit(
  edits: ReadonlyMap<string, readonly Edit[]>,
  { abilities, documents }: Pick<Session, 'abilities' | 'documents'>,
): WorkspaceEdit {
  const files = [...edits].flatMap(([uri, own]) => {
    const document = documents.get(uri);
    return document ? [{ document, edits: own.map((each) => toTextEdit(document, each)) }] : [];
  });
  if (!abilities.versionedEdits)
    return { changes: Object.fromEntries(files.map((file) => [file.document.uri, file.edits])) };
  return {
    documentChanges: files.map((file) => ({
      textDocument: {
        uri: file.document.uri,
        version: documents.isOpen(file.document.uri) ? file.document.version : null,
      },
      edits: file.edits,
    })),
  };
}
