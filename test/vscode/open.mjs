// Opens the samples with the extension as it was just built: what `npm run editor` calls after the build.
// In the desktop VS Code when `code` is on the PATH, else in the VS Code in the browser that the tests use.
import { spawn, spawnSync } from 'node:child_process';
import path from 'node:path';
import { packageExtension } from '../editor/packageExtension.mjs';
import { findChromium, onPath } from './chromium.mjs';
import { makeScratch } from './scratch.mjs';
import { exitOnSignals, installServer, startServer } from './server.mjs';

const root = path.resolve(import.meta.dirname, '../..');
const samples = path.join(root, 'samples');

const code = onPath('code');
if (code) {
  const { status } = spawnSync(code, [`--extensionDevelopmentPath=${root}`, samples], { stdio: 'inherit' });
  process.exit(status ?? 1);
}

exitOnSignals(0); // Ctrl+C is how it ends.
console.log('No `code` on the PATH: starting the VS Code that the tests use.');
installServer();
const scratch = makeScratch();
const vsix = path.join(scratch.folder, 'tenuity.vsix');
await packageExtension(root, vsix);
const server = await startServer(path.join(scratch.folder, 'server'), { extension: { kind: 'packaged', vsix } });

const address = `http://127.0.0.1:${server.port}/?${new URLSearchParams({ folder: samples })}`;
console.log(`\nGas State is running in VS Code at\n\n  ${address}\n\nEdits are saved to samples/. Ctrl+C ends it.\n`);
openBrowser(address);

console.error(`VS Code's server ${await server.ended}`);
process.exit(1);

/** A help and no more: where no window can be opened, the printed address does. */
function openBrowser(url) {
  const screen = process.env.DISPLAY || process.env.WAYLAND_DISPLAY;
  const browser = screen && findChromium();
  if (!browser) return;
  const profile = `--user-data-dir=${path.join(scratch.folder, 'browser')}`;
  const asRoot = process.getuid?.() === 0 ? ['--no-sandbox'] : [];
  const window = spawn(browser, [profile, '--no-first-run', `--app=${url}`, ...asRoot], { stdio: 'ignore' });
  window.once('error', (error) =>
    console.error(`The browser did not start (${error.message}); open the address by hand.`),
  );
  process.once('exit', () => window.kill());
}
