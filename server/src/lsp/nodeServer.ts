import { createConnection, ProposedFeatures } from 'vscode-languageserver/node';
import { nodeRuntime } from './nodeRuntime';
import { startServer } from './start';

/** Serves over what the arguments of the process say: `--stdio`, or the channel to the parent process. */
export function startNodeServer(): void {
  startServer(createConnection(ProposedFeatures.all), nodeRuntime);
}
