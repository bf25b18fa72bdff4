import assert from 'node:assert/strict';
import type {
  DocumentDiagnosticReport,
  InlayHint,
  PublishDiagnosticsParams,
  RegistrationParams,
} from 'vscode-languageserver-protocol/node';
import type { Client, ClientOptions } from './client';
import { serveHere } from './server';

const MAIN = 'file:///shop/main.gas';
const SHARED = 'file:///shop/shared.gas';
const USER = 'use "shared.gas"\nstate a of N2 { pressure = base, temperature = 20 °C }\n';

const refreshing = {
  workspace: {
    inlayHint: { refreshSupport: true },
    diagnostics: { refreshSupport: true },
    configuration: true,
    didChangeWatchedFiles: { dynamicRegistration: true },
    didChangeConfiguration: { dynamicRegistration: true },
  },
};

/** A server whose disk is a map that the test may change. */
function serveFrom(disk: Map<string, string>, options: ClientOptions = {}): Promise<Client> {
  return serveHere(
    { readFile: (uri) => Promise.resolve(disk.get(uri)), listFiles: () => Promise.resolve([...disk.keys()]) },
    { capabilities: refreshing, ...options },
  );
}

const published = (client: Client, uri: string, { since = 0 } = {}) =>
  client.next<PublishDiagnosticsParams>('textDocument/publishDiagnostics', { since, when: (each) => each.uri === uri });

const count = (client: Client, wanted: string) => client.messages.filter(({ method }) => method === wanted).length;

const firstLines = { range: { start: { line: 0, character: 0 }, end: { line: 9, character: 0 } } };

