import * as vscode from 'vscode';
import { LanguageClient } from 'vscode-languageclient/browser';
import { startExtension } from './extension';
import type { LanguageServer } from './languageServer';

let server: LanguageServer | undefined;
let worker: Worker | undefined;

/** Browser windows: the server is a worker. */
export function activate(context: vscode.ExtensionContext): void {
  const script = vscode.Uri.joinPath(context.extensionUri, 'dist/web/server.js').toString(true);
  // The library asks for a worker at each start, and leaves the one that went before to us.
  const startWorker = (): Promise<Worker> => {
    worker?.terminate();
    worker = new Worker(script);
    return Promise.resolve(worker);
  };
  server = startExtension(context, (options) => new LanguageClient('tenuity', 'Gas State', startWorker, options));
}

export async function deactivate(): Promise<void> {
  await server?.stop();
  worker?.terminate();
}
