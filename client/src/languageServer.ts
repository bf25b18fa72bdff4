import * as vscode from 'vscode';
import { RevealOutputChannelOn, State } from 'vscode-languageclient';
import type { BaseLanguageClient, LanguageClientOptions } from 'vscode-languageclient';
import type { ClientOptions } from '../../server/src/lsp/messages';
import { restartAFewTimes } from './restartPolicy';
import { serveWorkspaceFiles } from './workspaceFiles';

/** Desktop and web differ only in how a client and its server are made. */
export type MakeClient = (options: LanguageClientOptions) => BaseLanguageClient;

export type ServerState =
  | { readonly kind: 'starting' }
  | { readonly kind: 'running'; readonly version: string | undefined }
  | { readonly kind: 'stopped' };

export interface LanguageServer {
  readonly onDidChangeState: vscode.Event<ServerState>;
  /** Settles with whether the server answers. */
  start(): Promise<boolean>;
  stop(): Promise<void>;
  /** Asks the server; undefined while there is none. */
  request<R>(method: string, params: unknown): Promise<R | undefined>;
}

/**
 * Runs one language server at a time. Each start makes a new client, because a client whose server failed to start
 * refuses to try again.
 */
export function createLanguageServer(makeClient: MakeClient, log: vscode.LogOutputChannel): LanguageServer {
  const states = new vscode.EventEmitter<ServerState>();
  let client: BaseLanguageClient | undefined;
  let lastStep: Promise<unknown> = Promise.resolve();

  async function startNow(): Promise<boolean> {
    const started = makeClient(clientOptions(log));
    client = started;
    logInsteadOfToast(started);
    serveWorkspaceFiles(started);
    started.onDidChangeState(({ newState }) => {
      if (client === started) states.fire(describeState(newState, started));
    });
    try {
      await started.start();
      return true;
    } catch {
      return false; // The library has logged why.
    }
  }

  async function stopNow(): Promise<void> {
    const stopped = client;
    client = undefined;
    states.fire({ kind: 'stopped' });
    await stopped?.dispose().catch((reason: unknown) => log.warn('The language server did not stop cleanly.', reason));
  }

  // Starts and stops take turns: a client that is still starting cannot be stopped.
  function inTurn<T>(step: () => Promise<T>): Promise<T> {
    const result = lastStep.then(step);
    lastStep = result;
    return result;
  }

  return {
    onDidChangeState: states.event,
    start: () => inTurn(startNow),
    stop: () => inTurn(stopNow),
    request: async <R>(method: string, params: unknown) => {
      await lastStep;
      return client?.isRunning() ? client.sendRequest<R>(method, params) : undefined;
    },
  };
}

function clientOptions(log: vscode.LogOutputChannel): LanguageClientOptions {
  return {
    // Any scheme: untitled documents and virtual workspaces are served like files on disk.
    documentSelector: [{ language: 'tenuity' }],
    outputChannel: log,
    revealOutputChannelOn: RevealOutputChannelOn.Never,
    initializationOptions: { pages: true, files: true } satisfies ClientOptions,
    markdown: { isTrusted: false, supportHtml: false },
    errorHandler: restartAFewTimes(() => Date.now()),
    initializationFailedHandler: () => false,
  };
}

/** The library announces a lost server in a toast. Our user reads it in the status item, and the details in the log. */
function logInsteadOfToast(client: BaseLanguageClient): void {
  const report = client.error.bind(client);
  client.error = (message, data) => report(message, data, false);
}

function describeState(state: State, client: BaseLanguageClient): ServerState {
  switch (state) {
    case State.Starting:
      return { kind: 'starting' };
    case State.Running:
      return { kind: 'running', version: client.initializeResult?.serverInfo?.version };
    case State.Stopped:
    case State.StartFailed:
      return { kind: 'stopped' };
  }
}