describe('files that others use', () => {
  it('shows no unknown name while a file is being read', async () => {
    let arrive: (text: string) => void = () => assert.fail('nothing was read');
    const reads: string[] = [];
    const client = await serveHere({
      readFile: (uri) => {
        reads.push(uri);
        return new Promise((resolve) => (arrive = resolve));
      },
    });
    const file = client.open(MAIN, USER);
    assert.deepEqual(await file.ask('inlayHint', firstLines), [], 'there is no value yet');
    assert.equal(count(client, 'textDocument/publishDiagnostics'), 0);
    arrive('let base = 3 Pa\n');
    assert.deepEqual(await file.problems(), []);
    assert.deepEqual(reads, [SHARED]);
  });

  it('reads what has changed on disk, appeared or gone', async () => {
    const disk = new Map<string, string>();
    const client = await serveFrom(disk);
    const { registrations } = await client.next<RegistrationParams>('client/registerCapability', {
      when: (each) => each.registrations.some(({ method }) => method === 'workspace/didChangeWatchedFiles'),
    });
    assert.deepEqual(registrations[0]?.registerOptions, { watchers: [{ globPattern: '**/*.gas' }] });

    const change = async (text: string | undefined, type: 1 | 2 | 3) => {
      if (text === undefined) disk.delete(SHARED);
      else disk.set(SHARED, text);
      const since = client.messages.length;
      client.notify('workspace/didChangeWatchedFiles', { changes: [{ uri: SHARED, type }] });
      const { diagnostics } = await published(client, MAIN, { since });
      return diagnostics.map(({ code }) => code);
    };
    const missing = (await client.open(MAIN, USER).problems()).map(({ code }) => code);
    assert.ok(missing.includes('file-not-found'));
    assert.deepEqual(await change('let base = 3 Pa\n', 1), []);
    assert.deepEqual(await change('let base = 3 kg\n', 2), ['unit-mismatch']);
    assert.deepEqual(await change(undefined, 3), missing);
  });

  it('goes by the editor’s text while a file is open there, and by the disk’s after', async () => {
    const client = await serveFrom(new Map([[SHARED, 'let base = 3 Pa\n']]));
    await client.open(MAIN, USER).problems();
    let since = client.messages.length;
    const shared = client.open(SHARED, 'let base = 3 kg\n');
    assert.equal((await published(client, MAIN, { since })).diagnostics[0]?.code, 'unit-mismatch');
    since = client.messages.length;
    shared.close();
    const republished = await client.next<PublishDiagnosticsParams>('textDocument/publishDiagnostics', {
      since,
      when: ({ uri, diagnostics }) => uri === MAIN && diagnostics.length === 0,
    });
    assert.deepEqual(republished.diagnostics, []);
  });

  it('asks for hints again only when a value has changed', async () => {
    const client = await serveFrom(new Map());
    const shared = client.open(SHARED, 'let base = 3 Pa\n');
    const main = client.open(MAIN, USER);
    await main.problems();
    const [before] = await main.ask<InlayHint[]>('inlayHint', firstLines);
    await client.next('workspace/configuration');

    let since = client.messages.length;
    shared.replace(0, 0, '# The pressure when the valve closes.\n');
    await published(client, MAIN, { since });
    since = client.messages.length;
    const place = shared.document.getText().indexOf('3 Pa');
    shared.replace(place, place + 1, '4');
    await client.next('workspace/inlayHint/refresh', { since });
    assert.equal(count(client, 'workspace/inlayHint/refresh'), 1);
    const [after] = await main.ask<InlayHint[]>('inlayHint', firstLines);
    assert.notEqual(after?.label, before?.label);
  });

  it('follows the settings', async () => {
    let settings: unknown = null;
    const client = await serveFrom(new Map(), {
      answers: { 'workspace/configuration': () => [settings] },
    });
    const file = client.open(MAIN, 'let base = 2 * 3 Pa\n');
    const all = await file.ask<InlayHint[]>('inlayHint', firstLines);
    assert.equal(all.length, 1);
    settings = { hints: { enabled: 'off' } };
    client.notify('workspace/didChangeConfiguration', { settings: null });
    await client.next('workspace/inlayHint/refresh');
    assert.deepEqual(await file.ask('inlayHint', firstLines), []);
    settings = { hints: { enabled: 'sometimes', digits: 99 } };
    const since = client.messages.length;
    client.notify('workspace/didChangeConfiguration', { settings: null });
    await client.next('workspace/inlayHint/refresh', { since });
    assert.deepEqual(await file.ask('inlayHint', firstLines), all, 'what makes no sense is as by default');
  });

  it('answers clients that ask for problems, and sends them none', async () => {
    const client = await serveFrom(new Map(), {
      capabilities: { ...refreshing, textDocument: { diagnostic: {} } },
    });
    assert.deepEqual(client.initialized.capabilities.diagnosticProvider, {
      interFileDependencies: true,
      workspaceDiagnostics: false,
    });
    const shared = client.open(SHARED, 'let base = 3 Pa\n');
    const main = client.open(MAIN, USER);
    const pull = (previousResultId?: string) => main.ask<DocumentDiagnosticReport>('diagnostic', { previousResultId });
    const first = await pull();
    assert.deepEqual(first.kind === 'full' && first.items, []);
    const again = await pull(first.resultId);
    assert.deepEqual(again, { kind: 'unchanged', resultId: first.resultId });

    const place = shared.document.getText().indexOf('Pa');
    shared.replace(place, place + 2, 'kg');
    await client.next('workspace/diagnostic/refresh');
    const mended = await pull(first.resultId);
    assert.deepEqual(mended.kind === 'full' && mended.items.map(({ code }) => code), ['unit-mismatch']);
    assert.equal(count(client, 'textDocument/publishDiagnostics'), 0);
  });

  it('reads through the client what it cannot reach', async () => {
    const asked: string[] = [];
    const client = await serveHere(
      { readFile: () => 'out-of-reach', listFiles: () => 'out-of-reach' },
      {
        initializationOptions: { files: true },
        folders: ['vscode-vfs://host/shop'],
        answers: {
          'tenuity/readFile': ({ uri }: { uri: string }) => {
            asked.push(uri);
            return 'let base = 3 Pa\n';
          },
          'tenuity/listFiles': () => ['vscode-vfs://host/shop/shared.gas'],
        },
      },
    );
    const file = client.open('vscode-vfs://host/shop/main.gas', USER);
    assert.deepEqual(await file.problems(), []);
    assert.deepEqual(asked, ['vscode-vfs://host/shop/shared.gas']);
    const symbols = await client.request<{ name: string }[]>('workspace/symbol', { query: 'bas' });
    assert.deepEqual(
      symbols.map(({ name }) => name),
      ['base'],
    );
  });

  it('knows a file however its address is spelt', async () => {
    const client = await serveFrom(new Map());
    const shared = client.open('file:///c:/gas%20data/shared.gas', 'let base = 3 Pa\n');
    const main = client.open('file:///c%3A/gas%20data/main.gas', USER);
    assert.deepEqual(await main.problems(), []);
    const found = await main.ask<{ uri: string }>('definition', { position: main.at('base') });
    assert.equal(found.uri, shared.uri, 'as the client spells it');
  });
});
