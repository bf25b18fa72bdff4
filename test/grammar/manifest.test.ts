import assert from 'node:assert/strict';
import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { Ajv } from 'ajv';
import { build } from 'esbuild';
import { commands } from '../../client/src/commands';

interface Setting {
  readonly order: number;
  readonly scope: string;
  readonly default: unknown;
  readonly markdownDescription: string;
  readonly enum?: readonly string[];
  readonly markdownEnumDescriptions?: readonly string[];
}

interface Manifest {
  readonly icon: string;
  readonly keywords: readonly string[];
  readonly activationEvents: readonly string[];
  readonly contributes: {
    readonly commands: readonly { command: string; category: string; title: string }[];
    readonly menus: Record<string, readonly { command: string; when?: string }[]>;
    readonly keybindings: readonly { command: string; when: string }[];
    readonly configuration: readonly { title: string; order: number; properties: Record<string, Setting> }[];
    readonly semanticTokenScopes: readonly { scopes: Record<string, readonly string[]> }[];
    readonly walkthroughs: readonly { steps: readonly WalkthroughStep[] }[];
  };
}

interface WalkthroughStep {
  readonly id: string;
  readonly description: string;
  readonly media: { readonly svg: string; readonly altText: string };
  readonly completionEvents: readonly string[];
}

const text = readFileSync('package.json', 'utf8');
const nls = JSON.parse(readFileSync('package.nls.json', 'utf8')) as Record<string, string>;
const localised = text.replace(/"%([^%"]+)%"/g, (_all, key: string) => JSON.stringify(nls[key] ?? `missing ${key}`));
const manifest = JSON.parse(localised) as Manifest;
const { contributes } = manifest;
const settings = contributes.configuration.flatMap(({ properties }) => Object.entries(properties));

