import type * as vscode from 'vscode';
import { LanguageClient, TransportKind } from 'vscode-languageclient/node';
import { startExtension } from './extension';
import type { LanguageServer } from './languageServer';

let server: LanguageServer | undefined;

/** Desktop and remote windows: the server is a process of its own. */
export function activate(context: vscode.ExtensionContext): void {
  const module = context.asAbsolutePath('dist/server.js');
  const run = { module, transport: TransportKind.ipc };
  const debug = { ...run, options: { execArgv: ['--enable-source-maps'] } };
  server = startExtension(context, (options) => new LanguageClient('tenuity', 'Gas State', { run, debug }, options));
}

export function deactivate(): Promise<void> | undefined {
  return server?.stop();
}
