import assert from 'node:assert/strict';
import type { Hover } from 'vscode-languageserver-protocol/node';
import { LSPErrorCodes } from 'vscode-languageserver-protocol/node';
import type { Client } from './client';
import { serveHere, spawnServer } from './server';

const TEXT = 'state a of N2 { pressure = 3 Pa, temperature = 20 °C }\n';
const URI = 'file:///faults/a.gas';

/** The requests that are about a place of a file, with params that miss what they need. */
const requests = [
  'hover',
  'inlayHint',
  'completion',
  'signatureHelp',
  'definition',
  'references',
  'documentHighlight',
  'rename',
  'prepareRename',
  'codeAction',
  'formatting',
  'rangeFormatting',
  'onTypeFormatting',
  'documentSymbol',
  'foldingRange',
  'selectionRange',
  'semanticTokens/full',
  'semanticTokens/range',
  'documentLink',
].map((name) => `textDocument/${name}`);

describe('a server in trouble', () => {
  it('answers what is malformed with nothing, logs it with the request’s name, and lives', async () => {
    const server = await spawnServer();
    const { client } = server;
    for (const method of requests) await client.request(method, {});
    for (const method of requests) await client.request(method, { textDocument: { uri: 'file:///unknown.gas' } });
    client.notify('textDocument/didChange', {
      textDocument: { uri: 'file:///unknown.gas', version: 2 },
      contentChanges: [],
    });
    client.notify('textDocument/didClose', { textDocument: { uri: 'file:///unknown.gas' } });
    client.notify('textDocument/didOpen', {});
    client.notify('workspace/didChangeConfiguration', null);
    client.notify('workspace/didChangeWatchedFiles', {});
    await assert.rejects(client.request('textDocument/noSuchRequest', {}), /Unhandled method/);
    await stillAnswers(client);
    const logged = client.messages.filter(({ method }) => method === 'window/logMessage');
    const texts = logged.map(({ params }) => (params as { message: string }).message);
    assert.ok(
      texts.some((text) => /^hover: TypeError: .*\n\s+at /.test(text)),
      texts.join('\n'),
    );
    assert.equal(await server.stop(), 0);
  });

  it('has nothing to say of numbers that lie outside a file', async () => {
    const server = await spawnServer();
    const { client } = server;
    const file = client.open(URI, TEXT);
    for (const position of [
      { line: 99, character: 0 },
      { line: 0, character: 9999 },
      { line: -1, character: -1 },
    ]) {
      for (const method of ['hover', 'completion', 'definition', 'documentHighlight'])
        await file.ask(method, { position });
    }
    await stillAnswers(client);
    assert.deepEqual(
      client.messages.filter(({ method }) => method === 'window/logMessage'),
      [],
    );
    await server.stop();
  });

  it('lives on when a handler throws', async () => {
    const client = await serveHere(
      {
        listFiles: () => {
          throw new Error('the disk is gone');
        },
      },
      { folders: ['file:///faults'] },
    );
    client.open(URI, TEXT);
    assert.deepEqual(await client.request('workspace/symbol', { query: '' }), []);
    const { message } = await client.next<{ message: string }>('window/logMessage');
    assert.match(message, /^workspaceSymbol: Error: the disk is gone\n\s+at /);
    await stillAnswers(client);
  });

  it('lets a fault through where a test asks for it', async () => {
    const client = await serveHere({ faults: 'throw' });
    await assert.rejects(client.request('textDocument/hover', {}), /Cannot read properties of undefined/);
  });

  it('takes a file that cannot be read for one that is not there', async () => {
    const client = await serveHere({ readFile: () => Promise.reject(new Error('access denied')) });
    const file = client.open(URI, 'use "other.gas"\n');
    const [problem] = await file.problems();
    assert.equal(problem?.code, 'file-not-found');
  });

  it('does without what the client refuses', async () => {
    const refuse = () => {
      throw new Error('not here');
    };
    const workspace = {
      configuration: true,
      didChangeWatchedFiles: { dynamicRegistration: true },
      didChangeConfiguration: { dynamicRegistration: true },
    };
    const client = await serveHere(
      {},
      {
        capabilities: { workspace },
        answers: { 'client/registerCapability': refuse, 'workspace/configuration': refuse },
      },
    );
    await client.next('window/logMessage', {
      when: ({ message }: { message: string }) => message.startsWith('watched files: '),
    });
    await stillAnswers(client);
  });

  it('does not answer what is no longer wanted', async () => {
    const client = await serveHere({});
    const file = client.open(URI, TEXT);
    const params = { textDocument: { uri: URI }, position: file.at('a of') };
    const unwanted = client.cancellable('textDocument/hover', params);
    unwanted.cancel();
    await assert.rejects(unwanted.answer, { code: LSPErrorCodes.RequestCancelled });
    await stillAnswers(client);
  });

  it('stops waiting for a file when that is called off', async () => {
    const client = await serveHere(
      { readFile: () => new Promise(() => undefined) },
      { capabilities: { textDocument: { diagnostic: {} } } },
    );
    client.open(URI, 'use "slow.gas"\n');
    const unwanted = client.cancellable('textDocument/diagnostic', { textDocument: { uri: URI } });
    await stillAnswers(client);
    unwanted.cancel();
    await assert.rejects(unwanted.answer, { code: LSPErrorCodes.RequestCancelled });
  });
});

async function stillAnswers(client: Client): Promise<void> {
  const file = client.open('file:///faults/sound.gas', TEXT);
  const hover = await file.ask<Hover>('hover', { position: file.at('a of') });
  assert.match((hover.contents as { value: string }).value, /mean_free_path/);
}