describe('the manifest', () => {
  it('has a text for every key, and no text too many', () => {
    const used = [...text.matchAll(/"%([^%"]+)%"/g)].map(([, key]) => key);
    assert.deepEqual([...new Set(used)].sort(), Object.keys(nls).sort());
  });

  it('contributes exactly the commands that the client knows, each with category and title', () => {
    assert.deepEqual(contributes.commands.map(({ command }) => command).sort(), Object.values(commands).sort());
    for (const { category, title } of contributes.commands) {
      assert.equal(category, 'Gas State');
      assert.match(title, /^[A-Z]/);
    }
  });

  it('shows commands only beside our files, but for the one that makes a file', () => {
    const palette = contributes.menus['commandPalette'] ?? [];
    for (const command of Object.values(commands).filter((name) => name !== commands.newFile)) {
      const item = palette.find((entry) => entry.command === command);
      assert.equal(item?.when, 'editorLangId == tenuity', command);
    }
    for (const { when } of contributes.keybindings) assert.match(when, /editorLangId == tenuity/);
    assert.ok(contributes.keybindings.length <= 3);
  });

  it('names only commands that exist', () => {
    const own = new Set<string>(Object.values(commands));
    const named = [
      ...Object.values(contributes.menus).flatMap((items) => items.map(({ command }) => command)),
      ...contributes.keybindings.map(({ command }) => command),
      ...[...localised.matchAll(/command:(tenuity\.\w+)/g)].map(([, command]) => command),
      ...[...localised.matchAll(/onCommand:(tenuity\.\w+)/g)].map(([, command]) => command),
    ];
    assert.ok(named.length >= 8);
    for (const command of named) assert.ok(own.has(command ?? ''), command);
  });

  it('describes every setting, and every choice of it', () => {
    assert.ok(settings.length <= 12);
    for (const [name, setting] of settings) {
      assert.match(name, /^tenuity\.\w+\.\w+$/);
      assert.match(setting.markdownDescription, /^[A-Z][^]*\.$/, name);
      assert.equal(typeof setting.order, 'number', name);
      assert.equal(setting.scope, 'window', name);
      assert.equal(setting.markdownEnumDescriptions?.length, setting.enum?.length, name);
      for (const [, link] of setting.markdownDescription.matchAll(/`#([^#]+)#`/g)) {
        assert.ok(
          settings.some(([other]) => other === link),
          `${name} links to ${link}`,
        );
      }
    }
  });

  it('gives every setting a default that the setting allows', () => {
    const ajv = new Ajv({ strict: false });
    for (const [name, setting] of settings) {
      assert.ok(ajv.validate(setting, setting.default), `${name}: ${ajv.errorsText()}`);
    }
    const figures = settings.find(([name]) => name === 'tenuity.hints.figures')?.[1];
    assert.ok(figures);
    for (const wrong of [{ state: 'density' }, { state: ['Mean free path'] }, { state: ['a', 'b', 'c', 'd'] }]) {
      assert.equal(ajv.validate(figures, wrong), false);
    }
  });

  it('names only files that exist', () => {
    const files = [manifest.icon, ...JSON.stringify(contributes).matchAll(/"(\.\/[^"]+)"/g)].map((match) =>
      typeof match === 'string' ? match : (match[1] ?? ''),
    );
    assert.ok(files.length >= 12);
    for (const file of files) assert.ok(existsSync(file), file);
  });

  it('gives semantic tokens the colours of the TextMate grammar', () => {
    const grammar = readFileSync('grammar/gas-state.tmLanguage.json', 'utf8');
    const [{ scopes } = { scopes: {} }] = contributes.semanticTokenScopes;
    assert.ok(Object.keys(scopes).length >= 12);
    for (const [selector, [scope = '', ...others]] of Object.entries(scopes)) {
      assert.deepEqual(others, [], selector);
      // A theme that colours a scope colours all that it begins.
      const start = scope.replace(/\.tenuity$/, '');
      assert.match(grammar, new RegExp(`"${start}(\\.[a-z]+)*\\.tenuity"`), selector);
    }
  });

  it('leads through the first minutes in at most six steps, with pictures that everyone can take in', () => {
    for (const { steps } of contributes.walkthroughs) {
      assert.ok(steps.length <= 6);
      for (const { id, description, media, completionEvents } of steps) {
        assert.match(description, /\n\[[^\]]+\]\(command:/, `${id} has a button`);
        assert.ok(media.altText.length > 20, id);
        assert.ok(completionEvents.length > 0, id);
        const svg = readFileSync(media.svg, 'utf8');
        assert.match(svg, /<title>[^<]+<\/title>/, id);
        assert.doesNotMatch(svg, /#[0-9a-f]{3,6}"/i, `${id} takes its colours from the theme`);
        for (const [, colour] of svg.matchAll(/(?:fill|stroke)="([^"]+)"/g))
          assert.match(colour ?? '', /^(none|var\()/);
      }
    }
  });

  it('shows an icon of 256 by 256 pixels', () => {
    const png = readFileSync(manifest.icon);
    assert.equal(png.toString('latin1', 1, 4), 'PNG');
    // The header chunk of a PNG: width and height as big-endian words (ISO/IEC 15948, 11.2.2).
    assert.deepEqual([png.readUInt32BE(16), png.readUInt32BE(20)], [256, 256]);
  });

  it('keeps to what the marketplace takes', () => {
    assert.ok(manifest.keywords.length <= 5);
    assert.deepEqual(manifest.activationEvents, []);
  });
});

describe('the client', () => {
  it('has every text in the bundle for translators', () => {
    const bundle = JSON.parse(readFileSync('l10n/bundle.l10n.json', 'utf8')) as Record<string, string>;
    const sources = readdirSync('client/src', { recursive: true, encoding: 'utf8' })
      .filter((file) => file.endsWith('.ts'))
      .map((file) => readFileSync(`client/src/${file}`, 'utf8'));
    const used = sources.flatMap((source) => [...source.matchAll(/l10n\.t\(\s*'([^']*)'/g)].map(([, text]) => text));
    assert.deepEqual(Object.keys(bundle).sort(), [...new Set(used)].sort());
    for (const [key, value] of Object.entries(bundle)) assert.equal(value, key);
  });

  it('needs nothing of Node in the browser', async () => {
    const { errors, outputFiles } = await build({
      entryPoints: ['client/src/browser.ts'],
      bundle: true,
      write: false,
      platform: 'browser',
      format: 'cjs',
      external: ['vscode'],
      logLevel: 'silent',
    });
    assert.deepEqual(errors, []);
    const required = [...(outputFiles[0]?.text ?? '').matchAll(/\brequire\("([^"]+)"\)/g)].map(([, name]) => name);
    assert.deepEqual([...new Set(required)], ['vscode']);
  });
});
