import * as vscode from 'vscode';
import type { BaseLanguageClient } from 'vscode-languageclient';
import { listFilesRequest, readFileRequest } from '../../server/src/lsp/messages';
import type { ReadFileParams } from '../../server/src/lsp/messages';

/** A server in a worker reaches no file, and one on a machine none of a virtual workspace: they ask here. */
export function serveWorkspaceFiles(client: BaseLanguageClient): void {
  client.onRequest(readFileRequest, ({ uri }: ReadFileParams) => readText(vscode.Uri.parse(uri)));
  client.onRequest(listFilesRequest, async () => {
    const found = await vscode.workspace.findFiles('**/*.gas', '**/node_modules/**');
    return found.map((uri) => uri.toString());
  });
}

/** Null where there is no such file, as the message has it. */
async function readText(uri: vscode.Uri): Promise<string | null> {
  try {
    return new TextDecoder().decode(await vscode.workspace.fs.readFile(uri));
  } catch {
    return null;
  }
}
