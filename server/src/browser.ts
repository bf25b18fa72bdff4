import {
  BrowserMessageReader,
  BrowserMessageWriter,
  createConnection,
  ProposedFeatures,
} from 'vscode-languageserver/browser';
import { startServer } from './lsp/start';
import type { Runtime } from './lsp/runtime';

declare const self: DedicatedWorkerGlobalScope;

/** A worker reaches no file by itself. */
const workerRuntime: Runtime = {
  readFile: () => 'out-of-reach',
  listFiles: () => 'out-of-reach',
  after: (milliseconds, run) => {
    const timer = self.setTimeout(run, milliseconds);
    return () => self.clearTimeout(timer);
  },
  breathe: () => new Promise((resolve) => self.setTimeout(resolve)),
};

startServer(
  createConnection(ProposedFeatures.all, new BrowserMessageReader(self), new BrowserMessageWriter(self)),
  workerRuntime,
);
