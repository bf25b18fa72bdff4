import type { Freshness } from '../freshness';
import type { Session } from '../session';

/** Keeps the texts as the editor and the disk have them. Nothing is computed here but what the schedule takes up. */
export function handleTexts({ connection, documents, guard }: Session, freshness: Freshness): void {
  connection.onDidOpenTextDocument(
    guard.notification('didOpen', ({ textDocument }) => {
      documents.open(textDocument);
      freshness.changed(textDocument.uri, 0);
    }),
  );

  connection.onDidChangeTextDocument(
    guard.notification('didChange', ({ textDocument, contentChanges }) => {
      documents.change(textDocument.uri, textDocument.version, contentChanges);
      freshness.changed(textDocument.uri);
    }),
  );

  connection.onDidCloseTextDocument(
    guard.notification('didClose', ({ textDocument }) => {
      documents.close(textDocument.uri);
      freshness.closed(textDocument.uri);
      freshness.changed(textDocument.uri);
    }),
  );

  connection.onDidChangeWatchedFiles(
    guard.notification('didChangeWatchedFiles', ({ changes }) => {
      for (const { uri } of changes) documents.reload(uri);
    }),
  );
}
