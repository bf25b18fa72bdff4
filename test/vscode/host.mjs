// A real VS Code for the tests: its server, and its workbench in a headless Chromium.
import fs from 'node:fs';
import path from 'node:path';
import { launchChromium } from './chromium.mjs';
import { makeScratch } from './scratch.mjs';
import { startServer } from './server.mjs';

/**
 * Opens a copy of `workspace`, since quick fixes and saving write to it.
 *
 * @param workspace the folder to copy
 * @param options `extension`, `settings` and `env` as for startServer; `screen` as for Playwright's newPage
 */
export async function startHost(workspace, { extension, settings, env, screen }) {
  const scratch = makeScratch();
  const folder = path.join(scratch.folder, 'workspace', path.basename(workspace));
  fs.cpSync(workspace, folder, { recursive: true });

  let server;
  let browser;
  const stop = async () => {
    await browser?.close();
    await server?.stop();
    scratch.remove();
  };
  try {
    server = await startServer(path.join(scratch.folder, 'server'), { extension, settings, env });
    browser = await launchChromium();
    const page = await browser.newPage({ viewport: { width: 1280, height: 800 }, ...screen });
    const authority = `127.0.0.1:${server.port}`;
    return {
      page,
      server,
      /** What VS Code's server and the extension have logged. */
      log: () => [server.log.text(), ...extensionLogs(scratch.folder)].join('\n'),
      folder,
      scratch: scratch.folder,
      strangers: watchStrangers(page),
      stop,
      /** The page's own origin. */
      origin: `http://${authority}`,
      /** A path of this machine as the workbench must name it. */
      remote: (file) => `vscode-remote://${authority}${file}`,
      /** The workbench's address, with what its `payload` parameter is to carry. */
      url: (payload = []) =>
        `http://${authority}/?${new URLSearchParams({ folder, payload: JSON.stringify(payload) })}`,
    };
  } catch (error) {
    await stop();
    throw error;
  }
}

/** Fills a list with every address asked for that is not this machine's. */
function watchStrangers(page) {
  const strangers = [];
  const note = (address) => {
    const { protocol, hostname } = new URL(address);
    if (/^(https?|wss?):$/.test(protocol) && hostname !== '127.0.0.1') strangers.push(address);
  };
  page.on('request', (request) => note(request.url()));
  page.on('websocket', (socket) => note(socket.url()));
  return strangers;
}

/** What the extension wrote to its Output channels; a web extension's are not on disk. */
function extensionLogs(scratch) {
  const logs = path.join(scratch, 'server/data/logs');
  if (!fs.existsSync(logs)) return [];
  const files = fs.readdirSync(logs, { recursive: true }).filter((file) => /Gas State.*\.log$/.test(file));
  return files.map((file) => `--- ${path.basename(file)}\n${fs.readFileSync(path.join(logs, file), 'utf8')}`);
}
