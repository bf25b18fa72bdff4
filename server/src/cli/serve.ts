import type { Command } from './command';
import { readArguments, UsageError } from './command';

export const serve: Command = {
  name: 'serve',
  summary: 'is the language server for an editor',
  help: `tenuity serve --stdio

Speaks the Language Server Protocol over standard input and output, for any editor that does.

  tenuity serve --stdio
  tenuity serve --stdio 2> server.log`,
  run: async (args) => {
    if (!readArguments(args, { stdio: { type: 'boolean' } }).flag('stdio'))
      throw new UsageError('write tenuity serve --stdio');
    // The other commands need no protocol, and start sooner without it.
    const { startNodeServer } = await import('../lsp/nodeServer');
    startNodeServer();
    // The server ends the process when its client says so or goes.
    return new Promise<never>(() => undefined);
  },
};
