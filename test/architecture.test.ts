import assert from 'node:assert/strict';
import { readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { components } from '../server/src/model/graph';

/** What a folder may import besides itself. */
const LAYERS: Readonly<Record<string, readonly string[]>> = {
  quantities: [],
  physics: ['quantities'],
  syntax: [],
  model: ['syntax', 'physics', 'quantities'],
  features: ['model', 'syntax', 'quantities'],
  report: ['features', 'model', 'syntax', 'quantities'],
  // The reference book is compared with the engine itself. Only the command line has it, so that no server carries it.
  verify: ['report', 'physics', 'quantities'],
  lsp: ['features', 'report', 'model', 'syntax', 'quantities'],
  cli: ['verify', 'lsp', 'features', 'report', 'model', 'syntax', 'quantities'],
  'node.ts': ['lsp'],
  'browser.ts': ['lsp'],
  'cli.ts': ['cli'],
};

/** The folders that run anywhere, a worker included. */
const CORE = ['quantities', 'physics', 'syntax', 'model', 'features', 'report', 'verify'];

/**
 * The one knot of files that need each other when they run: an expression consists of expressions, so its forms call back to
 * where they are told apart; and a name may stand for a result of a kind, whose inputs are expressions again. All kinds are
 * part of it, so that adding one needs no word here.
 */
const KNOT = [
  ...['call', 'comparison', 'expression', 'inputs', 'member'],
  ...['mixture', 'mixtureParts', 'sum', 'table', 'toleranced'],
].map((file) => `server/src/model/${file}.ts`);
const KINDS = 'server/src/model/kinds/';

interface Import {
  readonly from: string;
  /** As written. */
  readonly specifier: string;
  /** The file, of a relative import. */
  readonly to?: string;
  readonly typeOnly: boolean;
}

const sources = ['server/src', 'client/src'].flatMap((folder) =>
  readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.ts') && !file.endsWith('.d.ts'))
    .map((file) => `${folder}/${file}`),
);
const imports = sources.flatMap(importsOf);

describe('the architecture', () => {
  it('is read from the sources', () => {
    assert.ok(sources.length > 100);
    assert.ok(imports.length > sources.length);
  });

  it('lets imports point inwards only', () => {
    const wrong = imports.filter(({ from, to }) => {
      const own = layerOf(from);
      const other = to === undefined ? undefined : layerOf(to);
      if (own === undefined || other === undefined || own === other) return false;
      return !(LAYERS[own] ?? []).includes(other);
    });
    assert.deepEqual(wrong.map(edge), []);
  });

  it('lets nothing out of the sources in but the manifest, for the version', () => {
    const outside = imports.filter(({ to }) => to !== undefined && !sources.includes(to) && to !== GENERATED);
    assert.deepEqual(outside.filter(({ from, to }) => to !== 'package.json' || layerOf(from) !== 'lsp').map(edge), []);
  });

  it('shares nothing between client and server but their messages', () => {
    const shared = imports.filter(
      ({ from, to }) => to !== undefined && to !== 'package.json' && isClient(from) !== isClient(to),
    );
    assert.deepEqual(shared.filter(({ to }) => to !== MESSAGES).map(edge), []);
    const behind = imports.filter(({ from, typeOnly }) => from === MESSAGES && !typeOnly);
    assert.deepEqual(behind.map(edge), []);
  });

  it('knows every folder of the server', () => {
    const folders = new Set(sources.filter((file) => file.startsWith('server/src/')).map((file) => layerOf(file)));
    assert.deepEqual(
      [...folders].filter((folder) => !(String(folder) in LAYERS)),
      [],
    );
  });

  it('has no circle of files but the one of expressions', () => {
    const edges = new Map(sources.map((file) => [file, [] as string[]]));
    for (const { from, to, typeOnly } of imports) if (to && !typeOnly && edges.has(to)) edges.get(from)?.push(to);
    const circles = components(sources, (file) => edges.get(file) ?? []).filter(({ circular }) => circular);
    assert.deepEqual(
      circles.map(({ members }) => members.filter((file) => !file.startsWith(KINDS)).sort()),
      [[...KNOT].sort()],
    );
  });

  it('keeps the editor out of the server', () => {
    assert.deepEqual(
      uses('vscode', (file) => !file.startsWith('client/')),
      [],
    );
  });

  it('keeps the protocol at the edge', () => {
    const protocol = /^vscode-(?:languageserver|jsonrpc)/;
    assert.deepEqual(
      uses(protocol, (file) => file.startsWith('server/') && !PROTOCOL_PLACES.includes(layerOf(file) ?? '')),
      [],
    );
    assert.deepEqual(
      uses(/^vscode-languageserver(?:\/|$)/, (file) => file.startsWith('client/')),
      [],
    );
  });

  it('keeps the core free of Node', () => {
    const modules = /^(?:node:|fs$|path$|url$|os$|process$|buffer$|child_process$|worker_threads$)/;
    assert.deepEqual(
      uses(modules, (file) => CORE.includes(layerOf(file) ?? '')),
      [],
    );
  });

  it('gives the core no package at all', () => {
    const packages = imports.filter(({ from, to }) => to === undefined && CORE.includes(layerOf(from) ?? ''));
    assert.deepEqual(packages.map(edge), []);
  });

  it('exports by name only', () => {
    const byDefault = sources.filter((file) => /^export default/m.test(readFileSync(file, 'utf8')));
    assert.deepEqual(byDefault, []);
  });
});

const MESSAGES = 'server/src/lsp/messages.ts';
const GENERATED = 'server/src/syntax/generated/parser';
const PROTOCOL_PLACES = ['lsp', 'node.ts', 'browser.ts'];

/** The folder below server/src, or the entry file; nothing for the client. */
function layerOf(file: string): string | undefined {
  return /^server\/src\/([^/]+)/.exec(file)?.[1];
}

function isClient(file: string): boolean {
  return file.startsWith('client/');
}

function importsOf(from: string): readonly Import[] {
  const text = readFileSync(from, 'utf8');
  const statements = text.matchAll(
    /^(?:import|export)\s+(type\s)?[^;]*?from\s+'([^']+)'|^import\s+'([^']+)'|\bimport\('([^']+)'\)/gm,
  );
  return [...statements].map(([, type, named, bare, dynamic]) => {
    const specifier = named ?? bare ?? dynamic ?? '';
    const typeOnly = type !== undefined;
    return specifier.startsWith('.')
      ? { from, specifier, to: resolve(from, specifier), typeOnly }
      : { from, specifier, typeOnly };
  });
}

function resolve(from: string, specifier: string): string {
  const target = path.posix.join(path.posix.dirname(from), specifier);
  return [`${target}.ts`, `${target}/index.ts`].find((file) => sources.includes(file)) ?? target;
}

function uses(what: string | RegExp, where: (file: string) => boolean): readonly string[] {
  return imports
    .filter(
      ({ from, specifier }) => (typeof what === 'string' ? specifier === what : what.test(specifier)) && where(from),
    )
    .map(edge);
}

function edge({ from, specifier }: Import): string {
  return `${from} → ${specifier}`;
}
