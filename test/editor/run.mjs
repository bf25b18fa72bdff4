// Tests the extension inside a real VS Code: what `npm run test:editor` calls after the build.
// Usage: node test/editor/run.mjs [--only host|ui|web]
import fs from 'node:fs';
import path from 'node:path';
import { parseArgs } from 'node:util';
import { findChromium } from '../vscode/chromium.mjs';
import { exitOnSignals, installServer } from '../vscode/server.mjs';
import { packageExtension } from './packageExtension.mjs';
import { runSuite } from './runSuite.mjs';
import { driveByHand } from './ui.mjs';

const root = path.resolve(import.meta.dirname, '../..');
const out = path.join(root, 'out');
const workspace = path.join(import.meta.dirname, 'workspace');

const LEGS = {
  host: { title: 'in the extension host', run: () => suiteIn('node', 'index.js') },
  ui: { title: 'the packaged extension by keyboard and mouse', run: runByHand },
  web: { title: 'as a web extension', run: () => suiteIn('web', 'index.web.js') },
};

const { values: options } = parseArgs({ options: { only: { type: 'string' } } });
if (options.only && !(options.only in LEGS)) {
  console.error(`--only takes one of ${Object.keys(LEGS).join(', ')}, not ${options.only}`);
  process.exit(2);
}

if (!findChromium()) {
  tellThatNothingRan();
  process.exit(process.env.TENUITY_REQUIRE_EDITOR === '1' ? 1 : 0);
}

exitOnSignals(1);
installServer();
fs.mkdirSync(out, { recursive: true });
const results = [];
for (const name of options.only ? [options.only] : Object.keys(LEGS)) results.push(...(await runLeg(name)));

const passed = results.filter((result) => result.kind === 'passed').length;
console.log(`\n${passed} passed, ${results.length - passed} failed`);
process.exit(passed > 0 && passed === results.length ? 0 : 1);

/** A leg that breaks down counts as one failed test. */
async function runLeg(name) {
  const { title, run } = LEGS[name];
  console.log(`\n${name}: ${title}`);
  const legResults = await run().catch((error) => [{ kind: 'failed', title: 'runs to its end', message: error.stack }]);
  for (const result of legResults) print(result);
  return legResults;
}

function suiteIn(hostKind, suite) {
  const { publisher, name } = JSON.parse(fs.readFileSync(path.join(root, 'package.json'), 'utf8'));
  return runSuite(
    { folder: root, id: `${publisher}.${name}` },
    { hostKind, suite: path.join(out, 'editor', suite), workspace, picture: path.join(out, `suite-${hostKind}.png`) },
  );
}

async function runByHand() {
  const vsix = path.join(out, 'tenuity.vsix');
  await packageExtension(root, vsix);
  return driveByHand(vsix, { workspace, pictures: path.join(out, 'shots') });
}

function print(result) {
  switch (result.kind) {
    case 'passed':
      return console.log(`  ok ${result.title} (${result.milliseconds} ms)`);
    case 'failed':
      return console.log(`  FAILED ${result.title}\n${result.message.replace(/^/gm, '    ')}`);
    case 'skipped':
      return console.log(`  SKIPPED, which counts as failed: ${result.title}`);
  }
}

function tellThatNothingRan() {
  console.error(`
**********************************************************************
*  THE REAL-EDITOR TESTS DID NOT RUN: there is no Chromium here.     *
*                                                                    *
*  Install one        apt-get install --no-install-recommends chromium
*  or name one        CHROMIUM=/path/to/chromium npm run test:editor *
*  To make its absence an error, set TENUITY_REQUIRE_EDITOR=1.       *
**********************************************************************
`);
}
