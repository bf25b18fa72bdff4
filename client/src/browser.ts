import * as vscode from 'vscode';
import { BrowserMessageReader, BrowserMessageWriter, LanguageClient } from 'vscode-languageclient/browser';
import type { MessageTransports } from 'vscode-languageclient/browser';
import { startExtension } from './extension';
import type { LanguageServer } from './languageServer';

let server: LanguageServer | undefined;
let worker: Worker | undefined;

/** Browser windows: the server is a worker. */
export function activate(context: vscode.ExtensionContext): void {
  const script = vscode.Uri.joinPath(context.extensionUri, 'dist/web/server.js').toString(true);
  // The library asks for a server at each start, and leaves the worker that went before to us. Given a worker it would
  // test for the class Worker, which VS Code has replaced; so it is given the transports.
  const startWorker = (): Promise<MessageTransports> => {
    worker?.terminate();
    worker = new Worker(script);
    return Promise.resolve({ reader: new BrowserMessageReader(worker), writer: new BrowserMessageWriter(worker) });
  };
  server = startExtension(context, (options) => new LanguageClient('tenuity', 'Gas State', startWorker, options));
}

export async function deactivate(): Promise<void> {
  await server?.stop();
  worker?.terminate();
}
