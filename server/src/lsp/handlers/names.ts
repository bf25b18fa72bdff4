import type { Location, ReferenceParams, RenameParams, WorkspaceSymbolParams } from 'vscode-languageserver';
import { DocumentHighlightKind, LSPErrorCodes, ResponseError } from 'vscode-languageserver';
import { definition, highlights, references } from '../../features/navigation';
import { prepareRename, rename } from '../../features/rename';
import { workspaceSymbols } from '../../features/workspaceSymbols';
import { toWorkspaceEdit } from '../convert/edit';
import { toLocation } from '../convert/location';
import { toOffset, toRange } from '../convert/range';
import { toWorkspaceSymbol } from '../convert/symbol';
import { loadWorkspace } from '../loadWorkspace';
import type { Session } from '../session';
import { onFile } from './onFile';

/** Where names are declared and used, in all files of the workspace, and other names for them. */
export function handleNames(session: Session): void {
  const { connection, documents, guard } = session;
  const about = onFile(session);

  connection.onDefinition(
    about('definition', null, ({ document, analysis }, { position }) => {
      const found = definition(analysis, toOffset(document, position));
      return found ? toLocation(found, documents) : null;
    }),
  );

  connection.onDocumentHighlight(
    about('documentHighlight', [], ({ document, analysis }, { position }) =>
      highlights(analysis, toOffset(document, position)).map((each) => ({
        range: toRange(document, each),
        kind: each.kind === 'write' ? DocumentHighlightKind.Write : DocumentHighlightKind.Read,
      })),
    ),
  );

  connection.onReferences(
    guard.request<ReferenceParams, Location[]>('references', [], async ({ textDocument, position, context }) => {
      const sight = await loadWorkspace(session);
      const document = documents.get(textDocument.uri);
      if (!document) return [];
      const declaration = context.includeDeclaration ? 'included' : 'left out';
      const found = references(sight, documents.key(document.uri), toOffset(document, position), { declaration });
      return found.flatMap((each) => toLocation(each, documents) ?? []);
    }),
  );

  connection.onWorkspaceSymbol(
    guard.request('workspaceSymbol', [], async ({ query }: WorkspaceSymbolParams) => {
      const { analyses } = await loadWorkspace(session);
      return workspaceSymbols(analyses, query).flatMap((each) => toWorkspaceSymbol(each, documents));
    }),
  );

  connection.onPrepareRename(
    about('prepareRename', null, ({ document, analysis }, { position }) => {
      const sight = { analyses: [analysis, ...analysis.uses.map(({ uri }) => documents.analyse(uri))] };
      const found = prepareRename(sight, analysis.uri, toOffset(document, position));
      if (found.kind === 'refused') return refusal(found.reason);
      return { range: toRange(document, found), placeholder: found.placeholder };
    }),
  );

  connection.onRenameRequest(
    guard.request('rename', null, async ({ textDocument, position, newName }: RenameParams) => {
      const sight = await loadWorkspace(session);
      const document = documents.get(textDocument.uri);
      if (!document) return null;
      const found = rename(sight, documents.key(document.uri), toOffset(document, position), newName);
      return found.kind === 'refused' ? refusal(found.reason) : toWorkspaceEdit(found.edits, session);
    }),
  );
}

/** The editor shows the reason beside the name. */
function refusal(reason: string): ResponseError<never> {
  return new ResponseError(LSPErrorCodes.RequestFailed, reason);
}
