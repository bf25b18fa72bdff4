// Bundles what ships (dist/), and with --tests what the tests run (out/).
import { existsSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { build } from 'esbuild';

const root = import.meta.dirname;
const { version } = JSON.parse(readFileSync(path.join(root, 'package.json'), 'utf8'));
const common = {
  absWorkingDir: root,
  bundle: true,
  sourcemap: 'linked',
  target: 'es2022',
  logLevel: 'warning',
  define: { TENUITY_VERSION: JSON.stringify(version) },
};
const node = { ...common, platform: 'node', format: 'cjs', mainFields: ['module', 'main'] };
const browser = { ...common, platform: 'browser', external: ['vscode'] };

const shipped = [
  { ...node, external: ['vscode'], entryPoints: { extension: 'client/src/node.ts' }, outdir: 'dist' },
  { ...node, entryPoints: { server: 'server/src/node.ts', cli: 'server/src/cli.ts' }, outdir: 'dist' },
  { ...browser, format: 'cjs', entryPoints: { extension: 'client/src/browser.ts' }, outdir: 'dist/web' },
  { ...browser, format: 'iife', entryPoints: { server: 'server/src/browser.ts' }, outdir: 'dist/web' },
];

/** Every test file below test/, but for what runs inside VS Code. */
function testFiles(folder) {
  return readdirSync(path.join(root, folder), { recursive: true })
    .map((file) => path.join(folder, file))
    .filter((file) => file.endsWith('.ts') && !file.includes('node_modules') && !file.startsWith('test/editor'));
}

const tests = [
  {
    ...node,
    entryPoints: testFiles('test'),
    outdir: 'out/test',
    outbase: 'test',
    packages: 'external',
    splitting: false,
  },
  { ...node, entryPoints: ['test/editor/suite/index.ts'], outdir: 'out/editor', external: ['vscode', 'mocha'] },
  {
    ...browser,
    format: 'cjs',
    entryPoints: ['test/editor/suite/index.web.ts'],
    outdir: 'out/editor',
  },
].filter((bundle) => Object.values(bundle.entryPoints).every((entry) => existsSync(path.join(root, entry))));

// What was built for a test that is gone must not run.
if (process.argv.includes('--tests')) rmSync(path.join(root, 'out/test'), { recursive: true, force: true });
const bundles = process.argv.includes('--tests') ? tests : shipped.map((bundle) => ({ ...bundle, minify: true }));
await Promise.all(bundles.map((bundle) => build(bundle)));
