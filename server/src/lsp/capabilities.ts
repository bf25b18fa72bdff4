import type { ServerCapabilities } from 'vscode-languageserver';
import { CodeActionKind, TextDocumentSyncKind } from 'vscode-languageserver';
import type { Abilities } from './abilities';
import { fixAllKind } from './convert/codeAction';
import { tokensLegend } from './convert/tokens';

/** What the server can do, as it tells the client. */
export function capabilitiesFor({ pullsDiagnostics, preparesRename }: Abilities): ServerCapabilities {
  return {
    textDocumentSync: { openClose: true, change: TextDocumentSyncKind.Incremental },
    workspace: { workspaceFolders: { supported: true, changeNotifications: true } },
    ...(pullsDiagnostics ? { diagnosticProvider: { interFileDependencies: true, workspaceDiagnostics: false } } : {}),
    hoverProvider: true,
    inlayHintProvider: true,
    signatureHelpProvider: { triggerCharacters: ['(', ','] },
    completionProvider: { triggerCharacters: ['.', ' ', '=', '"'] },
    codeActionProvider: { codeActionKinds: [CodeActionKind.QuickFix, CodeActionKind.Refactor, fixAllKind] },
    documentFormattingProvider: true,
    documentRangeFormattingProvider: true,
    documentOnTypeFormattingProvider: { firstTriggerCharacter: '}', moreTriggerCharacter: ['\n'] },
    definitionProvider: true,
    referencesProvider: true,
    documentHighlightProvider: true,
    renameProvider: preparesRename ? { prepareProvider: true } : true,
    documentSymbolProvider: true,
    workspaceSymbolProvider: true,
    semanticTokensProvider: { legend: tokensLegend, full: { delta: true }, range: true },
    foldingRangeProvider: true,
    selectionRangeProvider: true,
    documentLinkProvider: {},
  };
}
