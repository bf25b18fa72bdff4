// Finds the Chromium of this machine and starts it so that nothing but this machine can be reached.
import fs from 'node:fs';
import path from 'node:path';
import { chromium } from 'playwright-core';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable'];

const ARGUMENTS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--host-resolver-rules=MAP * ~NOTFOUND, EXCLUDE 127.0.0.1',
];

/** The path of a Chromium, or undefined when this machine has none. */
export function findChromium() {
  const named = process.env.CHROMIUM;
  if (!named) return onPath(...NAMES);
  if (!fs.existsSync(named)) throw new Error(`CHROMIUM names ${named}, which does not exist`);
  return named;
}

/** The first of these programs that is on the PATH. */
export function onPath(...names) {
  const folders = (process.env.PATH ?? '').split(path.delimiter).filter(Boolean);
  return folders.flatMap((folder) => names.map((name) => path.join(folder, name))).find((file) => fs.existsSync(file));
}

export function launchChromium() {
  const executablePath = findChromium();
  if (!executablePath) throw new Error(`none of ${NAMES.join(', ')} is on the PATH; CHROMIUM may name one`);
  return chromium.launch({ executablePath, args: ARGUMENTS });
}
