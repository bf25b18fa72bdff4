import { readdir, readFile } from 'node:fs/promises';
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { setImmediate as immediately } from 'node:timers/promises';
import { canonical } from './address';
import type { Runtime } from './runtime';

/** Files by Node; what is no file of this machine is out of reach. */
export const nodeRuntime: Runtime = {
  readFile: (uri) => (isFile(uri) ? readText(fileURLToPath(uri)) : 'out-of-reach'),
  listFiles: (folder) => (isFile(folder) ? listBelow(fileURLToPath(folder)) : 'out-of-reach'),
  after: (milliseconds, run) => {
    const timer = setTimeout(run, milliseconds);
    return () => clearTimeout(timer);
  },
  breathe: () => immediately(),
};

function isFile(uri: string): boolean {
  return uri.startsWith('file:');
}

async function readText(file: string): Promise<string | undefined> {
  try {
    return await readFile(file, 'utf8');
  } catch (error) {
    if (absent.has((error as NodeJS.ErrnoException).code ?? '')) return undefined;
    throw error;
  }
}

const absent: ReadonlySet<string> = new Set(['ENOENT', 'ENOTDIR', 'EISDIR']);

/** Folders that hold what others wrote. */
const passedOver: ReadonlySet<string> = new Set(['node_modules', '.git']);

/** A folder that cannot be read holds nothing for us. */
async function listBelow(folder: string): Promise<readonly string[]> {
  const entries = await readdir(folder, { withFileTypes: true }).catch(() => []);
  const found = await Promise.all(
    entries.map(async (entry): Promise<readonly string[]> => {
      const inside = path.join(folder, entry.name);
      if (entry.isDirectory()) return passedOver.has(entry.name) ? [] : listBelow(inside);
      return entry.isFile() && entry.name.endsWith('.gas') ? [canonical(pathToFileURL(inside).href)] : [];
    }),
  );
  return found.flat();
}
