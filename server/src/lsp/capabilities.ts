import type { ServerCapabilities } from 'vscode-languageserver';
import { TextDocumentSyncKind } from 'vscode-languageserver';
import type { Abilities } from './abilities';

/** What the server can do, as it tells the client. */
export function capabilitiesFor({ pullsDiagnostics }: Abilities): ServerCapabilities {
  return {
    textDocumentSync: { openClose: true, change: TextDocumentSyncKind.Incremental },
    workspace: { workspaceFolders: { supported: true, changeNotifications: true } },
    ...(pullsDiagnostics ? { diagnosticProvider: { interFileDependencies: true, workspaceDiagnostics: false } } : {}),
    hoverProvider: true,
    inlayHintProvider: true,
  };
}
