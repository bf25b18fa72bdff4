// Runs the mocha suite inside VS Code, in the extension host of one kind or the other.
import fs from 'node:fs';
import path from 'node:path';
import { format } from 'node:util';
import { startHost } from '../vscode/host.mjs';
import { makeScratch } from '../vscode/scratch.mjs';
import { serveWebExtension } from '../vscode/serveWebExtension.mjs';

const MARK = 'tenuity-test-results ';
const SUITE_LIMIT = 120_000;
const AFTERMATH = 2_000;

/**
 * @param extension `{ folder, id }` of the extension to run
 * @param options `hostKind` 'node' or 'web'; `suite`, its built entry; `workspace`, the folder to open; `picture`, the
 *   file for a picture of the workbench when something failed
 * @returns the results that the suite left: `[{ kind: 'passed' | 'failed' | 'skipped', title, … }]`
 */
export async function runSuite(extension, { hostKind, suite, workspace, picture }) {
  const scratch = makeScratch();
  const resultsFile = path.join(scratch.folder, 'results.json');
  const printed = [];
  let host;
  try {
    host = await startHost(workspace, {
      extension: { kind: 'development' },
      settings: hostKind === 'web' ? { 'remote.extensionKind': { [extension.id]: ['web'] } } : {},
      env: { TENUITY_TEST_RESULTS: resultsFile },
    });
    const end = suiteEnd(host);
    await listen(host.page, { resultsFile, printed, end });
    await openSuite(host, extension.folder, { hostKind, suite });
    const tests = readResults(resultsFile, await end.promise);
    const failed = tests.findLast((test) => test.kind === 'failed');
    if (failed) failed.message += await gatherEvidence(host, { printed, picture });
    return tests;
  } catch (error) {
    error.message += await gatherEvidence(host, { printed, picture });
    throw error;
  } finally {
    await host?.stop();
    scratch.remove();
  }
}

/** Settles with what ended the suite, in words, or undefined when VS Code reports that it ran through. */
function suiteEnd({ page, server }) {
  let settle;
  const promise = new Promise((resolve) => (settle = resolve));
  setTimeout(() => settle(`it did not end in ${SUITE_LIMIT / 1000} s`), SUITE_LIMIT).unref();
  page.on('crash', () => settle('the page crashed'));
  void server.ended.then((how) => settle(`VS Code's server ${how}`));
  server.log.watch(() => {
    const exit = /Extension Host Process exited with code: (\S+), signal: (\S+)\./.exec(server.log.text());
    // A clean exit follows VS Code's own report; that is given a moment to arrive first.
    if (exit) setTimeout(() => settle(`the extension host ended (code ${exit[1]}, signal ${exit[2]})`), AFTERMATH);
  });
  return { promise, settle };
}

/** VS Code calls these two functions of the page when they are there. */
async function listen(page, { resultsFile, printed, end }) {
  await page.exposeFunction('codeAutomationExit', (code) =>
    end.settle(code === 0 ? undefined : `it exited with ${code}`),
  );
  await page.exposeFunction('codeAutomationLog', (type, args) => {
    const text = format(...args);
    // A web worker has neither files nor an environment: its suite prints the results as one marked line.
    if (text.startsWith(MARK)) fs.writeFileSync(resultsFile, text.slice(MARK.length));
    else if (type !== 'info') printed.push(`${type}: ${withoutOwnFrames(text)}`);
  });
}

async function openSuite(host, extensionFolder, { hostKind, suite }) {
  if (hostKind === 'web') {
    await serveWebExtension(host, extensionFolder, suite);
    await host.page.goto(host.url());
  } else {
    const development = ['extensionDevelopmentPath', host.remote(extensionFolder)];
    await host.page.goto(host.url([development, ['extensionTestsPath', host.remote(suite)]]));
  }
}

/**
 * VS Code reports a clean exit too when its extension host has died, so a run counts only with the results that the
 * suite wrote, and a bad exit only when the results do not explain it.
 */
function readResults(file, trouble) {
  if (!fs.existsSync(file)) throw new Error(`the suite left no results: ${trouble ?? 'it ended without a word'}`);
  const tests = JSON.parse(fs.readFileSync(file, 'utf8'));
  if (tests.length === 0) throw new Error('the suite has no test');
  if (trouble && tests.every((test) => test.kind === 'passed')) throw new Error(`all tests passed, but ${trouble}`);
  return tests;
}

async function gatherEvidence(host, { printed, picture }) {
  await host?.page.screenshot({ path: picture }).catch(() => {});
  return `\n--- VS Code's server\n${host?.log()}\n--- console\n${printed.join('\n')}\n--- picture: ${picture}`;
}

/** Less VS Code's own stack frames. */
function withoutOwnFrames(text) {
  return text.replace(/\n\s+at .*\/static\/out\/.*/g, '');
}
