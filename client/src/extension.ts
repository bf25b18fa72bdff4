import * as vscode from 'vscode';
import { commands } from './commands';
import { createLanguageServer } from './languageServer';
import type { LanguageServer, MakeClient } from './languageServer';
import { newFile } from './newFile';
import { registerPages } from './pages';
import { createStatusItem, showState } from './statusItem';
import { toggleHints } from './toggleHints';

/**
 * What the desktop and the web extension share. The server starts in the background, so that no command waits for it.
 */
export function startExtension(context: vscode.ExtensionContext, makeClient: MakeClient): LanguageServer {
  const log = vscode.window.createOutputChannel('Gas State', { log: true });
  const server = createLanguageServer(makeClient, log);
  const status = createStatusItem();

  context.subscriptions.push(
    log,
    status,
    registerPages(server),
    server.onDidChangeState((state) => showState(status, state)),
    vscode.commands.registerCommand(commands.newFile, (wanted: unknown) => newFile(context.extensionUri, wanted)),
    vscode.commands.registerCommand(commands.toggleHints, () => toggleHints(context.globalState)),
    vscode.commands.registerCommand(commands.restartServer, () => restart(server, log)),
    vscode.commands.registerCommand(commands.showLog, () => log.show(true)),
  );

  showState(status, { kind: 'starting' });
  void server.start();
  return server;
}

async function restart(server: LanguageServer, log: vscode.LogOutputChannel): Promise<void> {
  await server.stop();
  if (await server.start()) return;
  const showLog = vscode.l10n.t('Show log');
  const choice = await vscode.window.showErrorMessage(vscode.l10n.t('The language server did not start.'), showLog);
  if (choice === showLog) log.show(true);
}
