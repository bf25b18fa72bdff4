// Solves the kinetic equation for every entry of the table of resistances and writes it as TypeScript; takes minutes.
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { build } from 'esbuild';
import prettier from 'prettier';

const here = import.meta.dirname;
const folder = mkdtempSync(path.join(tmpdir(), 'tables-'));
try {
  const outfile = path.join(folder, 'tabulate.mjs');
  await build({
    entryPoints: [path.join(here, 'tabulate.ts')],
    outfile,
    bundle: true,
    format: 'esm',
    logLevel: 'warning',
  });
  const { tabulate } = await import(pathToFileURL(outfile).href);
  const file = path.join(here, 'excessResistance.ts');
  const text = [
    "import type { ResistanceTable } from './resistanceTable';",
    '',
    '/** Generated from the kinetic equation by generate.mjs; see resistanceTable.ts for what it holds. */',
    `export const excessResistance: ResistanceTable = ${JSON.stringify(tabulate())};`,
    '',
  ].join('\n');
  const options = await prettier.resolveConfig(file);
  writeFileSync(file, await prettier.format(text, { ...options, filepath: file }));
} finally {
  rmSync(folder, { recursive: true });
}
