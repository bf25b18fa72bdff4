// Takes the pictures of the README in the real editor, after `npm run build`.
// Usage: node test/editor/shots.mjs [NAME…]   (all of them without names)
import fs from 'node:fs';
import path from 'node:path';
import { startHost } from '../vscode/host.mjs';
import { makeScratch } from '../vscode/scratch.mjs';
import { exitOnSignals, installServer } from '../vscode/server.mjs';
import { packageExtension } from './packageExtension.mjs';
import { scenes } from './scenes.mjs';
import * as workbench from './workbench.mjs';

const root = path.resolve(import.meta.dirname, '../..');
const samples = path.join(root, 'samples');
const pictures = path.join(samples, 'pictures');

const THEMES = { light: 'Light Modern', dark: 'Dark Modern' };
const SETTINGS = {
  'breadcrumbs.enabled': false,
  'editor.minimap.enabled': false,
  'editor.fontSize': 14,
  'workbench.activityBar.location': 'hidden',
  'workbench.layoutControl.enabled': false,
  'window.commandCenter': false,
};

const wanted = process.argv.slice(2);
const unknown = wanted.filter((name) => scenes.every((scene) => scene.name !== name));
if (unknown.length > 0) {
  console.error(
    `No picture is named ${unknown.join(', ')}; there are ${scenes.map((scene) => scene.name).join(', ')}.`,
  );
  process.exit(2);
}

exitOnSignals(1);
installServer();
fs.mkdirSync(pictures, { recursive: true });
const scratch = makeScratch();
const vsix = path.join(scratch.folder, 'tenuity.vsix');
await packageExtension(root, vsix);
for (const scene of scenes) {
  if (wanted.length === 0 || wanted.includes(scene.name)) await takeScene(scene);
}
scratch.remove();

/** One VS Code a picture, so that none sees what another left open. */
async function takeScene(scene) {
  const { name, theme } = scene;
  const host = await startHost(samples, {
    extension: { kind: 'packaged', vsix },
    settings: { ...SETTINGS, 'workbench.colorTheme': THEMES[theme] },
    screen: { deviceScaleFactor: 2, colorScheme: theme },
  });
  try {
    await takePicture(host, scene);
    console.log(`samples/pictures/${name}.png`);
  } finally {
    await host.stop();
  }
}

async function takePicture({ page, url }, { name, file, size, show }) {
  await page.setViewportSize(size);
  await workbench.openWorkbench(page, url());
  await workbench.openFile(page, file);
  await page.keyboard.press('Control+B'); // Hides the explorer.
  for (const thing of show) await bringAbout(page, thing);
  await page.screenshot({ path: path.join(pictures, `${name}.png`), caret: 'initial' });
}

function bringAbout(page, thing) {
  switch (thing.kind) {
    case 'hover':
      return workbench.hoverOver(page, thing.at, { showing: thing.showing });
    case 'caret':
      return workbench.clickOn(page, thing.at);
    case 'fixes':
      return workbench.openQuickFixes(page, thing.at);
    case 'problems':
      return workbench.openProblems(page).then((rows) => rows.first().waitFor());
    case 'replace':
      return workbench.replaceWord(page, thing.at, thing.text);
    case 'press':
      return page.keyboard.press(thing.key);
    case 'command':
      return workbench.runCommand(page, thing.title);
    case 'wait':
      return page.locator(thing.for).first().waitFor();
    default:
      throw new Error(`a scene cannot show ${thing.kind}`);
  }
}
