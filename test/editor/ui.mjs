// Drives the packaged extension as a person would: reads the squiggle, the hint, the hover and the Problems view,
// applies the fix, sees the figures follow, saves.
import assert from 'node:assert/strict';
import fs from 'node:fs';
import path from 'node:path';
import { startHost } from '../vscode/host.mjs';
import * as workbench from './workbench.mjs';

const STEP_LIMIT = 30_000;
const PACKAGE_LIMIT = 1_000_000;
const FAULT = { line: 'pressure = 3', word: 'mm' };
const NAME = { line: 'state backing', word: 'backing' };
const PRESSURE = /pressure\s=\s3\s([µmhkM]?(Pa|bar|Torr)|mmHg|inHg|atm|at|psia?)(?!\w)/;
const LENGTH = /\d\s(nm|µm|mm|cm|m)(?!\w)/;

/** What the manifest does not name; vsce gives these their lower-case names. */
const SHIPPED = ['readme.md', 'changelog.md', 'LICENSE.txt', 'dist/server.js', 'dist/web/server.js', 'client/starters'];

/**
 * @param vsix the packaged extension
 * @param options `workspace`, the folder whose copy is opened; `pictures`, the folder for the pictures taken on the way
 * @returns one result a step, in the form that the suites give; the steps after a failed one are not taken
 */
export async function driveByHand(vsix, { workspace, pictures }) {
  fs.rmSync(pictures, { recursive: true, force: true });
  fs.mkdirSync(pictures, { recursive: true });
  const host = await startHost(workspace, {
    extension: { kind: 'packaged', vsix },
    screen: { viewport: { width: 1280, height: 800 }, deviceScaleFactor: 2 },
  });
  const picture = (name) => host.page.screenshot({ path: path.join(pictures, `${name}.png`) });
  host.page.setDefaultTimeout(STEP_LIMIT);
  try {
    return await take(steps(host, { vsix, picture }), async (error) => {
      await picture('failure').catch(() => {});
      return `${error.stack}\n--- VS Code's server\n${host.log()}`;
    });
  } finally {
    await host.stop();
  }
}

async function take(list, describe) {
  const results = [];
  for (const [title, act] of list) {
    const start = Date.now();
    try {
      await act();
      results.push({ kind: 'passed', title, milliseconds: Date.now() - start });
    } catch (error) {
      results.push({ kind: 'failed', title, message: await describe(error) });
      break;
    }
  }
  return results;
}

function steps({ page, folder, scratch, url, strangers }, { vsix, picture }) {
  const problem = page.locator('.markers-panel .monaco-list-row', { hasText: 'unit-mismatch' });
  const fixed = workbench.editor(page).locator('.view-line', { hasText: PRESSURE });
  return [
    [
      'is packed with all that it names and nothing else, in less than 1 MB',
      () => {
        checkInstalled(path.join(scratch, 'server/extensions'));
        assert.ok(fs.statSync(vsix).size < PACKAGE_LIMIT, `the package has ${fs.statSync(vsix).size} bytes`);
      },
    ],
    [
      'opens a record as a gas-state file',
      async () => {
        await workbench.openWorkbench(page, url());
        await workbench.openFile(page, 'slip.gas');
        assert.equal(await workbench.languageName(page), 'Gas State');
      },
    ],
    ['underlines the length where a pressure is wanted', () => workbench.squiggle(page, 'error').waitFor()],
    [
      'lists it under Problems',
      async () => {
        await workbench.openProblems(page);
        await problem.waitFor();
        await picture('1-problem');
      },
    ],
    [
      'offers pressure units by Control+. and puts one',
      async () => {
        await workbench.openQuickFixes(page, FAULT);
        await picture('2-quick-fix');
        await page.keyboard.press('Enter');
        await fixed.waitFor();
      },
    ],
    [
      'withdraws the underline and the entry under Problems',
      async () => {
        await workbench.squiggle(page, 'error').waitFor({ state: 'detached' });
        await problem.waitFor({ state: 'detached' });
      },
    ],
    [
      'shows figures beside the state now',
      async () => {
        const hint = workbench.editor(page).locator('span[class*="dyn-rule-"]', { hasText: LENGTH });
        await hint.first().waitFor();
      },
    ],
    [
      'explains the state where the pointer rests on its name',
      async () => {
        await workbench.hoverOver(page, NAME, { showing: /mean[ _]free[ _]path/i });
        await picture('3-hover');
      },
    ],
    [
      'saves',
      async () => {
        await page.keyboard.press('Escape');
        await workbench.save(page);
        assert.match(fs.readFileSync(path.join(folder, 'slip.gas'), 'utf8'), PRESSURE);
        await picture('4-saved');
      },
    ],
    [
      'goes on after a restart of the language server, in a new file from a starter',
      async () => {
        await workbench.runCommand(page, 'Gas State: Restart the language server');
        await workbench.runCommand(page, 'Gas State: New gas-state file');
        await workbench.choose(page, 'Blank state');
        await workbench.replaceWord(page, { line: 'pressure', word: 'Pa' }, 'mm');
        await workbench.squiggle(page, 'error').waitFor();
        await picture('5-new-file');
      },
    ],
    ['asks no other machine for anything', () => assert.deepEqual(strangers, [])],
  ];
}

function checkInstalled(extensions) {
  const [name] = fs.readdirSync(extensions).filter((entry) => entry.startsWith('tenuity.'));
  const folder = path.join(extensions, name);
  const manifest = JSON.parse(fs.readFileSync(path.join(folder, 'package.json'), 'utf8'));
  const missing = [...SHIPPED, ...filesNamedIn(manifest)].filter((file) => !fs.existsSync(path.join(folder, file)));
  assert.deepEqual(missing, []);
  const packed = fs
    .readdirSync(folder, { recursive: true })
    .filter((file) => /\.(map|ts|mjs)$|peggy|node_modules/.test(file));
  assert.deepEqual(packed, []);
}

/** The paths below the extension's folder that its manifest points to. */
function filesNamedIn(value) {
  if (typeof value === 'string') return /^(\.\/|client\/|dist\/)/.test(value) ? [value] : [];
  return value && typeof value === 'object' ? Object.values(value).flatMap(filesNamedIn) : [];
}
