import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { PassThrough } from 'node:stream';
import { build } from 'esbuild';
import { createConnection, ProposedFeatures } from 'vscode-languageserver/node';
import { StreamMessageReader, StreamMessageWriter } from 'vscode-languageserver-protocol/node';
import { nodeRuntime } from '../../server/src/lsp/nodeRuntime';
import type { Runtime } from '../../server/src/lsp/runtime';
import { startServer } from '../../server/src/lsp/start';
import type { Client, ClientOptions } from './client';
import { connect } from './client';

const bundle = path.resolve('dist/server.js');

/** The server as it ships, in a process of its own. */
export async function spawnServer(options: ClientOptions = {}): Promise<{ client: Client; stop(): Promise<number> }> {
  await ensureBundle();
  const server = spawn(process.execPath, [bundle, '--stdio'], { stdio: ['pipe', 'pipe', 'inherit'] });
  const client = await connect(new StreamMessageReader(server.stdout), new StreamMessageWriter(server.stdin), options);
  return {
    client,
    stop: async () => {
      const ended = once(server, 'exit');
      await client.request('shutdown', undefined);
      client.notify('exit', undefined);
      const [status] = (await ended) as [number];
      return status;
    },
  };
}

/** The same server in this process, on a machine of which a test may change parts. */
export function serveHere(changes: Partial<Runtime>, options: ClientOptions = {}): Promise<Client> {
  const [toServer, toClient] = [new PassThrough(), new PassThrough()];
  const connection = createConnection(
    ProposedFeatures.all,
    new StreamMessageReader(toServer),
    new StreamMessageWriter(toClient),
  );
  startServer(connection, { ...nodeRuntime, ...changes });
  return connect(new StreamMessageReader(toClient), new StreamMessageWriter(toServer), options);
}

/** A test run by itself may find nothing built. */
async function ensureBundle(): Promise<void> {
  if (existsSync(bundle)) return;
  await build({
    entryPoints: { server: 'server/src/node.ts' },
    outdir: 'dist',
    bundle: true,
    platform: 'node',
    format: 'cjs',
    mainFields: ['module', 'main'],
    target: 'es2022',
  });
}
