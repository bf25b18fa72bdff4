import type { InitializeParams } from 'vscode-languageserver';
import { MarkupKind } from 'vscode-languageserver';
import type { ClientOptions } from './messages';

/** What the client can do, as far as the server acts differently for it. */
export interface Abilities {
  readonly pullsDiagnostics: boolean;
  readonly refreshesDiagnostics: boolean;
  readonly refreshesHints: boolean;
  readonly refreshesTokens: boolean;
  readonly relatedInformation: boolean;
  readonly codeDescription: boolean;
  readonly tags: boolean;
  readonly versionedEdits: boolean;
  readonly markdownHover: boolean;
  readonly markdownCompletion: boolean;
  readonly markdownSignature: boolean;
  readonly snippets: boolean;
  readonly preparesRename: boolean;
  readonly nestedSymbols: boolean;
  readonly labelOffsets: boolean;
  readonly configuration: boolean;
  readonly folders: boolean;
  readonly registersConfiguration: boolean;
  readonly registersWatchers: boolean;
  readonly pages: boolean;
  readonly files: boolean;
}

export function abilitiesOf({
  capabilities,
  initializationOptions,
}: Pick<InitializeParams, 'capabilities' | 'initializationOptions'>): Abilities {
  const { textDocument, workspace } = capabilities;
  const options = (initializationOptions ?? {}) as ClientOptions;
  const { publishDiagnostics, diagnostic, completion } = textDocument ?? {};
  const described = publishDiagnostics ?? diagnostic;
  return {
    pullsDiagnostics: diagnostic !== undefined,
    refreshesDiagnostics: workspace?.diagnostics?.refreshSupport === true,
    refreshesHints: workspace?.inlayHint?.refreshSupport === true,
    refreshesTokens: workspace?.semanticTokens?.refreshSupport === true,
    relatedInformation: described?.relatedInformation === true,
    codeDescription: described?.codeDescriptionSupport === true,
    tags: described?.tagSupport !== undefined,
    versionedEdits: workspace?.workspaceEdit?.documentChanges === true,
    markdownHover: textDocument?.hover?.contentFormat?.includes(MarkupKind.Markdown) === true,
    markdownCompletion: completion?.completionItem?.documentationFormat?.includes(MarkupKind.Markdown) === true,
    markdownSignature:
      textDocument?.signatureHelp?.signatureInformation?.documentationFormat?.includes(MarkupKind.Markdown) === true,
    snippets: completion?.completionItem?.snippetSupport === true,
    preparesRename: textDocument?.rename?.prepareSupport === true,
    nestedSymbols: textDocument?.documentSymbol?.hierarchicalDocumentSymbolSupport === true,
    labelOffsets: textDocument?.signatureHelp?.signatureInformation?.parameterInformation?.labelOffsetSupport === true,
    configuration: workspace?.configuration === true,
    folders: workspace?.workspaceFolders === true,
    registersConfiguration: workspace?.didChangeConfiguration?.dynamicRegistration === true,
    registersWatchers: workspace?.didChangeWatchedFiles?.dynamicRegistration === true,
    pages: options.pages === true,
    files: options.files === true,
  };
}
