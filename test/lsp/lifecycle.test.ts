import assert from 'node:assert/strict';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import type {
  CodeAction,
  CompletionItem,
  Diagnostic,
  Hover,
  InlayHint,
  Location,
  PublishDiagnosticsParams,
  TextDocumentEdit,
  WorkspaceEdit,
} from 'vscode-languageserver-protocol/node';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { version } from '../../package.json';
import type { Client } from './client';
import { spawnServer } from './server';

const capabilities = {
  workspace: { workspaceEdit: { documentChanges: true } },
  textDocument: {
    hover: { contentFormat: ['markdown' as const] },
    publishDiagnostics: {
      relatedInformation: true,
      tagSupport: { valueSet: [1 as const] },
      codeDescriptionSupport: true,
    },
    rename: { prepareSupport: true },
    completion: { completionItem: { snippetSupport: true, documentationFormat: ['markdown' as const] } },
  },
};

const SLIP = 'state backing of N2 {\n  pressure = 3 mm\n  temperature = 21 °C\n}\n';
const SOUND = SLIP.replace('3 mm', '3 mbar');
const codes = (problems: readonly Diagnostic[]) => problems.map(({ code }) => code);

describe('the server as it ships', () => {
  let client: Client;
  let server: Awaited<ReturnType<typeof spawnServer>>;
  let folder: string;
  let count = 0;
  const fresh = (name = 'file') => pathToFileURL(path.join(folder, `${name}${(count += 1)}.gas`)).href;

  before(async () => {
    folder = await mkdtemp(path.join(tmpdir(), 'tenuity-'));
    server = await spawnServer({
      capabilities,
      initializationOptions: { pages: true },
      folders: [pathToFileURL(folder).href],
    });
    client = server.client;
  });
  after(async () => {
    assert.equal(await server.stop(), 0, 'after shutdown it exits without an error');
    await rm(folder, { recursive: true });
    const loud = client.messages.filter(({ method }) => method.startsWith('window/show'));
    assert.deepEqual(loud, [], 'nothing interrupts the user');
    const faults = client.messages.filter(({ method }) => method === 'window/logMessage');
    assert.deepEqual(faults, [], 'nothing went wrong on the way');
  });

  it('says who it is and what it can do', () => {
    const { serverInfo, capabilities: can } = client.initialized;
    assert.deepEqual(serverInfo, { name: 'tenuity', version });
    assert.deepEqual(can.textDocumentSync, { openClose: true, change: 2 });
    assert.deepEqual(can.completionProvider?.triggerCharacters, ['.', ' ', '=', '"']);
    assert.equal(can.diagnosticProvider, undefined, 'a client that cannot ask for problems is sent them');
  });

  it('publishes problems with the version they belong to, and takes them back on close', async () => {
    const file = client.open(fresh(), SLIP);
    const [problem] = await file.problems();
    assert.equal(problem?.code, 'unit-mismatch');
    assert.equal(problem.source, 'tenuity');
    assert.equal(problem.severity, 1);
    assert.deepEqual(problem.range, file.range('mm'));
    assert.equal(problem.codeDescription?.href, 'tenuity:/problems/unit-mismatch.md');

    const start = file.document.getText().indexOf('mm');
    file.replace(start, start + 2, 'mbar');
    assert.deepEqual(await file.problems(), []);

    const since = client.messages.length;
    file.close();
    const cleared = await client.next<PublishDiagnosticsParams>('textDocument/publishDiagnostics', { since });
    assert.deepEqual(cleared, { uri: file.uri, diagnostics: [] });
  });

  it('fades what is not used, and points to where else a name is declared', async () => {
    const file = client.open(fresh(), `let twice = 1 Pa\nlet twice = 2 Pa\n${SOUND}`);
    const problems = await file.problems();
    const duplicate = problems.find(({ code }) => code === 'duplicate-name');
    assert.equal(duplicate?.relatedInformation?.[0]?.location.uri, file.uri);
    assert.equal(duplicate.relatedInformation[0].location.range.start.line, 1);
    const unused = problems.find(({ code }) => code === 'unused-declaration');
    assert.deepEqual(unused?.tags, [1]);
    file.close();
  });

  it('answers hovers and hints for the text as it is', async () => {
    const file = client.open(fresh(), SOUND);
    const { contents, range } = await file.ask<Hover>('hover', { position: file.at('backing') });
    assert.match((contents as { value: string }).value, /mean_free_path/);
    assert.deepEqual(range, file.range('backing'));
    const everything = { range: { start: { line: 0, character: 0 }, end: { line: 9, character: 0 } } };
    const before = await file.ask<InlayHint[]>('inlayHint', everything);
    assert.equal(before.length, 1);
    assert.deepEqual(before[0]?.position, { line: 0, character: SOUND.indexOf('\n') });

    const start = SOUND.indexOf('3 mbar');
    file.replace(start, start + 1, '30');
    const after = await file.ask<InlayHint[]>('inlayHint', everything);
    assert.notEqual(after[0]?.label, before[0].label);
    file.close();
  });

  it('mends a problem by its quick fix, for the version at hand', async () => {
    const file = client.open(fresh(), SLIP);
    const problems = await file.problems();
    const context = { diagnostics: problems, only: ['quickfix'] };
    const actions = await file.ask<CodeAction[]>('codeAction', { range: file.range('mm'), context });
    assert.ok(actions.length > 0 && actions.every(({ kind }) => kind === 'quickfix'));
    const action = actions.find(({ title }) => title === 'Use mbar');
    assert.deepEqual(codes(action?.diagnostics ?? []), ['unit-mismatch']);
    const [change] = action!.edit!.documentChanges as TextDocumentEdit[];
    assert.deepEqual(change!.textDocument, { uri: file.uri, version: 1 });
    assert.equal(TextDocument.applyEdits(file.document, change!.edits as never), SOUND);
    file.close();
  });

  it('offers what fits the place', async () => {
    const file = client.open(fresh(), 'state a of N2 {\n  pressure = 3 Pa\n  \n}\n');
    const items = await file.ask<CompletionItem[]>('completion', { position: { line: 2, character: 2 } });
    const labels = items.map(({ label }) => label);
    assert.ok(labels.includes('temperature'), labels.join(' '));
    assert.ok(!labels.includes('pressure'), 'it is there already');
    file.close();
  });

  it('formats', async () => {
    const file = client.open(fresh(), 'let  a=3 Pa\n');
    const edits = await file.ask<never[]>('formatting', { options: { tabSize: 2, insertSpaces: true } });
    assert.equal(TextDocument.applyEdits(file.document, edits), 'let a = 3 Pa\n');
    file.close();
  });

  it('follows and renames across files, open and on disk', async () => {
    const gases = fresh('gases');
    const reader = fresh('reader');
    await writeFile(
      new URL(reader),
      `use "${path.basename(gases)}"\nstate b of N2 { pressure = base, temperature = 20 °C }\n`,
    );
    const shared = client.open(gases, 'let base = 3 Pa\n');
    const user = client.open(fresh(), `use "${path.basename(gases)}"\nlet double = 2 * base\n`);
    assert.deepEqual(await user.problems(), []);

    const found = await user.ask<Location>('definition', { position: user.at('base\n') });
    assert.deepEqual(found, { uri: gases, range: shared.range('base') });

    const prepared = await user.ask('prepareRename', { position: user.at('base\n') });
    const start = user.at('base\n');
    const range = { start, end: { line: start.line, character: start.character + 'base'.length } };
    assert.deepEqual(prepared, { range, placeholder: 'base' });

    const edit = await user.ask<WorkspaceEdit>('rename', { position: user.at('base\n'), newName: 'floor_pressure' });
    const changes = edit.documentChanges as TextDocumentEdit[];
    const touched = new Map(
      changes.map(({ textDocument, edits }) => [
        textDocument.uri,
        { version: textDocument.version, edits: edits.length },
      ]),
    );
    assert.deepEqual(touched.get(gases), { version: 1, edits: 1 });
    assert.deepEqual(touched.get(user.uri), { version: 1, edits: 1 });
    assert.deepEqual(touched.get(reader), { version: null, edits: 1 });
    await assert.rejects(user.ask('rename', { position: user.at('base\n'), newName: '3x' }), /a name is a letter/);
    shared.close();
    user.close();
  });

  it('keeps files apart that change together', async () => {
    const [left, right] = [client.open(fresh('left'), SLIP), client.open(fresh('right'), SOUND)];
    const place = (text: string) => text.indexOf('3 m');
    left.replace(place(SLIP), place(SLIP) + 4, '3 mbar');
    right.replace(place(SOUND), place(SOUND) + 6, '3 kg');
    left.replace(0, 0, '# A remark.\n');
    right.replace(0, 0, '# A remark.\n');
    const [leftProblems, rightProblems] = await Promise.all([left.problems(), right.problems()]);
    assert.deepEqual(leftProblems, []);
    assert.deepEqual(codes(rightProblems), ['unit-mismatch']);
    assert.equal(rightProblems[0]?.range.start.line, 2);
    left.close();
    right.close();
  });

  it('takes several changes in one notification, each on the text that the one before has left', async () => {
    const file = client.open(fresh(), SLIP);
    const start = SLIP.indexOf('mm');
    file.replaceAll([
      { start: 0, end: 0, text: '# Größe µ 𝜆\n' },
      { start: start + 13, end: start + 15, text: 'mbar' },
    ]);
    assert.equal(file.document.getText().includes('3 mbar'), true);
    assert.deepEqual(await file.problems(), []);
    file.close();
  });

  it('has a page for the code of a problem, and none for what is no code', async () => {
    const page = await client.request<string>('tenuity/page', { code: 'unit-mismatch' });
    assert.match(page, /^# A unit that measures something else\n/);
    assert.equal(await client.request('tenuity/page', { code: 'no-such-code' }), null);
  });
});
